using PartPick.Values;

namespace PartPick.Commands;

/// <summary>The file of a list that is to be imported.</summary>
internal static class ListFile
{
    /// <summary>Opens it for reading.</summary>
    public static Result<Stream> Open(string path)
    {
        try
        {
            return Result.Ok<Stream>(
                new FileStream(path, FileMode.Open, FileAccess.Read, FileShare.ReadWrite, 1 << 16, FileOptions.SequentialScan));
        }
        catch (Exception error) when (error is IOException or UnauthorizedAccessException or ArgumentException or NotSupportedException)
        {
            string what = error is FileNotFoundException or DirectoryNotFoundException ? "is not there"
                : Directory.Exists(path) ? "is a directory" : "cannot be read";
            return Result.Fail<Stream>(path, what, "the path of a file");
        }
    }

    /// <summary>Where rows that are not taken go.</summary>
    public static string RejectedPathOf(string path) => Path.ChangeExtension(path, ".rejected.csv");
}
