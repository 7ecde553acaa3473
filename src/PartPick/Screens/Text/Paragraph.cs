using System.Collections.Immutable;

namespace PartPick.Screens;

/// <summary>Breaks running text into lines at its spaces.</summary>
public static class Paragraph
{
    private const int LongestUnit = 4;

    /// <summary>Breaks a sentence; later lines are indented.</summary>
    /// <param name="text">The text.</param>
    /// <param name="width">Width in cells, above the indents.</param>
    /// <param name="glyphs">The signs.</param>
    /// <param name="first">What stands before the first line.</param>
    /// <param name="indent">Indent of the later lines.</param>
    /// <param name="tone">The tone.</param>
    public static ImmutableArray<Line> Of(
        string text, int width, Glyphs glyphs, string first = "", int indent = 0, Tone tone = Tone.Normal)
    {
        ArgumentNullException.ThrowIfNull(text);
        ArgumentNullException.ThrowIfNull(glyphs);
        var lines = ImmutableArray.CreateBuilder<Line>();
        string line = glyphs.Show(first);
        bool fresh = true;
        foreach (string word in Words(glyphs.Show(text)))
        {
            if (!fresh && line.Length + 1 + word.Length > width)
            {
                lines.Add(new Line([new Span(line, tone)]));
                line = new string(' ', indent);
                fresh = true;
            }

            line += fresh ? word : " " + word;
            fresh = false;
        }

        lines.Add(new Line([new Span(line, tone)]));
        return lines.ToImmutable();
    }

    // A number and the short word behind it, which may be its unit, stay together.
    private static IEnumerable<string> Words(string text)
    {
        string? held = null;
        foreach (string word in text.Split(' ', StringSplitOptions.RemoveEmptyEntries))
        {
            if (held is not null && char.IsDigit(held[^1]) && word.Length <= LongestUnit)
            {
                held += " " + word;
                continue;
            }

            if (held is not null)
            {
                yield return held;
            }

            held = word;
        }

        if (held is not null)
        {
            yield return held;
        }
    }
}
