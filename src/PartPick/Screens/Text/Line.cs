using System.Collections.Immutable;
using System.Text;

namespace PartPick.Screens;

/// <summary>One row of a screen. Two lines are equal when they look the same.</summary>
public sealed class Line : IEquatable<Line>
{
    /// <summary>Makes a line.</summary>
    /// <param name="spans">Its pieces from left to right.</param>
    public Line(IEnumerable<Span> spans)
    {
        Spans = [.. spans.Where(span => span.Text.Length > 0)];
    }

    /// <summary>A line without text.</summary>
    public static Line Empty { get; } = new([]);

    /// <summary>Its pieces from left to right, none of them empty.</summary>
    public ImmutableArray<Span> Spans { get; }

    /// <summary>Its width in cells: every character that is used here takes one.</summary>
    public int Width => Spans.Sum(span => span.Text.Length);

    /// <summary>Its text without tones.</summary>
    public string Text => string.Concat(Spans.Select(span => span.Text));

    /// <summary>The line cut or filled to a width.</summary>
    /// <param name="width">The width in cells.</param>
    public Line Fit(int width)
    {
        var spans = new List<Span>();
        int left = width;
        foreach (Span span in Spans)
        {
            if (span.Text.Length > left)
            {
                spans.Add(span with { Text = span.Text[..left] });
                left = 0;
                break;
            }

            spans.Add(span);
            left -= span.Text.Length;
        }

        spans.Add(new Span(new string(' ', left), Tone.Normal));
        return new Line(spans);
    }

    /// <summary>This line, and another one beside it.</summary>
    /// <param name="width">The width of this line.</param>
    /// <param name="other">The line to its right.</param>
    public Line Beside(int width, Line other)
    {
        ArgumentNullException.ThrowIfNull(other);
        return new Line([.. Fit(width).Spans, .. other.Spans]);
    }

    /// <summary>The line all in one tone.</summary>
    /// <param name="tone">The tone.</param>
    public Line In(Tone tone) => new([new Span(Text, tone)]);

    /// <summary>The line as the chosen one: what has the accent or a warning keeps standing out.</summary>
    public Line Chosen() => new(Spans.Select(span => span with
    {
        Tone = span.Tone is Tone.Accent or Tone.Warning ? Tone.ChosenAccent : Tone.Chosen,
    }));

    /// <inheritdoc/>
    public bool Equals(Line? other) => other is not null && Spans.SequenceEqual(other.Spans);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => Equals(obj as Line);

    /// <inheritdoc/>
    public override int GetHashCode() => Text.GetHashCode(StringComparison.Ordinal);

    /// <inheritdoc/>
    public override string ToString()
    {
        var text = new StringBuilder();
        foreach (Span span in Spans)
        {
            text.Append(span.Text);
        }

        return text.ToString().TrimEnd();
    }
}
