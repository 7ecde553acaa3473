using System.Collections.Immutable;

namespace PartPick.Selection;

/// <summary>A choice that a file names, ready to be put on a list.</summary>
/// <param name="Choice">The parts.</param>
/// <param name="Support">The support parts; null where the file names none.</param>
/// <param name="Requirement">What is wanted.</param>
/// <param name="Remarks">What was taken for granted, as sentences.</param>
public sealed record ShortlistSource(
    CandidateParts Choice, SupportParts? Support, Requirement Requirement, ImmutableArray<string> Remarks);
