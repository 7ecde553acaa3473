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
    // Share of an estimated shift that is sure, and what is taken off it.
    private const double SureShare = 0.7;
    private const double Slack = 0.5e-6;
    private double? _amplifierRatio;

    /// <summary>
    /// A shift of the frequency over amplifier and supply that the full analysis will at least find, as a ratio: from
    /// estimates at the two extreme corners. Computed once for all crystals of the family.
    /// </summary>
    public double LeastAmplifierRatio(CircuitTemplate template, in CircuitValues values) =>
        _amplifierRatio ??= FindLeastAmplifierRatio(template, values);

    private double FindLeastAmplifierRatio(CircuitTemplate template, in CircuitValues values)
    {
        double most = 0;
        foreach (OperatingPoint point in new[] { template.AmplifierCorners[0], template.AmplifierCorners[^1] })
        {
            if (OscillatorAnalysis.EstimateSteadyState(template.At(values, point), State, out _) is { } there)
            {
                most = Math.Max(most, Math.Abs(there.FrequencyHz / Steady.FrequencyHz - 1));
            }
        }

        return Math.Max(0, SureShare * most - Slack);
    }
}
