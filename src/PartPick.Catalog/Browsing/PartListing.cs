using System.Collections.Immutable;
using PartPick.Catalog.Mapping;
using PartPick.Values;

namespace PartPick.Catalog.Browsing;

/// <summary>
/// Reads the parts of a catalogue as rows, some thousand at a time: between them the catalogue is free for others, and what is
/// there already can be shown.
/// </summary>
public static class PartListing
{
    private const int FirstPiece = 500;

    /// <summary>Reads the rows of all kinds; begins anew where an import or an undo comes between.</summary>
    /// <param name="path">The path of the file.</param>
    /// <param name="take">Is given the rows of each kind read so far, again and again; called on the reading thread.</param>
    /// <param name="cancellation">Ends it.</param>
    /// <returns>The rows of each kind, or the problem.</returns>
    public static Result<ImmutableDictionary<PartKind, PartRows>> Read(
        string path, Action<ImmutableDictionary<PartKind, PartRows>> take, CancellationToken cancellation)
    {
        ArgumentNullException.ThrowIfNull(take);
        while (true)
        {
            var parts = PartKinds.All.ToDictionary(kind => kind, kind => new GrowingRows(kind));
            var all = ImmutableDictionary<PartKind, PartRows>.Empty;
            Result<bool> read = PartPieces.Read(
                path,
                FirstPiece,
                (piece, _) =>
                {
                    foreach (StoredPart stored in piece)
                    {
                        parts[stored.Kind].Add(PartRow.Of(stored));
                    }

                    all = parts.ToImmutableDictionary(pair => pair.Key, pair => pair.Value.ToRows());
                    take(all);
                },
                cancellation);
            if (!read.IsOk || read.Value)
            {
                return read.Map(_ => all);
            }
        }
    }

    /// <summary>Reads the row of one part.</summary>
    /// <param name="path">The path of the file.</param>
    /// <param name="id">The id of the part.</param>
    /// <returns>The row, null where there is no such part; or the problem.</returns>
    public static Result<PartRow?> ReadOne(string path, string id)
    {
        ArgumentNullException.ThrowIfNull(id);
        return CatalogStore.UseCurrent(path, file => file.FindStored(id) is { } stored ? PartRow.Of(stored) : null);
    }

    private sealed class GrowingRows(PartKind kind)
    {
        private readonly ImmutableArray<PartBlock>.Builder _full = ImmutableArray.CreateBuilder<PartBlock>();
        private readonly List<PartRow> _rest = [];

        public void Add(PartRow row)
        {
            _rest.Add(row);
            if (_rest.Count == PartBlock.Size)
            {
                _full.Add(PartBlock.Of(kind, _rest));
                _rest.Clear();
            }
        }

        public PartRows ToRows() => new(kind, _rest.Count == 0 ? _full.ToImmutable() : [.. _full, PartBlock.Of(kind, _rest)]);
    }
}
