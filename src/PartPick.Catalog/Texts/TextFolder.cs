using System.Collections.Immutable;
using System.Text;
using PartPick.Values;

namespace PartPick.Catalog;

/// <summary>
/// A folder of small texts, each a file of its own. Several programs may use it at once: whoever changes it holds the lock in it, a
/// file is written whole under another name and renamed, and none is put over another one.
/// </summary>
/// <param name="folder">The path of the folder, which need not be there.</param>
public sealed class TextFolder(string folder)
{
    private const string Ending = ".json";
    private const int LongestStem = 60;
    private const long MostBytes = 1_000_000;

    private static readonly TimeSpan Patience = TimeSpan.FromSeconds(2);
    private static readonly UTF8Encoding Strict = new(encoderShouldEmitUTF8Identifier: false, throwOnInvalidBytes: true);

    /// <summary>The path of the folder.</summary>
    public string Path => folder;

    /// <summary>Reads all texts by the names of their files.</summary>
    /// <returns>The texts, or why the folder cannot be read.</returns>
    public Result<ImmutableArray<KeptText>> Read() => Guarded(() => Result.Ok(ReadFiles()));

    /// <summary>Changes texts while no one else does.</summary>
    /// <param name="work">Is given the texts as they are now; what it answers is the answer.</param>
    /// <returns>The answer, or why the folder cannot be changed.</returns>
    public Result<T> Change<T>(Func<ImmutableArray<KeptText>, Result<T>> work)
    {
        ArgumentNullException.ThrowIfNull(work);
        return Guarded(() =>
        {
            Directory.CreateDirectory(folder);
            Result<IDisposable> taken = CatalogLock.Take(System.IO.Path.Combine(folder, "change"), Patience);
            if (!taken.IsOk)
            {
                return Result.Fail<T>(taken.Problem with { Where = folder });
            }

            using (taken.Value)
            {
                return work(ReadFiles());
            }
        });
    }

    /// <summary>Writes a new text; called from within <see cref="Change"/>.</summary>
    /// <param name="name">What the file is named after, as far as a file can be.</param>
    /// <param name="text">The text.</param>
    public KeptText Add(string name, string text)
    {
        string stem = Stem(name);
        string id = stem + Ending;
        for (int number = 2; Exists(id); number++)
        {
            id = FormattableString.Invariant($"{stem} {number}{Ending}");
        }

        return Put(id, text);
    }

    /// <summary>Writes another text in the place of one; called from within <see cref="Change"/>.</summary>
    /// <param name="id">The name of its file.</param>
    /// <param name="text">The text.</param>
    public KeptText Put(string id, string text)
    {
        string path = System.IO.Path.Combine(folder, id);
        string unfinished = path + ".new";
        using (var stream = new FileStream(unfinished, FileMode.Create, FileAccess.Write))
        {
            stream.Write(Strict.GetBytes(text));
            stream.Flush(flushToDisk: true);
        }

        File.Move(unfinished, path, overwrite: true);
        return new KeptText(id, Result.Ok(text));
    }

    /// <summary>Takes a text away; called from within <see cref="Change"/>.</summary>
    /// <param name="id">The name of its file.</param>
    public void Remove(string id) => File.Delete(System.IO.Path.Combine(folder, id));

    private bool Exists(string id)
    {
        string path = System.IO.Path.Combine(folder, id);
        return File.Exists(path) || Directory.Exists(path);
    }

    private ImmutableArray<KeptText> ReadFiles() => Directory.Exists(folder)
        ?
        [
            .. Directory.EnumerateFiles(folder, "*" + Ending).Order(StringComparer.Ordinal)
                .Select(path => new KeptText(System.IO.Path.GetFileName(path), ReadFile(path))),
        ]
        : [];

    private static Result<string> ReadFile(string path)
    {
        try
        {
            return new FileInfo(path).Length > MostBytes
                ? Result.Fail<string>(path, "is too long for a text that is kept here", "at most 1 MB")
                : Result.Ok(Strict.GetString(File.ReadAllBytes(path)));
        }
        catch (Exception error) when (error is IOException or UnauthorizedAccessException or DecoderFallbackException)
        {
            return Result.Fail<string>(path, $"cannot be read: {error.Message}", "a text in UTF-8");
        }
    }

    private Result<T> Guarded<T>(Func<Result<T>> work)
    {
        try
        {
            return work();
        }
        catch (Exception error) when (error is IOException or UnauthorizedAccessException)
        {
            return Result.Fail<T>(folder, $"cannot be used: {error.Message}", "a folder that can be written to");
        }
    }

    // Letters and digits of any language, and what no file system minds.
    private static string Stem(string name)
    {
        string plain = new([.. name.Trim().Take(LongestStem).Select(sign => IsPlain(sign) ? sign : '-')]);
        plain = plain.Trim(' ', '.', '-');
        return plain.Length == 0 ? "wanted" : plain;
    }

    private static bool IsPlain(char sign) => char.IsLetterOrDigit(sign) || sign is ' ' or '-' or '_' or '.' or ',' or '(' or ')' or '+';
}
