using System.Collections.Immutable;
using PartPick.Physics;

namespace PartPick.Selection.Search;

/// <summary>
/// The first look at a family: which combinations of values have the margin, and could still change the answer for some crystal.
/// Uses start-up figures and quick estimates; what it drops is off by more than an estimate can be.
/// </summary>
internal sealed class FamilyScan
{
    private const double MarginSlack = 0.98;

    // Between the wanted frequency and that of the natural mode the negative resistance changes by far less than this.
    private const double ScreenSlack = 0.99;

    // A margin just below one at nominal capacitances may be above it at others.
    private const double DisturbedBelow = 1.05;
    private readonly SearchRun _run;
    private readonly SearchSpace _space;
    private readonly CircuitFamily _family;
    private readonly CircuitTemplate _template;
    private readonly Requirement _requirement;
    private readonly HashSet<(int Option, int C1, int C2)> _sparse = [];
    private readonly double _wanted;
    private readonly double _screenHz;
    private readonly double _mostWatts;
    private int _weakest;

    public FamilyScan(SearchRun run, CircuitFamily family)
    {
        _run = run;
        _space = run.Space;
        _family = family;
        _template = family.Members[0].Template;
        _requirement = _space.Requirement;
        Grid = new EstimateGrid(_space, family, Window());
        _wanted = _requirement.Margin * MarginSlack;
        _mostWatts = family.Members.Max(member => member.Crystal.DriveLevelWatts ?? double.PositiveInfinity);
        _screenHz = family.Members[0].Crystal.FrequencyHz;
    }

    /// <summary>The estimates made so far.</summary>
    public EstimateGrid Grid { get; }

    /// <summary>Combinations (of parts, for one crystal) that the margin removed.</summary>
    public double MarginRejections { get; private set; }

    /// <summary>Combinations (of parts, for one crystal) that the frequency error removed for every crystal.</summary>
    public double ErrorRejections { get; private set; }

    /// <summary>Combinations (of parts, for one crystal) that the drive level removed for every crystal.</summary>
    public double DriveRejections { get; private set; }

    /// <summary>
    /// A few combinations spread over the whole, for good answers early: against them the rest can be left out sooner.
    /// </summary>
    public List<Spot> Sparse()
    {
        var found = new List<Spot>();
        foreach (int i in Grid.Values())
        {
            foreach (int j in Grid.Values().Reverse())
            {
                _run.Cancellation.ThrowIfCancellationRequested();
                found.AddRange(SparseOptions().Select(option => AtNode(option, i, j)).OfType<Spot>());
            }
        }

        return found;
    }

    /// <summary>Everything else that could still change the answer.</summary>
    public List<Spot> Rest()
    {
        var found = new List<Spot>();
        for (int i = 0; i < _space.Capacitors.Length; i++)
        {
            for (int j = _space.Capacitors.Length - 1; j >= 0; j--)
            {
                _run.Cancellation.ThrowIfCancellationRequested();
                ScanPair(i, j, found);
            }
        }

        return found;
    }

    // Bias networks differ little from one to the next, so every fourth serves for a beginning.
    private IEnumerable<int> SparseOptions() => _family.IsGate ? Grid.Options() : Grid.Options().Where((_, place) => place % 2 == 0);

    private Spot? AtNode(int option, int i, int j)
    {
        if (Grid.IsOutside(option, i, j) || Screen(option, i, j) < _wanted * ScreenSlack)
        {
            return null;
        }

        double margin = WorstMargin(option, i, j);
        if (margin < _wanted || Grid.At(option, i, j) is not { } estimate)
        {
            return null;
        }

        _sparse.Add((option, i, j));
        LoadRange load = LoadRange.Of(estimate);
        return new Spot(option, i, j, margin, load, Grid.Slopes(option, i, j, load), 0);
    }

    private void ScanPair(int i, int j, List<Spot> found)
    {
        double weight = (double)_space.Capacitors[i].Parts * _space.Capacitors[j].Parts;
        double before = double.NegativeInfinity;
        for (int option = 0; option < _family.Options.Length; option++)
        {
            double screened = Screen(option, i, j);
            if (screened < _wanted * ScreenSlack)
            {
                if (_family.IsGate && !_requirement.AllowDisturbance && screened < before)
                {
                    // At one corner the margin rises, if at all, and then falls along Rs: nothing beyond has it.
                    MarginRejections += weight * (_family.Options.Length - option);
                    return;
                }

                before = screened;
                MarginRejections += weight;
                continue;
            }

            before = screened;
            if (_sparse.Contains((option, i, j)))
            {
                continue;
            }

            if (Grid.LiesOutside(option, i, j))
            {
                ErrorRejections += weight;
                continue;
            }

            LoadSlopes slopes = LoadSlopes.OfCapacitors(_requirement.Board, _family.IsGate, Values(option, i, j));
            if (!MayMatter(option, i, j, Grid.WideRange(option, i, j), slopes, 0, screened / ScreenSlack, weight))
            {
                continue;
            }

            LoadRange range = Grid.Range(option, i, j);
            if (!MayMatter(option, i, j, range, slopes, 0, screened / ScreenSlack, weight))
            {
                continue;
            }

            if (range != LoadRange.Any)
            {
                slopes = Grid.Slopes(option, i, j, range);
                if (!MayMatter(option, i, j, range, slopes, 0, screened / ScreenSlack, weight))
                {
                    continue;
                }
            }

            double margin = WorstMargin(option, i, j);
            if (margin < _wanted)
            {
                MarginRejections += weight;
            }
            else if (Narrowed(option, i, j, range, slopes, margin, weight) is { } spot)
            {
                found.Add(spot);
            }
        }
    }

