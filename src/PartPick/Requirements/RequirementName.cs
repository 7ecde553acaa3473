using PartPick.Values;

namespace PartPick.Requirements;

/// <summary>What may be the name under which a requirement is kept.</summary>
public static class RequirementName
{
    /// <summary>The most letters.</summary>
    public const int Longest = 60;

    private const string Fits = "1 to 60 letters, digits, spaces or signs";

    /// <summary>Reads a name.</summary>
    /// <param name="text">The text; spaces round it are left out.</param>
    /// <returns>The name, or the problem.</returns>
    public static Result<string> Read(string text)
    {
        ArgumentNullException.ThrowIfNull(text);
        string name = text.Trim();
        string? what = name.Length == 0 ? "is empty"
            : name.Length > Longest ? $"{Problem.Quote(name)} is too long"
            : name.Any(sign => char.IsControl(sign) || char.IsSurrogate(sign)) ? $"{Problem.Quote(name)} holds a sign that no name may hold"
            : null;
        return what is null ? Result.Ok(name) : Result.Fail<string>("name", what, Fits);
    }
}
