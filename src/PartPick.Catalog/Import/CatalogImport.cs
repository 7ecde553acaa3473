using PartPick.Values;

namespace PartPick.Catalog.Import;

/// <summary>Imports files of parts into a catalogue, and takes the last import back.</summary>
public static class CatalogImport
{
    /// <summary>Imports a file: all of it, or, where something goes wrong or is stopped, none of it.</summary>
    /// <param name="path">The path of the catalogue.</param>
    /// <param name="source">The bytes of the file, read to the end and closed.</param>
    /// <param name="request">What is to be imported, and how.</param>
    /// <param name="progress">Hears now and then how far it is.</param>
    /// <param name="stop">Stops it.</param>
    /// <returns>What became of the rows, or the problem that kept the file as a whole from being read.</returns>
    public static Result<ImportReport> Run(
        string path, Stream source, ImportRequest request, IProgress<ImportProgress>? progress, CancellationToken stop)
    {
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(request);
        using var text = SourceText.Of(source);
        Func<double?> share = () => source.CanSeek && source.Length > 0 ? (double)source.Position / source.Length : null;
        return Run(path, text, share, request, progress, stop);
    }

    /// <summary>Imports a text that is already decoded.</summary>
    /// <param name="path">The path of the catalogue.</param>
    /// <param name="source">The text, read to the end and closed.</param>
    /// <param name="request">What is to be imported, and how.</param>
    /// <param name="stop">Stops it.</param>
    /// <returns>What became of the rows, or the problem that kept the file as a whole from being read.</returns>
    public static Result<ImportReport> Run(string path, TextReader source, ImportRequest request, CancellationToken stop)
    {
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(request);
        using var text = SourceText.Of(source);
        return Run(path, text, () => null, request, null, stop);
    }

    /// <summary>Takes the last import back: its parts go, what it changed is as before, what was set by hand stays.</summary>
    /// <param name="path">The path of the catalogue.</param>
    /// <returns>The note of the import that was taken back, null where there is none; or the problem.</returns>
    public static Result<ImportNote?> Undo(string path) => CatalogChange.Make(path, file =>
    {
        ImportNote? note = file.UndoLastImport();
        return (Result.Ok(note), note is not null);
    });

    private static Result<ImportReport> Run(
        string path,
        SourceText text,
        Func<double?> share,
        ImportRequest request,
        IProgress<ImportProgress>? progress,
        CancellationToken stop)
    {
        long start = TimeProvider.System.GetTimestamp();
        Result<List<ColumnWish>> wishes = Wishes(path, request);
        if (!wishes.IsOk)
        {
            return Result.Fail<ImportReport>(wishes.Problem);
        }

        Result<FileLayout> found = FileLayout.Find(text.Reader, request.Name, request.Kind, wishes.Value);
        if (!found.IsOk)
        {
            return Result.Fail<ImportReport>(found.Problem);
        }

        FileLayout layout = found.Value;
        var options = new ImportOptions
        {
            Notation = request.DecimalSign switch
            {
                "comma" => NumberNotation.Comma,
                "point" => NumberNotation.Point,
                _ => NumberNotation.Unknown,
            },
            Currency = request.Currency,
            Supplier = request.Supplier,
        };
        ColumnUse[] uses = new ColumnProposal(request.Kind, layout.Sample, options).For(layout.Header, wishes.Value);
        if (!uses.Any(use => use.Field is "id" or "supplierPart"))
        {
            return Result.Fail<ImportReport>(
                request.Name, "has no column with a supplier's number or an id", "such a column, or --column HEADER=supplierPart");
        }

        return CatalogChange.Make(path, file =>
        {
            using var run = new ImportRun(file, request, layout, uses);
            var rows = new CsvRows(text.Reader, layout.Delimiter, layout.Head);
            run.Take(
                rows, layout.HeaderLine, layout.Header.Length,
                count => progress?.Report(new ImportProgress(count, share(), TimeProvider.System.GetElapsedTime(start))), stop);
            run.Close();
            if (request.Map is { } name && !request.DryRun && file.ReadMap(name) is null)
            {
                file.WriteMap(name, ColumnMapText.Write(request.Kind, uses));
            }

            var report = new ImportReport
            {
                Read = run.Read,
                Added = run.Added,
                Updated = run.Updated,
                Unchanged = run.Unchanged,
                Rejected = run.Rejected,
                Columns = [.. uses.Select(use => new ImportColumn(
                    CellText.Harmless(use.Header), use.Field, use.Power == ColumnUse.NoPlainNumbers ? "" : use.Unit, use.Why))],
                Rejections = run.Listed,
                RejectedFile = run.PublishRejected(),
                Encoding = text.EncodingName,
                Delimiter = layout.Delimiter,
                HeaderLine = layout.HeaderLine,
                DryRun = request.DryRun,
                Elapsed = TimeProvider.System.GetElapsedTime(start),
            };
            return (Result.Ok(report), !request.DryRun && (run.Added + run.Updated > 0 || request.Map is not null));
        });
    }

    internal static Result<List<ColumnWish>> Wishes(string path, ImportRequest request)
    {
        Result<List<ColumnWish>> stated = ColumnWishes.Read(request.Kind, request.Columns);
        if (!stated.IsOk || request.Map is not { } name)
        {
            return stated;
        }

        Result<string?> map = CatalogStore.UseCurrent(path, file => file.ReadMap(name));
        if (!map.IsOk)
        {
            return Result.Fail<List<ColumnWish>>(map.Problem);
        }

        return map.Value is null ? stated
            : ColumnMapText.Read(map.Value, request.Kind) is { } kept ? Result.Ok<List<ColumnWish>>([.. stated.Value, .. kept])
            : Result.Fail<List<ColumnWish>>(
                "--map",
                $"{Problem.Quote(name)} is a map of another kind of part",
                "the name of a map of " + request.Kind.Word());
    }
}