    // What the margin left, with ever more from the nodes round it.
    private Spot? Narrowed(int option, int i, int j, LoadRange range, LoadSlopes slopes, double margin, double weight)
    {
        if (range == LoadRange.Any)
        {
            return MayMatter(option, i, j, range, slopes, 0, margin, weight) ? new Spot(option, i, j, margin, range, slopes, 0) : null;
        }

        if (!MayMatter(option, i, j, range, slopes, 0, margin, weight))
        {
            return null;
        }

        range = Grid.Sharp(option, i, j, range);
        slopes = Grid.Slopes(option, i, j, range);
        if (!MayMatter(option, i, j, range, slopes, 0, margin, weight))
        {
            return null;
        }

        if (Grid.LeastDriveWatts(option, i, j, highest: false) > _mostWatts)
        {
            DriveRejections += weight;
            return null;
        }

        double amplifier = _family.IsGate ? Grid.LeastAmplifierRatio(option, i, j) : 0;
        if (!MayMatter(option, i, j, range, slopes, amplifier, margin, weight))
        {
            return null;
        }

        if (_family.IsGate && Grid.LeastDriveWatts(option, i, j, highest: true) > _mostWatts)
        {
            DriveRejections += weight;
            return null;
        }

        return new Spot(option, i, j, margin, range, slopes, amplifier);
    }

    // The margin of the weakest device at the lowest supply at the crystal's nominal frequency: the worst one is no better.
    private double Screen(int option, int i, int j) =>
        Bound(OscillatorAnalysis.FindMarginAt(_template.At(Values(option, i, j), _template.AmplifierCorners[0]), _screenHz));

    // Where a disturbance may start it, a corner that does not build up counts with its running margin, which nothing bounds yet.
    private double Bound(double margin) =>
        _requirement.AllowDisturbance && margin < DisturbedBelow ? double.PositiveInfinity : margin;

    // Whether a combination could still change the answer for some crystal.
    private bool MayMatter(
        int option, int i, int j, in LoadRange range, LoadSlopes slopes, double amplifierRatio, double margin, double weight)
    {
        LeastTerms terms = LeastTerms.OfLoad(
            _requirement.Board, _family.IsGate, _template.Crystal.Crystal, Values(option, i, j), slopes, range.Highest);
        double least = amplifierRatio + terms.Ratio(_run.Prices.LeastSpread(i), _run.Prices.LeastSpread(j));
        decimal cost = _family.OptionCosts[option] + _run.Prices.CheapestPair(i, j);
        double bound = margin * MemberSearch.MarginSlack;
        bool within = false;
        foreach (FamilyMember member in _family.Members)
        {
            double error = member.TermsRatio + least + LeastCentre(member, range);
            if (error <= _requirement.BudgetRatio)
            {
                within = true;
                if (_run.MayEnter(member, error, bound, member.BaseCost + cost))
                {
                    return true;
                }
            }
        }

        if (!within)
        {
            ErrorRejections += weight;
        }

        return false;
    }

    // Loads at which some crystal of the family is within the budget.
    private LoadRange Window()
    {
        double lowest = double.PositiveInfinity;
        double highest = 0;
        foreach (FamilyMember member in _family.Members)
        {
            double room = _requirement.BudgetRatio - member.TermsRatio;
            lowest = Math.Min(lowest, Load(member, member.TargetHz * (1 + room)));
            highest = Math.Max(highest, Load(member, member.TargetHz * (1 - room)));
        }

        return new LoadRange(lowest, highest, 0);

        static double Load(FamilyMember member, double hertz) => hertz <= member.Model.Crystal.SeriesHz
            ? double.PositiveInfinity
            : Math.Max(0, member.Model.Crystal.LoadAtFrequencyFarads(hertz));
    }

    /// <summary>
    /// Least distance from the target, as a ratio, of a crystal's frequency at a load between bounds. Crystals of one family differ
    /// in rated load, and so in the frequency that a load gives.
    /// </summary>
    public static double LeastCentre(FamilyMember member, in LoadRange range)
    {
        Crystal crystal = member.Model.Crystal;
        double slowest = crystal.FrequencyAtLoadHz(range.Highest);
        double fastest = crystal.FrequencyAtLoadHz(range.Lowest);
        double off = Math.Max(slowest / member.TargetHz - 1, 1 - fastest / member.TargetHz);
        return Math.Max(0, off - member.Quality.ErrorRatio(crystal, fastest, range.HarmonicShare));
    }

    // Least margin over supply, ambient and device at nominal capacitances, no less than the full analysis finds; the corner that
    // was least somewhere is looked at first elsewhere.
    private double WorstMargin(int option, int i, int j)
    {
        double least = double.PositiveInfinity;
        CircuitValues values = Values(option, i, j);
        ImmutableArray<OperatingPoint> corners = _template.AmplifierCorners;
        int first = _weakest;
        for (int k = 0; k < corners.Length && least >= _wanted; k++)
        {
            int corner = (first + k) % corners.Length;
            double margin = Bound(OscillatorAnalysis.FindMarginAt(_template.At(values, corners[corner]), _screenHz)) / ScreenSlack;
            if (margin < least)
            {
                (least, _weakest) = (margin, corner);
            }
        }

        return least;
    }

    private CircuitValues Values(int option, int i, int j) =>
        _family.Options[option].With(_space.Capacitors[i].Farads, _space.Capacitors[j].Farads);
}
