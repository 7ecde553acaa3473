using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>Every figure of a candidate with its definition, its formula with this candidate's numbers, and the source.</summary>
public static class FigureWorkings
{
    /// <summary>All figures, in the order in which the screens show them.</summary>
    /// <param name="candidate">The candidate.</param>
    /// <param name="requirement">The requirement that it was judged by.</param>
    /// <param name="cheapest">The cheapest fit cost of the ranking; null where it is not known.</param>
    public static ImmutableArray<FigureWorking> Of(Candidate candidate, Requirement requirement, decimal? cheapest)
    {
        ArgumentNullException.ThrowIfNull(candidate);
        ArgumentNullException.ThrowIfNull(requirement);
        SupportParts support = SupportOf(candidate);
        CandidateStudy? study = CandidateStudy.Of(requirement, candidate.Choice, support);
        if (study is null)
        {
            return [CostFigure.Of(candidate, support, requirement.Builds)];
        }

        ImmutableArray<WorkingStep> nominal = CircuitWorking.Of(candidate.Describe(requirement.OutputHz), candidate.Result);
        return
        [
            .. ErrorFigures.Of(candidate, requirement, study),
            .. CornerFigures.Of(candidate, requirement, study),
            .. NominalFigures.Of(candidate, nominal),
            CostFigure.Of(candidate, support, requirement.Builds),
            .. ScoreFigure.Of(candidate, requirement, cheapest),
        ];
    }

    // The support parts stand in the list of parts under their roles.
    private static SupportParts SupportOf(Candidate candidate)
    {
        return new SupportParts(
            In(PartRoles.Feedback) as ResistorPart, In(PartRoles.Decoupling) as CapacitorPart, In(PartRoles.Coupling) as CapacitorPart);

        Part? In(string role) => candidate.Parts.FirstOrDefault(use => use.Role == role)?.Part;
    }
}
