using PartPick.Values;

namespace PartPick.Catalog.Import;

/// <summary>Finds the use of columns without a telling header from their cells alone, where only one use is possible.</summary>
/// <param name="kind">The kind of the parts.</param>
/// <param name="sample">The first rows.</param>
/// <param name="file">The decimal sign of the file.</param>
internal sealed class ValueMatching(PartKind kind, ColumnSample sample, NumberNotation file)
{
    /// <summary>The uses with those that the cells tell.</summary>
    public ColumnUse[] Complete(ColumnUse[] uses)
    {
        foreach ((string field, Dimension dimension) in Measured())
        {
            Take(uses, field, use => sample.Cells(use.Index).All(cell => Carries(field, dimension, cell))
                && !(field == "load" && sample.Cells(use.Index).All(cell => Read(cell, Dimension.Capacitance).Value <= 7e-12)));
        }

        if (ImportFields.DimensionOf(kind, "temperatureMin") is not null
            && !uses.Any(use => use.Field is "temperatureMin" or "temperatureMax"))
        {
            Take(uses, "temperature", use => sample.Cells(use.Index).All(cell =>
                cell.Contains('C', StringComparison.Ordinal) && TemperatureRange.Read(cell) is not null));
        }

        if (!uses.Any(use => use.Field is "price"))
        {
            Take(uses, "prices", use => sample.Cells(use.Index).All(cell => PriceCells.List(cell, file) is { Count: > 1 }));
        }

        Take(uses, "currency", use => sample.Cells(use.Index).All(Currencies.IsName));

        if (ImportFields.HasStages(kind))
        {
            Take(uses, "stages", use => sample.Cells(use.Index).All(cell => cell.Length > 3 && ImportFields.Stages(cell) is not null));
        }

        if (!uses.Any(use => use.Field is "id" or "supplierPart"))
        {
            ColumnUse? code = uses.FirstOrDefault(use => IsOpen(use) && sample.IsCode(use.Index));
            if (code is not null)
            {
                uses[code.Index] = code with { Field = "supplierPart", Why = "its cells: a code in every row, each time another" };
            }
        }

        return uses;
    }

    private void Take(ColumnUse[] uses, string field, Func<ColumnUse, bool> fits)
    {
        if (uses.Any(use => use.Field == field))
        {
            return;
        }

        TradeWords? words = TradeWords.Of(kind).FirstOrDefault(each => each.Field == field);
        ColumnUse[] fitting = [.. uses.Where(use => IsOpen(use)
            && words?.IsOther(HeaderCell.Of(use.Header)) != true
            && sample.Cells(use.Index).Length > 0 && fits(use))];
        if (fitting.Length == 1)
        {
            int at = fitting[0].Index;
            uses[at] = uses[at] with
            {
                Field = field,
                Power = ColumnUse.NoPlainNumbers,
                Notation = file,
                Why = field is "temperature" ? "its cells: temperature ranges"
                    : field is "stages" ? "its cells: buffered or not"
                    : field is "currency" ? "its cells: currencies"
                    : field is "prices" ? "its cells: lists of prices" : "the unit of its cells",
            };
        }
    }

    private static bool IsOpen(ColumnUse use) => use.Field is null && use.IsUnnamed;

    private bool Carries(string field, Dimension dimension, string cell) =>
        !CellNumber.HasNoUnit(cell) && Read(cell, dimension) is { IsOk: true } read && Plausible.Holds(kind, field, read.Value);

    private Result<double> Read(string cell, Dimension dimension) => CellNumber.Read(cell, dimension, 0, file, false);

    private IEnumerable<(string Field, Dimension Dimension)> Measured() => kind switch
    {
        PartKind.Crystal =>
        [
            ("frequency", Dimension.Frequency),
            ("load", Dimension.Capacitance),
            ("resistance", Dimension.Resistance),
            ("driveLevel", Dimension.Power),
        ],
        PartKind.Capacitor =>
        [
            ("value", Dimension.Capacitance), ("voltage", Dimension.Voltage), ("temperatureCoefficient", Dimension.RelativePerKelvin),
        ],
        PartKind.Resistor => [("value", Dimension.Resistance), ("tolerance", Dimension.Relative)],
        PartKind.Transistor => [("transitionFrequency", Dimension.Frequency), ("currentMax", Dimension.Current)],
        _ => [],
    };
}
