using System.Collections.Immutable;

namespace PartPick.Screens;

/// <summary>A piece of the sentence as it stands on the screen.</summary>
/// <param name="Text">The text, in signs that can be shown.</param>
/// <param name="Tone">Its tone.</param>
/// <param name="Field">Number of its value, from zero; -1 for words.</param>
internal readonly record struct SentenceText(string Text, Tone Tone, int Field);

/// <summary>The sentence broken into lines, at the spaces between its values and never inside one.</summary>
internal sealed class SentenceLayout
{
    private SentenceLayout(ImmutableArray<Line> lines, ImmutableArray<(int Row, int Column)> places)
    {
        Lines = lines;
        Places = places;
    }

    /// <summary>The lines.</summary>
    public ImmutableArray<Line> Lines { get; }

    /// <summary>Where each value begins.</summary>
    public ImmutableArray<(int Row, int Column)> Places { get; }

    /// <summary>Breaks the sentence.</summary>
    public static SentenceLayout Of(IReadOnlyList<SentenceText> texts, int width, int indent)
    {
        var lines = new List<Line>();
        var places = new Dictionary<int, (int, int)>();
        var line = new List<Span>();
        int column = 0;
        foreach (List<SentenceText> word in Words(texts))
        {
            int length = word.Sum(text => text.Text.Length);
            bool atStart = line.Count <= 1;
            bool space = !atStart && word[0].Text.StartsWith(' ');
            if (!atStart && column + length > width)
            {
                lines.Add(new Line(line));
                line.Clear();
                column = 0;
                space = false;
            }

            if (line.Count == 0)
            {
                string margin = new(' ', lines.Count == 0 ? 1 : indent);
                line.Add(new Span(margin, Tone.Normal));
                column = margin.Length;
            }

            for (int i = 0; i < word.Count; i++)
            {
                SentenceText text = word[i];
                string shown = i == 0 && !space ? text.Text.TrimStart(' ') : text.Text;
                if (text.Field >= 0)
                {
                    places.TryAdd(text.Field, (lines.Count, column));
                }

                line.Add(new Span(shown, text.Tone));
                column += shown.Length;
            }
        }

        lines.Add(new Line(line));
        return new SentenceLayout([.. lines], [.. places.OrderBy(place => place.Key).Select(place => place.Value)]);
    }

    /// <summary>What must stay together: each begins with its space.</summary>
    private static List<List<SentenceText>> Words(IReadOnlyList<SentenceText> texts)
    {
        var words = new List<List<SentenceText>> { new() };
        foreach (SentenceText text in texts)
        {
            if (text.Field >= 0)
            {
                words[^1].Add(text);
                continue;
            }

            int from = 0;
            for (int i = 0; i < text.Text.Length; i++)
            {
                if (text.Text[i] == ' ')
                {
                    Add(text.Text[from..i]);
                    words.Add([]);
                    from = i;
                }
            }

            Add(text.Text[from..]);

            void Add(string part)
            {
                if (part.Length > 0)
                {
                    words[^1].Add(text with { Text = part.Replace('~', ' ') });
                }
            }
        }

        words.RemoveAll(word => word.Count == 0);
        return words;
    }
}
