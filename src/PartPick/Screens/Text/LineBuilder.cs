namespace PartPick.Screens;

/// <summary>Puts a line together from left to right, in the signs that the terminal can show.</summary>
/// <param name="glyphs">The signs.</param>
public sealed class LineBuilder(Glyphs glyphs)
{
    private readonly List<Span> _spans = [];

    /// <summary>Width so far, in cells.</summary>
    public int Width { get; private set; }

    /// <summary>Adds text.</summary>
    /// <param name="text">The text.</param>
    /// <param name="tone">Its tone.</param>
    public LineBuilder Add(string text, Tone tone = Tone.Normal)
    {
        string shown = glyphs.Show(text);
        _spans.Add(new Span(shown, tone));
        Width += shown.Length;
        return this;
    }

    /// <summary>Adds a line that is there already, cut after a whole word where it is too long.</summary>
    /// <param name="line">The line.</param>
    /// <param name="width">The most cells it may take.</param>
    public LineBuilder Add(Line line, int width)
    {
        ArgumentNullException.ThrowIfNull(line);
        int end = line.Width <= width ? line.Width : Math.Max(0, line.Text.LastIndexOf(' ', Math.Max(0, width)));
        foreach (Span span in line.Fit(end).Spans)
        {
            _spans.Add(span);
            Width += span.Text.Length;
        }

        return this;
    }

    /// <summary>Adds text in a column: filled with spaces, or cut with a mark where it is too long.</summary>
    /// <param name="text">The text.</param>
    /// <param name="width">Width of the column in cells.</param>
    /// <param name="tone">Its tone.</param>
    /// <param name="right">Whether it stands at the right end of the column.</param>
    public LineBuilder Column(string text, int width, Tone tone = Tone.Normal, bool right = false)
    {
        string shown = Cut(glyphs.Show(text), width);
        return Add(right ? shown.PadLeft(width) : shown.PadRight(width), tone);
    }

    /// <summary>Adds words, cut after a whole word with a mark where they are too long.</summary>
    /// <param name="text">The text.</param>
    /// <param name="width">The most cells it may take.</param>
    /// <param name="tone">Its tone.</param>
    public LineBuilder Words(string text, int width, Tone tone = Tone.Normal)
    {
        string shown = glyphs.Show(text);
        if (shown.Length <= width)
        {
            return Add(shown, tone);
        }

        string mark = " " + glyphs.Show("…");
        int room = width - mark.Length;
        int end = room > 0 ? shown.LastIndexOf(' ', room) : -1;
        return end > 0 ? Add(shown[..end].TrimEnd(',', ';') + mark, tone) : Add(Cut(shown, Math.Max(0, width)), tone);
    }

    /// <summary>Adds spaces up to a column.</summary>
    /// <param name="column">The column, from zero; nothing is added where the line is already there.</param>
    public LineBuilder To(int column) => Width < column ? Add(new string(' ', column - Width)) : this;

    /// <summary>Adds a piece of rule up to a column.</summary>
    /// <param name="column">The column, from zero.</param>
    public LineBuilder RuleTo(int column) =>
        Width < column ? Add(new string(glyphs.Horizontal, column - Width), Tone.Quiet) : this;

    /// <summary>The line.</summary>
    public Line Build() => new(_spans);

    private string Cut(string text, int width)
    {
        string mark = glyphs.Show("…");
        return text.Length <= width ? text : width <= mark.Length ? text[..width] : text[..(width - mark.Length)] + mark;
    }
}
