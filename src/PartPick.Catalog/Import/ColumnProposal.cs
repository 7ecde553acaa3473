using PartPick.Catalog.Fields;
using PartPick.Values;

namespace PartPick.Catalog.Import;

/// <summary>Proposes what each column of a file is: from its header, and from its cells.</summary>
/// <param name="kind">The kind of the parts.</param>
/// <param name="rows">The first rows of the file.</param>
/// <param name="options">What the user stated.</param>
internal sealed class ColumnProposal(PartKind kind, IReadOnlyList<string[]> rows, ImportOptions options)
{
    private const double MostUnfit = 0.5;

    private readonly PartShape _shape = PartShape.Of(kind);

    /// <summary>The columns of a header.</summary>
    public ColumnUse[] For(IReadOnlyList<string> header, IReadOnlyList<ColumnWish> wishes)
    {
        HeaderCell[] cells = [.. header.Select(HeaderCell.Of)];
        if (wishes.Count == 0 && cells.Where(cell => !RejectedFile.IsOwnColumn(cell.Text)).All(cell => FieldOf(cell.Text) is not null))
        {
            return [.. cells.Select((cell, i) => Exactly(i, cell.Text))];
        }

        ColumnUse[] uses = Assign(cells, wishes);
        NumberNotation file = options.Notation != NumberNotation.Unknown ? options.Notation : FileNotation(uses);
        for (int i = 0; i < uses.Length; i++)
        {
            uses[i] = Finish(uses[i], cells[i], file, wishes.FirstOrDefault(wish => Same(wish.Header, cells[i].Text)));
        }

        return WithoutUnknownMoney(ByValues(uses, file));
    }

    /// <summary>How many cells of a row are known headers.</summary>
    public static int Known(PartKind kind, IReadOnlyList<string> row, IReadOnlyList<ColumnWish> wishes)
    {
        PartShape shape = PartShape.Of(kind);
        return row.Count(cell => cell.Length is > 0 and < 80 && !char.IsAsciiDigit(cell[0])
                && (shape.Fields.Any(field => field.Header == cell.Trim())
                    || wishes.Any(wish => Same(wish.Header, cell))
                    || FieldMatch.Of(kind, 0, HeaderCell.Of(cell)).Any()))
            + row.Count(cell => cell.Length is > 0 and < 80
                && char.IsAsciiDigit(cell[0])
                && HeaderCell.Of(cell).PriceQuantity() is not null);
    }

    private static bool Same(string one, string other) => string.Equals(one.Trim(), other.Trim(), StringComparison.OrdinalIgnoreCase);

    private PartField? FieldOf(string header) => _shape.Fields.FirstOrDefault(field => field.Header == header);

    private ColumnUse Exactly(int index, string header) => FieldOf(header) is { } field
        ? new ColumnUse
        {
            Index = index, Header = header, Field = field.Key, Unit = field.Unit, Power = field.Power, Notation = NumberNotation.Point,
            Exact = true, Why = "the program's own header",
        }
        : new ColumnUse { Index = index, Header = header, Why = "added by an earlier import, not read" };

    private ColumnUse[] Assign(HeaderCell[] cells, IReadOnlyList<ColumnWish> wishes)
    {
        var uses = new ColumnUse[cells.Length];
        var taken = new HashSet<string>(StringComparer.Ordinal);
        for (int i = 0; i < cells.Length; i++)
        {
            uses[i] = new ColumnUse
            {
                Index = i,
                Header = cells[i].Text,
                Basis = cells[i].Basis,
                Why = "its header names no figure of " + kind.Word(),
            };
            if (RejectedFile.IsOwnColumn(cells[i].Text))
            {
                uses[i] = uses[i] with { Why = "added by an earlier import, not read" };
            }
            else if (wishes.FirstOrDefault(wish => Same(wish.Header, cells[i].Text)) is { } wish)
            {
                uses[i] = uses[i] with { Field = wish.Field, Why = wish.Field is null ? "left out as stated" : "stated" };
                if (wish.Field is { } field && field is not "price")
                {
                    taken.Add(field);
                }
            }
            else if (cells[i].PriceQuantity() is { } quantity
                && !FieldMatch.Of(kind, i, cells[i]).Any(match => match.Score >= 85 && match.Field != "price"))
            {
                uses[i] = uses[i] with { Field = "price", Quantity = quantity, Why = $"header: price from {quantity}" };
            }
        }

        IEnumerable<FieldMatch> matches = cells
            .SelectMany((cell, i) => uses[i].Field is null && uses[i].Why.StartsWith("its header", StringComparison.Ordinal)
                ? FieldMatch.Of(kind, i, cell)
                : [])
            .OrderByDescending(match => match.Score).ThenBy(match => match.Column);
        foreach (FieldMatch match in matches)
        {
            if (uses[match.Column].Field is null && Fits(match, cells[match.Column]))
            {
                if (taken.Add(match.Field))
                {
                    uses[match.Column] = uses[match.Column] with { Field = match.Field, Why = "header" };
                }
                else
                {
                    uses[match.Column] = uses[match.Column] with { Why = $"another column is {match.Field} more surely" };
                }
            }
        }

        return uses;
    }

