using PartPick.Values;

namespace PartPick.Output;

/// <summary>Says beforehand what keeps a picture from being written.</summary>
internal static class PictureFile
{
    /// <summary>The problem of a file's name; null where there is none that can be seen.</summary>
    /// <param name="path">The path of the file.</param>
    /// <param name="replaces">Whether a file that is there may be replaced.</param>
    /// <param name="where">The option or field that names it.</param>
    /// <param name="another">What to do where a file is there already.</param>
    public static Problem? Check(string path, bool replaces, string where, string another) =>
        !Path.GetExtension(path).Equals(".svg", StringComparison.OrdinalIgnoreCase)
            ? new Problem(where, $"{Problem.Quote(path)} is no name of a picture", "a name that ends with .svg")
        : !replaces && File.Exists(path) ? new Problem(where, $"{Problem.Quote(path)} is there already", another)
        : null;
}
