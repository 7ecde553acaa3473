using System.Collections.Immutable;
using System.CommandLine;
using PartPick.Catalog;
using PartPick.Output;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Commands;

/// <summary><c>partpick shortlist alternates</c>: what may replace the parts of chosen circuits, and what other quantities cost.</summary>
internal static class ShortlistAlternatesCommand
{
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
        Shortlist list = ShortlistListCommand.Load(context, parsed, wish.List)[0];
        ImmutableArray<ShortlistEntry> entries = Entries(list, wish);
        var reviewer = new ShortlistReviewer(catalog);
        (ShortlistReview Review, ChosenCircuit Chosen)[] circuits =
        [
            .. entries.Select(entry => CommandFailure.Unless(reviewer.Review(list.Name, entry)))
                .Select(review => (review, CommandFailure.Unless(ChosenCircuit.Of(review, catalog)))),
        ];
        return wish switch
        {
            { Gone: { } gone } => PartGone.Run(context, parsed, wish, circuits[0], gone, catalog),
            { Quantities: true } => OtherQuantities.Run(context, parsed, wish, circuits[0], catalog),
            _ => PartReplacement.Run(context, parsed, wish, circuits, catalog),
        };
    }

    private static ImmutableArray<ShortlistEntry> Entries(Shortlist list, AlternatesWish wish)
    {
        ImmutableArray<ShortlistEntry> entries = [.. list.Entries.Where(entry => wish.Number is null || entry.Number == wish.Number)];
        string numbers = string.Join(", ", list.Entries.Select(entry => Figures.Whole(entry.Number)));
        if (entries.IsEmpty)
        {
            throw new CommandFailure(
                new Problem(
                    "NUMBER", $"{Figures.Whole(wish.Number!.Value)} is no candidate of {Problem.Quote(list.Name)}", "one of " + numbers),
                ExitStatus.WrongInput);
        }

        return entries.Length > 1 && (wish.Gone is not null || wish.Quantities)
            ? throw new CommandFailure(
                new Problem(
                    "NUMBER",
                    $"is missing: {Problem.Quote(list.Name)} holds {Figures.Whole(entries.Length)} candidates",
                    "one of " + numbers),
                ExitStatus.WrongInput)
            : entries;
    }
}
