using System.Collections.Immutable;
using System.Globalization;
using PartPick.Commands;
using PartPick.Selection;

namespace PartPick.Output;

/// <summary>Cost and choice over the number of boards, for people.</summary>
internal static class QuantityTable
{
    private const int Width = 64;
    private const int Height = 10;
    private const int MostLines = 20;

    /// <summary>Prints picture, table, turns of the cost and ranges of the choice.</summary>
    public static void Write(TextWriter output, QuantityView view)
    {
        ChosenSentence.Write(output, view.List, view.Review, view.Chosen);
        output.WriteLine();
        WritePicture(output, view);
        output.WriteLine();
        WriteRows(output, view);
        WriteBreaks(output, view);
        if (view.Choice is not null)
        {
            ChoiceTable.Write(output, view, view.Choice);
        }

        output.WriteLine();
        output.WriteLine(HelpFooter.Cautions);
    }

    private static void WritePicture(TextWriter output, QuantityView view)
    {
        output.WriteLine($"Cost per unit ({view.Chosen.Candidate.Currency}) of this circuit over the number of boards, both logarithmic:");
        foreach (string line in CostPicture.Draw(view.Curve.Most, view.Curve.UnitCost, Width, Height, view.Ascii))
        {
            output.WriteLine(line);
        }

        if (view.Choice is { } choice)
        {
            output.WriteLine($"    best  {Letters(view, choice, Width)}");
        }
    }

    /// <summary>The letters of the best candidates, one below each column of the picture.</summary>
    /// <param name="view">What is shown.</param>
    /// <param name="choice">Its best candidates.</param>
    /// <param name="width">Width of the picture in letters.</param>
    public static string Letters(QuantityView view, QuantityChoice choice, int width) => string.Concat(Enumerable.Range(0, width)
        .Select(column => view.Letter(choice.At(CostPicture.BuildsAt(column, width, view.Curve.Most)).Candidate)[0]));

    /// <summary>Prints the table of costs.</summary>
    public static void WriteRows(TextWriter output, QuantityView view)
    {
        string currency = view.Chosen.Candidate.Currency;
        TextColumn[] columns = [new("boards", true), new($"each ({currency})", true), new($"all ({currency})", true), new("breaks")];
        TextColumn[] best = [new("best"), new($"each ({currency})", true)];
        TextTable.Write(
            output,
            [.. columns, .. view.Choice is null ? [] : best],
            [
                .. view.Rows.Select(builds => new[]
                {
                    Figures.Whole(builds),
                    Money(view.Curve.UnitCost(builds)),
                    (view.Curve.UnitCost(builds) * builds).ToString("F2", CultureInfo.InvariantCulture),
                    view.Breaks(builds),
                }.Concat(view.Choice is null ? [] : Best(view, view.Choice, builds)).ToArray()),
            ]);
        if (view.Curve.CoveredTo is { } covered && covered < view.Curve.Most)
        {
            output.WriteLine($"The stock of all its parts covers {Figures.Whole(covered)} boards.");
        }
    }

    private static string[] Best(QuantityView view, QuantityChoice choice, int builds) =>
        [view.Letter(choice.At(builds).Candidate), choice.Costs[builds - 1] is { } cost ? Money(cost) : Figures.None];

    private static void WriteBreaks(TextWriter output, QuantityView view)
    {
        ImmutableArray<CostBreak> breaks = view.Curve.Breaks;
        IGrouping<(int Builds, CostBreakKind Kind), CostBreak>[] single =
        [
            .. breaks.Where(turn => turn.Kind != CostBreakKind.Multiple).GroupBy(turn => (turn.Builds, turn.Kind)),
        ];
        output.WriteLine();
        if (breaks.IsEmpty)
        {
            output.WriteLine("The cost per unit turns nowhere.");
            return;
        }

        output.WriteLine("Where it turns:");
        output.WriteLine();
        ImmutableArray<BoardLine> lines = BoardLine.Of(view.Chosen.Board);
        TextColumn[] columns = [new("from", true), new("each before", true), new("each", true), new("what")];
        TextTable.Write(output, columns, [.. single.Take(MostLines).Select(turns => Row(turns, lines))]);
        if (single.Length > MostLines)
        {
            output.WriteLine($"… and {Figures.Whole(single.Length - MostLines)} more (--format json).");
        }

        foreach (string steps in Multiples(breaks))
        {
            output.WriteLine(steps);
        }
    }

    /// <summary>Where the cost turns, a sentence each.</summary>
    /// <param name="view">What is shown.</param>
    public static IEnumerable<string> Turns(QuantityView view)
    {
        ImmutableArray<BoardLine> lines = BoardLine.Of(view.Chosen.Board);
        return view.Curve.Breaks.Where(turn => turn.Kind != CostBreakKind.Multiple)
            .GroupBy(turn => (turn.Builds, turn.Kind))
            .Select(turns => Row(turns, lines))
            .Select(row => row[1] == row[2] ? $"From {row[0]}: {row[3]}." : $"From {row[0]}: {row[1]} → {row[2]}, {row[3]}.")
            .Concat(Multiples(view.Curve.Breaks))
            .DefaultIfEmpty("The cost per unit turns nowhere.");
    }

    private static IEnumerable<string> Multiples(ImmutableArray<CostBreak> breaks) => breaks
        .Where(turn => turn.Kind == CostBreakKind.Multiple)
        .GroupBy(turn => turn.Part.Id)
        .Select(steps => $"{steps.Key} is sold in multiples of {Figures.Whole(steps.First().Part.Offer.Multiple)}: "
            + $"{Figures.Whole(steps.Count())} steps, the first from {Figures.Whole(steps.First().Builds)} boards on.");

    private static string[] Row(IGrouping<(int Builds, CostBreakKind Kind), CostBreak> turns, ImmutableArray<BoardLine> lines)
    {
        string[] parts =
        [
            .. turns.Select(turn =>
                string.Join(", ", lines.First(line => line.Part.Id == turn.Part.Id).Designators)
                + (turns.Key.Kind == CostBreakKind.Price ? $" {Figures.Whole(turn.Ordered)} at {Price(turn.UnitPrice)}" : "")),
        ];
        return
        [
            Figures.Whole(turns.Key.Builds),
            Money(turns.First().Before),
            Money(turns.First().After),
            turns.Key.Kind switch
            {
                CostBreakKind.Price => "another price: ",
                CostBreakKind.UsedUp => "all bought are used: ",
                _ => "stock does not cover: ",
            } + string.Join(", ", parts),
        ];
    }

    private static string Price(decimal price) => price.ToString("0.####", CultureInfo.InvariantCulture);

    /// <summary>A cost of one board.</summary>
    public static string Money(decimal cost) => cost.ToString("F4", CultureInfo.InvariantCulture);
}
