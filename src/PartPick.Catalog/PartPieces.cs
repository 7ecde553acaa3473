using PartPick.Catalog.Mapping;
using PartPick.Values;

namespace PartPick.Catalog;

/// <summary>Reads all stored parts, some thousand at a time: between them the catalogue is free for others.</summary>
internal static class PartPieces
{
    /// <summary>The most parts that are read at once.</summary>
    public const int Most = 8192;

    /// <summary>Reads them in the order of their ids.</summary>
    /// <param name="path">The path of the file.</param>
    /// <param name="first">How many are read at first.</param>
    /// <param name="take">Is given each piece with the notes of the imports, while the catalogue is not held.</param>
    /// <param name="cancellation">Ends it.</param>
    /// <returns>
    /// True; false where an import or an undo came between two pieces, which do not belong together then; or the problem.
    /// </returns>
    public static Result<bool> Read(
        string path,
        int first,
        Action<IReadOnlyList<StoredPart>, IReadOnlyDictionary<int, ImportNote>> take,
        CancellationToken cancellation)
    {
        (string last, (int, int)? state) = ("", null);
        for (int most = first; ; most = Most)
        {
            cancellation.ThrowIfCancellationRequested();
            (string after, int wanted) = (last, most);
            Result<Piece> read = CatalogStore.UseCurrent(path, file => new Piece(
                file.ReadStoredAfter(after, wanted)
                    .Select(stored => stored ?? throw new InvalidDataException("A part in it cannot be read.")).ToList(),
                file.ReadImports(), file.NextImport()));
            if (!read.IsOk)
            {
                return Result.Fail<bool>(read.Problem);
            }

            Piece piece = read.Value;
            (int, int) now = (piece.NextImport, piece.Imports.Count);
            if (state is not null && state != now)
            {
                return Result.Ok(false);
            }

            state = now;
            take(piece.Parts, piece.Imports);
            if (piece.Parts.Count < most)
            {
                return Result.Ok(true);
            }

            last = piece.Parts[^1].Id;
        }
    }

    private sealed record Piece(List<StoredPart> Parts, Dictionary<int, ImportNote> Imports, int NextImport);
}
