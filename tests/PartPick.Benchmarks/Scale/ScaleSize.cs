namespace PartPick.Benchmarks;

/// <summary>How many parts of each kind a generated catalogue holds.</summary>
/// <param name="Crystals">Crystals.</param>
/// <param name="Capacitors">Capacitors.</param>
/// <param name="Amplifiers">Inverters, counters, ports and transistors together.</param>
/// <param name="Resistors">Resistors.</param>
internal sealed record ScaleSize(int Crystals, int Capacitors, int Amplifiers, int Resistors)
{
    /// <summary>A distributor's catalogue.</summary>
    public static ScaleSize Full { get; } = new(20_000, 2_000, 500, 500);

    /// <summary>A small one, to try the benchmark with.</summary>
    public static ScaleSize Quick { get; } = new(1_000, 300, 12, 300);
}
