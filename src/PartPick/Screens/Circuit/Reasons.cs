using System.Collections.Immutable;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>Says why a circuit stands where it stands.</summary>
public static class Reasons
{
    /// <summary>The reasons as sentences.</summary>
    /// <param name="candidate">The candidate.</param>
    /// <param name="result">The ranking that it belongs to.</param>
    public static ImmutableArray<string> Of(Candidate candidate, RankingResult result)
    {
        ArgumentNullException.ThrowIfNull(candidate);
        ArgumentNullException.ThrowIfNull(result);
        var reasons = ImmutableArray.CreateBuilder<string>();
        if (Nearest(candidate, result.Requirement) is { } nearest)
        {
            reasons.Add(nearest);
        }

        if (candidate.IsFit)
        {
            reasons.Add(Score(candidate, result));
            reasons.Add(candidate.OnFront ? "No other fit circuit is as good in error, margin and cost together and better in one of them."
                : result.Candidates.Any(one => ReferenceEquals(one, candidate))
                    ? "Another fit circuit is as good in error, margin and cost together and better in one of them."
                : "It was changed by hand and is not ranked; its score is reckoned like the others.");
        }

        if (result.Requirement is { Waveform: Waveform.Any } && candidate.Choice.Circuit == CircuitKind.Follower)
        {
            reasons.Add("A follower gives a sine: for logic levels, ask for square.");
        }

        return reasons.ToImmutable();
    }

    private static string? Nearest(Candidate candidate, Requirement requirement)
    {
        LimitUse? use = LimitUses.Nearest(LimitUses.Of(candidate, requirement));
        return use is null ? null : FormattableString.Invariant(
            $"The nearest limit is the {use.Word}: {use.Figure} {use.Against}, {Percent(use.Used!.Value)} of it used ({use.Because}).");
    }

    private static string Score(Candidate candidate, RankingResult result)
    {
        Requirement requirement = result.Requirement;
        Weights weights = requirement.Weights;
        double error = weights.Error * (candidate.Budget?.WorstRatio ?? double.NaN) / requirement.BudgetRatio;
        double margin = weights.Margin * requirement.Margin / candidate.Margin.Value;
        double cost = candidate.Score - error - margin;
        return FormattableString.Invariant(
            $"Score {candidate.Score:F3}, lower is better: error {error:F3}, margin {margin:F3}, cost {cost:F3} (weights ") +
            string.Join(
                ", ",
                new[] { weights.Error, weights.Margin, weights.Cost }.Select(w => ValueText.Format(w, Dimension.Number))) + ").";
    }

    private static string Percent(double share) => Figures.Fixed(share * 100, 0) + " %";
}
