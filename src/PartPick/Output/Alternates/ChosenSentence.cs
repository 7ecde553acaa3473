using System.Globalization;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Output;

/// <summary>A candidate of a list as one sentence, with how far each limit is used.</summary>
internal static class ChosenSentence
{
    /// <summary>The sentence, and one for each limit that it breaks.</summary>
    public static void Write(TextWriter output, string list, ShortlistReview review, ChosenCircuit chosen)
    {
        Candidate candidate = chosen.Candidate;
        CandidateParts choice = candidate.Choice;
        Requirement requirement = review.Requirement;
        string stage = choice.Tap > 0 ? $", stage {Figures.Whole(choice.Tap)}" : "";
        string drive = candidate.Drive is { } most
            ? $", drive level {ValueText.Format(most.Value, Dimension.Power)}"
                + (candidate.RatedDriveWatts is { } rated ? $" of {ValueText.Format(rated, Dimension.Power)}" : "")
            : "";
        string cost = !candidate.IsInOneCurrency ? "priced in more than one currency" : candidate.Cost.ToString("0.000", CultureInfo.InvariantCulture)
            + (requirement.CostLimit is { } limit ? " of " + limit.ToString("0.###", CultureInfo.InvariantCulture) : "")
            + $" {candidate.Currency} each";
        output.WriteLine(
            $"{list}, candidate {Figures.Whole(review.Entry.Number)}: {choice.Circuit.Word()} {choice.Amplifier.Id} with "
            + $"{choice.Crystal.Id}{stage}; error {Figures.Fixed(candidate.Budget?.WorstRatio, 1e-6, 1)} of "
            + $"{Figures.Fixed(requirement.BudgetRatio, 1e-6, 1)} ppm, margin {Figures.Fixed(candidate.Margin.Value, 1, 2)} "
            + $"({Figures.Short(requirement.Margin, 1)} wanted){drive}, {cost} for "
            + $"{Figures.Whole(requirement.Builds)} boards.");
        foreach (Miss miss in review.Misses)
        {
            output.WriteLine($"Unfit today: {miss.Sentence}.");
        }

        foreach (PartChange gone in review.Changes.Where(change => change.Kind == ChangeKind.Gone))
        {
            output.WriteLine($"{gone}.");
        }
    }
}
