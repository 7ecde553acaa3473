namespace PartPick.Screens;

/// <summary>What the terminal can show, as its environment says.</summary>
/// <param name="HasColour">Whether colours may be used.</param>
/// <param name="IsUtf8">Whether anything but ASCII may be used.</param>
public sealed record TerminalTraits(bool HasColour, bool IsUtf8)
{
    private static readonly string[] LocaleNames = ["LC_ALL", "LC_CTYPE", "LANG"];

    // Names of terminals that cannot place the cursor, or not by the sequences of ECMA-48.
    private static readonly string[] Unplaced =
        ["", "dumb", "unknown", "network", "printer", "lp", "emacs", "vt52", "adm3a", "wy50", "tvi920"];

    // Names, up to the first sign that is no letter or digit, of terminals in windows, and of those that run in them.
    private static readonly string[] Windowed =
    [
        "xterm", "screen", "tmux", "rxvt", "alacritty", "foot", "kitty", "konsole", "gnome", "vte", "putty", "st", "mlterm", "wezterm",
        "ghostty", "contour", "mintty", "iterm", "iterm2", "nsterm", "eterm", "ms", "cygwin",
    ];

    /// <summary>The terminal's name.</summary>
    public string Name { get; init; } = "";

    /// <summary>Whether the cursor can be placed; without it there are no screens.</summary>
    public bool CanPlace => !Unplaced.Contains(Name);

    /// <summary>Whether there is a second screen, so that the first is as it was afterwards.</summary>
    public bool HasAlternateScreen => Windowed.Contains(Family);

    /// <summary>Whether the cursor can be hidden.</summary>
    public bool HidesCursor => HasAlternateScreen || Family == "linux" || (IsTube && Number >= 200);

    /// <summary>Whether it knows faint text.</summary>
    public bool HasFaint => HasAlternateScreen || Family == "linux";

    private string Family => new([.. Name.TakeWhile(char.IsAsciiLetterOrDigit).Select(char.ToLowerInvariant)]);

    // VT100 and its successors: screens without colours, and without Unicode.
    private bool IsTube => Family.Length >= 5 && Family.StartsWith("vt", StringComparison.Ordinal) && char.IsAsciiDigit(Family[2]);

    private int Number => int.TryParse(new string([.. Family.Skip(2).TakeWhile(char.IsAsciiDigit)]), out int number) ? number : 0;

    /// <summary>Whether the font has Braille patterns, as far as the kind of terminal tells.</summary>
    public bool HasBraille { get; init; }

    /// <summary>The signs to draw with.</summary>
    internal Glyphs Glyphs => !IsUtf8 ? Glyphs.Ascii : HasBraille ? Glyphs.Drawn : Glyphs.DrawnInBlocks;

    /// <summary>Reads the environment: NO_COLOR, TERM, and the first of LC_ALL, LC_CTYPE, LANG that is set.</summary>
    /// <param name="environment">Looks up a variable.</param>
    public static TerminalTraits Of(Func<string, string?> environment)
    {
        ArgumentNullException.ThrowIfNull(environment);
        var named = new TerminalTraits(false, false) { Name = environment("TERM") ?? "" };
        bool colour = string.IsNullOrEmpty(environment("NO_COLOR"))
            && named.CanPlace
            && !named.IsTube
            && !named.Name.EndsWith("-m", StringComparison.Ordinal)
            && !named.Name.EndsWith("-mono", StringComparison.Ordinal);
        string locale = LocaleNames.Select(environment).FirstOrDefault(text => !string.IsNullOrEmpty(text)) ?? "";
        string plain = locale.Replace("-", "", StringComparison.Ordinal);
        return named with
        {
            HasColour = colour,
            IsUtf8 = !named.IsTube && plain.Contains("UTF8", StringComparison.OrdinalIgnoreCase),
            HasBraille = BrailleFonts.Has(named.Name),
        };
    }
}
