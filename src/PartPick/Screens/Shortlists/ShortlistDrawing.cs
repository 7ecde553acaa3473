using System.Collections.Immutable;
using System.Globalization;
using PartPick.Catalog;
using PartPick.Output;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>Draws the page of a list: its candidates, and below them what there is to say about the chosen one.</summary>
internal static class ShortlistDrawing
{
    private const int LeastRows = 3;

    /// <summary>The lines.</summary>
    /// <param name="page">The page.</param>
    /// <param name="width">Width in cells.</param>
    /// <param name="height">Height in rows.</param>
    /// <param name="glyphs">The signs.</param>
    public static ImmutableArray<Line> Draw(ShortlistPage page, int width, int height, Glyphs glyphs)
    {
        if (page.Replacements is { } replacements)
        {
            return ReplacementsDrawing.Draw(replacements, width, height, glyphs);
        }

        if (page.Quantity is { } quantity)
        {
            return QuantityDrawing.Draw(quantity, width, height, glyphs);
        }

        if (page is { IsReading: true, Candidates.IsEmpty: true })
        {
            return [Rules.Draw($"List {page.Name}: reading its parts", "Esc stops it", width, glyphs, Tone.Accent)];
        }

        int changed = page.Candidates.Count(each => each.IsChanged), unfit = page.Candidates.Count(each => !each.IsFit);
        string noun = page.Candidates.Length == 1 ? "candidate" : "candidates";
        string counts = FormattableString.Invariant($"{page.Candidates.Length} {noun}, {changed} changed, {unfit} unfit");
        ImmutableArray<Line> words = Words(page.Chosen, width, glyphs);
        int rows = Math.Clamp(page.Candidates.Length, 1, Math.Max(LeastRows, height - 4 - words.Length));
        int first = Math.Clamp(page.At - rows + 1, 0, Math.Max(0, page.Candidates.Length - rows));
        return
        [
            Rules.Draw($"List {page.Name}: {counts}", page.IsReading ? "at work" : page.Position, width, glyphs, Tone.Strong),
            Heading(page, width, glyphs),
            .. page.Candidates.Skip(first).Take(rows).Select((each, i) => Row(each, first + i == page.At, width, glyphs)),
            Rules.Draw(page.Chosen is { } chosen ? ReviewWords.Name(chosen) : "", "", width, glyphs),
            .. page.Scroll.Cut(words, height - rows - 3),
        ];
    }

    private static Line Heading(ShortlistPage page, int width, Glyphs glyphs)
    {
        string currency = page.Candidates.Select(each => each.Now.Currency).FirstOrDefault(each => each.Length > 0, "");
        return Cells("  ", "#", "circuit", "MHz", "boards", "ppm", "margin", currency, "state", width, glyphs, Tone.Quiet);
    }

    private static Line Row(ShortlistReview review, bool here, int width, Glyphs glyphs)
    {
        CrystalPart? crystal = review.Parts.Select(use => use.Part).OfType<CrystalPart>().FirstOrDefault();
        string megahertz = (crystal?.FrequencyHz / 1e6)?.ToString("0.######", CultureInfo.InvariantCulture) ?? "";
        Line line = Cells(
            here ? glyphs.Chosen + " " : "  ", FormattableString.Invariant($"{review.Entry.Number}"),
            $"{review.Chosen.Circuit.Word()} {review.Chosen.Ids["amplifier"]}", megahertz,
            FormattableString.Invariant($"{review.Entry.Builds}"),
            review.Now.ErrorWorst is { } error ? Figures.Three(error) : "-", review.Now.Margin is { } margin ? Figures.Three(margin) : "-",
            review.Now.Cost is { } cost ? Figures.Money(cost) : "-", ReviewWords.ShortState(review), width, glyphs,
            review.IsFit ? review.IsChanged ? Tone.Accent : Tone.Normal : Tone.Warning);
        return here ? line.Chosen() : line;
    }

    private static Line Cells(
        string mark, string number, string circuit, string megahertz, string boards, string error, string margin, string cost, string state,
        int width, Glyphs glyphs, Tone tone)
    {
        LineBuilder line = new LineBuilder(glyphs).Add(mark).Column(number, 2, right: true).Add(" ");
        Tone plain = tone == Tone.Quiet ? Tone.Quiet : Tone.Normal;
        if (width >= 76)
        {
            line.Column(circuit, 20, plain).Column(megahertz, 9, plain, right: true).Column(boards, 8, plain, right: true);
        }
        else
        {
            line.Column(circuit, 11, plain);
        }

        line.Column(error, 6, plain, right: true).Column(margin, 7, plain, right: true).Column(cost, 6, plain, right: true).Add(" ");
        return line.Words(state, Math.Max(4, width - line.Width), tone).Build();
    }

    private static ImmutableArray<Line> Words(ShortlistReview? review, int width, Glyphs glyphs)
    {
        if (review is null)
        {
            return [];
        }

        string[] lines = [.. ReviewWords.Lines(review)];
        return
        [
            .. Paragraph.Of("Wanted: " + RequirementSentence.Of(review.Requirement), width - 1, glyphs, " ", 1),
            .. Paragraph.Of(
                $"Put here on {review.Entry.Added}" + (review.Entry.Note is { } note ? $": {note}" : "."), width - 1, glyphs, " ", 1,
                Tone.Quiet),
            .. Paragraph.Of(string.Join(", ", review.Parts.Select(Label)), width - 1, glyphs, " ", 1),
            .. lines.Length == 0
                ? Paragraph.Of("Nothing about its parts changed since.", width - 1, glyphs, " ", 1)
                : lines.SelectMany(line => Paragraph.Of(line, width - 1, glyphs, " - ", 3, Tone.Accent)),
        ];
    }

    private static string Label(PartUse use) => $"{use.Designator} {(use.Role == PartRoles.Amplifier ? use.Part.Id : use.Value)}";
}
