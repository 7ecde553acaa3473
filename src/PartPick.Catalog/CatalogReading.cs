using PartPick.Catalog.Mapping;
using PartPick.Values;

namespace PartPick.Catalog;

/// <summary>Reads parts of a catalogue with their origins, one kind or one part at a time.</summary>
public static class CatalogReading
{
    /// <summary>
    /// Reads the parts of a kind, one by one in the order of their ids; what is done with them takes as long as it may, the catalogue
    /// is not held meanwhile.
    /// </summary>
    /// <param name="path">The path of the file; made as in <see cref="CatalogStore.Load(string)"/> where it is not there.</param>
    /// <param name="kind">The kind.</param>
    /// <param name="take">What is done with each part.</param>
    /// <returns>How many there were, or the problem; an import that comes between is one.</returns>
    public static Result<int> Each(string path, PartKind kind, Action<CatalogEntry> take)
    {
        ArgumentNullException.ThrowIfNull(take);
        int count = 0;
        Result<bool> whole = PartPieces.Read(
            path,
            PartPieces.Most,
            (piece, imports) =>
            {
                var origins = new Origins(imports);
                foreach (StoredPart stored in piece.Where(stored => stored.Kind == kind))
                {
                    take(EntryOf(stored, origins));
                    count++;
                }
            },
            CancellationToken.None);
        return whole.Then(isWhole => isWhole
            ? Result.Ok(count)
            : Result.Fail<int>(path, "was changed by an import or an undo while it was read", "the same again"));
    }

    /// <summary>
    /// Reads all parts as <see cref="CatalogStore.Load(string)"/> does, but leaves the catalogue free for others between pieces.
    /// </summary>
    /// <param name="path">The path of the file.</param>
    /// <param name="cancellation">Ends it.</param>
    /// <returns>The parts, or the problem.</returns>
    public static Result<PartsCatalog> All(string path, CancellationToken cancellation)
    {
        while (true)
        {
            var parts = new List<Part>();
            Result<bool> whole = PartPieces.Read(
                path, PartPieces.Most, (piece, _) => parts.AddRange(piece.Select(BuiltOf)), cancellation);
            if (!whole.IsOk || whole.Value)
            {
                return whole.Map(_ => new PartsCatalog(parts));
            }
        }
    }

    /// <summary>Reads one part.</summary>
    /// <param name="path">The path of the file.</param>
    /// <param name="id">The id of the part.</param>
    /// <returns>The part, null where there is none; or the problem.</returns>
    public static Result<CatalogEntry?> Find(string path, string id)
    {
        ArgumentNullException.ThrowIfNull(id);
        return CatalogStore.UseCurrent(
            path, file => file.FindStored(id) is { } stored ? EntryOf(stored, new Origins(file.ReadImports())) : null);
    }

    /// <summary>Reads some parts.</summary>
    /// <param name="path">The path of the file.</param>
    /// <param name="ids">The ids of the parts.</param>
    /// <returns>Those of them that are there; or the problem.</returns>
    public static Result<PartsCatalog> FindAll(string path, IEnumerable<string> ids)
    {
        ArgumentNullException.ThrowIfNull(ids);
        return CatalogStore.UseCurrent(
            path,
            file => new PartsCatalog(
                ids.Distinct(StringComparer.Ordinal).Select(file.FindStored).OfType<StoredPart>().Select(BuiltOf).ToList()));
    }

    /// <summary>The import that can be taken back.</summary>
    /// <param name="path">The path of the file.</param>
    /// <returns>Its note, null where there is none; or the problem.</returns>
    public static Result<ImportNote?> Undoable(string path) => CatalogStore.UseCurrent(path, file => file.Undoable());

    /// <summary>Counts what a catalogue holds.</summary>
    /// <param name="path">The path of the file.</param>
    /// <returns>The counts, or the problem.</returns>
    public static Result<CatalogInfo> Info(string path) => CatalogStore.UseCurrent(path, file =>
    {
        var counts = PartKinds.All.ToDictionary(kind => kind, _ => 0);
        (int own, int byHand) = (0, 0);
        foreach (StoredPart? stored in file.ReadStored())
        {
            counts[stored?.Kind ?? throw Unreadable()]++;
            own += stored.BuiltIn ? 0 : 1;
            byHand += stored.HasHandwork ? 1 : 0;
        }

        string full = System.IO.Path.GetFullPath(path);
        return new CatalogInfo(
            full, new FileInfo(full).Length, [.. PartKinds.All.Select(kind => (kind, counts[kind]))], own, byHand,
            [.. file.ReadImports().Values.OrderByDescending(note => note.Number)], [.. file.MapNames().Order(StringComparer.Ordinal)]);
    });

    private static CatalogEntry EntryOf(StoredPart stored, Origins origins) =>
        new(BuiltOf(stored), origins.Of(stored));

    private static Part BuiltOf(StoredPart stored) => stored.Build() ?? throw Unreadable();

    private static InvalidDataException Unreadable() => new("A part in it cannot be read.");
}
