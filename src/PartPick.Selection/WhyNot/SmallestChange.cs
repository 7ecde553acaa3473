namespace PartPick.Selection.Search;

/// <summary>Lets one limit out as little as lets the part in, while the others stay as they are; each answer was ranked again.</summary>
/// <param name="search">The search of the circuits with the part.</param>
internal sealed class SmallestChange(PartSearch search)
{
    private const int Tries = 4;
    private const double NearEnough = 1.004;
    private const double SupplyStepVolts = 0.1;

    /// <summary>The requirement with the limit let out, and what fits it; null where nothing does however far it is let out.</summary>
    /// <param name="at">The requirement in which the limit stands as it is wanted.</param>
    /// <param name="limit">The limit.</param>
    public (LetOut At, FitPoint Point)? Of(LetOut at, Limit limit)
    {
        Requirement wanted = at.Requirement;
        LetOut open = at.Without(limit).Weighing(wanted, [limit is Limit.Error or Limit.Cost ? limit : Limit.Margin]);
        if (search.Best(open.Requirement, open.RatingFactor) is not { } point)
        {
            return null;
        }

        return limit switch
        {
            Limit.Error => Settle(more => at with
            {
                Requirement = wanted with { BudgetRatio = Rounding.Up(point.ErrorRatio, more) },
            }),
            Limit.Margin => Settle(more => at with { Requirement = wanted with { Margin = Rounding.Down(point.Margin, more) } }),
            Limit.Cost => Settle(_ => at with { Requirement = wanted with { CostLimit = Rounding.Up(point.Cost) } }),
            Limit.StartUpTime => OfTime(at, point),
            _ => OfDrive(at, point),
        };
    }

    /// <summary>The highest supply, in tenths of a volt, at which the part fits with all else as it is; null where none does.</summary>
    public (LetOut At, FitPoint Point)? OfSupply(LetOut at)
    {
        Requirement wanted = at.Requirement;
        (LetOut At, FitPoint Point)? best = null;
        int steps = (int)Math.Floor((wanted.SupplyMaxVolts - wanted.SupplyMinVolts) / SupplyStepVolts + 1e-9);
        (int low, int high) = (0, steps - 1);
        while (low <= high)
        {
            int middle = best is null ? low : (low + high) / 2;
            double volts = Math.Round(wanted.SupplyMinVolts + middle * SupplyStepVolts, 6);
            LetOut one = at with { Requirement = wanted with { SupplyMaxVolts = volts } };
            if (Fitting(one) is { } point)
            {
                best = (one, point);
                low = middle + 1;
            }
            else if (best is null)
            {
                return null;
            }
            else
            {
                high = middle - 1;
            }
        }

        return best;
    }

    private (LetOut At, FitPoint Point)? Settle(Func<int, LetOut> rounded)
    {
        for (int more = 0; more < Tries; more++)
        {
            LetOut one = rounded(more);
            if (Fitting(one) is { } point)
            {
                return (one, point);
            }
        }

        return null;
    }

    private FitPoint? Fitting(LetOut one) => search.Best(one.Requirement, one.RatingFactor);

    // The time is in no score, so it is halved in; whatever fits within a time fits within a longer one.
    private (LetOut At, FitPoint Point)? OfTime(LetOut at, FitPoint first)
    {
        Requirement wanted = at.Requirement;
        double high = TimeOf(first);
        return Halve(
            wanted.StartUpTimeSeconds!.Value, high,
            seconds => at with { Requirement = wanted with { StartUpTimeSeconds = Rounding.Up(seconds) } },
            TimeOf);

        double TimeOf(FitPoint point) => search.Build(wanted, point.Choice)?.StartUpTime?.Value ?? double.PositiveInfinity;
    }

    private (LetOut At, FitPoint Point)? OfDrive(LetOut at, FitPoint first)
    {
        return Halve(1, UsedOf(first), factor => at with { RatingFactor = Rounding.Up(factor) }, UsedOf);

        double UsedOf(FitPoint point) => search.Build(at.Requirement, point.Choice) is { Drive: { } drive, RatedDriveWatts: { } rated }
            ? drive.Value / rated
            : double.PositiveInfinity;
    }

    private (LetOut At, FitPoint Point)? Halve(double low, double high, Func<double, LetOut> at, Func<FitPoint, double> reached)
    {
        if (!double.IsFinite(high) || Fitting(at(high)) is not { } found)
        {
            return null;
        }

        (LetOut, FitPoint) best = (at(high), found);
        high = Math.Min(high, reached(found));
        while (high / low > NearEnough)
        {
            double middle = Math.Sqrt(low * high);
            if (Fitting(at(middle)) is { } point)
            {
                best = (at(middle), point);
                high = Math.Min(middle, Math.Max(low, reached(point)));
                best = Fitting(at(high)) is { } again ? (at(high), again) : best;
            }
            else
            {
                low = middle;
            }
        }

        return best;
    }
}
