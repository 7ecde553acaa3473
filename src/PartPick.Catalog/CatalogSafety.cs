using PartPick.Catalog.Mapping;
using PartPick.Values;

namespace PartPick.Catalog;

/// <summary>Checks a catalogue, copies it to a safe place, and brings a copy back.</summary>
public static class CatalogSafety
{
    private const int MostFaults = 20;

    private static readonly TimeSpan Patience = TimeSpan.FromSeconds(5);

    /// <summary>Reads everything in a catalogue and says what was looked at.</summary>
    /// <param name="path">The path of the file.</param>
    /// <returns>What was checked and what is wrong, or the problem that kept it from being read at all.</returns>
    public static Result<CatalogCheck> Verify(string path) => CatalogStore.UseCurrent(path, Check);

    /// <summary>Copies a catalogue whole, also while the program runs elsewhere: no one keeps it open for longer than a moment.</summary>
    /// <param name="path">The path of the catalogue.</param>
    /// <param name="target">The file to make; one that is there is replaced.</param>
    /// <returns>The full path of the copy, or the problem.</returns>
    public static Result<string> Backup(string path, string target)
    {
        ArgumentException.ThrowIfNullOrEmpty(target);
        Result<bool> ready = CatalogStore.UseCurrent(path, _ => true);
        if (!ready.IsOk)
        {
            return Result.Fail<string>(ready.Problem);
        }

        (path, target) = (Path.GetFullPath(path), Path.GetFullPath(target));
        if (path == target)
        {
            return Result.Fail<string>(target, "is the catalogue itself", "another file");
        }

        return Guarded(target, () => CatalogStore.Locked(path, Patience, () =>
        {
            CatalogFile.Copy(path, target + ".new");
            CatalogFile.Publish(target + ".new", target);
            return target;
        }));
    }

    /// <summary>Puts a copy in the place of a catalogue, after it was read whole. The catalogue may be damaged, or not there.</summary>
    /// <param name="path">The path of the catalogue.</param>
    /// <param name="source">The copy.</param>
    /// <returns>What was checked in the copy, or the problem.</returns>
    public static Result<CatalogCheck> Restore(string path, string source)
    {
        ArgumentException.ThrowIfNullOrEmpty(path);
        ArgumentException.ThrowIfNullOrEmpty(source);
        (path, source) = (Path.GetFullPath(path), Path.GetFullPath(source));
        if (!File.Exists(source) || path == source)
        {
            return Result.Fail<CatalogCheck>(
                source,
                path == source ? "is the catalogue itself" : "is not there",
                "a file made by partpick catalog backup");
        }

        return Guarded(path, () =>
        {
            Directory.CreateDirectory(Path.GetDirectoryName(path)!);
            Result<IDisposable> changing = CatalogLock.Take(path + ".change", Patience);
            if (!changing.IsOk)
            {
                return Result.Fail<CatalogCheck>(changing.Problem with { Where = path });
            }

            using (changing.Value)
            {
                string copy = path + ".copy";
                try
                {
                    CatalogFile.Delete(copy);
                    File.Copy(source, copy);
                    Result<CatalogCheck> check = CatalogStore.WorkOn(copy, Check);
                    if (!check.IsOk)
                    {
                        return Result.Fail<CatalogCheck>(check.Problem with { Where = source });
                    }

                    return check.Value.Faults.Count > 0
                        ? Result.Fail<CatalogCheck>(source, check.Value.Faults[0], "a whole copy of a catalogue")
                        : CatalogStore.Locked(path, Patience, () =>
                        {
                            CatalogFile.Publish(copy, path);
                            return check.Value;
                        });
                }
                finally
                {
                    CatalogFile.Delete(copy);
                }
            }
        });
    }

    private static Result<T> Guarded<T>(string target, Func<Result<T>> work)
    {
        try
        {
            return work();
        }
        catch (Exception error) when (error is IOException or UnauthorizedAccessException)
        {
            return Result.Fail<T>(target, $"cannot be written: {error.Message}", "a file in a directory that can be written to");
        }
    }

    private static CatalogCheck Check(CatalogFile file)
    {
        var faults = new List<string>();
        var notes = file.ReadImports();
        (int parts, int origins) = (0, 0);
        foreach ((string id, StoredPart? stored) in file.ReadNamed())
        {
            string? fault = stored is null ? "cannot be read"
                : stored.Id != id ? $"holds the figures of {Problem.Quote(stored.Id)}"
                : stored.Build() is null ? "has figures that make no part"
                : stored.Elsewhere.Values.Append(stored.Place).Any(place => place.Import != 0 && !notes.ContainsKey(place.Import))
                    ? "comes from an import that is not noted" : null;
            parts++;
            origins += stored is null ? 0 : new Origins(notes).Of(stored).Count;
            if (fault is not null && faults.Count < MostFaults)
            {
                faults.Add($"the part {Problem.Quote(id)} {fault}");
            }
        }

        if (parts != file.CountParts())
        {
            faults.Add($"{file.CountParts()} parts are counted, {parts} are found");
        }

        int earlier = file.ReadEarlier().Count(part => part is not null);
        if (earlier != file.ReadEarlier().Count())
        {
            faults.Add("a part that is kept for taking the last import back cannot be read");
        }

        if (file.Shortlists.FindAll().Any(document => ShortlistDocument.Read(document) is null))
        {
            faults.Add("a candidate of a shortlist cannot be read");
        }

        int maps = file.MapNames().Count(name => file.ReadMap(name) is not null);
        return new CatalogCheck(parts, origins, notes.Count, earlier, maps, faults);
    }
}
