namespace PartPick.Values;

/// <summary>Makes results: a value, or the problem that kept it from being one.</summary>
public static class Result
{
    /// <summary>A result that holds a value.</summary>
    /// <typeparam name="T">The type of the value.</typeparam>
    /// <param name="value">The value.</param>
    /// <returns>The result.</returns>
    public static Result<T> Ok<T>(T value) => new(value, null);

    /// <summary>A result that holds a problem.</summary>
    /// <typeparam name="T">The type of the value that is missing.</typeparam>
    /// <param name="problem">What went wrong.</param>
    /// <returns>The result.</returns>
    public static Result<T> Fail<T>(Problem problem)
    {
        ArgumentNullException.ThrowIfNull(problem);
        return new Result<T>(default, problem);
    }

    /// <summary>A result that holds a problem, put together here.</summary>
    /// <typeparam name="T">The type of the value that is missing.</typeparam>
    /// <param name="where">The place that is meant.</param>
    /// <param name="what">What is wrong there.</param>
    /// <param name="fits">What would be right.</param>
    /// <returns>The result.</returns>
    public static Result<T> Fail<T>(string where, string what, string fits) => Fail<T>(new Problem(where, what, fits));
}
