using System.Collections.Immutable;
using PartPick.Catalog.Fields;
using PartPick.Values;

namespace PartPick.Catalog.Import;

/// <summary>Looks at a file as an import would, without a catalogue being changed.</summary>
public static class ImportPreview
{
    private static readonly string[] Further = ["price", "prices", "temperature"];

    /// <summary>How many rows are looked at.</summary>
    public const int MostRows = 100;

    /// <summary>Looks at a file.</summary>
    /// <param name="path">The path of the catalogue, for a column map that is kept there.</param>
    /// <param name="source">The bytes of the file; read no further than its first rows, and closed.</param>
    /// <param name="request">What is to be imported, and how.</param>
    /// <returns>What it looks like, or the problem that keeps the file as a whole from being read.</returns>
    public static Result<ImportLook> Look(string path, Stream source, ImportRequest request)
    {
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(request);
        using var text = SourceText.Of(source);
        return ImportPlan.Make(path, text, request).Map(plan => new ImportLook
        {
            Columns = plan.Columns(),
            Rows = RowsOf(plan, request),
            Encoding = text.EncodingName,
            Delimiter = plan.Layout.Delimiter,
            HeaderLine = plan.Layout.HeaderLine,
            HasNumbers = plan.TellsPartsApart,
        });
    }

    /// <summary>The names that a column of a list of some kind can be given.</summary>
    /// <param name="kind">The kind.</param>
    public static ImmutableArray<string> FieldNames(PartKind kind) => [.. PartShape.Of(kind).Fields.Select(field => field.Key), .. Further];

    // The last row of a head that is not the whole text may be cut off.
    private static ImmutableArray<LookedAtRow> RowsOf(ImportPlan plan, ImportRequest request)
    {
        var looked = ImmutableArray.CreateBuilder<LookedAtRow>();
        var reader = new RowReader(request.Kind, plan.Uses);
        var rows = new CsvRows(TextReader.Null, plan.Layout.Delimiter, plan.Layout.Head);
        LookedAtRow? last = null;
        while (looked.Count < MostRows && rows.Read())
        {
            if (last is not null)
            {
                looked.Add(last);
            }

            bool isRow = rows.Line > plan.Layout.HeaderLine
                && (rows.Fault is not null || rows.Cells.Any(cell => !string.IsNullOrWhiteSpace(cell)));
            last = isRow ? RowOf(rows, reader, request) : null;
        }

        if (last is not null && plan.Layout.IsWhole && looked.Count < MostRows)
        {
            looked.Add(last);
        }

        return looked.ToImmutable();
    }

    private static LookedAtRow RowOf(CsvRows rows, RowReader reader, ImportRequest request)
    {
        ImmutableArray<string> cells = [.. rows.Cells.Select(cell => CellText.Harmless(cell.Length > 200 ? cell[..200] : cell))];
        if (rows.Fault is { } fault)
        {
            return new LookedAtRow(rows.Line, cells, null, new RowRejection(rows.Line, null, null, fault));
        }

        (PartDraft? draft, RowRejection? wrong) = reader.Read(rows.Cells, rows.Line);
        if (draft is null)
        {
            return new LookedAtRow(rows.Line, cells, null, wrong);
        }

        if (request.Supplier is { } supplier && !draft.Has("supplier"))
        {
            draft.Set("supplier", CellText.Harmless(supplier));
        }

        if (!draft.Has("id") && draft.Text("supplierPart") is { } number)
        {
            draft.Set("id", RowCompletion.IdOf(CellText.Harmless(number)));
        }

        if (!draft.Has("id"))
        {
            return new LookedAtRow(rows.Line, cells, null, new RowRejection(
                rows.Line, null, null, "has neither a supplier's number nor an id; fits a row with one of them"));
        }

        RowCompletion.Complete(request.Kind, draft);
        var figures = new DraftReader(draft, key => key);
        Part? part = PartShape.Of(request.Kind).Build(figures);
        Problem? problem = part is null ? figures.Problems[0] : null;
        return new LookedAtRow(
            rows.Line, cells, part,
            problem is null ? null : new RowRejection(
                rows.Line, problem.Where, draft.Text(problem.Where), $"{problem.Where} {problem.What}; fits {problem.Fits}"));
    }
}
