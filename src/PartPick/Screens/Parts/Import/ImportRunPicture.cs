using System.Collections.Immutable;
using System.Globalization;
using PartPick.Catalog.Import;
using PartPick.Output;

namespace PartPick.Screens;

/// <summary>Draws an import that runs, and what became of the rows when it is done.</summary>
/// <param name="page">The page.</param>
/// <param name="glyphs">The signs.</param>
/// <param name="width">Width in cells.</param>
internal sealed class ImportRunPicture(ImportPage page, Glyphs glyphs, int width)
{
    /// <summary>The lines above the foot.</summary>
    /// <param name="height">Number of rows.</param>
    public ImmutableArray<Line> Draw(int height)
    {
        ImmutableArray<Line> body = page.Step == ImportStep.Running ? Running() : page.ReportScroll.Cut(Done(), height - 1);
        string title = page.Step == ImportStep.Running ? "Importing " : page.Run.Report is { DryRun: true } ? "Tried " : "Imported ";
        string more = page.Step == ImportStep.Done && page.ReportScroll.HasMore ? "more below" : "";
        return
        [
            Rules.Draw(title + Path.GetFileName(page.Wishes.File), more, width, glyphs), .. body,
            .. Enumerable.Repeat(Line.Empty, Math.Max(0, height - 1 - body.Length)),
        ];
    }

    private ImmutableArray<Line> Running()
    {
        ImportProgress progress = page.Run.Progress;
        LineBuilder bar = new LineBuilder(glyphs).Add(" ");
        if (progress.Share is { } share)
        {
            bar.Add(Bars.Bar(share, Math.Clamp(width - 10, 8, 60), glyphs), Tone.Accent)
                .Add(string.Create(CultureInfo.InvariantCulture, $" {Math.Floor(share * 100):F0} %"));
        }

        return
        [
            Line.Empty, bar.Build(), Line.Empty,
            new LineBuilder(glyphs).Add(" ").Words(
                page.Run.IsStopping ? "stopping" : progress.Rows == 0 ? "beginning" : ImportPace.Words(progress), width - 2).Build(),
            Line.Empty,
            new LineBuilder(glyphs).Add(" ").Words("Nothing is in the catalogue before all of it is.", width - 2, Tone.Quiet).Build(),
        ];
    }

    private ImmutableArray<Line> Done()
    {
        if (page.Run.Report is not { } report)
        {
            return [];
        }

        var lines = ImmutableArray.CreateBuilder<Line>();
        lines.Add(Line.Empty);
        lines.AddRange(Paragraph.Of(ImportPace.Sum(report), width - 2, glyphs, " ", 1, Tone.Strong));
        string seconds = string.Create(CultureInfo.InvariantCulture, $"{report.Elapsed.TotalSeconds:F1} s");
        lines.AddRange(Paragraph.Of(
            $"{ImportPace.Layout(report.Encoding, report.Delimiter, report.HeaderLine)}; {seconds}",
            width - 2, glyphs, " ", 1, Tone.Quiet));
        if (report.RejectedFile is { } file)
        {
            lines.AddRange(Paragraph.Of($"The rejected rows are in {file}, to be mended and imported again.", width - 2, glyphs, " ", 1));
        }

        if (report.Rejections.IsEmpty)
        {
            return lines.ToImmutable();
        }

        lines.Add(Line.Empty);
        lines.Add(new LineBuilder(glyphs).Add("   line  column", Tone.Quiet).Build());
        foreach (RowRejection rejection in report.Rejections)
        {
            string head = rejection.Line.ToString(CultureInfo.InvariantCulture).PadLeft(7) + "  ";
            lines.AddRange(Paragraph.Of(
                $"{(rejection.Column is null ? "" : rejection.Column + ": ")}{rejection.Reason}", width - 2, glyphs, head, 9));
        }

        if (report.Rejected > report.Rejections.Length)
        {
            lines.AddRange(Paragraph.Of("and more, which are not listed here.", width - 2, glyphs, "         ", 9, Tone.Quiet));
        }

        return lines.ToImmutable();
    }
}
