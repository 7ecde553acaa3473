using System.Globalization;
using System.Text;

namespace PartPick.Screens;

/// <summary>The signs that screens are drawn with: line drawing, or ASCII where the locale has nothing else.</summary>
public sealed record Glyphs
{
    private static readonly Dictionary<char, string> Spelled = new()
    {
        ['Ω'] = "ohm", ['µ'] = "u", ['μ'] = "u", ['±'] = "+/-", ['°'] = "deg", ['÷'] = "/", ['…'] = "...", ['²'] = "2",
        ['−'] = "-", ['–'] = "-", ['×'] = "x", ['√'] = "sqrt", ['Σ'] = "sum", ['∞'] = "inf", ['σ'] = "sigma", ['∂'] = "d",
        ['β'] = "beta", ['τ'] = "tau", ['≤'] = "<=", ['≥'] = ">=", ['’'] = "'", ['·'] = ".", ['é'] = "e",
    };

    private Glyphs()
    {
    }

    /// <summary>Line drawing and block signs, all of them in the oldest terminal fonts.</summary>
    public static Glyphs Drawn { get; } = new()
    {
        IsAscii = false,
        Horizontal = '─', Vertical = '│', DownRight = '┌', DownLeft = '┐', UpRight = '└', UpLeft = '┘',
        TeeRight = '├', TeeLeft = '┤', TeeDown = '┬', TeeUp = '┴', Cross = '┼', Ground = "═╧═", Full = '■', Free = '·', Trace = '-',
        Chosen = "►", Up = "↑", Down = "↓", Left = "←", Right = "→", HasBraille = true,
    };

    /// <summary>Line drawing and block signs, without the Braille patterns that the fonts of a console lack.</summary>
    public static Glyphs DrawnInBlocks { get; } = Drawn with { HasBraille = false };

    /// <summary>ASCII alone.</summary>
    public static Glyphs Ascii { get; } = new()
    {
        IsAscii = true,
        Horizontal = '-', Vertical = '|', DownRight = '+', DownLeft = '+', UpRight = '+', UpLeft = '+',
        TeeRight = '+', TeeLeft = '+', TeeDown = '+', TeeUp = '+', Cross = '+', Ground = "===", Full = '#', Free = '.', Trace = '-',
        Chosen = ">", Up = "Up", Down = "Down", Left = "Left", Right = "Right",
    };

    /// <summary>Whether every sign has to be ASCII.</summary>
    public required bool IsAscii { get; init; }

    /// <summary>Whether Braille patterns may be used, as dots of pictures.</summary>
    public bool HasBraille { get; init; }

    /// <summary>Horizontal line.</summary>
    public required char Horizontal { get; init; }

    /// <summary>Vertical line.</summary>
    public required char Vertical { get; init; }

    /// <summary>Corner from below to the right.</summary>
    public required char DownRight { get; init; }

    /// <summary>Corner from below to the left.</summary>
    public required char DownLeft { get; init; }

    /// <summary>Corner from above to the right.</summary>
    public required char UpRight { get; init; }

    /// <summary>Corner from above to the left.</summary>
    public required char UpLeft { get; init; }

    /// <summary>Vertical line with a branch to the right.</summary>
    public required char TeeRight { get; init; }

    /// <summary>Vertical line with a branch to the left.</summary>
    public required char TeeLeft { get; init; }

    /// <summary>Horizontal line with a branch down.</summary>
    public required char TeeDown { get; init; }

    /// <summary>Horizontal line with a branch up.</summary>
    public required char TeeUp { get; init; }

    /// <summary>Crossing of two lines that are joined.</summary>
    public required char Cross { get; init; }

    /// <summary>Ground, three cells.</summary>
    public required string Ground { get; init; }

    /// <summary>A used cell of a bar.</summary>
    public required char Full { get; init; }

    /// <summary>A free cell of a bar.</summary>
    public required char Free { get; init; }

    /// <summary>A cell of a bar of which less than half is used.</summary>
    public required char Trace { get; init; }

    /// <summary>Mark of the chosen row.</summary>
    public required string Chosen { get; init; }

    /// <summary>Name of the key Up.</summary>
    public required string Up { get; init; }

    /// <summary>Name of the key Down.</summary>
    public required string Down { get; init; }

    /// <summary>Name of the key Left.</summary>
    public required string Left { get; init; }

    /// <summary>Name of the key Right.</summary>
    public required string Right { get; init; }

    /// <summary>
    /// The text in signs that can be shown: control signs become spaces, so do those that turn the direction of writing or take no
    /// room, and in ASCII all else is spelled.
    /// </summary>
    /// <param name="text">The text.</param>
    public string Show(string text)
    {
        ArgumentNullException.ThrowIfNull(text);
        if (!text.Any(sign => IsUnseen(sign) || (IsAscii && !char.IsAscii(sign))))
        {
            return text;
        }

        var shown = new StringBuilder();
        foreach (char sign in text)
        {
            shown.Append(
                IsUnseen(sign) ? " "
                : !IsAscii || char.IsAscii(sign) ? sign.ToString()
                : Spelled.TryGetValue(sign, out string? spelled) ? spelled
                : "?");
        }

        return shown.ToString();
    }

    private static bool IsUnseen(char sign) => char.IsControl(sign)
        || (!char.IsAscii(sign) && char.GetUnicodeCategory(sign)
            is UnicodeCategory.Format or UnicodeCategory.LineSeparator or UnicodeCategory.ParagraphSeparator);
}
