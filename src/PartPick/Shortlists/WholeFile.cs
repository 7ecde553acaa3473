using PartPick.Values;

namespace PartPick.Shortlists;

/// <summary>Writes files whole or not at all, and over another file only when asked.</summary>
internal static class WholeFile
{
    /// <summary>Writes a file under another name first, forces it to the disk, and renames it.</summary>
    /// <param name="path">The path of the file.</param>
    /// <param name="bytes">What it holds.</param>
    /// <param name="replace">Whether a file that is there may be replaced.</param>
    /// <param name="where">The option or field that names the file, for the problem.</param>
    /// <returns>The problem; null where the file is written.</returns>
    public static Problem? Write(string path, byte[] bytes, bool replace, string where)
    {
        if (string.IsNullOrWhiteSpace(path) || path.Contains('\0', StringComparison.Ordinal))
        {
            return new Problem(where, $"{Problem.Quote(path)} is no path", "the path of a file");
        }

        if (Directory.Exists(path))
        {
            return new Problem(where, $"{Problem.Quote(path)} is a directory", "the path of a file");
        }

        // A rename would put a file in the place of the device.
        if (!OperatingSystem.IsWindows() && Path.GetFullPath(path).StartsWith("/dev/", StringComparison.Ordinal))
        {
            return new Problem(where, $"{Problem.Quote(path)} is a device", "the path of a file");
        }

        if (!replace && File.Exists(path))
        {
            return Taken(path, where);
        }

        string unfinished = $"{path}.{Guid.NewGuid():N}.new";
        try
        {
            using (var stream = new FileStream(unfinished, FileMode.CreateNew, FileAccess.Write))
            {
                stream.Write(bytes);
                stream.Flush(flushToDisk: true);
            }

            File.Move(unfinished, path, replace);
            return null;
        }
        catch (IOException) when (!replace && File.Exists(path))
        {
            // Another process was faster.
            Remove(unfinished);
            return Taken(path, where);
        }
        catch (Exception error) when (error is IOException or UnauthorizedAccessException or ArgumentException or NotSupportedException)
        {
            Remove(unfinished);
            string why = error is DirectoryNotFoundException ? "its directory is not there"
                : error is UnauthorizedAccessException ? "no permission"
                : error.Message.Replace(Path.GetFullPath(unfinished), path, StringComparison.Ordinal).TrimEnd('.');
            return new Problem(where, $"{Problem.Quote(path)} cannot be written: {why}", "a file in a directory that can be written to");
        }
    }

    private static Problem Taken(string path, string where) =>
        new(where, $"{Problem.Quote(path)} is there already", "another name, or --force to replace it");

    private static void Remove(string path)
    {
        try
        {
            File.Delete(path);
        }
        catch (Exception error) when (error is IOException or UnauthorizedAccessException)
        {
            // What kept it from being written may keep it from being removed; the first problem is the one to say.
        }
    }
}
