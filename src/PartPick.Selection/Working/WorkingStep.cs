namespace PartPick.Selection;

/// <summary>One step of the working behind a circuit's figures.</summary>
/// <param name="Section">The part of the model that it belongs to.</param>
/// <param name="Quantity">What is found, with its symbol.</param>
/// <param name="Formula">The formula, or the condition that is solved.</param>
/// <param name="Numbers">The formula with its numbers; empty where it is solved rather than evaluated.</param>
/// <param name="Value">The value with its unit.</param>
/// <param name="Source">Where the formula is from; empty for a definition.</param>
public sealed record WorkingStep(string Section, string Quantity, string Formula, string Numbers, string Value, string Source);
