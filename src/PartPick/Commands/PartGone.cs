using System.CommandLine;
using PartPick.Catalog;
using PartPick.Output;
using PartPick.Selection;

namespace PartPick.Commands;

/// <summary>What else meets a requirement where a part cannot be had.</summary>
internal static class PartGone
{
    /// <summary>Finds and prints it.</summary>
    /// <returns>The exit status.</returns>
    public static int Run(
        CommandContext context,
        ParseResult parsed,
        AlternatesWish wish,
        (ShortlistReview Review, ChosenCircuit Chosen) circuit,
        string gone,
        PartsCatalog catalog)
    {
        BoardLine line = PartWish.Find(BoardLine.Of(circuit.Chosen.Board), [gone], "--gone")[0];
        Shortage shortage = RankingProgress.Over(context.Surroundings, wish.Quiet, progress => ShortageSearch.Find(
            circuit.Chosen,
            line,
            circuit.Review.Requirement,
            catalog,
            wish.Equal,
            new RankingOptions { Top = wish.Top ?? 10 },
            progress,
            context.Surroundings.Cancellation));
        var view = new ShortageView(wish.List, circuit.Review, circuit.Chosen, line, shortage);
        ShortageOutput.Write(context.Output, context.FormatOf(parsed), view);
        return shortage.Candidates.IsEmpty ? ExitStatus.NothingFits : ExitStatus.Done;
    }
}
