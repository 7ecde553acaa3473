using PartPick.Values;

namespace PartPick.Selection.Files;

/// <summary>Keeps the first problem of a file: one line is what the user gets.</summary>
internal sealed class ProblemBox
{
    /// <summary>The first problem; null so far as all is well.</summary>
    public Problem? First { get; private set; }

    /// <summary>Notes a problem.</summary>
    public void Add(Problem problem) => First ??= problem;

    /// <summary>Notes a problem.</summary>
    public void Add(string where, string what, string fits) => Add(new Problem(where, what, fits));

    /// <summary>The value where nothing is wrong, else the first problem.</summary>
    /// <param name="make">Makes the value; called only where nothing is wrong.</param>
    public Result<T> Result<T>(Func<T> make) => First is null ? Values.Result.Ok(make()) : Values.Result.Fail<T>(First);
}