    private bool Fits(FieldMatch match, HeaderCell header)
    {
        Dimension? dimension = DimensionOf(match.Field);
        if (dimension is { } known && header.Unit.Length > 0 && match.Field is not ("price" or "prices" or "temperature" or "toleranceAny")
            && UnitSpelling.PowerOf(header.Unit, known) is null)
        {
            return false;
        }

        string[] cells = Cells(match.Column);
        // A whole name is believed where any cell fits, a part of one where most do.
        double least = match.Score >= 85 ? double.Epsilon : MostUnfit;
        return cells.Length == 0 || match.Field switch
        {
            "temperature" => Share(cells, cell => TemperatureRange.Read(cell) is not null) >= least,
            "price" => Share(cells, cell => PriceCells.Price(cell, NumberNotation.Point) is not null
                || PriceCells.Price(cell, NumberNotation.Comma) is not null) >= least,
            "prices" => Share(cells, cell => PriceCells.List(cell, NumberNotation.Point) is not null
                || PriceCells.List(cell, NumberNotation.Comma) is not null) >= least,
            "toleranceAny" => Share(cells, cell => cell.Any(char.IsAsciiDigit) || cell.Length == 1) >= least,
            "overtone" or "cut" => true,
            _ when dimension is { } measured => Share(cells, cell => Readable(match.Field, cell, measured)) >= least,
            _ => true,
        };
    }

    private static bool Readable(string field, string cell, Dimension dimension) =>
        CellNumber.Read(
            cell, dimension, 0, NumberNotation.Point, field.StartsWith("temp", StringComparison.Ordinal) || field == "parabola").IsOk
        || CellNumber.Read(cell, dimension, 0, NumberNotation.Comma, field == "parabola").IsOk;

    private NumberNotation FileNotation(ColumnUse[] uses)
    {
        var proved = uses.Where(use => use.Field is not null && IsNumeric(use.Field))
            .Select(use => NotationChoice.Proved(Numbers(use), DimensionOf(use.Field!) == Dimension.Count))
            .Where(notation => notation != NumberNotation.Unknown).Distinct().ToList();
        return proved.Count == 1 ? proved[0] : NumberNotation.Unknown;
    }

    private ColumnUse Finish(ColumnUse use, HeaderCell header, NumberNotation file, ColumnWish? wish)
    {
        if (use.Field is not { } field || !IsNumeric(field))
        {
            return use;
        }

        string unit = wish?.Unit is { Length: > 0 } stated ? stated : header.Unit;
        Dimension? dimension = DimensionOf(field);
        int? power = dimension is { } known && unit.Length > 0 ? UnitSpelling.PowerOf(unit, known) : null;
        (NumberNotation notation, string how) = Notation(use, field, dimension, power, file);
        use = use with { Notation = notation, Why = use.Why + how };
        if (field is "price" or "prices")
        {
            string? currency = PriceCells.CurrencyIn(header.Text) ?? options.Currency;
            return use with { Currency = currency };
        }

        if (dimension is not { } measured || field is "temperature" or "toleranceAny")
        {
            return use with { Unit = unit };
        }

        if (power is { } ready)
        {
            return use with { Unit = unit, Power = ready };
        }

        (int found, string name, string why) = UnitChoice.For(kind, field, measured, notation, Cells(use.Index));
        return use with { Unit = name, Power = found, Why = use.Why + why };
    }

