using PartPick.Selection;

namespace PartPick.Benchmarks;

/// <summary>The requirements that are ranked, over the built-in catalogue.</summary>
internal static class Wanted
{
    /// <summary>The requirements by name, in the order of the tables.</summary>
    public static IReadOnlyList<Requirement> All { get; } =
    [
        new()
        {
            Name = "river logger",
            OutputHz = 1000,
            Waveform = Waveform.Square,
            BudgetRatio = 80e-6,
            TemperatureMinCelsius = -10,
            StartUpTimeSeconds = 50e-3,
            Builds = 200,
            CostLimit = 2.50m,
        },
        new() { Name = "32.768 kHz gate", OutputHz = 32768, Circuits = [CircuitKind.Gate] },
        new() { Name = "4 MHz gate", OutputHz = 4e6, Circuits = [CircuitKind.Gate] },
        new() { Name = "4 MHz sine", OutputHz = 4e6, Waveform = Waveform.Sine },
        new() { Name = "8 MHz port", OutputHz = 8e6, SupplyMinVolts = 3.0, SupplyMaxVolts = 3.6, Circuits = [CircuitKind.Port] },
    ];

    /// <summary>Finds a requirement by a part of its name; null where there is none.</summary>
    public static Requirement? Named(string part) =>
        All.FirstOrDefault(wanted => wanted.Name.Contains(part, StringComparison.OrdinalIgnoreCase));
}
