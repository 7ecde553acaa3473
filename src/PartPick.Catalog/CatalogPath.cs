using PartPick.Values;

namespace PartPick.Catalog;

/// <summary>Where the catalogue is.</summary>
public static class CatalogPath
{
    /// <summary>The option of the command line.</summary>
    public const string Option = "--catalog";

    /// <summary>The variable that names the catalogue where the option does not.</summary>
    public const string Variable = "PARTPICK_CATALOG";

    /// <summary>
    /// Finds the path: the option, else PARTPICK_CATALOG, else <c>partpick/catalog.db</c> in XDG_DATA_HOME,
    /// which is <c>~/.local/share</c> where it is not set to an absolute path.
    /// </summary>
    /// <param name="option">The value of <c>--catalog</c>; null when it was not given.</param>
    /// <param name="environment">Looks up a variable.</param>
    /// <returns>The full path, or the problem.</returns>
    public static Result<string> Resolve(string? option, Func<string, string?> environment)
    {
        ArgumentNullException.ThrowIfNull(environment);
        if (option is not null)
        {
            return Full(option, Option);
        }

        if (environment(Variable) is { Length: > 0 } variable)
        {
            return Full(variable, Variable);
        }

        if (environment("XDG_DATA_HOME") is { } data && Path.IsPathFullyQualified(data))
        {
            return Full(Path.Combine(data, "partpick", "catalog.db"), "XDG_DATA_HOME");
        }

        foreach (string name in new[] { "HOME", "USERPROFILE" })
        {
            if (environment(name) is { } home && Path.IsPathFullyQualified(home))
            {
                return Full(Path.Combine(home, ".local", "share", "partpick", "catalog.db"), name);
            }
        }

        return Result.Fail<string>(
            "catalogue", "there is no home directory to keep it in", $"a file named by {Option} or {Variable}");
    }

    private static Result<string> Full(string path, string where) =>
        string.IsNullOrWhiteSpace(path) || path.Contains('\0', StringComparison.Ordinal)
            ? Result.Fail<string>(where, $"{Problem.Quote(path)} is no path", "the path of a catalogue file")
            : Result.Ok(Path.GetFullPath(path));
}
