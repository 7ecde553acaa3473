using System.Collections.Immutable;
using System.Globalization;
using PartPick.Output;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>Draws the replacements of a part: what each changes, and below them the circuit with the chosen one.</summary>
internal static class ReplacementsDrawing
{
    private const int Narrow = 56;
    private const int Middle = 78;
    private const int Wide = 104;
    private const int LeastRows = 3;

    /// <summary>The lines.</summary>
    /// <param name="page">The page.</param>
    /// <param name="width">Width in cells.</param>
    /// <param name="height">Height in rows.</param>
    /// <param name="glyphs">The signs.</param>
    public static ImmutableArray<Line> Draw(ReplacementsPage page, int width, int height, Glyphs glyphs)
    {
        if (page.Problem is { } problem)
        {
            return
            [
                Rules.Draw("Replacements", "", width, glyphs),
                .. Paragraph.Of(problem.ToString(), width - 1, glyphs, " ! ", 3, Tone.Warning),
            ];
        }

        ImmutableArray<Line> words = page.Found is { } found ? ReplacementWords.Of(page, found, width, glyphs) : [];
        ImmutableArray<Replacement> all = page.Found?.Replacements ?? [];
        int rows = Math.Clamp(all.Length, 0, Math.Max(LeastRows, height - 3 - words.Length));
        int first = Math.Clamp(page.At - rows + 1, 0, Math.Max(0, all.Length - rows));
        return
        [
            Rules.Draw(Title(page, width), Position(page), width, glyphs, page.IsLooking ? Tone.Accent : Tone.Strong),
            .. page.Found is null ? [] : new[] { Heading(page, width, glyphs) },
            .. all.Skip(first).Take(rows).Select((one, i) => Row(one, first + i == page.At, width, glyphs)),
            .. page.Found is null
                ? []
                : new[] { Rules.Draw(page.Chosen is { } chosen ? $"With {chosen.Part.Id}" : "None keeps the circuit fit", "", width, glyphs) },
            .. words.Take(Math.Max(0, height - rows - 3)),
        ];
    }

    private static string Title(ReplacementsPage page, int width)
    {
        if (page.Lines.IsEmpty)
        {
            return "Replacements: reading";
        }

        BoardLine line = page.Lines[page.Part];
        string part = string.Join(", ", line.Designators) + (width < Narrow ? "" : $" {line.Part.Id}");
        string count = page.Found is { } found
            ? FormattableString.Invariant($"{found.Replacements.Length} of {found.Considered} others fit")
            : "computing";
        return width < Wide ? $"{part}: {count}" : $"For {part}, {string.Join(" and ", line.Roles)}: {count}";
    }

    private static string Position(ReplacementsPage page) =>
        page.Lines.IsEmpty ? "" : FormattableString.Invariant($"part {page.Part + 1} of {page.Lines.Length}");

    private static Line Heading(ReplacementsPage page, int width, Glyphs glyphs)
    {
        string currency = page.Circuit!.Chosen.Candidate.Currency;
        return Cells("  ", "part", ["MHz ppm", "ppm", "margin", "µW", "ms", currency, "change", "most in"], "stock", width, glyphs, Tone.Quiet);
    }

    private static Line Row(Replacement one, bool here, int width, Glyphs glyphs)
    {
        string stock = one.Part.Stock?.ToString(CultureInfo.InvariantCulture) ?? "-";
        Line line = Cells(
            here ? glyphs.Chosen + " " : "  ", one.Part.Id + (one.SamePackage ? "" : " *"), ChangeFigures.Cells(one.Change), stock, width, glyphs,
            Tone.Normal);
        return here ? line.Chosen() : line;
    }

    // The cells of a change: frequency, error, margin, drive level, start-up time, cost, size, most in.
    private static Line Cells(string mark, string part, string[] change, string stock, int width, Glyphs glyphs, Tone tone)
    {
        LineBuilder line = new LineBuilder(glyphs).Add(mark);
        if (width < Middle)
        {
            return line.Column(part, Math.Max(10, width - 28), tone).Column(change[1], 8, tone, right: true)
                .Column(change[2], 8, tone, right: true).Column(change[5], 9, tone, right: true).Build();
        }

        line.Column(part, 22, tone);
        if (width >= Wide)
        {
            line.Column(change[0], 9, tone, right: true);
        }

        line.Column(change[1], 8, tone, right: true).Column(change[2], 8, tone, right: true).Column(change[3], 8, tone, right: true);
        if (width >= Wide)
        {
            line.Column(change[4], 8, tone, right: true);
        }

        line.Column(change[5], 9, tone, right: true).Column(change[6], 8, tone, right: true).Add(" ").Column(change[7], 13, tone);
        return width >= Wide ? line.Column(stock, 9, tone, right: true).Build() : line.Build();
    }
}
