using PartPick.Selection;

namespace PartPick.Output;

/// <summary>The best candidate over the number of boards, for people.</summary>
internal static class ChoiceTable
{
    private const int MostLines = 20;

    /// <summary>Prints the ranges, and how far they are exact.</summary>
    public static void Write(TextWriter output, QuantityView view, QuantityChoice choice)
    {
        output.WriteLine();
        output.WriteLine(choice.Spans.Length == 1
            ? "The best candidate by score is the same for every number of boards:"
            : "The best candidate by score changes with the number of boards:");
        output.WriteLine();
        TextColumn[] columns =
        [
            new("best"), new("from", true), new("to", true), new("circuit"), new("crystal"), new("amplifier"), new("C1"), new("C2"),
            new("Rs or RE (ohm)", true), new("error (ppm)", true), new("margin", true),
            new("each at first", true), new("at last", true), new(""),
        ];
        TextTable.Write(output, columns, [.. choice.Spans.Take(MostLines).Select(span => Row(view, span))]);
        if (choice.Spans.Length > MostLines)
        {
            output.WriteLine($"… and {Figures.Whole(choice.Spans.Length - MostLines)} more ranges (--format json).");
        }

        output.WriteLine();
        output.WriteLine(Exactness(choice));
    }

    /// <summary>How far the choice is exact.</summary>
    /// <param name="choice">The choice.</param>
    public static string Exactness(QuantityChoice choice) => choice.IsExact
        ? $"Exact for every number of boards: all {Figures.Whole(choice.Compared)} fit combinations were compared at each."
        : "Exact where the whole catalogue was ranked: for "
            + $"{string.Join(", ", choice.RankedAt.Select(builds => Figures.Whole(builds)))} boards. Between them the best of "
            + $"{Figures.Whole(choice.Compared)} candidates that were on the front there. * ranked within the range.";

    private static string[] Row(QuantityView view, ChoiceSpan span)
    {
        CandidateParts? choice = span.Candidate?.Choice;
        return
        [
            view.Letter(span.Candidate),
            Figures.Whole(span.From),
            Figures.Whole(span.To),
            choice?.Circuit.Word() ?? "nothing fits",
            choice?.Crystal.Id ?? "",
            choice?.Amplifier.Id ?? "",
            choice?.C1.Id ?? "",
            choice?.C2.Id ?? "",
            choice is null
                ? Figures.None
                : Figures.Short(choice.Circuit == CircuitKind.Follower ? choice.Emitter?.ValueOhms : choice.Series?.ValueOhms ?? 0, 1),
            Figures.Fixed(span.Candidate?.Budget?.WorstRatio, 1e-6, 1),
            Figures.Fixed(span.Candidate?.Margin.Value, 1, 2),
            span.Candidate is { } candidate ? QuantityTable.Money(candidate.Cost) : Figures.None,
            span.CostAtEnd is { } cost ? QuantityTable.Money(cost) : Figures.None,
            span.Ranked ? "*" : "",
        ];
    }
}
