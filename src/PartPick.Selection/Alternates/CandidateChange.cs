namespace PartPick.Selection;

/// <summary>
/// What a change of parts does to the figures of a circuit. How much changes is one number: of every figure that the requirement
/// limits, the part of its limit that the change takes (or gives back), over the part that was still free; the largest of them
/// counts. At 1 one figure has moved by all that it had left. A margin uses the required margin over the margin of its limit; the
/// nominal frequency may move by what the error has left; a cost without a limit is taken over itself. Of each limit at least a
/// hundredth counts as free, so that a circuit at its limit has an order too.
/// </summary>
public sealed record CandidateChange
{
    private const double LeastFree = 0.01;

    /// <summary>Change of the nominal frequency as a ratio; null without a steady state.</summary>
    public required double? FrequencyRatio { get; init; }

    /// <summary>Change of the frequency error, worst case, as a ratio; null without a steady state.</summary>
    public required double? ErrorRatio { get; init; }

    /// <summary>Change of the start-up margin at the worst corner.</summary>
    public required double Margin { get; init; }

    /// <summary>Change of the highest drive level in watts; null where one of the two is not known.</summary>
    public required double? DriveWatts { get; init; }

    /// <summary>Change of the longest start-up time in seconds; null where one of the two is not known.</summary>
    public required double? StartUpSeconds { get; init; }

    /// <summary>Change of the cost per unit, in the catalogue's currency; null where one of the two is in several.</summary>
    public required decimal? Cost { get; init; }

    /// <summary>How much changes: zero or more, 1 where a figure moved by all that it had left.</summary>
    public required double Size { get; init; }

    /// <summary>The figure that changes most, in that sense.</summary>
    public required ChangedFigure Most { get; init; }

    /// <summary>The change from one candidate to another.</summary>
    /// <param name="from">The candidate before.</param>
    /// <param name="to">The candidate after.</param>
    /// <param name="requirement">What is needed of both.</param>
    public static CandidateChange Between(Candidate from, Candidate to, Requirement requirement)
    {
        ArgumentNullException.ThrowIfNull(from);
        ArgumentNullException.ThrowIfNull(to);
        ArgumentNullException.ThrowIfNull(requirement);
        double budget = requirement.BudgetRatio;
        double? centre = to.Budget?.CentreRatio - from.Budget?.CentreRatio;
        var sizes = new List<(ChangedFigure Figure, double Size)>
        {
            (ChangedFigure.Frequency, Math.Abs(centre / budget ?? 0) / Free(from.Budget?.WorstRatio / budget)),
            Moved(ChangedFigure.Error, from.Budget?.WorstRatio / budget, to.Budget?.WorstRatio / budget),
            Moved(ChangedFigure.Margin, Used(requirement.Margin, from.Margin.Value), Used(requirement.Margin, to.Margin.Value)),
            Moved(ChangedFigure.Drive, from.Drive?.Value / from.RatedDriveWatts, to.Drive?.Value / to.RatedDriveWatts),
        };
        if (requirement.StartUpTimeSeconds is { } time)
        {
            sizes.Add(Moved(ChangedFigure.StartUpTime, from.StartUpTime?.Value / time, to.StartUpTime?.Value / time));
        }

        bool priced = from.IsInOneCurrency && to.IsInOneCurrency;
        if (!priced)
        {
            // There is no sum of different currencies.
        }
        else if (requirement.CostLimit is { } limit and > 0)
        {
            sizes.Add(Moved(ChangedFigure.Cost, (double)(from.Cost / limit), (double)(to.Cost / limit)));
        }
        else if (from.Cost > 0)
        {
            sizes.Add((ChangedFigure.Cost, Math.Abs((double)(to.Cost / from.Cost - 1))));
        }

        (ChangedFigure most, double size) = sizes.MaxBy(pair => pair.Size);
        return new CandidateChange
        {
            FrequencyRatio = centre,
            ErrorRatio = to.Budget?.WorstRatio - from.Budget?.WorstRatio,
            Margin = to.Margin.Value - from.Margin.Value,
            DriveWatts = to.Drive?.Value - from.Drive?.Value,
            StartUpSeconds = to.StartUpTime?.Value - from.StartUpTime?.Value,
            Cost = priced ? to.Cost - from.Cost : null,
            Size = size,
            Most = most,
        };
    }

    private static (ChangedFigure Figure, double Size) Moved(ChangedFigure figure, double? before, double? after) =>
        (figure, before is { } old && after is { } now ? Math.Abs(now - old) / Free(old) : 0);

    private static double Free(double? used) => Math.Max(1 - (used ?? 1), LeastFree);

    private static double Used(double required, double margin) => margin > required / 100 ? required / margin : 100;
}
