using System.Collections.Immutable;
using PartPick.Catalog.Fields;
using PartPick.Values;

namespace PartPick.Catalog.Import;

/// <summary>Looks at a file as an import would, without a catalogue being changed.</summary>
public static class ImportPreview
{
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
    public static ImmutableArray<string> FieldNames(PartKind kind) => [.. ImportFields.Names(kind)];

    // The last row of a head that is not the whole text may be cut off.
    private static ImmutableArray<LookedAtRow> RowsOf(ImportPlan plan, ImportRequest request)
    {
        var looked = ImmutableArray.CreateBuilder<LookedAtRow>();
        var builder = new RowBuilder(request.Kind, plan.Uses, request.Supplier);
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
            last = isRow ? RowOf(rows, builder, plan.Layout.Header.Length) : null;
        }

        if (last is not null && plan.Layout.IsWhole && looked.Count < MostRows)
        {
            looked.Add(last);
        }

        return looked.ToImmutable();
    }

    private static LookedAtRow RowOf(CsvRows rows, RowBuilder builder, int headerCells)
    {
        ImmutableArray<string> cells = [.. rows.Cells.Select(cell => CellText.Harmless(cell.Length > 200 ? cell[..200] : cell))];
        (Part? part, RowRejection? wrong) = rows.Fault is { } fault
            ? (null, new RowRejection(rows.Line, null, null, fault))
            : PartOf(rows, builder, headerCells);
        return new LookedAtRow(rows.Line, cells, part, wrong);
    }

    private static (Part? Part, RowRejection? Wrong) PartOf(CsvRows rows, RowBuilder builder, int headerCells)
    {
        (RowPart named, RowRejection? unnamed) = builder.Begin(rows.Cells, rows.Line, headerCells);
        if (unnamed is not null)
        {
            return (null, unnamed);
        }

        (PartDraft? draft, RowRejection? wrong) = builder.Read(rows.Cells, rows.Line, named);
        if (draft is null)
        {
            return (null, wrong);
        }

        if (!draft.Has("id"))
        {
            draft.Set("id", RowCompletion.IdOf(named.Number!));
        }

        return builder.Build(draft, rows.Line);
    }
}
