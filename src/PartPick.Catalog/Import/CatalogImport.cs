using System.Globalization;
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
        using var origin = new ImportSource(source);
        return Run(path, origin, request, progress, stop);
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
        using var origin = new ImportSource(source);
        return Run(path, origin, request, null, stop);
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
        string path, ImportSource source, ImportRequest request, IProgress<ImportProgress>? progress, CancellationToken stop)
    {
        Result<List<ColumnWish>> wishes = Wishes(path, request);
        if (!wishes.IsOk)
        {
            return Result.Fail<ImportReport>(wishes.Problem);
        }

        IReadOnlyList<string[]>? rows = null;
        while (true)
        {
            Result<FileLayout> layout = FileLayout.Find(source.Text.Reader, request.Name, request.Kind, wishes.Value);
            if (!layout.IsOk)
            {
                return Result.Fail<ImportReport>(layout.Problem);
            }

            var attempt = new ImportAttempt(request, layout.Value, wishes.Value, rows ?? layout.Value.Sample);
            Result<ImportReport> result = attempt.Make(path, source, progress, stop);
            if (attempt.Contradicted is not { } contradicted)
            {
                return result;
            }

            // A number further down shows another decimal sign than was taken: all again, with what it shows.
            if (!source.TryRewind())
            {
                return Result.Fail<ImportReport>(
                    string.Create(CultureInfo.InvariantCulture, $"{request.Name} line {contradicted.Line}, column {contradicted.Column}"),
                    "shows another decimal sign than the rows above it, and what is piped cannot be read again",
                    "--decimal point or comma");
            }

            rows = attempt.Rows;
        }
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
