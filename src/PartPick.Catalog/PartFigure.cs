using PartPick.Values;

namespace PartPick.Catalog;

/// <summary>One figure or text of a part as files and listings show it.</summary>
/// <param name="Key">The key, such as <c>load</c>; a figure of a supply point has its number behind it, as in <c>gm 1</c>.</param>
/// <param name="Dimension">What a number measures; null for a text.</param>
/// <param name="Number">The number in the unit that <see cref="Values.Dimension"/> names; null for a text.</param>
/// <param name="Text">The text; null for a number.</param>
/// <param name="Basis">What it rests on.</param>
public sealed record PartFigure(string Key, Dimension? Dimension, double? Number, string? Text, Basis Basis)
{
    /// <summary>The figure with prefix and unit, all its digits.</summary>
    public override string ToString() => Dimension is { } dimension && Number is { } number
        ? ValueText.FormatExact(number, dimension)
        : Text ?? "";
}
