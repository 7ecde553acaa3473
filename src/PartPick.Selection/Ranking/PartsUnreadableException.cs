using PartPick.Values;

namespace PartPick.Selection;

/// <summary>A ranking cannot go on because parts cannot be read.</summary>
/// <param name="problem">What is wrong.</param>
public sealed class PartsUnreadableException(Problem problem) : Exception(problem?.ToString())
{
    /// <summary>What is wrong.</summary>
    public Problem Problem { get; } = problem!;
}
