using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>What the rankings of this session found, by what was wanted; names do not count.</summary>
internal sealed class RankedFigures
{
    private readonly Dictionary<string, RankedFigure> _found = new(StringComparer.Ordinal);

    /// <summary>What was found for a requirement; null where it was not ranked with these parts.</summary>
    /// <param name="requirement">The requirement.</param>
    public RankedFigure? Of(Requirement requirement) => _found.GetValueOrDefault(KeyOf(requirement));

    /// <summary>Remembers an exact answer.</summary>
    /// <param name="result">The answer; a best-so-far is left out.</param>
    public void Take(RankingResult result)
    {
        if (result.IsComplete)
        {
            _found[KeyOf(result.Requirement)] = new RankedFigure(result.Candidates.Length, result.Candidates.FirstOrDefault());
        }
    }

    /// <summary>Forgets all, as after the parts have changed.</summary>
    public void Clear() => _found.Clear();

    /// <summary>Whether two requirements want the same, whatever their names.</summary>
    /// <param name="one">One of them.</param>
    /// <param name="other">The other one.</param>
    public static bool AreSame(Requirement one, Requirement other) => KeyOf(one) == KeyOf(other);

    // 2.50 and 2.5 are one limit: the division leaves out what zeros there are behind.
    private static string KeyOf(Requirement requirement) => RequirementFile.Write(requirement with
    {
        Name = "",
        CostLimit = requirement.CostLimit / 1.0000000000000000000000000000m,
    }).ToJsonString();
}

/// <summary>What a ranking found.</summary>
/// <param name="Fit">How many circuits fit.</param>
/// <param name="Best">The best of them; null where none does.</param>
internal sealed record RankedFigure(int Fit, Candidate? Best);
