namespace PartPick.Selection;

/// <summary>The circuit of a choice of parts with everything that its figures are made from.</summary>
/// <param name="Model">The crystal's model.</param>
/// <param name="Template">Circuit, crystal and amplifier on the board.</param>
/// <param name="Analysis">The figures of the nominal values.</param>
/// <param name="Corners">The worst corners.</param>
public sealed record CandidateStudy(CrystalModel Model, CircuitTemplate Template, ValueAnalysis Analysis, CornerAnalysis Corners)
{
    /// <summary>Analyses a choice from nothing; null where its amplifier is not specified over the supply range.</summary>
    /// <param name="requirement">What is needed.</param>
    /// <param name="choice">The parts that a ranking varies.</param>
    /// <param name="support">The parts that the circuit needs besides.</param>
    public static CandidateStudy? Of(Requirement requirement, CandidateParts choice, SupportParts support)
    {
        ArgumentNullException.ThrowIfNull(choice);
        ArgumentNullException.ThrowIfNull(support);
        CrystalModel model = CrystalModel.From(choice.Crystal);
        return TemplateOf(requirement, choice, support, model) is { } template
            ? new CandidateStudy(
                model, template, new ValueAnalysis(template, requirement, CircuitValues.Of(choice)),
                    CornersOf(requirement, choice, template))
            : null;
    }

    internal static CircuitTemplate? TemplateOf(Requirement requirement, CandidateParts choice, SupportParts support, CrystalModel model) =>
        CircuitTemplate.Create(requirement, choice.Circuit, model, choice.Amplifier,
            support.Feedback?.ValueOhms ?? double.PositiveInfinity);

    internal static CornerAnalysis CornersOf(Requirement requirement, CandidateParts choice, CircuitTemplate template) => new(
        template, requirement, CircuitValues.Of(choice), BudgetBuilder.Tolerance(choice.C1), BudgetBuilder.Tolerance(choice.C2));
}
