namespace PartPick.Screens;

/// <summary>Says a reason in fewer letters, where the line is short.</summary>
public static class CornerWords
{
    private static readonly (string Whole, string Brief)[] Briefer =
    [
        ("least at ", "least: "), ("most at ", "most: "), ("longest at ", "longest: "),
        ("weakest device", "weak device"), ("strongest device", "strong device"),
        ("capacitances high", "high C"), ("capacitances low", "low C"),
    ];

    /// <summary>The reason in short: "least: 4.5 V, weak device, high C".</summary>
    /// <param name="reason">The reason.</param>
    public static string Shorten(string reason)
    {
        ArgumentNullException.ThrowIfNull(reason);
        return Briefer.Aggregate(reason, (text, pair) => text.Replace(pair.Whole, pair.Brief, StringComparison.Ordinal));
    }
}
