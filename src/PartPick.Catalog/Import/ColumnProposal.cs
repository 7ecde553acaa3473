using PartPick.Catalog.Fields;
using PartPick.Values;

namespace PartPick.Catalog.Import;

/// <summary>Proposes what each column of a file is: from its header, and from its cells.</summary>
/// <param name="kind">The kind of the parts.</param>
/// <param name="rows">The first rows of the file, and those further down that show another decimal sign.</param>
/// <param name="options">What the user stated.</param>
internal sealed class ColumnProposal(PartKind kind, IReadOnlyList<string[]> rows, ImportOptions options)
{
    private readonly ColumnSample _sample = new(rows);

    /// <summary>The columns of a header.</summary>
    public ColumnUse[] For(IReadOnlyList<string> header, IReadOnlyList<ColumnWish> wishes)
    {
        HeaderCell[] cells = [.. header.Select(HeaderCell.Of)];
        if (wishes.Count == 0
            && cells.Where(cell => !RejectedFile.IsOwnColumn(cell.Text)).All(cell => FieldOf(kind, cell.Text) is not null))
        {
            return [.. cells.Select((cell, i) => Exactly(i, cell.Text))];
        }

        ColumnUse[] uses = new HeaderMatching(kind, _sample).Assign(cells, wishes);
        var notation = new ColumnNotation(kind, _sample, options.Notation);
        NumberNotation file = notation.OfFile(uses);
        for (int i = 0; i < uses.Length; i++)
        {
            uses[i] = Finish(uses[i], cells[i], notation, file, wishes.FirstOrDefault(wish => wish.IsOf(cells[i].Text)));
        }

        uses = new ValueMatching(kind, _sample, file).Complete(uses);
        for (int i = 0; i < uses.Length; i++)
        {
            uses[i] = uses[i] is { Field: "prices", Currency: null } ? Finish(uses[i], cells[i], notation, file, null) : uses[i];
        }

        return PriceColumns.Settle(uses, _sample);
    }

    /// <summary>How many cells of a row are known headers.</summary>
    public static int Known(PartKind kind, IReadOnlyList<string> row, IReadOnlyList<ColumnWish> wishes) => row.Count(cell =>
        cell.Length is > 0 and < 80
        && (char.IsAsciiDigit(cell[0])
            ? PriceHeader.Of(cell) is { IsBare: false } or { IsMarked: true }
            : FieldOf(kind, cell.Trim()) is not null
                || wishes.Any(wish => wish.IsOf(cell))
                || FieldMatch.Of(kind, 0, HeaderCell.Of(cell)).Any()));

    private static PartField? FieldOf(PartKind kind, string header) =>
        PartShape.Of(kind).Fields.FirstOrDefault(field => field.Header == header);

    private ColumnUse Exactly(int index, string header) => FieldOf(kind, header) is { } field
        ? new ColumnUse
        {
            Index = index, Header = header, Field = field.Key, Unit = field.Unit, Power = field.Power, Notation = NumberNotation.Point,
            Exact = true, Why = "the program's own header",
        }
        : new ColumnUse { Index = index, Header = header, Why = "added by an earlier import, not read" };

    private ColumnUse Finish(ColumnUse use, HeaderCell header, ColumnNotation notation, NumberNotation file, ColumnWish? wish)
    {
        if (use.Field is not { } field || !ImportFields.IsNumeric(kind, field))
        {
            return use;
        }

        string unit = field is not "price" && wish?.Unit is { Length: > 0 } stated ? stated : use.HeaderUnit;
        Dimension? dimension = ImportFields.DimensionOf(kind, field);
        int? power = dimension is { } known && unit.Length > 0 ? UnitSpelling.PowerOf(unit, known) : null;
        (NumberNotation sign, string how) = notation.Of(use, power, file);
        use = use with { Notation = sign, Why = use.Why + how };
        if (field is "price" or "prices")
        {
            return use with { Currency = Currencies.In(HeaderCell.Parted(header.Text)) ?? options.Currency };
        }

        if (dimension is not { } measured || field is "toleranceAny")
        {
            return use with { Unit = unit };
        }

        if (power is { } ready)
        {
            return use with { Unit = unit, Power = ready };
        }

        (int found, string name, string why) = UnitChoice.For(kind, field, measured, sign, _sample.Cells(use.Index));
        return use with { Unit = name, Power = found, Why = use.Why + why };
    }
}
