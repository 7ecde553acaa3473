using System.Collections.Immutable;
using System.CommandLine;
using PartPick.Catalog;
using PartPick.Output;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Commands;

/// <summary>What a circuit costs, and which candidate is the best, over the number of boards.</summary>
internal static class OtherQuantities
{
    private const int MostBuilds = 10_000;

    /// <summary>Finds and prints it.</summary>
    /// <returns>The exit status.</returns>
    public static int Run(
        CommandContext context,
        ParseResult parsed,
        AlternatesWish wish,
        (ShortlistReview Review, ChosenCircuit Chosen) circuit,
        PartsCatalog catalog)
    {
        Requirement requirement = circuit.Review.Requirement;
        CostCurve curve = CostCurve.Of(circuit.Chosen.Board, MostBuilds) ?? throw new CommandFailure(
            new Problem("--builds", "a part of the circuit has no price, or one in another currency", "a candidate whose parts all have one"), ExitStatus.WrongInput);
        QuantityChoice? choice = wish.ChosenOnly
            ? null
            : RankingProgress.Over(context.Surroundings, wish.Quiet, progress => QuantitySearch.Find(
                requirement,
                catalog,
                circuit.Chosen.Candidate,
                new QuantityOptions { Most = MostBuilds },
                progress,
                context.Surroundings.Cancellation));
        ImmutableArray<int> rows = wish.Builds.IsEmpty ? QuantityView.UsualRows(requirement.Builds, MostBuilds) : wish.Builds;
        bool ascii = !Screens.TerminalTraits.Of(context.Surroundings.Environment).IsUtf8;
        var view = new QuantityView(wish.List, circuit.Review, circuit.Chosen, curve, choice, rows, ascii);
        switch (context.FormatOf(parsed))
        {
            case OutputFormat.Json:
                JsonOutput.Write(context.Output, QuantityJson.Of(view));
                break;
            case OutputFormat.Csv:
                QuantityJson.WriteCsv(context.Output, view);
                break;
            default:
                QuantityTable.Write(context.Output, view);
                break;
        }

        return ExitStatus.Done;
    }
}
