using System.Collections.Immutable;
using PartPick.Selection;

namespace PartPick.Output;

/// <summary>What a circuit costs over the number of boards, and which candidate is the best there.</summary>
/// <param name="List">Name of the list.</param>
/// <param name="Review">The candidate as it is today.</param>
/// <param name="Chosen">The same, analysed.</param>
/// <param name="Curve">What it costs.</param>
/// <param name="Choice">The best candidates; null where they were not asked for.</param>
/// <param name="Rows">The numbers of boards of the table, ascending.</param>
/// <param name="Ascii">Whether only ASCII may be used.</param>
internal sealed record QuantityView(
    string List,
    ShortlistReview Review,
    ChosenCircuit Chosen,
    CostCurve Curve,
    QuantityChoice? Choice,
    ImmutableArray<int> Rows,
    bool Ascii)
{
    /// <summary>The candidates of the choice, each once, in the order in which they come; a letter stands for each.</summary>
    public ImmutableArray<Candidate> Candidates { get; } = Choice is null
        ? []
        : [.. Choice.Spans.Select(span => span.Candidate).OfType<Candidate>().DistinctBy(candidate => candidate.Id)];

    /// <summary>The usual numbers of boards for the table, and the wanted one.</summary>
    /// <param name="builds">The wanted number.</param>
    /// <param name="most">The largest.</param>
    public static ImmutableArray<int> UsualRows(int builds, int most) =>
    [
        .. new[] { 1, 2, 5, 10, 20, 50, 100, 200, 500, 1000, 2000, 5000, most }.Append(Math.Min(builds, most)).Distinct().Order(),
    ];

    /// <summary>The letter of a candidate: A to Z, then a number behind it.</summary>
    public string Letter(Candidate? candidate)
    {
        int place = candidate is null ? -1 : Candidates.ToList().FindIndex(one => one.Id == candidate.Id);
        return place < 0 ? Figures.None : (char)('A' + place % 26) + (place < 26 ? "" : Figures.Whole(place / 26));
    }

    /// <summary>Why the chosen circuit is not fit for a number of boards, in a few words; empty where it is.</summary>
    public string Breaks(int builds)
    {
        bool stock = builds > (Curve.CoveredTo ?? int.MaxValue);
        bool cost = Curve.UnitCost(builds) > Review.Requirement.CostLimit;
        return (stock, cost) switch
        {
            (true, true) => "stock, cost limit",
            (true, false) => "stock",
            (false, true) => "cost limit",
            _ => "",
        };
    }
}
