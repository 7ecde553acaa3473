using System.Collections.Immutable;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>What is to be minded before a circuit is built, as far as the requirement shows it.</summary>
public static class Cautions
{
    // From here on an output is usable as a carrier; long-wave broadcasting begins at 148.5 kHz (ITU Radio Regulations, region 1).
    private const double CarrierHz = 100e3;

    // Common practice: a start-up margin of 10 is asked for where safety rests on the oscillator.
    private const double SafetyMargin = 10;

    /// <summary>The cautions as sentences.</summary>
    /// <param name="requirement">The requirement.</param>
    public static ImmutableArray<string> Of(Requirement requirement)
    {
        ArgumentNullException.ThrowIfNull(requirement);
        var cautions = ImmutableArray.CreateBuilder<string>();
        cautions.Add("Measure the first board: its frequency, and its start-up margin by adding resistance in series with the crystal.");
        if (requirement.OutputHz >= CarrierHz)
        {
            string output = ValueText.Format(requirement.OutputHz, Dimension.Frequency);
            cautions.Add($"If {output} or a harmonic of it is radiated as a carrier, that needs a licence where the law says so.");
        }

        if (requirement.Margin >= SafetyMargin)
        {
            string margin = ValueText.Format(requirement.Margin, Dimension.Number);
            cautions.Add($"A start-up margin of {margin} is for timing on which safety rests: have a qualified person review it.");
        }

        return cautions.ToImmutable();
    }
}
