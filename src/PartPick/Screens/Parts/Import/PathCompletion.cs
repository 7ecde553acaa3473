namespace PartPick.Screens;

/// <summary>Completes a path that is being typed.</summary>
internal static class PathCompletion
{
    private const int MostLookedAt = 5000;

    /// <summary>The path, longer by as much as all files agree that begin so.</summary>
    /// <param name="typed">What is typed; a leading tilde is the home directory.</param>
    public static string Of(string typed)
    {
        string full = new ImportWishes { File = typed }.FullPath;
        string name = Path.GetFileName(full);
        string directory = Path.GetDirectoryName(full) is { Length: > 0 } above ? above : full.StartsWith('/') ? "/" : ".";
        try
        {
            string[] found =
            [
                .. new DirectoryInfo(directory).EnumerateFileSystemInfos().Take(MostLookedAt)
                    .Where(entry => entry.Name.StartsWith(name, StringComparison.Ordinal) && !entry.Name.Any(char.IsControl))
                    .Select(entry => entry is DirectoryInfo ? entry.Name + "/" : entry.Name),
            ];
            if (found.Length == 0)
            {
                return typed;
            }

            string common = found.Aggregate((one, other) => one[..one.AsSpan().CommonPrefixLength(other)]);
            return typed[..(typed.Length - name.Length)] + common;
        }
        catch (Exception error) when (error is IOException or UnauthorizedAccessException or ArgumentException)
        {
            return typed;
        }
    }
}
