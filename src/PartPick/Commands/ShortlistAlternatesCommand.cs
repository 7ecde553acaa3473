using System.Collections.Immutable;
using System.CommandLine;
using System.Text.Json.Nodes;
using PartPick.Catalog;
using PartPick.Output;
using PartPick.Screens;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Commands;

/// <summary><c>partpick shortlist alternates</c>: what may replace the parts of chosen circuits, and what other quantities cost.</summary>
internal static class ShortlistAlternatesCommand
{
    private const int MostBuilds = 10_000;

    private const string Examples =
        """
        partpick shortlist alternates logger                   what may replace each part of each candidate
        partpick shortlist alternates logger 1 --part C1 --part crystal --same-package
        partpick shortlist alternates logger 1 --gone Y1       no such crystal: what else meets the requirement round the amplifier
        partpick shortlist alternates logger 1 --gone amplifier --equal
        partpick shortlist alternates logger 1 --builds        cost per unit and best candidate for 1 to 10 000 boards
        partpick shortlist alternates logger 1 --builds 50,75,300 --chosen-only
        A part is named by its designator, by what it is (crystal, amplifier, rs, rf, rbTop, rbBottom, re, decoupling, coupling) or by
        its id. Every replacement is analysed in the whole circuit, and keeps every limit of the requirement.
        Exit status: 0 done, 1 nothing was found that fits, 2 wrong input, 3 the catalogue cannot be used.
        """;

    /// <summary>Builds the command.</summary>
    public static Command Build(CommandContext context)
    {
        var wishes = new AlternatesArguments();
        var command = new Command("alternates", "Shows what may replace the parts of a list's candidates, and what other quantities cost.");
        wishes.AddTo(command);
        command.Add(context.Format);
        HelpFooter.AddTo(command, "Examples", Examples);
        HelpFooter.AddTo(command, "Cautions", HelpFooter.Cautions);
        command.SetAction(parsed => Run(context, parsed, wishes.Read(parsed)));
        return command;
    }

    private static int Run(CommandContext context, ParseResult parsed, AlternatesWish wish)
    {
        PartsCatalog catalog = context.LoadCatalog(parsed);
        Shortlist list = Load(context, parsed, wish.List);
        ImmutableArray<ShortlistEntry> entries = Entries(list, wish);
        var reviewer = new ShortlistReviewer(catalog);
        (ShortlistReview Review, ChosenCircuit Chosen)[] circuits =
        [
            .. entries.Select(entry => CommandFailure.Unless(reviewer.Review(list.Name, entry)))
                .Select(review => (review, CommandFailure.Unless(ChosenCircuit.Of(review, catalog)))),
        ];
        return wish switch
        {
            { Gone: { } gone } => WithoutPart(context, parsed, wish, circuits[0], gone, catalog),
            { Quantities: true } => OverQuantities(context, parsed, wish, circuits[0], catalog),
            _ => Replace(context, parsed, wish, circuits, catalog),
        };
    }

    private static int Replace(
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

    private static int WithoutPart(
        CommandContext context,
        ParseResult parsed,
        AlternatesWish wish,
        (ShortlistReview Review, ChosenCircuit Chosen) circuit,
        string gone,
        PartsCatalog catalog)
    {
        BoardLine line = PartWish.Find(BoardLine.Of(circuit.Chosen.Board), [gone], "--gone")[0];
        Shortage shortage = WithProgress(context, wish, progress => ShortageSearch.Find(
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

    private static int OverQuantities(
        CommandContext context,
        ParseResult parsed,
        AlternatesWish wish,
        (ShortlistReview Review, ChosenCircuit Chosen) circuit,
        PartsCatalog catalog)
    {
        Requirement requirement = circuit.Review.Requirement;
        CostCurve curve = CostCurve.Of(circuit.Chosen.Board, MostBuilds) ?? throw new CommandFailure(
            new Problem("--builds", "a part of the circuit has no price", "a candidate whose parts all have one"), ExitStatus.WrongInput);
        QuantityChoice? choice = wish.ChosenOnly
            ? null
            : WithProgress(context, wish, progress => QuantitySearch.Find(
                requirement,
                catalog,
                circuit.Chosen.Candidate,
                new QuantityOptions { Most = MostBuilds },
                progress,
                context.Surroundings.Cancellation));
        ImmutableArray<int> rows = wish.Builds.IsEmpty ? UsualRows(requirement.Builds) : wish.Builds;
        bool ascii = !TerminalTraits.Of(context.Surroundings.Environment).IsUtf8;
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

    private static ImmutableArray<int> UsualRows(int builds) =>
    [
        .. new[] { 1, 2, 5, 10, 20, 50, 100, 200, 500, 1000, 2000, 5000, MostBuilds }
            .Append(Math.Min(builds, MostBuilds)).Distinct().Order(),
    ];

    private static T WithProgress<T>(CommandContext context, AlternatesWish wish, Func<IProgress<RankingResult>?, T> work)
    {
        RankingProgress? progress = wish.Quiet || !context.Surroundings.ErrorIsTerminal
            ? null
            : new RankingProgress(context.Surroundings.Error);
        try
        {
            return work(progress);
        }
        finally
        {
            progress?.Clear();
        }
    }

    private static Shortlist Load(CommandContext context, ParseResult parsed, string name)
    {
        Result<Shortlist> list = ShortlistStore.Read(context.CatalogPath(parsed), name);
        return CommandFailure.Unless(list, list.Problem?.Where == "NAME" ? ExitStatus.WrongInput : ExitStatus.NoCatalog);
    }

    private static ImmutableArray<ShortlistEntry> Entries(Shortlist list, AlternatesWish wish)
    {
        ImmutableArray<ShortlistEntry> entries = [.. list.Entries.Where(entry => wish.Number is null || entry.Number == wish.Number)];
        string numbers = string.Join(", ", list.Entries.Select(entry => Figures.Whole(entry.Number)));
        if (entries.IsEmpty)
        {
            throw new CommandFailure(
                new Problem("NUMBER", $"{Figures.Whole(wish.Number!.Value)} is no candidate of {Problem.Quote(list.Name)}", "one of " + numbers),
                ExitStatus.WrongInput);
        }

        return entries.Length > 1 && (wish.Gone is not null || wish.Quantities)
            ? throw new CommandFailure(
                new Problem("NUMBER", $"is missing: {Problem.Quote(list.Name)} holds {Figures.Whole(entries.Length)} candidates", "one of " + numbers),
                ExitStatus.WrongInput)
            : entries;
    }
}
