namespace PartPick.Screens;

/// <summary>What the terminal can show, as its environment says.</summary>
/// <param name="HasColour">Whether colours may be used.</param>
/// <param name="IsUtf8">Whether anything but ASCII may be used.</param>
public sealed record TerminalTraits(bool HasColour, bool IsUtf8)
{
    private static readonly string[] LocaleNames = ["LC_ALL", "LC_CTYPE", "LANG"];
    private static readonly string[] Colourless = ["", "dumb", "unknown"];

    /// <summary>Whether the font has Braille patterns, as far as the kind of terminal tells.</summary>
    public bool HasBraille { get; init; }

    /// <summary>The signs to draw with.</summary>
    internal Glyphs Glyphs => !IsUtf8 ? Glyphs.Ascii : HasBraille ? Glyphs.Drawn : Glyphs.DrawnInBlocks;

    /// <summary>Reads the environment: NO_COLOR, TERM, and the first of LC_ALL, LC_CTYPE, LANG that is set.</summary>
    /// <param name="environment">Looks up a variable.</param>
    public static TerminalTraits Of(Func<string, string?> environment)
    {
        ArgumentNullException.ThrowIfNull(environment);
        string terminal = environment("TERM") ?? "";
        bool colour = string.IsNullOrEmpty(environment("NO_COLOR"))
            && !Colourless.Contains(terminal)
            && !terminal.StartsWith("vt1", StringComparison.Ordinal)
            && !terminal.StartsWith("vt2", StringComparison.Ordinal)
            && !terminal.EndsWith("-m", StringComparison.Ordinal)
            && !terminal.EndsWith("-mono", StringComparison.Ordinal);
        string locale = LocaleNames.Select(environment).FirstOrDefault(text => !string.IsNullOrEmpty(text)) ?? "";
        string plain = locale.Replace("-", "", StringComparison.Ordinal);
        return new TerminalTraits(colour, plain.Contains("UTF8", StringComparison.OrdinalIgnoreCase))
        {
            HasBraille = BrailleFonts.Has(terminal),
        };
    }
}
