using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>Computes the numbers of a candidate's pictures: at once what is known already, and in the background what takes long.</summary>
/// <param name="work">Does what takes long.</param>
internal sealed class PictureCharts(ScreenWork work)
{
    private readonly Dictionary<PictureKind, Result<Chart>> _charts = [];
    private readonly LatestWork _margin = new(work);
    private readonly LatestWork _growth = new(work);

    /// <summary>Raised when another picture is there.</summary>
    public event Action? Changed;

    /// <summary>The numbers of a picture, or why there are none; null while they are computed, and for what is no chart.</summary>
    /// <param name="kind">The picture.</param>
    public Result<Chart>? Of(PictureKind kind) => _charts.GetValueOrDefault(kind);

    /// <summary>Begins the pictures of a candidate.</summary>
    /// <param name="candidate">The candidate.</param>
    /// <param name="result">The ranking that it belongs to.</param>
    public void Start(Candidate candidate, RankingResult result)
    {
        Requirement requirement = result.Requirement;
        _charts.Clear();
        _charts[PictureKind.Error] = ErrorOverTemperature.Of(candidate, requirement);
        Follow(candidate, result);
        _margin.Start(stop => MarginOverSupply.Of(candidate, requirement, stop), chart => Take(PictureKind.Margin, chart));
        _growth.Start(stop => GrowthAfterSwitchOn.Of(candidate, stop), chart => Take(PictureKind.Growth, chart));
    }

    /// <summary>Takes another answer of the ranking.</summary>
    /// <param name="candidate">The candidate.</param>
    /// <param name="result">The answer.</param>
    public void Follow(Candidate candidate, RankingResult result) =>
        _charts[PictureKind.Scatter] = ErrorAgainstCost.Of(result, candidate);

    /// <summary>Ends what is being computed.</summary>
    public void Stop()
    {
        _margin.Stop();
        _growth.Stop();
    }

    private void Take(PictureKind kind, Result<Chart> chart)
    {
        _charts[kind] = chart;
        Changed?.Invoke();
    }
}
