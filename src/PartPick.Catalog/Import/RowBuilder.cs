using PartPick.Catalog.Fields;
using PartPick.Values;

namespace PartPick.Catalog.Import;

/// <summary>Makes the parts of rows, for an import and for a look at what it would do.</summary>
/// <param name="kind">The kind of the parts.</param>
/// <param name="uses">The columns.</param>
/// <param name="stated">The supplier of rows that name none; null for none.</param>
internal sealed class RowBuilder(PartKind kind, ColumnUse[] uses, string? stated)
{
    private readonly RowReader _reader = new(kind, uses);
    private readonly RowName _name = new(uses, stated);

    /// <summary>The shape of the parts.</summary>
    public PartShape Shape { get; } = PartShape.Of(kind);

    /// <summary>The keys of the figures that the columns state.</summary>
    public IReadOnlyList<string> Keys => _reader.Keys;

    /// <summary>What a row names its part by, or why it cannot be taken: cells beyond the header, or no name.</summary>
    public (RowPart Part, RowRejection? Wrong) Begin(IReadOnlyList<string> cells, long line, int headerCells)
    {
        bool tooMany = cells.Count > headerCells && cells.Skip(headerCells).Any(cell => !string.IsNullOrWhiteSpace(cell));
        if (tooMany || (uses[0].Exact && cells.Count != headerCells))
        {
            return (default, new RowRejection(
                line, null, null,
                $"has {CellNumber.Text(cells.Count)} cells, the header {CellNumber.Text(headerCells)}; fits one cell for each column"));
        }

        (string? id, string? number, string? supplier) = _name.Of(cells);
        return id is null && number is null
            ? (default, new RowRejection(line, null, null, "has neither a supplier's number nor an id; fits a row with one of them"))
            : (new RowPart(id, number, supplier), null);
    }

    /// <summary>What a row states, or what is wrong with it first.</summary>
    public (PartDraft? Draft, RowRejection? Wrong) Read(IReadOnlyList<string> cells, long line, RowPart named)
    {
        (PartDraft? draft, RowRejection? wrong) = _reader.Read(cells, line);
        if (draft is not null && named.Supplier is { } supplier && !draft.Has("supplier"))
        {
            draft.Set("supplier", CellText.Harmless(supplier));
        }

        return (draft, wrong);
    }

    /// <summary>The part of a draft, filled in with what may be assumed, or what is wrong with it first.</summary>
    public (Part? Part, RowRejection? Wrong) Build(PartDraft draft, long line)
    {
        RowCompletion.Complete(kind, draft);
        var figures = new DraftReader(draft, key => key);
        if (Shape.Build(figures) is { } part)
        {
            return (part, null);
        }

        Problem problem = figures.Problems.Find(each => Header(each.Where) is not null)
            ?? figures.Problems.Find(each => each.Where is "frequency" or "value" or "beta") ?? figures.Problems[0];
        string what = IsGmMissing(problem)
            ? $"{problem.Where} is missing: whether an oscillator starts rests on the transconductance, and a class has no safe value, "
                + "since too much stops it as too little does; fits a column of it, from the maker's data"
            : $"{problem.Where} {problem.What}; fits {problem.Fits}";
        return (null, new RowRejection(line, Header(problem.Where), draft.Text(problem.Where), what));
    }

    private static bool IsGmMissing(Problem problem) =>
        problem.Where.StartsWith("gm ", StringComparison.Ordinal) && problem.What == "is missing";

    /// <summary>The header of the column of a figure; null where none states it.</summary>
    public string? Header(string key) => Array.Find(uses, use => use.Field == key)?.Header;
}
