using PartPick.Values;

namespace PartPick.Catalog.Import;

/// <summary>Whether the cells of a column can be the figures that its header names.</summary>
/// <param name="kind">The kind of the parts.</param>
/// <param name="sample">The first rows.</param>
internal sealed class ColumnFit(PartKind kind, ColumnSample sample)
{
    // A whole name is believed where any cell fits, a part of one where most do.
    private const double MostUnfit = 0.5;

    /// <summary>Whether they can.</summary>
    public bool Holds(FieldMatch match)
    {
        HeaderCell header = match.Reading;
        Dimension? dimension = ImportFields.DimensionOf(kind, match.Field);
        if (header.Unit.Length > 0 && !UnitFits(match.Field, dimension, header))
        {
            return false;
        }

        double least = match.Field == "priceFor" ? MostUnfit : match.Score >= FieldMatch.Whole ? double.Epsilon : MostUnfit;
        string[] cells = sample.Cells(match.Column);
        return ColumnSample.Share(cells, cell => Reads(match.Field, dimension, header, cell)) >= least;
    }

    private static bool UnitFits(string field, Dimension? dimension, HeaderCell header) => field switch
    {
        "price" or "prices" => Currencies.IsName(header.Unit) || header.Unit is "pcs",
        "temperature" => UnitSpelling.PowerOf(header.Unit, Dimension.Temperature) is not null,
        "toleranceAny" => UnitSpelling.PowerOf(header.Unit, Dimension.Relative) is not null
            || UnitSpelling.PowerOf(header.Unit, Dimension.Capacitance) is not null,
        "stock" or "minimumOrder" or "multiple" or "priceQuantity" or "priceFor" => header.Unit is "pcs" || header.Unit.Length == 0
            || UnitSpelling.Of(header.Unit).Length == 0,
        _ => dimension is not { } known || UnitSpelling.PowerOf(header.Unit, known) is not null,
    };

    private bool Reads(string field, Dimension? dimension, HeaderCell header, string cell) => field switch
    {
        "temperature" => TemperatureRange.Read(cell) is not null,
        "price" or "prices" when TradeAnswers.IsOnRequest(cell) => true,
        "stock" when TradeAnswers.Stock(cell) is not null => true,
        "price" => Either(notation => PriceCells.Price(cell, notation) is not null),
        "prices" => Either(notation => PriceCells.List(cell, notation) is not null),
        "priceQuantity" or "priceFor" => Either(notation => CellNumber.Read(cell, Dimension.Count, 0, notation, false).IsOk),
        "toleranceAny" => cell.Any(char.IsAsciiDigit) || cell.Length == 1,
        "stages" => ImportFields.Stages(cell) is not null,
        "overtone" => CrystalWords.OvertoneOf(cell) is not null,
        "cut" => CrystalWords.CutOf(cell) is not null,
        "dielectric" => cell.Length < 40 && cell.Any(char.IsLetter) && !cell.Contains("ppm", StringComparison.OrdinalIgnoreCase),
        "load" when CrystalWords.IsSeries(cell) => true,
        "currency" => Currencies.IsName(cell) || Currencies.In(cell) is not null,
        "package" => cell.Length < 60,
        "supplierPart" => cell.Length < 80,
        _ when dimension is { } measured => Either(notation => Plausibly(field, measured, header, cell, notation)),
        _ => true,
    };

    // Also a figure that no part has speaks against it, whatever unit it may be in.
    private bool Plausibly(string field, Dimension dimension, HeaderCell header, string cell, NumberNotation notation)
    {
        bool IsFigure(int power) =>
            CellNumber.Read(cell, dimension, power, notation, AllowsNegative(field)) is { IsOk: true } read
            && (read.Value == 0 || Plausible.Holds(kind, field, read.Value));
        return header.Unit.Length > 0 && UnitSpelling.PowerOf(header.Unit, dimension) is { } stated ? IsFigure(stated)
            : CellNumber.HasNoUnit(cell) ? UnitChoice.Units(dimension).Any(unit => IsFigure(unit.Power))
            : IsFigure(0);
    }

    private static bool AllowsNegative(string field) =>
        field is "parabola" or "temperatureCoefficient" || field.StartsWith("temp", StringComparison.Ordinal);

    private static bool Either(Func<NumberNotation, bool> reads) => reads(NumberNotation.Point) || reads(NumberNotation.Comma);
}
