namespace PartPick.Screens;

/// <summary>Changes of figures as texts, each with its sign.</summary>
internal static class Signed
{
    /// <summary>A change with about three figures: "+3.21"; "0" where nothing of it is left.</summary>
    /// <param name="change">The change.</param>
    public static string Of(double change) => Of(change, Figures.Three(Math.Abs(change)));

    /// <summary>A change of an amount of money.</summary>
    /// <param name="change">The change.</param>
    public static string Of(decimal change) =>
        Of((double)change, Math.Abs(change).ToString("0.00##", System.Globalization.CultureInfo.InvariantCulture));

    /// <summary>A size with the sign of a change.</summary>
    /// <param name="change">The change.</param>
    /// <param name="size">Its size as a text.</param>
    public static string Of(double change, string size) =>
        !size.Any(sign => sign is >= '1' and <= '9') ? "0" : (change < 0 ? "-" : "+") + size;
}
