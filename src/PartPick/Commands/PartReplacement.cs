using System.Collections.Immutable;
using System.CommandLine;
using System.Text.Json.Nodes;
using PartPick.Catalog;
using PartPick.Output;
using PartPick.Selection;

namespace PartPick.Commands;

/// <summary>What may replace the parts of circuits.</summary>
internal static class PartReplacement
{
    /// <summary>Finds and prints it.</summary>
    /// <returns>The exit status.</returns>
    public static int Run(
        CommandContext context,
        ParseResult parsed,
        AlternatesWish wish,
        (ShortlistReview Review, ChosenCircuit Chosen)[] circuits,
        PartsCatalog catalog)
    {
        CancellationToken stop = context.Surroundings.Cancellation;
        var options = new AlternatesOptions { SamePackage = wish.SamePackage };
        AlternatesView[] views =
        [
            .. circuits.Select(circuit =>
            {
                var alternates = new Alternates(circuit.Chosen, circuit.Review.Requirement, catalog, options);
                ImmutableArray<BoardLine> lines = PartWish.Find(BoardLine.Of(circuit.Chosen.Board), wish.Parts, "--part");
                return new AlternatesView(
                    wish.List, circuit.Review, circuit.Chosen, [.. lines.Select(line => alternates.Find(line, stop))], wish.Top ?? 5);
            }),
        ];
        switch (context.FormatOf(parsed))
        {
            case OutputFormat.Json:
                JsonOutput.Write(context.Output, new JsonArray([.. views.Select(view => (JsonNode)AlternatesJson.Of(view))]));
                break;
            case OutputFormat.Csv:
                AlternatesCsv.Write(context.Output, views);
                break;
            default:
                for (int i = 0; i < views.Length; i++)
                {
                    context.Output.Write(i > 0 ? "\n" : "");
                    AlternatesTable.Write(context.Output, views[i]);
                }

                AlternatesTable.WriteLegend(context.Output);
                break;
        }

        return views.Any(view => view.Lines.Any(line => !line.Replacements.IsEmpty)) ? ExitStatus.Done : ExitStatus.NothingFits;
    }
}
