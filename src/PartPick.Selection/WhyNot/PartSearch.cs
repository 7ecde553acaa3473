using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection.Search;

/// <summary>The exact search over the circuits with one part, and over all.</summary>
/// <param name="source">Where the parts come from.</param>
/// <param name="part">The crystal or amplifier that is asked about.</param>
/// <param name="cancellation">Ends it.</param>
internal sealed class PartSearch(IPartsSource source, Part part, CancellationToken cancellation)
{
    /// <summary>How many a list shows.</summary>
    public const int Listed = 50;

    private readonly Dictionary<double, OnePartSource> _alone = [];
    private readonly OnePartSource _all = new(source, part, alone: false);

    /// <summary>The part.</summary>
    public Part Part => part;

    /// <summary>All parts that matter for a requirement, the part among them.</summary>
    public PartsCatalog PartsFor(Requirement requirement) => _all.PartsFor(requirement, cancellation);

    /// <summary>The best choice with the part; null where none fits.</summary>
    /// <param name="requirement">What is needed.</param>
    /// <param name="ratingFactor">By what the rated drive levels are multiplied.</param>
    public FitPoint? Best(Requirement requirement, double ratingFactor = 1) =>
        BestOf(Run(requirement, ratingFactor));

    /// <summary>The best choice of a finished search; null where none fits.</summary>
    public static FitPoint? BestOf(SearchRun run) => run.Leaders.Best() is [var first, ..] ? first : null;

    /// <summary>A finished search of the circuits with the part.</summary>
    /// <param name="requirement">What is needed.</param>
    /// <param name="ratingFactor">By what the rated drive levels are multiplied.</param>
    public SearchRun Run(Requirement requirement, double ratingFactor = 1)
    {
        if (!_alone.TryGetValue(ratingFactor, out OnePartSource? parts))
        {
            parts = new OnePartSource(source, part, alone: true, ratingFactor);
            _alone.Add(ratingFactor, parts);
        }

        return Searched(requirement, parts, 1);
    }

    /// <summary>A choice analysed in full, with the parts as they are.</summary>
    public Candidate? Build(Requirement requirement, CandidateParts choice)
    {
        PartsCatalog parts = PartsFor(requirement);
        CandidateParts own = choice with { Crystal = (CrystalPart)parts.Find(choice.Crystal.Id)! };
        return new CandidateBuilder(requirement, new Market(parts, requirement.Builds)).Build(own);
    }

    /// <summary>Where the part stands in the list of all circuits.</summary>
    /// <param name="requirement">What is needed.</param>
    /// <param name="own">The best choice with the part; with its score as it stands in that list.</param>
    /// <returns>Its place, and the score of the part's candidate.</returns>
    public (ListPlace Place, double Score) PlaceOf(Requirement requirement, FitPoint own)
    {
        SearchRun run = Searched(requirement, _all, Listed);
        ImmutableArray<FitPoint> points = [.. run.Leaders.Best().Take(Listed)];
        int at = -1;
        for (int i = 0; i < points.Length && at < 0; i++)
        {
            at = Holds(points[i].Choice) ? i : -1;
        }

        var builder = new CandidateBuilder(requirement, run.Space.Market);
        Candidate first = Built(points[0]);
        Candidate? above = at switch
        {
            0 => null,
            1 => first,
            > 1 => Built(points[at - 1]),
            _ => points.Length == 1 ? first : Built(points[^1]),
        };
        return (new ListPlace(at < 0 ? null : at + 1, points.Length, first, above), ScoreOf(at < 0 ? own : points[at]));

        Candidate Built(FitPoint point) => builder.Build(point.Choice)! with { Score = ScoreOf(point) };

        double ScoreOf(FitPoint point) =>
            Score.Of(requirement, point.ErrorRatio, point.Margin, point.Cost, run.Leaders.Cheapest ?? point.Cost);
    }

    private bool Holds(CandidateParts choice) => choice.Crystal.Id == part.Id || choice.Amplifier.Id == part.Id;

    private SearchRun Searched(Requirement requirement, IPartsSource parts, int top)
    {
        var space = new SearchSpace(requirement, parts, every: false, cancellation);
        var run = new SearchRun(space, new RankingOptions { Top = top }, null, cancellation, leadersOnly: true);
        run.Search();
        return run;
    }
}
