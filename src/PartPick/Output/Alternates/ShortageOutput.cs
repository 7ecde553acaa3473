using System.Collections.Immutable;
using System.Globalization;
using System.Text.Json.Nodes;
using PartPick.Commands;
using PartPick.Selection;

namespace PartPick.Output;

/// <summary>What else meets a requirement where a part cannot be had.</summary>
/// <param name="List">Name of the list.</param>
/// <param name="Review">The candidate as it is today.</param>
/// <param name="Chosen">The same, analysed.</param>
/// <param name="Line">The part that cannot be had.</param>
/// <param name="Shortage">What was found.</param>
internal sealed record ShortageView(string List, ShortlistReview Review, ChosenCircuit Chosen, BoardLine Line, Shortage Shortage);

/// <summary>Prints what else meets a requirement where a part cannot be had.</summary>
internal static class ShortageOutput
{
    /// <summary>Prints it in the chosen format.</summary>
    public static void Write(TextWriter output, OutputFormat format, ShortageView view)
    {
        switch (format)
        {
            case OutputFormat.Json:
                JsonOutput.Write(output, Json(view));
                break;
            case OutputFormat.Csv:
                WriteCsv(output, view.Shortage.Candidates);
                break;
            default:
                WriteTable(output, view);
                break;
        }
    }

    private static void WriteTable(TextWriter output, ShortageView view)
    {
        Shortage shortage = view.Shortage;
        ChosenSentence.Write(output, view.List, view.Review, view.Chosen);
        output.WriteLine();
        output.WriteLine(
            $"Without {string.Join(", ", shortage.Gone.Select(part => part.Id).DefaultIfEmpty(view.Line.Part.Id))} "
            + $"({string.Join(", ", view.Line.Designators)}), keeping {string.Join(" and ", shortage.Kept.Select(part => part.Id))}: "
            + $"{Figures.Count(shortage.Ranking.Combinations)} combinations; {Figures.Fixed(shortage.Ranking.ElapsedSeconds, 1, 2)} s.");
        output.WriteLine();
        if (shortage.Candidates.IsEmpty)
        {
            WriteMisses(output, shortage.Ranking);
            return;
        }

        TextColumn[] columns =
        [
            new("#", true), new("crystal"), new("amplifier"), new("tap", true), new("C1 (pF)", true), new("C2 (pF)", true),
            new("Rs or RE (ohm)", true), .. ChangeFigures.Columns(view.Chosen.Candidate.Currency),
        ];
        TextTable.Write(output, columns, [.. shortage.Candidates.Select(Row)]);
        output.WriteLine();
        output.WriteLine("Best first, as in a ranking. The figures are changes from the circuit as it stands; change is the largest");
        output.WriteLine("share that a figure takes, or gives back, of what its limit had left.");
        output.WriteLine();
        output.WriteLine(HelpFooter.Cautions);
    }

    private static string[] Row(ChangedCandidate one, int index)
    {
        CandidateParts choice = one.Candidate.Choice;
        return
        [
            Figures.Whole(index + 1),
            choice.Crystal.Id,
            choice.Amplifier.Id,
            Figures.Whole(choice.Tap),
            Figures.Short(choice.C1.ValueFarads, 1e-12),
            Figures.Short(choice.C2.ValueFarads, 1e-12),
            Figures.Short(choice.Circuit == CircuitKind.Follower ? choice.Emitter?.ValueOhms : choice.Series?.ValueOhms ?? 0, 1),
            .. ChangeFigures.Cells(one.Change),
        ];
    }

    private static void WriteMisses(TextWriter output, RankingResult ranking)
    {
        output.WriteLine("Nothing fits.");
        foreach (Candidate miss in ranking.NearestMisses.Take(3))
        {
            output.WriteLine($"Near: {miss.Id}: {string.Join("; ", miss.Misses.Select(one => one.Sentence))}");
        }
    }

    private static JsonObject Json(ShortageView view)
    {
        RankingResult ranking = view.Shortage.Ranking;
        JsonObject json = AlternatesJson.Chosen(view.List, view.Review, view.Chosen);
        json["gone"] = new JsonArray([.. view.Shortage.Gone.Select(part => (JsonNode)part.Id)]);
        json["kept"] = new JsonArray([.. view.Shortage.Kept.Select(part => (JsonNode)part.Id)]);
        JsonObject answer = RankJson.Of(new RankView(ranking, Colour: false));
        foreach ((JsonNode? candidate, ChangedCandidate one) in answer["candidates"]!.AsArray().Zip(view.Shortage.Candidates))
        {
            candidate!["change"] = ChangeFigures.Json(one.Change);
        }

        foreach ((string key, JsonNode? value) in answer)
        {
            json[key] = value?.DeepClone();
        }

        return json;
    }

    private static void WriteCsv(TextWriter output, ImmutableArray<ChangedCandidate> candidates) => CsvOutput.Write(
        output,
        [
            "id", "circuit", "crystal", "amplifier", "tap", "c1 (F)", "c2 (F)", "rs (ohm)", "errorWorst (ppm)", "startUpMargin",
            "driveLevel (W)", "cost", "currency", .. ChangeFigures.Header,
        ],
        candidates.Select(one => (IEnumerable<string>)
        [
            one.Candidate.Id,
            one.Candidate.Choice.Circuit.Word(),
            one.Candidate.Choice.Crystal.Id,
            one.Candidate.Choice.Amplifier.Id,
            Figures.Whole(one.Candidate.Choice.Tap),
            Figures.Exact(one.Candidate.Choice.C1.ValueFarads),
            Figures.Exact(one.Candidate.Choice.C2.ValueFarads),
            Figures.Exact(one.Candidate.Choice.Series?.ValueOhms),
            Figures.Exact(one.Candidate.Budget?.WorstRatio * 1e6),
            Figures.Exact(one.Candidate.Margin.Value),
            Figures.Exact(one.Candidate.Drive?.Value),
            one.Candidate.Cost.ToString(CultureInfo.InvariantCulture),
            one.Candidate.Currency,
            .. ChangeFigures.ExactCells(one.Change),
        ]));
}
