using System.Globalization;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Output;

/// <summary>A requirement as one sentence.</summary>
internal static class RequirementSentence
{
    /// <summary>The sentence.</summary>
    public static string Of(Requirement requirement)
    {
        string name = requirement.Name.Length == 0 ? "" : requirement.Name + ": ";
        string wave = requirement.Waveform == Waveform.Any ? "" : requirement.Waveform.ToString().ToLowerInvariant() + " wave ";
        string supply = requirement.SupplyMinVolts == requirement.SupplyMaxVolts
            ? $"{Number(requirement.SupplyMinVolts)} V"
            : $"{Number(requirement.SupplyMinVolts)} to {Number(requirement.SupplyMaxVolts)} V";
        string start = requirement.StartUpTimeSeconds is { } time ? $", starting within {ValueText.Format(time, Dimension.Time)}" : "";
        string cost = requirement.CostLimit is { } limit ? $", at most {limit.ToString(CultureInfo.InvariantCulture)} each" : "";
        return $"{name}{wave}{ValueText.Format(requirement.OutputHz, Dimension.Frequency, 9)} within "
            + $"{ValueText.Format(requirement.BudgetRatio, Dimension.Relative)} from {supply}, "
            + $"{Number(requirement.TemperatureMinCelsius)} to {Number(requirement.TemperatureMaxCelsius)} °C, for "
            + $"{Number(requirement.Years)} years, start-up margin {Number(requirement.Margin)} or more"
            + (requirement.AllowDisturbance ? " or a disturbance" : "") + $"{start}; {Number(requirement.Builds)} builds{cost}, "
            + $"{requirement.Board.Name} board.";
    }

    private static string Number(double value) => value.ToString("0.###", CultureInfo.InvariantCulture);
}
