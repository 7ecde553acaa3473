namespace PartPick.Selection.Search;

/// <summary>Rounds a figure that was reached to one that can be wanted: outwards, to three figures.</summary>
internal static class Rounding
{
    /// <summary>The step of three figures: 0.1 for 91.3, 1e-3 for 0.271.</summary>
    public static double Step(double value) => Math.Pow(10, Math.Floor(Math.Log10(Math.Abs(value))) - 2);

    /// <summary>Up, and some steps more.</summary>
    public static double Up(double value, int more = 0) => Exactly(Math.Ceiling(value / Step(value) - 1e-9) + more, Step(value));

    /// <summary>Down, and some steps more.</summary>
    public static double Down(double value, int more = 0) => Exactly(Math.Floor(value / Step(value) + 1e-9) - more, Step(value));

    /// <summary>An amount of money up to what is paid: hundredths, or ten-thousandths below one tenth.</summary>
    public static decimal Up(decimal amount)
    {
        decimal step = amount < 0.1m ? 0.0001m : 0.01m;
        return Math.Ceiling(amount / step) * step;
    }

    // As the decimal number that is printed, not as the product of two binary ones.
    private static double Exactly(double steps, double step) =>
        double.Parse(FormattableString.Invariant($"{steps:F0}e{Math.Round(Math.Log10(step)):F0}"),
            System.Globalization.CultureInfo.InvariantCulture);
}
