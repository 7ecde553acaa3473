using System.Collections.Immutable;
using PartPick.Selection.Files;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>Reads the keys of a requirement and checks their ranges.</summary>
internal static class RequirementReader
{
    /// <summary>Largest budget that makes sense for a crystal: one per cent.</summary>
    private const double LargestBudgetRatio = 0.01;

    private const double MostYears = 100;

    public static Requirement Read(FieldReader fields)
    {
        var defaults = new Requirement { OutputHz = fields.Needed("output", Dimension.Frequency) };
        (double supplyMin, double supplyMax) =
            fields.Range("supply", Dimension.Voltage, (defaults.SupplyMinVolts, defaults.SupplyMaxVolts), positive: true);
        (double coldest, double hottest) = fields.Range(
            "temperature", Dimension.Temperature, (defaults.TemperatureMinCelsius, defaults.TemperatureMaxCelsius), positive: false);
        return defaults with
        {
            Name = fields.Text("name", "a text") ?? defaults.Name,
            Waveform = fields.Word("waveform", RequirementWords.Waveforms) ?? defaults.Waveform,
            BudgetRatio = Budget(fields) ?? defaults.BudgetRatio,
            SupplyMinVolts = supplyMin,
            SupplyMaxVolts = supplyMax,
            TemperatureMinCelsius = coldest,
            TemperatureMaxCelsius = hottest,
            Years = Years(fields) ?? defaults.Years,
            Margin = fields.Optional("margin", Dimension.Number, positive: true) ?? defaults.Margin,
            AllowDisturbance = fields.Flag("allowDisturbance") ?? defaults.AllowDisturbance,
            StartUpTimeSeconds = fields.Optional("startUpTime", Dimension.Time, positive: true),
            Builds = (int)(fields.Optional("builds", Dimension.Count, positive: true) ?? defaults.Builds),
            CostLimit = Cost(fields),
            Board = BoardFields.Read(fields) ?? defaults.Board,
            CapacitorSeries = Series(fields, "capacitorSeries") ?? defaults.CapacitorSeries,
            ResistorSeries = Series(fields, "resistorSeries") ?? defaults.ResistorSeries,
            BiasSeries = Series(fields, "biasSeries") ?? defaults.BiasSeries,
            Circuits = Circuits(fields) ?? defaults.Circuits,
            Weights = WeightFields.Read(fields) ?? defaults.Weights,
        };
    }

    private static double? Budget(FieldReader fields)
    {
        double? budget = fields.Optional("budget", Dimension.Relative, positive: true);
        if (budget > LargestBudgetRatio)
        {
            fields.Reject("budget", $"{ValueText.Format(budget.Value, Dimension.Relative)} is no budget for a crystal",
                "at most 1 %, such as 80 ppm (a plain number is a ratio: 8e-5)");
        }

        return budget;
    }

    private static double? Years(FieldReader fields)
    {
        double? years = fields.Optional("years", Dimension.Number);
        if (years > MostYears)
        {
            fields.Reject("years", "is beyond what an ageing figure tells", "at most 100, such as 5");
        }

        return years;
    }

    private static decimal? Cost(FieldReader fields)
    {
        double? cost = fields.Optional("costLimit", Dimension.Number, positive: true);
        if (cost > 1e9)
        {
            fields.Reject("costLimit", "is beyond any price", "a cost per unit such as 2.50");
            return null;
        }

        return (decimal?)cost;
    }

    private static string? Series(FieldReader fields, string key)
    {
        if (fields.Text(key, "a series such as E12") is not { } text)
        {
            return null;
        }

        Result<PreferredSeries> series = PreferredSeries.Named(text, fields.Where(key));
        if (!series.IsOk)
        {
            fields.Reject(key, series.Problem.What, series.Problem.Fits);
        }

        return series.Map(found => found.Name).ValueOr(text);
    }

    private static ImmutableArray<CircuitKind>? Circuits(FieldReader fields)
    {
        string fits = "a list of one or more of " + string.Join(", ", CircuitWords.ByWord.Keys);
        if (fields.Items("circuits", fits) is not { } items)
        {
            return null;
        }

        ImmutableArray<CircuitKind> circuits =
        [
            .. items.Select(item => fields.WordOf(item, CircuitWords.ByWord, fits)).OfType<CircuitKind>().Distinct(),
        ];
        if (items.Count == 0)
        {
            fields.Reject("circuits", "names none", fits);
        }

        return circuits;
    }
}
