using Terminal.Gui.Drawing;
using Attribute = Terminal.Gui.Drawing.Attribute;

namespace PartPick.Screens;

/// <summary>Spells how a cell looks in the parameters of SGR (ECMA-48, 8.3.117), each of which the terminal knows.</summary>
/// <param name="traits">What the terminal can show.</param>
internal sealed class Pen(TerminalTraits traits)
{
    private readonly Dictionary<Attribute, string> _spelled = [];

    /// <summary>The parameters; empty for plain text.</summary>
    /// <param name="look">How the cell looks.</param>
    public string Spell(Attribute look)
    {
        if (!_spelled.TryGetValue(look, out string? spelled))
        {
            _spelled[look] = spelled = string.Join(';', Parameters(look));
        }

        return spelled;
    }

    /// <summary>Whether a space looks like any other with these parameters.</summary>
    /// <param name="spelled">The parameters.</param>
    public static bool ShowsOnSpaces(string spelled) => spelled.Split(';').Any(one =>
        one is "4" or "7" || (one.Length == 2 && one[0] == '4') || one.StartsWith("10", StringComparison.Ordinal));

    private IEnumerable<int> Parameters(Attribute look)
    {
        if (look.Style.HasFlag(TextStyle.Bold))
        {
            yield return 1;
        }

        if (look.Style.HasFlag(TextStyle.Faint) && traits.HasFaint)
        {
            yield return 2;
        }

        if (look.Style.HasFlag(TextStyle.Underline))
        {
            yield return 4;
        }

        if (look.Style.HasFlag(TextStyle.Reverse))
        {
            yield return 7;
        }

        if (traits.HasColour && look.Foreground != Color.None)
        {
            yield return (int)look.Foreground.GetAnsiColorCode();
        }

        if (traits.HasColour && look.Background != Color.None)
        {
            yield return (int)look.Background.GetAnsiColorCode() + 10;
        }
    }
}
