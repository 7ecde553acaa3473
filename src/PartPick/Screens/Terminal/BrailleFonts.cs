namespace PartPick.Screens;

/// <summary>Which terminals have Braille patterns to draw dots with.</summary>
internal static class BrailleFonts
{
    // The fonts of these consoles have 256 or 512 signs: line drawing and blocks at most, no Braille patterns among them.
    private static readonly string[] OfFewSigns = ["linux", "cons", "vt", "wsvt", "pcvt", "sun", "ansi", "dumb"];

    /// <summary>Whether the font of a kind of terminal has them, as far as its name tells.</summary>
    /// <param name="terminal">The name of the kind, as TERM gives it.</param>
    public static bool Has(string terminal) => !OfFewSigns.Any(kind => terminal.StartsWith(kind, StringComparison.Ordinal));
}
