namespace PartPick.Screens;

/// <summary>Draws a text that is being typed, with its caret always in sight.</summary>
internal static class TypedLine
{
    /// <summary>Adds the text to a line.</summary>
    /// <param name="line">The line.</param>
    /// <param name="typed">The text.</param>
    /// <param name="width">The cells it takes, all of them filled.</param>
    /// <param name="glyphs">The signs.</param>
    public static LineBuilder Typed(this LineBuilder line, TypedText typed, int width, Glyphs glyphs)
    {
        // Each character is one cell here, whatever it is spelled as elsewhere.
        string text = new([.. (typed.Text + " ").Select(sign => Cell(sign, glyphs))]);
        int first = Math.Max(0, typed.Caret - width + 1);
        int end = Math.Min(text.Length, first + width);
        line.Add(text[first..typed.Caret], Tone.Accent).Add(text[typed.Caret..(typed.Caret + 1)], Tone.Caret);
        line.Add(text[(typed.Caret + 1)..Math.Max(typed.Caret + 1, end)], Tone.Accent);
        int left = width - Math.Max(end, typed.Caret + 1) + first;
        return line.Add(new string(' ', Math.Max(0, left)));
    }

    private static char Cell(char sign, Glyphs glyphs)
    {
        string shown = glyphs.Show(sign.ToString());
        return shown.Length == 1 ? shown[0] : '?';
    }
}
