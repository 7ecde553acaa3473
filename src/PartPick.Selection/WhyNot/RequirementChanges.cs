using System.Collections.Immutable;
using System.Globalization;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>What one requirement wants otherwise than another, key by key, as the options of a command take it.</summary>
internal static class RequirementChanges
{
    /// <summary>The changes from one requirement to another, in the order of the keys.</summary>
    /// <param name="from">The one.</param>
    /// <param name="to">The other.</param>
    public static ImmutableArray<NeededChange> Between(Requirement from, Requirement to)
    {
        var changes = ImmutableArray.CreateBuilder<NeededChange>();
        Add("output", "output", Hertz(from.OutputHz), Hertz(to.OutputHz), 10 * Larger(to.OutputHz, from.OutputHz));
        Add("waveform", "waveform", RequirementWords.Of(from.Waveform), RequirementWords.Of(to.Waveform), 2);
        Add("budget", "budget", Exact(from.BudgetRatio, Dimension.Relative), Exact(to.BudgetRatio, Dimension.Relative),
            Larger(to.BudgetRatio, from.BudgetRatio));
        Add("supply", "supply", Supply(from), Supply(to),
            1 + (Lost(from.SupplyMinVolts, from.SupplyMaxVolts, to.SupplyMinVolts, to.SupplyMaxVolts) / from.SupplyMaxVolts));
        Add("temperature", "temperature", Temperature(from), Temperature(to),
            1 + (Lost(from.TemperatureMinCelsius, from.TemperatureMaxCelsius, to.TemperatureMinCelsius, to.TemperatureMaxCelsius) / 100));
        Add("margin", "margin", Number(from.Margin), Number(to.Margin), Larger(from.Margin, to.Margin));
        Add("allowDisturbance", "a disturbance allowed", Truth(from.AllowDisturbance), Truth(to.AllowDisturbance), 2);
        Add("startUpTime", "start-up time", Time(from.StartUpTimeSeconds), Time(to.StartUpTimeSeconds),
            Larger(to.StartUpTimeSeconds ?? 1, from.StartUpTimeSeconds ?? 1));
        Add("builds", "builds", Number(from.Builds), Number(to.Builds), Larger(from.Builds, to.Builds));
        Add("costLimit", "cost limit", Money(from.CostLimit), Money(to.CostLimit),
            Larger((double)(to.CostLimit ?? 1), (double)(from.CostLimit ?? 1)));
        Add("circuits", "circuits", Circuits(from), Circuits(to), 2);
        return changes.ToImmutable();

        void Add(string key, string what, string was, string becomes, double size)
        {
            if (was != becomes)
            {
                changes.Add(new NeededChange(what, RequirementKeys.Of(key), was, becomes, size));
            }
        }
    }

    private static double Larger(double large, double small) => small > 0 && large > 0 ? Math.Max(large / small, small / large) : 2;

    // How much narrower a range has become, and how far it has moved out of the old one.
    private static double Lost(double low, double high, double newLow, double newHigh) =>
        Math.Abs(newLow - low) + Math.Abs(newHigh - high);

    private static string Exact(double value, Dimension dimension) => ValueText.FormatExact(value, dimension);

    private static string Hertz(double value) => Exact(value, Dimension.Frequency);

    private static string Supply(Requirement one) => Range(
        Exact(one.SupplyMinVolts, Dimension.Voltage), Exact(one.SupplyMaxVolts, Dimension.Voltage));

    private static string Temperature(Requirement one) => Range(Number(one.TemperatureMinCelsius), Number(one.TemperatureMaxCelsius));

    private static string Range(string low, string high) => low == high ? low : $"{low}..{high}";

    private static string Time(double? seconds) => seconds is { } value ? Exact(value, Dimension.Time) : "any";

    private static string Money(decimal? amount) => amount is { } value ? Say.Money(value) : "any";

    private static string Truth(bool value) => value ? "true" : "false";

    private static string Circuits(Requirement one) => string.Join(' ', one.Circuits.Select(circuit => circuit.Word()));

    private static string Number(double value) => value.ToString("0.####", CultureInfo.InvariantCulture);
}
