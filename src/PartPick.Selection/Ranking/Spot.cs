namespace PartPick.Selection.Search;

/// <summary>A combination of values that has the margin, and what the first look knows of it.</summary>
/// <param name="Option">Place of the amplifier option.</param>
/// <param name="C1">Place of C1's value.</param>
/// <param name="C2">Place of C2's value.</param>
/// <param name="Margin">Start-up margin at the worst corner of supply, ambient and device, nominal capacitances.</param>
/// <param name="Load">Bounds of the load seen by the crystal.</param>
/// <param name="Slopes">How much the load grows with the capacitances.</param>
/// <param name="AmplifierRatio">A shift of the frequency over amplifier and supply that the full analysis will at least find.</param>
internal sealed record Spot(int Option, int C1, int C2, double Margin, LoadRange Load, LoadSlopes Slopes, double AmplifierRatio);
