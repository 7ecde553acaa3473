using System.Collections.Immutable;

namespace PartPick.Selection;

/// <summary>A circuit whose parts are to be bought.</summary>
/// <param name="Label">What its rows call it: "1".</param>
/// <param name="Name">What it is, in a few words.</param>
/// <param name="Builds">Number of boards, one or more.</param>
/// <param name="Parts">Every part in its place.</param>
public sealed record PurchaseCircuit(string Label, string Name, int Builds, ImmutableArray<PartUse> Parts);

/// <summary>Where a circuit uses a part.</summary>
/// <param name="Circuit">The label of the circuit.</param>
/// <param name="Builds">Number of boards of it.</param>
/// <param name="Designators">Where the part stands on each: IEEE 315 letters.</param>
public sealed record PurchaseUse(string Circuit, int Builds, ImmutableArray<string> Designators);
