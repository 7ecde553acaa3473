using PartPick.Values;

namespace PartPick.Catalog;

/// <summary>
/// The catalogue on disk. Every call takes the lock beside the file, opens it, and closes it again,
/// so that other processes wait a moment at most.
/// </summary>
public static class CatalogStore
{
    private static readonly TimeSpan Patience = TimeSpan.FromSeconds(2);

    /// <summary>
    /// Reads all parts. A file that is not there is made from the built-in parts first;
    /// where the program brings other built-in parts than the file holds, those in the file are replaced.
    /// </summary>
    /// <param name="path">The path of the file.</param>
    /// <returns>The parts, or the problem: locked, damaged, or not to be opened.</returns>
    public static Result<PartsCatalog> Load(string path) => Load(path, BuiltInFiles.Embedded(), Patience);

    /// <summary>Reads a small text that <see cref="WriteSetting"/> has kept.</summary>
    /// <param name="path">The path of the file, which need not be there.</param>
    /// <param name="key">The name of the text.</param>
    /// <returns>The text, null when there is none; or the problem.</returns>
    public static Result<string?> ReadSetting(string path, string key)
    {
        ArgumentException.ThrowIfNullOrEmpty(key);
        return File.Exists(path)
            ? Use(path, BuiltInFiles.Embedded(), Patience, file => file.ReadSetting(key))
            : Result.Ok<string?>(null);
    }

    /// <summary>
    /// Keeps a small text, such as the last requirement. A file that is not there is made as in <see cref="Load(string)"/>.
    /// </summary>
    /// <param name="path">The path of the file.</param>
    /// <param name="key">The name of the text.</param>
    /// <param name="text">The text.</param>
    /// <returns>The problem; null when the text is kept.</returns>
    public static Problem? WriteSetting(string path, string key, string text)
    {
        ArgumentException.ThrowIfNullOrEmpty(key);
        ArgumentNullException.ThrowIfNull(text);
        return Use(path, BuiltInFiles.Embedded(), Patience, file =>
        {
            file.WriteSetting(key, text);
            return text;
        }).Problem;
    }

    internal static Result<T> UseCurrent<T>(string path, Func<CatalogFile, T> work) =>
        UseCurrent(path, BuiltInFiles.Embedded(), Patience, work);

    /// <summary>Does something with the open file after the built-in parts in it were brought up to date.</summary>
    internal static Result<T> UseCurrent<T>(string path, BuiltInFiles builtIn, TimeSpan patience, Func<CatalogFile, T> work) =>
        Use(path, builtIn, patience, file =>
        {
            if (file.BuiltInFingerprint != builtIn.Fingerprint())
            {
                file.ReplaceBuiltIn(builtIn);
            }

            return work(file);
        });

    internal static Result<PartsCatalog> Load(string path, BuiltInFiles builtIn, TimeSpan patience) =>
        UseCurrent(path, builtIn, patience, file =>
        {
            List<Part?> parts = file.ReadParts();
            return parts.Contains(null)
                ? throw new InvalidDataException("A part in it cannot be read.")
                : new PartsCatalog(parts.OfType<Part>());
        });

    /// <summary>Does something with the open file, and turns what is wrong with the file into a problem.</summary>
    internal static Result<T> Use<T>(string path, BuiltInFiles builtIn, TimeSpan patience, Func<CatalogFile, T> work)
    {
        ArgumentException.ThrowIfNullOrEmpty(path);
        try
        {
            path = Path.GetFullPath(path);
            Directory.CreateDirectory(Path.GetDirectoryName(path) ?? path);
            if (Directory.Exists(path))
            {
                return Result.Fail<T>(path, "is a directory", "the path of a catalogue file");
            }

            Result<IDisposable> taken = CatalogLock.Take(path, patience);
            if (!taken.IsOk)
            {
                return Result.Fail<T>(taken.Problem);
            }

            using (taken.Value)
            {
                if (!File.Exists(path))
                {
                    CatalogFile.Create(path, builtIn);
                }

                return WorkOn(path, work);
            }
        }
        catch (Exception error) when (error is IOException or UnauthorizedAccessException)
        {
            return Result.Fail<T>(path, $"cannot be opened: {error.Message}", "a file in a directory that can be written to");
        }
    }

    /// <summary>Does something with the files of a catalogue while no one has it open.</summary>
    internal static Result<T> Locked<T>(string path, TimeSpan patience, Func<T> work)
    {
        Result<IDisposable> taken = CatalogLock.Take(path, patience);
        if (!taken.IsOk)
        {
            return Result.Fail<T>(taken.Problem);
        }

        using (taken.Value)
        {
            return Result.Ok(work());
        }
    }

    /// <summary>Opens a file, does something with it, and turns damage into a problem.</summary>
    internal static Result<T> WorkOn<T>(string path, Func<CatalogFile, T> work)
    {
        CatalogFile? file = null;
        try
        {
            file = CatalogFile.Open(path);
            Result<T> result = file.StoredSchema == CatalogFile.Schema
                ? Result.Ok(work(file))
                : Result.Fail<T>(path, $"is of schema {file.StoredSchema}", $"a catalogue of schema {CatalogFile.Schema}");
            file.Dispose();
            return result;
        }
        catch (Exception error) when (IsDamage(error))
        {
            file?.Abandon();
            return Result.Fail<T>(
                path, $"is damaged or no catalogue: {error.Message}",
                "a catalogue made by this program; move this file away to begin anew");
        }
        catch
        {
            file?.Abandon();
            throw;
        }
    }

    // Reading pages of a damaged file fails in whatever way its bytes happen to mislead; what the disk refuses is no damage.
    private static bool IsDamage(Exception error) =>
        error is EndOfStreamException or not (IOException or UnauthorizedAccessException or BuiltInPartsException);
}
