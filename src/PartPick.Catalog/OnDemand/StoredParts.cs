using PartPick.Values;

namespace PartPick.Catalog;

/// <summary>
/// The parts of a catalogue as far as they are asked for. A small catalogue is read whole; of a large one a directory is kept beside
/// it, made once and again after each change, and only the parts that are wanted are read.
/// </summary>
/// <param name="path">The path of the catalogue.</param>
/// <param name="largeBytes">From which length of its file on a catalogue counts as large.</param>
public sealed class StoredParts(string path, long largeBytes = StoredParts.LargeBytes)
{
    /// <summary>The length from which on a catalogue counts as large: about 20 000 parts, read whole in half a second.</summary>
    public const long LargeBytes = 16_000_000;

    private const int MostKept = 50_000;

    private readonly Lock _gate = new();
    private readonly Dictionary<string, Part> _kept = new(StringComparer.Ordinal);
    private string? _keptMark;
    private volatile PartsCatalog? _whole;
    private volatile PartsDirectory? _directory;

    /// <summary>The directory of the catalogue, last read or made; null for a small catalogue, or before <see cref="Open"/>.</summary>
    public PartsDirectory? Directory => _directory;

    /// <summary>All parts of a small catalogue; null for a large one, or before <see cref="Open"/>.</summary>
    public PartsCatalog? Whole => _whole;

    /// <summary>The main currency; empty before <see cref="Open"/>.</summary>
    public string Currency => _directory?.Currency ?? _whole?.Currency ?? "";

    /// <summary>Reads a small catalogue, or the directory of a large one, anew.</summary>
    /// <param name="cancellation">Ends it.</param>
    /// <returns>True, or the problem.</returns>
    public Result<bool> Open(CancellationToken cancellation)
    {
        Result<long> length = CatalogStore.UseCurrent(path, _ => new FileInfo(System.IO.Path.GetFullPath(path)).Length);
        if (!length.IsOk)
        {
            return Result.Fail<bool>(length.Problem);
        }

        if (length.Value < largeBytes)
        {
            Result<PartsCatalog> all = CatalogStore.Load(path);
            (_whole, _directory) = (all.ValueOr(null!), null);
            return all.Map(_ => true);
        }

        Result<PartsDirectory> directory = DirectoryReading.Read(path, cancellation);
        (_whole, _directory) = (null, directory.ValueOr(null!));
        return directory.Map(_ => true);
    }

    /// <summary>Reads crystals of the directory and all parts of other kinds.</summary>
    /// <param name="directory">The directory that the places belong to.</param>
    /// <param name="places">The places of the crystals.</param>
    /// <param name="cancellation">Ends it.</param>
    /// <returns>The parts; null where the catalogue was changed since, and is to be opened anew; or the problem.</returns>
    public Result<PartsCatalog?> Read(PartsDirectory directory, IEnumerable<int> places, CancellationToken cancellation)
    {
        ArgumentNullException.ThrowIfNull(directory);
        ArgumentNullException.ThrowIfNull(places);
        string[] ids = [.. directory.OtherIds, .. places.Select(directory.IdOf)];
        Result<PartsCatalog?> read = CatalogStore.UseCurrent(path, file =>
        {
            lock (_gate)
            {
                return file.PartsMark == directory.Mark ? Read(file, directory, ids, cancellation) : null;
            }
        });
        cancellation.ThrowIfCancellationRequested();
        return read;
    }

    // Thrown from here, a cancellation would be taken for damage of the file.
    private PartsCatalog? Read(CatalogFile file, PartsDirectory directory, string[] ids, CancellationToken cancellation)
    {
        if (_keptMark != directory.Mark || _kept.Count > MostKept)
        {
            _kept.Clear();
            _keptMark = directory.Mark;
        }

        var parts = new List<Part>(ids.Length);
        foreach (string id in ids)
        {
            if (cancellation.IsCancellationRequested)
            {
                return null;
            }

            parts.Add(Find(file, id));
        }

        return new PartsCatalog(parts, directory.Currency);
    }

    private Part Find(CatalogFile file, string id)
    {
        if (!_kept.TryGetValue(id, out Part? part))
        {
            part = file.FindStored(id)?.Build() ?? throw new InvalidDataException("A part in it cannot be read.");
            _kept.Add(id, part);
        }

        return part;
    }
}
