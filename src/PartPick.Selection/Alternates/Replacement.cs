using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>A part that keeps a circuit fit in the place of another.</summary>
/// <param name="Part">The part.</param>
/// <param name="Candidate">The circuit with it, analysed in full.</param>
/// <param name="Change">What it changes.</param>
/// <param name="SamePackage">Whether its package is that of the part it replaces.</param>
public sealed record Replacement(Part Part, Candidate Candidate, CandidateChange Change, bool SamePackage);
