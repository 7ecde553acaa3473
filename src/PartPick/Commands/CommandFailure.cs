using PartPick.Values;

namespace PartPick.Commands;

/// <summary>Ends a command with one line and a status.</summary>
internal sealed class CommandFailure(Problem problem, int status) : Exception(problem.ToString())
{
    /// <summary>What went wrong.</summary>
    public Problem Problem { get; } = problem;

    /// <summary>The exit status.</summary>
    public int Status { get; } = status;

    /// <summary>The value, or the end of the command with wrong input.</summary>
    public static T Unless<T>(Result<T> result, int status = ExitStatus.WrongInput) =>
        result.IsOk ? result.Value : throw new CommandFailure(result.Problem, status);
}
