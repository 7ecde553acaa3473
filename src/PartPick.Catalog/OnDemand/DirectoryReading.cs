using PartPick.Catalog.Mapping;
using PartPick.Values;

namespace PartPick.Catalog;

/// <summary>Reads the directory beside a catalogue, or makes it of all parts.</summary>
internal static class DirectoryReading
{
    /// <summary>Gives the directory of the parts as they are.</summary>
    public static Result<PartsDirectory> Read(string path, CancellationToken cancellation)
    {
        string beside = DirectoryFile.Beside(System.IO.Path.GetFullPath(path));
        while (true)
        {
            // Every change of a part takes the mark away: as long as it is there, nothing has changed since it was set.
            Result<string> marked = CatalogStore.UseCurrent(path, file => file.MarkParts());
            if (!marked.IsOk)
            {
                return Result.Fail<PartsDirectory>(marked.Problem);
            }

            string mark = marked.Value;
            if (DirectoryFile.Read(beside, mark) is { } kept)
            {
                return Result.Ok(kept);
            }

            var builder = new DirectoryBuilder();
            Result<bool> whole = PartPieces.Read(path, PartPieces.Most, (piece, _) => Add(builder, piece), cancellation);
            Result<bool> same = whole.Then(isWhole => CatalogStore.UseCurrent(path, file => isWhole && file.PartsMark == mark));
            if (!same.IsOk)
            {
                return Result.Fail<PartsDirectory>(same.Problem);
            }

            if (same.Value)
            {
                DirectoryColumns columns = builder.Build(mark);
                DirectoryFile.Write(beside, columns);
                return Result.Ok(new PartsDirectory(columns));
            }
        }
    }

    private static void Add(DirectoryBuilder builder, IReadOnlyList<StoredPart> piece)
    {
        foreach (StoredPart stored in piece)
        {
            builder.Add(stored.Build() ?? throw new InvalidDataException("A part in it cannot be read."));
        }
    }
}
