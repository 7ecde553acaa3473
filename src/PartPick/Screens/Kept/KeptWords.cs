using System.Collections.Immutable;
using System.Globalization;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>Requirements in a few words, and value by value.</summary>
internal static class KeptWords
{
    /// <summary>What tells requirements apart at a glance: "1 kHz square, ±80 ppm, 4.5 to 5.5 V, 200 boards".</summary>
    /// <param name="requirement">The requirement.</param>
    public static string Short(Requirement requirement)
    {
        string wave = requirement.Waveform == Waveform.Any ? "" : " " + requirement.Waveform.ToString().ToLowerInvariant();
        string supply = requirement.SupplyMinVolts == requirement.SupplyMaxVolts
            ? $"{Number(requirement.SupplyMinVolts)} V"
            : $"{Number(requirement.SupplyMinVolts)} to {Number(requirement.SupplyMaxVolts)} V";
        return $"{ValueText.Format(requirement.OutputHz, Dimension.Frequency, 9)}{wave}, "
            + $"±{ValueText.Format(requirement.BudgetRatio, Dimension.Relative)}, {supply}, "
            + $"{Number(requirement.TemperatureMinCelsius)} to {Number(requirement.TemperatureMaxCelsius)} °C, "
            + $"{Number(requirement.Builds)} boards";
    }

    /// <summary>Every value but the name, in the words of the sentence and in its order.</summary>
    /// <param name="requirement">The requirement.</param>
    /// <param name="currency">The currency of the cost limit; empty where it is not known.</param>
    public static ImmutableArray<(string Name, string Value)> Values(Requirement requirement, string currency) =>
    [
        .. Sentence.Pieces(requirement, () => currency).Select(piece => piece.Field).OfType<SentenceField>().Skip(1)
            .Select(field => (field.Name, field.Show(requirement) + UnitOf(field.Name))),
        ("damping series", requirement.ResistorSeries),
        ("bias series", requirement.BiasSeries),
    ];

    // In the sentence the unit follows the second value of a range.
    private static string UnitOf(string field) => field switch
    {
        "lowest supply" => " V",
        "lowest temperature" => " °C",
        _ => "",
    };

    private static string Number(double value) => value.ToString("0.###", CultureInfo.InvariantCulture);
}
