namespace PartPick.Catalog.Import;

/// <summary>
/// Looks through a whole file for numbers that show another decimal sign than the first rows could: only the columns whose own cells
/// there prove none. A column that proves one keeps it, and a row that contradicts it is rejected.
/// </summary>
internal sealed class NotationWatch
{
    private readonly PartKind _kind;
    private readonly ColumnUse[] _uses;
    private readonly Func<IReadOnlyList<string[]>, ColumnUse[]> _propose;
    private readonly List<string[]> _rows;
    private (ColumnUse Use, NumberEvidence[] Seen)[] _open;

    /// <summary>Begins to look.</summary>
    /// <param name="kind">The kind of the parts.</param>
    /// <param name="rows">The rows that were looked at.</param>
    /// <param name="uses">The uses that they led to.</param>
    /// <param name="propose">Finds the uses that other rows lead to.</param>
    public NotationWatch(PartKind kind, IReadOnlyList<string[]> rows, ColumnUse[] uses, Func<IReadOnlyList<string[]>, ColumnUse[]> propose)
    {
        (_kind, _uses, _propose, _rows) = (kind, uses, propose, [.. rows]);
        _open = Open();
    }

    /// <summary>The rows that were looked at, with those further down that showed something else.</summary>
    public IReadOnlyList<string[]> Rows => _rows;

    /// <summary>The column that has to be read otherwise than it was so far, because of a row; null for none.</summary>
    public string? Contradicted(IReadOnlyList<string> row)
    {
        if (!Array.Exists(_open, each => ShowsNew(each.Use, each.Seen, row)))
        {
            return null;
        }

        _rows.Add([.. row]);
        _open = Open();
        ColumnUse[] now = _propose(_rows);
        var sample = new ColumnSample(_rows);
        return _uses.Zip(now).FirstOrDefault(pair =>
            (pair.First.Notation != pair.Second.Notation || pair.First.Power != pair.Second.Power)
            && sample.Numbers(pair.First).Any(IsTelling)).First?.Header;
    }

    private static bool IsTelling(string number) => CellNumber.Weigh(number) is not (NumberEvidence.None or NumberEvidence.Wrong);

    private (ColumnUse Use, NumberEvidence[] Seen)[] Open()
    {
        var sample = new ColumnSample(_rows);
        return
        [
            .. _uses.Where(use => use is { Exact: false, Field: { } field } && ImportFields.IsNumeric(_kind, field))
                .Select(use => (use, sample.Numbers(use).Select(CellNumber.Weigh).Distinct().ToArray()))
                .Where(each => !each.Item2.Contains(NumberEvidence.Point) && !each.Item2.Contains(NumberEvidence.Comma)),
        ];
    }

    private static bool ShowsNew(ColumnUse use, NumberEvidence[] seen, IReadOnlyList<string> row)
    {
        string cell = use.Index < row.Count ? row[use.Index] : "";
        if (!cell.AsSpan().ContainsAny(',', '.') || cell.Length > 200)
        {
            return false;
        }

        string plain = CellText.Plain(cell);
        IEnumerable<string> numbers = use.Field == "prices" ? PriceCells.In(plain) : [plain];
        return numbers.Any(number => IsTelling(number) && !seen.Contains(CellNumber.Weigh(number)));
    }
}
