using System.Collections.Immutable;
using System.Globalization;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>Draws requirements side by side: the values that differ, the best circuit of each, and what is the same in all.</summary>
internal sealed class ComparisonDrawing
{
    private const int LeastCell = 16;

    private readonly KeptComparison _comparison;
    private readonly Glyphs _glyphs;
    private readonly ImmutableArray<KeptRow> _shown;
    private readonly int _width;
    private readonly int _label;
    private readonly int _cell;

    private ComparisonDrawing(KeptComparison comparison, int width, Glyphs glyphs)
    {
        (_comparison, _width, _glyphs) = (comparison, width, glyphs);
        _label = width < 60 ? 13 : 22;
        int most = Math.Max(2, (width - _label) / LeastCell);
        _shown = [.. comparison.Rows.Skip(comparison.First).Take(most)];
        _cell = (width - _label) / Math.Max(2, _shown.Length);
    }

    /// <summary>The lines.</summary>
    /// <param name="comparison">What is compared.</param>
    /// <param name="currency">The currency; empty where it is not known.</param>
    /// <param name="width">Width in cells.</param>
    /// <param name="height">Height in rows.</param>
    /// <param name="glyphs">The signs.</param>
    public static ImmutableArray<Line> Draw(KeptComparison comparison, string currency, int width, int height, Glyphs glyphs) =>
        new ComparisonDrawing(comparison, width, glyphs).Draw(currency, height);

    private ImmutableArray<Line> Draw(string currency, int height)
    {
        int last = _comparison.First + _shown.Length;
        string place = _shown.Length == _comparison.Rows.Length ? ""
            : FormattableString.Invariant($"{_comparison.First + 1} to {last} of {_comparison.Rows.Length}");
        string state = _comparison.Current is { } current
            ? FormattableString.Invariant($"Side by side; ranking {current.Name}, {Math.Floor(100 * _comparison.Share)} %")
            : "Side by side";
        ImmutableArray<Line> page = [.. Wanted(currency, out string same), .. Found(currency), Line.Empty, .. Same(same)];
        Line rule = Rules.Draw(state, place, _width, _glyphs, _comparison.Current is null ? Tone.Strong : Tone.Accent);
        Line names = Row("", row => (row.Kept is null ? "as it stands" : row.Name, Tone.Strong));
        return [rule, names, .. _comparison.Scroll.Cut(page, height - 2)];
    }

    private List<Line> Wanted(string currency, out string same)
    {
        ImmutableArray<(string Name, string Value)>[] values =
            [.. _comparison.Rows.Select(row => KeptWords.Values(row.Requirement, currency))];
        var lines = new List<Line>();
        var equal = new List<string>();
        for (int i = 0; i < values[0].Length; i++)
        {
            (string name, string first) = values[0][i];
            if (values.All(each => each[i].Value == first))
            {
                equal.Add($"{name} {first}");
                continue;
            }

            int at = i;
            lines.Add(Row(name, row =>
            {
                string value = values[_comparison.Rows.IndexOf(row)][at].Value;
                return (value, value == first ? Tone.Normal : Tone.Accent);
            }));
        }

        if (lines.Count == 0)
        {
            lines.Add(new LineBuilder(_glyphs).Words(" They all want the same.", _width).Build());
        }

        same = string.Join(", ", equal);
        return lines;
    }

    private IEnumerable<Line> Found(string currency) =>
    [
        Line.Empty,
        new LineBuilder(_glyphs).Add(" The best circuit of each", Tone.Strong).Build(),
        .. _comparison.Problem is { } problem ? Paragraph.Of(problem.ToString(), _width - 1, _glyphs, " ! ", 3, Tone.Warning) : [],
        Row("circuits that fit", Fit),
        Row("circuit", Of(best => CircuitPane.ShortTitle(best).Split(',')[0])),
        Row("crystal, MHz", Of(best => (best.Choice.Crystal.FrequencyHz / 1e6).ToString("0.######", CultureInfo.InvariantCulture))),
        Row("error, ppm", Of(best => best.Budget is { } budget ? Figures.Ppm(budget.WorstRatio) : "-")),
        Row("start-up margin", Of(best => Figures.Three(best.Margin.Value))),
        Row("drive level", Of(best => best.Drive is { } drive ? ValueText.Format(drive.Value, Dimension.Power) : "-")),
        Row("start-up time", Of(best => best.StartUpTime is { } time ? ValueText.Format(time.Value, Dimension.Time) : "-")),
        Row(currency.Length > 0 ? $"cost, {currency}" : "cost", Of(best => Figures.Money(best.Cost))),
    ];

    private (string, Tone) Fit(KeptRow row) =>
        _comparison.FigureOf(row) is { } found ? found.Fit == 0 ? ("none", Tone.Warning) : ($"{found.Fit}", Tone.Normal)
        : ReferenceEquals(row, _comparison.Current) ? ("computing", Tone.Accent)
        : ("not ranked", Tone.Quiet);

    private Func<KeptRow, (string, Tone)> Of(Func<Candidate, string> figure) => row =>
        (_comparison.FigureOf(row) is { Best: { } best } ? figure(best) : "", Tone.Normal);

    private ImmutableArray<Line> Same(string same) =>
        same.Length == 0 ? [] : Paragraph.Of("The same in all: " + same + ".", _width - 1, _glyphs, " ", 1, Tone.Quiet);

    private Line Row(string label, Func<KeptRow, (string Text, Tone Tone)> cell)
    {
        LineBuilder line = new LineBuilder(_glyphs).Add(" ").Column(label, _label - 2, Tone.Quiet).Add(" ");
        foreach (KeptRow row in _shown)
        {
            (string text, Tone tone) = cell(row);
            line.Column(text, _cell - 1, tone).Add(" ");
        }

        return line.Build();
    }
}
