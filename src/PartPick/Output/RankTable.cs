using System.Collections.Immutable;
using System.Globalization;
using PartPick.Commands;
using PartPick.Selection;

namespace PartPick.Output;

/// <summary>A ranking for people.</summary>
internal static class RankTable
{
    /// <summary>Prints the requirement, the candidates or the nearest misses, and the cautions.</summary>
    public static void Write(TextWriter output, RankView view)
    {
        RankingResult result = view.Result;
        output.WriteLine(RequirementSentence.Of(result.Requirement));
        string fit = result.Fit is { } count ? $", {Figures.Count(count)} of them fit" : "";
        output.WriteLine($"{Figures.Count(result.Combinations)} combinations{fit}; {Figures.Fixed(result.ElapsedSeconds, 1, 2)} s.");
        output.WriteLine();
        if (view.NothingFits)
        {
            WriteMisses(output, view);
            return;
        }

        WriteCandidates(output, view, view.Result.Candidates);
        output.WriteLine();
        output.WriteLine(
            "* on the front: no fit candidate beats it on error, margin and cost together. Error is the worst case; margin, start-up");
        output.WriteLine("  time and drive level are those of the worst corner.");
        WriteWarnings(output, view.Result.Candidates);
        output.WriteLine();
        output.WriteLine(HelpFooter.Cautions);
    }

    private static void WriteCandidates(TextWriter output, RankView view, ImmutableArray<Candidate> candidates)
    {
        string currency = candidates.IsEmpty ? "" : candidates[0].Currency;
        TextColumn[] columns =
        [
            new("#", true), new(""), new("circuit"), new("crystal"), new("amplifier"), new("tap", true), new("C1 (pF)", true),
            new("C2 (pF)", true), new("Rs or RE (ohm)", true), new("error (ppm)", true), new("RSS (ppm)", true), new("margin", true),
            new("start-up (ms)", true), new("drive (uW)", true), new($"cost ({currency})", true), new("score", true),
        ];
        TextTable.Write(
            output,
            columns,
            [.. candidates.Select(Row)],
            (index, line) => Paint.Strong(line, view.Colour && candidates[index].OnFront));
    }

    private static string[] Row(Candidate candidate, int index) =>
    [
        Figures.Whole(index + 1),
        candidate.OnFront ? "*" : "",
        candidate.Choice.Circuit.Word(),
        candidate.Choice.Crystal.Id,
        candidate.Choice.Amplifier.Id,
        Figures.Whole(candidate.Choice.Tap),
        Figures.Short(candidate.Choice.C1.ValueFarads, 1e-12),
        Figures.Short(candidate.Choice.C2.ValueFarads, 1e-12),
        Figures.Short(
            candidate.Choice.Circuit == CircuitKind.Follower
                ? candidate.Choice.Emitter?.ValueOhms
                : candidate.Choice.Series?.ValueOhms ?? 0,
            1),
        Figures.Fixed(candidate.Budget?.WorstRatio, 1e-6, 1),
        Figures.Fixed(candidate.Budget?.RssRatio, 1e-6, 1),
        Figures.Fixed(candidate.Margin.Value, 1, 2),
        Figures.Short(candidate.StartUpTime?.Value, 1e-3),
        Figures.Short(candidate.Drive?.Value, 1e-6),
        candidate.Cost.ToString("F3", CultureInfo.InvariantCulture),
        Figures.Fixed(candidate.Score, 1, 3),
    ];

    private static void WriteMisses(TextWriter output, RankView view)
    {
        output.WriteLine(view.Removed.Count == 0
            ? "Nothing fits: the catalogue holds no combination for this output."
            : $"Nothing fits. The limit that removed most is the {LimitWords.Words(view.Removed[0].Key)}: "
                + $"{Figures.Count(view.Removed[0].Value)} of {Figures.Count(view.Result.Combinations)} combinations.");
        if (view.Result.NearestMisses.IsEmpty)
        {
            return;
        }

        output.WriteLine("Nearest misses:");
        output.WriteLine();
        WriteCandidates(output, view, view.Result.NearestMisses);
        output.WriteLine();
        for (int i = 0; i < view.Result.NearestMisses.Length; i++)
        {
            foreach (Miss miss in view.Result.NearestMisses[i].Misses)
            {
                output.WriteLine($"{Figures.Whole(i + 1)}: {miss.Sentence}");
            }
        }
    }

    private static void WriteWarnings(TextWriter output, ImmutableArray<Candidate> candidates)
    {
        foreach ((Candidate candidate, int index) in candidates.Take(3).Select((candidate, index) => (candidate, index)))
        {
            foreach (string warning in candidate.Warnings)
            {
                output.WriteLine($"Warning, {Figures.Whole(index + 1)}: {warning}");
            }
        }
    }
}
