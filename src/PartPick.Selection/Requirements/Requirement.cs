using System.Collections.Immutable;
using PartPick.Physics.Circuits;

namespace PartPick.Selection;

/// <summary>The waveform that the board needs.</summary>
public enum Waveform
{
    /// <summary>Either will do.</summary>
    Any,

    /// <summary>Logic levels: from a gate, a counter or a port.</summary>
    Square,

    /// <summary>A sine: from a follower.</summary>
    Sine,
}

/// <summary>Stray capacitances of a board and how far they may be off.</summary>
/// <param name="Name">Name of the preset, or "own".</param>
/// <param name="Strays">Nominal strays.</param>
/// <param name="UncertaintyRatio">Uncertainty of all strays, as a ratio.</param>
public sealed record Board(string Name, Strays Strays, double UncertaintyRatio)
{
    /// <summary>Breadboard: long wires and contact rows (common practice).</summary>
    public static Board Breadboard { get; } = new("breadboard", new Strays(6e-12, 6e-12, 2e-12), 0.4);

    /// <summary>Two-layer board (common practice: 2 to 5 pF at each pin).</summary>
    public static Board TwoLayer { get; } = new("two-layer", new Strays(3e-12, 3e-12, 1e-12), 0.3);

    /// <summary>Four-layer board, crystal beside the amplifier (common practice).</summary>
    public static Board FourLayer { get; } = new("four-layer", new Strays(2e-12, 2e-12, 0.5e-12), 0.25);

    /// <summary>The presets, from the loosest.</summary>
    public static ImmutableArray<Board> Presets { get; } = [Breadboard, TwoLayer, FourLayer];
}

/// <summary>Weights of the score.</summary>
/// <param name="Error">Weight of error over budget; zero or more.</param>
/// <param name="Margin">Weight of required margin over margin; zero or more.</param>
/// <param name="Cost">Weight of cost over the cheapest fit cost; zero or more.</param>
public sealed record Weights(double Error = 1, double Margin = 1, double Cost = 1);

/// <summary>What the board needs. Only the output frequency has no default.</summary>
public sealed record Requirement
{
    /// <summary>A name for the requirement; may be empty.</summary>
    public string Name { get; init; } = "";

    /// <summary>Wanted output frequency in hertz, above zero.</summary>
    public required double OutputHz { get; init; }

    /// <summary>Wanted waveform.</summary>
    public Waveform Waveform { get; init; } = Waveform.Any;

    /// <summary>Largest frequency error (worst case), as a ratio; above zero.</summary>
    public double BudgetRatio { get; init; } = 100e-6;

    /// <summary>Lowest supply in volts.</summary>
    public double SupplyMinVolts { get; init; } = 4.5;

    /// <summary>Highest supply in volts.</summary>
    public double SupplyMaxVolts { get; init; } = 5.5;

    /// <summary>Lowest ambient temperature in °C.</summary>
    public double TemperatureMinCelsius { get; init; }

    /// <summary>Highest ambient temperature in °C.</summary>
    public double TemperatureMaxCelsius { get; init; } = 50;

    /// <summary>Years of service, zero or more.</summary>
    public double Years { get; init; } = 5;

    /// <summary>Smallest start-up margin.</summary>
    public double Margin { get; init; } = 5;

    /// <summary>Whether a circuit that needs a disturbance to start may be fit.</summary>
    public bool AllowDisturbance { get; init; }

    /// <summary>Longest start-up time in seconds; null where it does not matter.</summary>
    public double? StartUpTimeSeconds { get; init; }

    /// <summary>Number of boards built, one or more.</summary>
    public int Builds { get; init; } = 100;

    /// <summary>Highest cost per unit in the catalogue's currency; null where it does not matter.</summary>
    public decimal? CostLimit { get; init; }

    /// <summary>The board and its strays.</summary>
    public Board Board { get; init; } = Board.TwoLayer;

    /// <summary>Series of the load capacitors' values.</summary>
    public string CapacitorSeries { get; init; } = "E12";

    /// <summary>Series of the damping resistor's values.</summary>
    public string ResistorSeries { get; init; } = "E12";

    /// <summary>Series of the follower's bias resistors' values.</summary>
    public string BiasSeries { get; init; } = "E3";

    /// <summary>Circuits that may be used.</summary>
    public ImmutableArray<CircuitKind> Circuits { get; init; } =
        [CircuitKind.Gate, CircuitKind.Counter, CircuitKind.Follower, CircuitKind.Port];

    /// <summary>Weights of the score.</summary>
    public Weights Weights { get; init; } = new();

    /// <summary>Supply at which the nominal figures are taken: the middle of the range, in volts.</summary>
    public double NominalSupplyVolts => (SupplyMinVolts + SupplyMaxVolts) / 2;
}
