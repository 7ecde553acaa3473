using PartPick.Physics;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>What load capacitors are wanted for.</summary>
public sealed record LoadPairRequest
{
    /// <summary>Wanted load capacitance in farads, above zero.</summary>
    public required double LoadFarads { get; init; }

    /// <summary>Stray capacitance as one figure, in farads: it adds to the load as a whole (ST AN2867, section 3.3).</summary>
    public double StrayFarads { get; init; }

    /// <summary>Stray capacitance at each of the two pins to ground, in farads: it adds to each capacitor.</summary>
    public double PinStrayFarads { get; init; }

    /// <summary>Series of the capacitors' values.</summary>
    public required PreferredSeries Series { get; init; }

    /// <summary>Whether a side may be two capacitors in parallel.</summary>
    public bool Parallel { get; init; }

    /// <summary>Largest ratio of the two sides: a lopsided pair costs gain.</summary>
    public double LargestRatio { get; init; } = 3;

    /// <summary>Number of pairs wanted.</summary>
    public int Top { get; init; } = 10;

    /// <summary>The crystal whose frequency the pairs are judged by; null for none.</summary>
    public Crystal? Crystal { get; init; }

    /// <summary>The value of each of two equal capacitors that would give the load exactly, in farads; zero or less: none can.</summary>
    public double ExactFarads => 2 * (LoadFarads - StrayFarads) - PinStrayFarads;
}
