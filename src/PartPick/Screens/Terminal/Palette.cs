using Terminal.Gui.Drawing;
using Attribute = Terminal.Gui.Drawing.Attribute;

namespace PartPick.Screens;

/// <summary>How each tone looks. Every tone differs by style too, so that nothing is said by colour alone.</summary>
internal sealed class Palette
{
    private readonly Dictionary<Tone, Attribute> _looks;

    private Palette(Color accent, Color warning)
    {
        _looks = new Dictionary<Tone, Attribute>
        {
            [Tone.Normal] = new(Color.None, Color.None),
            [Tone.Quiet] = new(Color.None, Color.None, TextStyle.Faint),
            [Tone.Strong] = new(Color.None, Color.None, TextStyle.Bold),
            [Tone.Accent] = new(accent, Color.None, TextStyle.Bold),
            [Tone.Chosen] = new(Color.None, Color.None, TextStyle.Reverse),
            [Tone.ChosenAccent] = new(accent, Color.None, TextStyle.Reverse | TextStyle.Bold),
            [Tone.Caret] = new(accent, Color.None, TextStyle.Reverse | TextStyle.Underline),
            [Tone.Warning] = new(warning, Color.None, TextStyle.Bold),
        };
    }

    /// <summary>The terminal's own colours, and one accent.</summary>
    public static Palette Coloured { get; } = new(new Color(ColorName16.Magenta), new Color(ColorName16.Magenta));

    /// <summary>Without colours.</summary>
    public static Palette Plain { get; } = new(Color.None, Color.None);

    public Attribute Of(Tone tone) => _looks[tone];
}
