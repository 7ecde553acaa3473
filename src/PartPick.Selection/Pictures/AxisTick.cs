namespace PartPick.Selection;

/// <summary>A tick of an axis.</summary>
/// <param name="Value">Where it stands, in the SI unit of the axis.</param>
/// <param name="Text">Its number in the axis's unit.</param>
public readonly record struct AxisTick(double Value, string Text);
