using System.Collections.Immutable;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>One picture within its part of the screen.</summary>
internal static class PictureBlock
{
    /// <summary>What it shows, and whether it is still computed.</summary>
    /// <param name="model">The pictures.</param>
    /// <param name="kind">Which of them.</param>
    public static string Title(PicturesModel model, PictureKind kind) => kind switch
    {
        PictureKind.Budget => "Error budget",
        PictureKind.Schematic => "Schematic",
        _ when model.ChartOf(kind) is { IsOk: true, Value: { } chart } => chart.Title,
        PictureKind.Error => "Frequency error over temperature",
        PictureKind.Margin => "Start-up margin over supply",
        PictureKind.Growth => "Growth of the amplitude after switch-on",
        _ => "Error against cost",
    };

    /// <summary>The lines, as many as there is room for or fewer.</summary>
    /// <param name="model">The pictures.</param>
    /// <param name="kind">Which of them.</param>
    /// <param name="width">Width in cells.</param>
    /// <param name="height">Height in rows.</param>
    /// <param name="glyphs">The signs.</param>
    public static ImmutableArray<Line> Draw(PicturesModel model, PictureKind kind, int width, int height, Glyphs glyphs)
    {
        Candidate candidate = model.Candidate!;
        return kind switch
        {
            PictureKind.Budget => [.. CircuitPage.Budget(candidate, model.Result!.Requirement, width, glyphs).Skip(1).Take(height)],
            PictureKind.Schematic => SchematicAndParts(candidate, width, height, glyphs),
            _ => Chart(model.ChartOf(kind), width, height, glyphs),
        };
    }

    private static ImmutableArray<Line> Chart(Result<Chart>? chart, int width, int height, Glyphs glyphs) =>
        chart is null ? [Line.Empty, new LineBuilder(glyphs).Add(" ").Add("computing …", Tone.Accent).Build()]
        : chart.IsOk ? ChartDrawing.Draw(chart.Value, width, height, glyphs)
        : [Line.Empty, .. Paragraph.Of(Sentence(chart.Problem), width - 1, glyphs, " ! ", 3, Tone.Warning)];

    private static ImmutableArray<Line> SchematicAndParts(Candidate candidate, int width, int height, Glyphs glyphs)
    {
        ImmutableArray<Line> drawing = Schematic.Draw(candidate, glyphs);
        const int left = Schematic.Width + 3;
        ImmutableArray<Line> parts = width - left >= 30 ? PartsTable.Draw(candidate, glyphs) : [];
        return
        [
            .. Enumerable.Range(0, Math.Min(height, Math.Max(drawing.Length, parts.Length)))
                .Select(i => (i < drawing.Length ? drawing[i] : Line.Empty)
                    .Beside(left, i < parts.Length ? parts[i].Fit(Math.Min(parts[i].Width, width - left)) : Line.Empty)),
        ];
    }

    private static string Sentence(Problem problem) => $"The {problem.Where} {problem.What}.";
}
