using System.Collections.Immutable;

namespace PartPick.Selection;

/// <summary>How one figure of a candidate comes about.</summary>
/// <param name="Name">The figure, in the words of the screens.</param>
/// <param name="Value">The figure with its unit, as it is shown.</param>
/// <param name="Definition">What it is, in one or two sentences.</param>
/// <param name="Steps">The formulas with this candidate's numbers; the last one gives the figure.</param>
public sealed record FigureWorking(string Name, string Value, string Definition, ImmutableArray<WorkingStep> Steps);
