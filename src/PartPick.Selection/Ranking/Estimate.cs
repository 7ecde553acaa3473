using PartPick.Physics;

namespace PartPick.Selection.Search;

/// <summary>What the first look at a family found of one combination of values.</summary>
/// <param name="Option">Place of the amplifier option.</param>
/// <param name="C1">Place of C1's value.</param>
/// <param name="C2">Place of C2's value.</param>
/// <param name="Margin">Start-up margin at the worst corner of supply, ambient and device, nominal capacitances.</param>
/// <param name="LoadFarads">Estimated load capacitance seen by the crystal.</param>
/// <param name="Steady">The estimate.</param>
/// <param name="State">The estimate's running state, from which the full solution starts.</param>
internal sealed record Estimate(
    int Option, int C1, int C2, double Margin, double LoadFarads, SteadyEstimate Steady, RunningState State)
{
    /// <summary>A shift of the frequency over amplifier and supply that the full analysis will at least find, as a ratio.</summary>
    public double LeastAmplifierRatio { get; init; }
}
