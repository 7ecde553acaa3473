using PartPick.Values;

namespace PartPick.Catalog;

/// <summary>What may be the name of a list.</summary>
public static class ShortlistName
{
    /// <summary>The list that is meant where none is named.</summary>
    public const string Usual = "default";

    private const int Longest = 60;
    private const string Fits = "1 to 60 letters, digits, spaces or signs without / and \\, not beginning with a hyphen";

    /// <summary>Reads a name.</summary>
    /// <param name="text">The text; spaces round it are left out.</param>
    /// <param name="where">The argument, for the problem.</param>
    /// <returns>The name, or the problem.</returns>
    public static Result<string> Read(string? text, string where = "NAME")
    {
        string name = (text ?? "").Trim();
        string? what = name.Length == 0 ? "is empty"
            : name.Length > Longest ? $"{Problem.Quote(name)} is too long"
            : name[0] == '-' ? $"{Problem.Quote(name)} begins with a hyphen"
            : name.Any(sign => char.IsControl(sign) || char.IsSurrogate(sign) || sign is '/' or '\\')
                ? $"{Problem.Quote(name)} holds a sign that no name may hold"
            : null;
        return what is null ? Result.Ok(name) : Result.Fail<string>(where, what, Fits);
    }
}
