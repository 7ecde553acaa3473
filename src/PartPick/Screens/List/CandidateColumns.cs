using System.Collections.Immutable;
using System.Globalization;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>
/// The list's figures as texts, lined up on their points down each column. The unit of a column stands in its heading.
/// </summary>
public sealed class CandidateColumns
{
    private CandidateColumns(ImmutableArray<CandidateCells> rows)
    {
        Rows = rows;
    }

    /// <summary>The rows.</summary>
    public ImmutableArray<CandidateCells> Rows { get; }

    /// <summary>Makes the texts.</summary>
    /// <param name="candidates">The candidates.</param>
    /// <param name="requirement">The limits they are held against.</param>
    public static CandidateColumns Of(IReadOnlyList<Candidate> candidates, Requirement requirement)
    {
        ArgumentNullException.ThrowIfNull(candidates);
        ArgumentNullException.ThrowIfNull(requirement);
        string[] frequency = Figures.LineUp([.. candidates.Select(c => MegaHertz(c.Choice.Crystal.FrequencyHz))]);
        string[] load = Figures.LineUp([.. candidates.Select(c => Picofarads(c.Choice.Crystal.LoadFarads))]);
        string[] error = Figures.LineUp([.. candidates.Select(c => c.Budget is { } b ? Figures.Ppm(b.WorstRatio) : "-")]);
        string[] margin = Figures.LineUp([.. candidates.Select(c => Figures.Three(c.Margin.Value))]);
        string[] cost = Figures.LineUp([.. candidates.Select(c => Figures.Money(c.Cost))]);
        return new CandidateColumns([.. candidates.Select((c, i) => new CandidateCells
        {
            Circuit = c.Choice.Circuit.Word(),
            FrequencyMegaHertz = frequency[i],
            LoadPicofarads = load[i],
            Amplifier = c.Choice.Amplifier.Id,
            Case = ShortCase(c.Choice.Crystal.Holder ?? ""),
            Divider = Divider(c.Choice.Tap),
            ErrorPpm = error[i],
            Margin = margin[i],
            Cost = cost[i],
            Uses = LimitUses.Of(c, requirement),
        })]);
    }

    private static string MegaHertz(double hertz) => (hertz / 1e6).ToString("0.######", CultureInfo.InvariantCulture);

    private static string Picofarads(double? farads) =>
        farads is { } load ? (load * 1e12).ToString("0.##", CultureInfo.InvariantCulture) : "-";

    // "HC-49/U" is known as 49U; a cylinder by its size.
    private static string ShortCase(string holder) => holder.Replace("HC-", "", StringComparison.OrdinalIgnoreCase)
        .Replace("cylinder ", "", StringComparison.OrdinalIgnoreCase).Replace("/", "", StringComparison.Ordinal);

    private static string Divider(int tap) => tap switch
    {
        0 => "",
        < 17 => (1L << tap).ToString(CultureInfo.InvariantCulture),
        _ => string.Create(CultureInfo.InvariantCulture, $"2^{tap}"),
    };
}