    private (NumberNotation Notation, string How) Notation(
        ColumnUse use, string field, Dimension? dimension, int? power, NumberNotation file)
    {
        if (options.Notation != NumberNotation.Unknown)
        {
            return (options.Notation, $"; decimal {Word(options.Notation)} as stated");
        }

        string[] numbers = [.. Numbers(use)];
        (bool comma, bool point) = NotationChoice.Open(numbers);
        NumberNotation proved = NotationChoice.Proved(numbers, dimension == Dimension.Count);
        if (proved != NumberNotation.Unknown)
        {
            return (proved, comma || point || proved == NumberNotation.Comma ? $"; decimal {Word(proved)}, as its other cells show" : "");
        }

        if (!comma && !point)
        {
            return (file == NumberNotation.Unknown ? NumberNotation.Point : file, "");
        }

        NumberNotation plausible = dimension is { } measured
            ? NotationChoice.Plausibly(kind, field, measured, power, numbers)
            : NumberNotation.Unknown;
        if (plausible != NumberNotation.Unknown)
        {
            return (plausible, $"; decimal {Word(plausible)}, since the other reading is no figure of a part");
        }

        if (file != NumberNotation.Unknown)
        {
            return (file, $"; decimal {Word(file)}, as the other columns show");
        }

        return comma
            ? (NumberNotation.Unknown, "; a comma before three digits is open: state --decimal point or comma")
            : (NumberNotation.Point, "; decimal point, as nothing in the file shows another");
    }

    // Prices of which nothing says the currency are left out rather than taken in a wrong one.
    private ColumnUse[] WithoutUnknownMoney(ColumnUse[] uses) => uses.Any(use => use.Field == "currency")
        ? uses
        : [.. uses.Select(use => use is { Field: "price" or "prices", Currency: null }
            && !Cells(use.Index).Any(cell => PriceCells.CurrencyIn(cell) is not null)
            ? use with { Field = null, Why = "prices without a currency are left out: state --currency" }
            : use)];

    // A column without a telling header, but whose cells carry the unit of one figure alone.
    private ColumnUse[] ByValues(ColumnUse[] uses, NumberNotation file)
    {
        foreach ((string field, Dimension dimension) in ValueFields())
        {
            if (uses.Any(use => use.Field == field))
            {
                continue;
            }

            ColumnUse[] fitting = [.. uses.Where(use => use.Field is null && use.Why.StartsWith("its header", StringComparison.Ordinal)
                && Cells(use.Index) is { Length: > 0 } cells
                && cells.All(cell => !CellNumber.HasNoUnit(cell)
                    && CellNumber.Read(cell, dimension, 0, file, false) is { IsOk: true } read
                    && Plausible.Holds(kind, field, read.Value)))];
            if (fitting.Length == 1
                && !(field == "load"
                    && Cells(fitting[0].Index).All(cell => CellNumber.Read(cell, dimension, 0, file, false).Value <= 7e-12)))
            {
                int at = fitting[0].Index;
                uses[at] = uses[at] with
                {
                    Field = field,
                    Power = ColumnUse.NoPlainNumbers,
                    Notation = file,
                    Why = "the unit of its cells",
                };
            }
        }

        return uses;
    }

    private IEnumerable<(string Field, Dimension Dimension)> ValueFields() => kind switch
    {
        PartKind.Crystal =>
        [
            ("frequency", Dimension.Frequency),
            ("load", Dimension.Capacitance),
            ("resistance", Dimension.Resistance),
            ("driveLevel", Dimension.Power),
        ],
        PartKind.Capacitor => [("value", Dimension.Capacitance), ("voltage", Dimension.Voltage)],
        PartKind.Resistor => [("value", Dimension.Resistance), ("tolerance", Dimension.Relative)],
        _ => [],
    };

    private bool IsNumeric(string field) => field is "price" or "prices" or "toleranceAny" || DimensionOf(field) is not null;

    private Dimension? DimensionOf(string field) => field is "overtone"
        ? null
        : _shape.Fields.FirstOrDefault(each => each.Key == field)?.Dimension;

    private IEnumerable<string> Numbers(ColumnUse use) =>
        use.Field == "prices" ? Cells(use.Index).SelectMany(PriceCells.In) : Cells(use.Index);

    private string[] Cells(int column) =>
        [.. rows.Where(row => row.Length > column).Select(row => CellText.Plain(row[column])).Where(cell => cell.Length is > 0 and < 200)];

    private static double Share(string[] cells, Func<string, bool> fits) => (double)cells.Count(fits) / cells.Length;

    private static string Word(NumberNotation notation) => notation == NumberNotation.Comma ? "comma" : "point";
}
