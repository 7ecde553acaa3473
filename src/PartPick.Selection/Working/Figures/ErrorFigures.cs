using System.Collections.Immutable;

namespace PartPick.Selection;

/// <summary>The frequency error: worst case, root of the sum of squares, centre, and each spread.</summary>
internal static class ErrorFigures
{
    private const string Section = "Frequency error";

    public static IEnumerable<FigureWorking> Of(Candidate candidate, Requirement requirement, CandidateStudy study)
    {
        if (candidate.Budget is not { } budget || study.Analysis.Steady is not { } steady)
        {
            yield break;
        }

        if (!double.IsFinite(budget.WorstRatio))
        {
            yield return new FigureWorking(
                "frequency error, worst case", "none", "There is none, as a corner does not run: it has no steady state.",
                [new WorkingStep(Section, "steady state", "Re Zc(I) = -Rm", "", "none at a corner", "periodic states at all corners")]);
            yield break;
        }

        string centre = Numbers.Ppm(Math.Abs(budget.CentreRatio));
        string[] terms = [.. budget.Terms.Select(term => Numbers.Ppm(term.Ratio))];
        yield return new FigureWorking(
            "frequency error, worst case", Numbers.ShownPpm(budget.WorstRatio),
            "How far the output may be off when everything that spreads lies at its end in the same direction. It is what the budget "
                + "limits and the list ranks by.",
            [
                new WorkingStep(Section, "worst case", "|e0| + sum of the spreads", string.Join(" + ", terms.Prepend(centre)),
                    Numbers.Ppm(budget.WorstRatio), "linear sum: no combination is worse"),
            ]);
        yield return new FigureWorking(
            "frequency error, RSS", Numbers.ShownPpm(budget.RssRatio),
            "How far the output is usually off: the centre and the root of the sum of the squared spreads, as if they were independent.",
            [
                new WorkingStep(Section, "RSS", "|e0| + sqrt(sum of the spreads squared)",
                    $"{centre} + sqrt({string.Join(" + ", terms.Select(term => $"({term})^2"))})",
                    Numbers.Ppm(budget.RssRatio), "independent spreads add by their squares"),
            ]);
        string divided = candidate.Choice.Tap == 0 ? "" : FormattableString.Invariant($"2^{candidate.Choice.Tap} ");
        yield return new FigureWorking(
            "centre error e0", (budget.CentreRatio < 0 ? "" : "+") + Numbers.ShownPpm(budget.CentreRatio),
            "How far the output is off with every value nominal, at 25 °C and the middle of the supply. A trimmed capacitor moves it; "
                + "the spreads stay.",
            [
                new WorkingStep(Section, "e0", "f / (2^k target) - 1",
                    $"{Numbers.Finely(steady.FrequencyHz)} / ({divided}{Numbers.Finely(requirement.OutputHz)}) - 1",
                    Numbers.Ppm(budget.CentreRatio), "definition"),
            ]);
        var spreads = new SpreadSteps(candidate, requirement, study, steady);
        foreach (BudgetTerm term in budget.Terms)
        {
            (string definition, ImmutableArray<WorkingStep> steps) = spreads.Of(term);
            yield return new FigureWorking(
                term.Term, "±" + Numbers.ShownPpm(term.Ratio) + (term.RestsOn is { } rest ? $" ({rest})" : ""), definition, steps);
        }
    }
}
