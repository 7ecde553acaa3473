using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>A part in its place in the circuit.</summary>
/// <param name="Designator">Reference designator, IEEE 315 letters: C1, R2, Y1, Q1, U1.</param>
/// <param name="Role">What it does there, in a few words: "load capacitor", "damping resistor Rs".</param>
/// <param name="Part">The part.</param>
/// <param name="Value">Its value with unit, or empty.</param>
public sealed record PartUse(string Designator, string Role, Part Part, string Value);
