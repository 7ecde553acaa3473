namespace PartPick.Screens;

/// <summary>A figure of two circuits.</summary>
/// <param name="Name">What it is.</param>
/// <param name="Unit">Its unit; empty for a plain number.</param>
/// <param name="A">That of the one; null where it has none.</param>
/// <param name="B">That of the other; null where it has none.</param>
/// <param name="Sense">−1 where less is better, 1 where more is, 0 where neither.</param>
/// <param name="Decimals">Digits after the point; null for about three figures.</param>
internal sealed record FigurePair(string Name, string Unit, double? A, double? B, int Sense, int? Decimals = null)
{
    /// <summary>The first figure as a text.</summary>
    public string TextA => Text(A);

    /// <summary>The second figure as a text.</summary>
    public string TextB => Text(B);

    /// <summary>How B differs from A, with its sign.</summary>
    public string Difference => TextA == TextB ? "same"
        : A is { } a && B is { } b ? Signed.Of(b - a, Text(Math.Abs(b - a)))
        : "-";

    /// <summary>Which one is better: "A", "B", or nothing. Figures that read the same are the same.</summary>
    public string Better
    {
        get
        {
            if (Sense == 0 || TextA == TextB)
            {
                return "";
            }

            if (A is null || B is null)
            {
                return A is null ? "B" : "A";
            }

            return Sense * Math.Sign(B.Value - A.Value) > 0 ? "B" : "A";
        }
    }

    private string Text(double? value) => value is not { } number || !double.IsFinite(number) ? "-"
        : Decimals is { } decimals ? Figures.Fixed(number, decimals) : Figures.Three(number);
}
