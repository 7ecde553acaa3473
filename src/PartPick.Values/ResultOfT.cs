using System.Diagnostics.CodeAnalysis;

namespace PartPick.Values;

/// <summary>A value, or the problem that kept it from being one. Made by <see cref="Result"/>.</summary>
/// <typeparam name="T">The type of the value.</typeparam>
public sealed class Result<T>
{
    private readonly T? _value;

    internal Result(T? value, Problem? problem)
    {
        _value = value;
        Problem = problem;
    }

    /// <summary>Whether there is a value.</summary>
    [MemberNotNullWhen(false, nameof(Problem))]
    public bool IsOk => Problem is null;

    /// <summary>The value.</summary>
    /// <exception cref="InvalidOperationException">There is none: look at <see cref="IsOk"/> first.</exception>
    public T Value => IsOk ? _value! : throw new InvalidOperationException($"There is no value: {Problem}");

    /// <summary>What went wrong; null when there is a value.</summary>
    public Problem? Problem { get; }

    /// <summary>Changes the value, if there is one.</summary>
    /// <typeparam name="TOther">The type it becomes.</typeparam>
    /// <param name="change">What to do with the value.</param>
    /// <returns>The changed value, or the same problem.</returns>
    public Result<TOther> Map<TOther>(Func<T, TOther> change)
    {
        ArgumentNullException.ThrowIfNull(change);
        return IsOk ? Result.Ok(change(_value!)) : Result.Fail<TOther>(Problem);
    }

    /// <summary>Goes on with a step that can itself fail, if there is a value.</summary>
    /// <typeparam name="TOther">The type of the next step's value.</typeparam>
    /// <param name="next">The next step.</param>
    /// <returns>What the next step gives, or the same problem.</returns>
    public Result<TOther> Then<TOther>(Func<T, Result<TOther>> next)
    {
        ArgumentNullException.ThrowIfNull(next);
        return IsOk ? next(_value!) : Result.Fail<TOther>(Problem);
    }

    /// <summary>The value, or another one when there is none.</summary>
    /// <param name="other">The value to take instead.</param>
    /// <returns>One of the two.</returns>
    public T ValueOr(T other) => IsOk ? _value! : other;

    /// <summary>The value or the problem, for messages.</summary>
    public override string ToString() => IsOk ? $"{_value}" : Problem.ToString();
}
