using PartPick.Values;

namespace PartPick.Catalog;

/// <summary>
/// Changes many parts at once, all or none: the change is made in a copy beside the catalogue, which takes its place by a rename
/// when it is complete and on the disk. Until then others go on reading the catalogue; a second change waits, or is refused.
/// </summary>
internal static class CatalogChange
{
    private static readonly TimeSpan Patience = TimeSpan.FromSeconds(2);

    /// <summary>Makes a change.</summary>
    /// <param name="path">The path of the catalogue.</param>
    /// <param name="work">Makes the change in the copy; gives its result, and whether it is to be kept.</param>
    public static Result<T> Make<T>(string path, Func<CatalogFile, (Result<T> Result, bool Keep)> work) => WhileChanging(path, full =>
    {
        string copy = full + ".copy";
        try
        {
            Result<bool> copied = CatalogStore.Locked(full, Patience, () => CatalogFile.Copy(full, copy));
            return copied.IsOk ? WorkOn(full, copy, work) : Result.Fail<T>(copied.Problem);
        }
        catch (Exception error) when (error is IOException or UnauthorizedAccessException)
        {
            return Result.Fail<T>(
                full,
                $"cannot be changed, and is as it was: {error.Message}",
                "a disk with room, and a directory that can be written to");
        }
        finally
        {
            CatalogFile.Delete(copy);
        }
    });

    /// <summary>Makes a small change in the catalogue itself, while no one makes a large one.</summary>
    public static Result<T> Hold<T>(string path, Func<Result<T>> work) => WhileChanging(path, _ => work());

    // Works on the full path with the lock that keeps every other change away.
    private static Result<T> WhileChanging<T>(string path, Func<string, Result<T>> work)
    {
        ArgumentException.ThrowIfNullOrEmpty(path);
        Result<bool> ready = CatalogStore.UseCurrent(path, _ => true);
        if (!ready.IsOk)
        {
            return Result.Fail<T>(ready.Problem);
        }

        path = Path.GetFullPath(path);
        Result<IDisposable> changing = CatalogLock.Take(path + ".change", Patience);
        if (!changing.IsOk)
        {
            return Result.Fail<T>(changing.Problem with { Where = path, What = "is in use by another process, which is changing it" });
        }

        using (changing.Value)
        {
            return work(path);
        }
    }

    private static Result<T> WorkOn<T>(string path, string copy, Func<CatalogFile, (Result<T> Result, bool Keep)> work)
    {
        Result<T> result;
        bool keep;
        CatalogFile file = CatalogFile.Open(copy);
        try
        {
            (result, keep) = work(file);
            file.Dispose();
        }
        catch
        {
            file.Abandon();
            throw;
        }

        if (!keep)
        {
            return result;
        }

        Result<bool> put = CatalogStore.Locked(path, Patience, () => CatalogFile.TakePlace(copy, path));
        return put.IsOk ? result : Result.Fail<T>(put.Problem);
    }
}
