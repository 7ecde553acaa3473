namespace PartPick.Screens;

/// <summary>Draws the rules that part the screen, with words in them.</summary>
internal static class Rules
{
    /// <summary>A rule with words at its left and right ends; those at the right give way.</summary>
    /// <param name="left">The words at the left.</param>
    /// <param name="right">The words at the right.</param>
    /// <param name="width">Width in cells.</param>
    /// <param name="glyphs">The signs.</param>
    /// <param name="tone">The tone of the words at the left.</param>
    public static Line Draw(string left, string right, int width, Glyphs glyphs, Tone tone = Tone.Strong)
    {
        if (glyphs.Show(left).Length + glyphs.Show(right).Length + 8 > width)
        {
            right = "";
        }

        int end = width - (right.Length == 0 ? 1 : glyphs.Show(right).Length + 4);
        LineBuilder line = new LineBuilder(glyphs).RuleTo(1);
        if (left.Length > 0)
        {
            string shown = glyphs.Show(left);
            line.Add(" ").Column(shown, Math.Clamp(shown.Length, 0, Math.Max(0, end - (right.Length == 0 ? 2 : 3))), tone).Add(" ");
        }

        line.RuleTo(end);
        return right.Length == 0 ? line.RuleTo(width).Build() : line.Add(" ").Add(right, Tone.Quiet).Add(" ").RuleTo(width).Build();
    }
}
