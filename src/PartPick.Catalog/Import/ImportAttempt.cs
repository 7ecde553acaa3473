using PartPick.Values;

namespace PartPick.Catalog.Import;

/// <summary>Reads a file into a catalogue with the uses of its columns that some of its rows lead to.</summary>
/// <param name="request">What is to be imported, and how.</param>
/// <param name="layout">The layout of the file.</param>
/// <param name="wishes">What is stated of the columns.</param>
/// <param name="rows">The rows that decide.</param>
internal sealed class ImportAttempt(
    ImportRequest request, FileLayout layout, IReadOnlyList<ColumnWish> wishes, IReadOnlyList<string[]> rows)
{
    private readonly ImportOptions _options = ImportOptions.Of(request);

    /// <summary>The line and the column that show that the rows were read wrongly; null where nothing does.</summary>
    public (long Line, string Column)? Contradicted { get; private set; }

    /// <summary>The rows that decide, with the one that contradicts.</summary>
    public IReadOnlyList<string[]> Rows { get; private set; } = rows;

    /// <summary>Makes it; nothing is kept where it is contradicted.</summary>
    public Result<ImportReport> Make(string path, ImportSource source, IProgress<ImportProgress>? progress, CancellationToken stop)
    {
        long start = TimeProvider.System.GetTimestamp();
        ColumnUse[] uses = Propose(Rows);
        if (!uses.Any(use => use.Field is "id" or "supplierPart"))
        {
            return Result.Fail<ImportReport>(
                request.Name, "has no column with a supplier's number or an id", "such a column, or --column HEADER=supplierPart");
        }

        NotationWatch? watch = _options.Notation == NumberNotation.Unknown ? new(request.Kind, Rows, uses, Propose) : null;
        return CatalogChange.Make(path, file =>
        {
            using var count = new ImportCount(request, layout);
            using var run = new ImportRun(file, request, uses);
            var text = new CsvRows(source.Text.Reader, layout.Delimiter, layout.Head);
            count.Take(
                text, run, watch,
                read => progress?.Report(new ImportProgress(read, source.Share, TimeProvider.System.GetElapsedTime(start))), stop);
            Contradicted = count.Contradicted;
            Rows = watch?.Rows ?? Rows;
            if (Contradicted is not null)
            {
                return (Result.Fail<ImportReport>(request.Name, "is to be read again", ""), false);
            }

            run.Close();
            if (request.Map is { } name && !request.DryRun && file.ReadMap(name) is null)
            {
                file.WriteMap(name, ColumnMapText.Write(request.Kind, uses));
            }

            return (
                Result.Ok(Report(count, run, uses, source.Text.EncodingName, TimeProvider.System.GetElapsedTime(start))),
                !request.DryRun && (run.Added + run.Updated > 0 || request.Map is not null));
        });
    }

    private ColumnUse[] Propose(IReadOnlyList<string[]> decisive) =>
        new ColumnProposal(request.Kind, decisive, _options).For(layout.Header, wishes);

    private ImportReport Report(ImportCount count, ImportRun run, ColumnUse[] uses, string encoding, TimeSpan elapsed) => new()
    {
        Read = count.Read,
        Added = run.Added,
        Updated = run.Updated,
        Unchanged = run.Unchanged,
        Rejected = count.Rejected,
        Columns = new ImportPlan(layout, uses).Columns(),
        Rejections = count.Listed,
        RejectedFile = count.PublishRejected(),
        Encoding = encoding,
        Delimiter = layout.Delimiter,
        HeaderLine = layout.HeaderLine,
        DryRun = request.DryRun,
        Elapsed = elapsed,
    };
}
