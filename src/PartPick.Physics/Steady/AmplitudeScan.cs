namespace PartPick.Physics.Steady;

/// <summary>
/// Follows −Re Zc(I) from small signals upwards: where it first falls through Rm lies the running amplitude, and its
/// largest value is the running margin.
/// </summary>
internal sealed class AmplitudeScan
{
    private const double LargestRatio = 1.35;
    private const double SmallestRatio = 1.03;
    private const double RunningTolerance = 1e-5;
    private const double JumpAgain = 0.7;
    private const double NearlyRunning = 0.9;
    private const double SmallerBy = 4;
    private const double SmallestShare = 1e-4;
    private const double SmallestLogStep = 1e-3;
    private const double CrestAccuracy = 1.005;
    private const int MostSteps = 400;
    private const int MostFiner = 3;
    private readonly Refinement _refinement;
    private readonly double _resistance;
    private readonly double _radians;
    private readonly bool _runningOnly;
    private ForcedState _balance;
    private double _jumpedAt = double.PositiveInfinity;
    private int _finer;

    /// <param name="refinement">The circuit's balances.</param>
    /// <param name="radians">Frequency of the motional current in rad/s.</param>
    /// <param name="resistanceOhms">Rm in ohms.</param>
    /// <param name="runningOnly">True to stop at the running amplitude, without the largest −Re Zc.</param>
    public AmplitudeScan(Refinement refinement, double radians, double resistanceOhms, bool runningOnly = false)
    {
        _refinement = refinement;
        _resistance = resistanceOhms;
        _radians = radians;
        _runningOnly = runningOnly;
        _balance = Fresh();
        Run();
    }

    /// <summary>The balance solved at the running amplitude; null where there is none.</summary>
    public ForcedState? Running { get; private set; }

    /// <summary>Largest −Re Zc in ohms found on the way, between steps by the cubic through values and slopes.</summary>
    public double LargestNegativeOhms { get; private set; } = double.NegativeInfinity;

    private void Run()
    {
        if (_balance.StartSaturated(_resistance) is not { } saturated || !RunDown(saturated))
        {
            RunUp();
        }
    }

    // A steep limiter holds its own input still at small amplitudes (no single zero crossing): only the limited branch is followed.
    private bool RunDown(double peak)
    {
        double ratio = LargestRatio;
        if (!_balance.SolveAt(peak))
        {
            return false;
        }

        double linear = _balance.LinearPeakAmps;
        double negative = Note();
        double slope = -_balance.ResistanceSlope;
        while (peak > linear)
        {
            _balance.Remember();
            if (!_balance.SolveAt(peak / ratio))
            {
                ratio = Math.Sqrt(ratio);
                if (ratio < SmallestRatio)
                {
                    return true;
                }

                _balance.Recall();

                continue;
            }

            double next = Note();
            double nextSlope = -_balance.ResistanceSlope;
            CubicCrest crest = CubicCrest.Between(next, nextSlope, negative, slope, Math.Log(ratio));
            Note(crest);
            if (Running is null && negative <= _resistance && Math.Max(next, crest.Height) > _resistance)
            {
                ForcedState scanning = _balance;
                _balance = _refinement.From(scanning.Keep())!;
                if (next > _resistance)
                {
                    FindRunning(peak / ratio, peak);
                }
                else
                {
                    FindRunningBeyond(peak / ratio * Math.Exp(crest.Place), peak);
                }

                _balance = scanning;
                if (_runningOnly && Running is not null)
                {
                    return true;
                }
            }

            if (next < 0.5 * LargestNegativeOhms && nextSlope > 0)
            {
                return true;
            }

            peak /= ratio;
            ratio = Math.Min(LargestRatio, ratio * ratio);
            (negative, slope) = (next, nextSlope);
        }

        return true;
    }

    private ForcedState Fresh()
    {
        ForcedState balance = _refinement.Coarse();
        balance.SetFrequency(_radians);
        return balance;
    }

    private void RunUp()
    {
        _balance = Fresh();
        _finer = 0;
        double peak = _balance.LinearPeakAmps;
        _balance.StartLinear(peak);
        if (!double.IsFinite(peak) || !_balance.SolveAt(peak))
        {
            return;
        }

        double ratio = LargestRatio;
        double negative = Note();
        double slope = -_balance.ResistanceSlope;
        if (slope < 0 && negative <= _resistance && negative > NearlyRunning * _resistance && RunSmall(peak))
        {
            return;
        }

        for (int step = 0; step < MostSteps && peak < _balance.LargestPeakAmps; step++)
        {
            _balance.Remember();
            if (_balance.FallsForGood && slope < 0 && negative > _resistance && negative < JumpAgain * _jumpedAt && Jump(peak))
            {
                return;
            }

            if (!_balance.SolveAt(peak * ratio))
            {
                if (!StepBack(peak, ref ratio))
                {
                    return;
                }

                continue;
            }

            double next = -_balance.Impedance.Real;
            double nextSlope = -_balance.ResistanceSlope;
            CubicCrest crest = CubicCrest.Between(negative, slope, next, nextSlope, Math.Log(ratio));
            double higher = Math.Max(negative, next);
            bool runsBetween = higher <= _resistance && crest.Height > _resistance;
            if ((runsBetween || crest.Height > CrestAccuracy * higher) && crest.Place > SmallestLogStep)
            {
                // A sharp crest, or one that alone is above Rm: on to where it should be.
                _balance.Recall();
                ratio = Math.Exp(crest.Place);
                continue;
            }

            Note(crest);
            Note();
            if (negative > _resistance && next <= _resistance)
            {
                FindRunning(peak, peak * ratio);
                return;
            }

            if (next < 0.5 * LargestNegativeOhms && next < 0.5 * _resistance && nextSlope < 0)
            {
                return;
            }

            if (next < 0 && nextSlope > -1e-6 * _resistance && step > 60)
            {
                return;
            }

            peak *= ratio;
            ratio = Math.Min(LargestRatio, ratio * ratio);
            (negative, slope) = (next, nextSlope);
        }
    }

    // A circuit that only just builds up runs at an amplitude at which it still acts as linear, about.
    private bool RunSmall(double peak)
    {
        _balance.Remember();
        for (double small = peak / SmallerBy; small > SmallestShare * peak; small /= SmallerBy)
        {
            _balance.StartLinear(small);
            if (_balance.SolveAt(small) && Note() > _resistance)
            {
                FindRunning(small, small * SmallerBy);
                return true;
            }
        }

        _balance.Recall();
        return false;
    }

    // Straight to the running amplitude from one below it, where −Re Zc falls already.
    private bool Jump(double peak)
    {
        _jumpedAt = -_balance.Impedance.Real;
        if (_balance.SolveRunning(_resistance, RunningTolerance) && _balance.PeakAmps > peak && _balance.Stays)
        {
            Running = _balance;
            return true;
        }

        _balance.Recall();
        return false;
    }

    // Back to the last amplitude for a smaller step; where steps become too small, on with twice the harmonics.
    private bool StepBack(double peak, ref double ratio)
    {
        _balance.Recall();
        ratio = Math.Sqrt(ratio);
        if (ratio >= SmallestRatio)
        {
            return true;
        }

        if (_finer == MostFiner || !_balance.SolveAt(peak) || _refinement.Finer(_balance) is not { } finer || !finer.SolveAt(peak))
        {
            return false;
        }

        _finer++;
        _balance = finer;
        ratio = LargestRatio;
        return true;
    }

    private double Note()
    {
        double negative = -_balance.Impedance.Real;
        LargestNegativeOhms = Math.Max(LargestNegativeOhms, negative);
        return negative;
    }

    private void Note(in CubicCrest crest) => LargestNegativeOhms = Math.Max(LargestNegativeOhms, crest.Height);

    // The curve rises above Rm only between two steps: from its top on, where it does.
    private void FindRunningBeyond(double top, double above)
    {
        if (_balance.SolveAt(top) && Note() > _resistance)
        {
            FindRunning(top, above);
        }
    }

    private void FindRunning(double below, double above)
    {
        _balance.Remember();
        if (_balance.SolveRunning(_resistance) && _balance.PeakAmps > below * 0.999 && _balance.PeakAmps < above * 1.001)
        {
            Running = _balance;
            return;
        }

        _balance.Recall();
        for (int step = 0; step < 60; step++)
        {
            double middle = Math.Sqrt(below * above);
            if (!_balance.SolveAt(middle))
            {
                return;
            }

            if (-_balance.Impedance.Real > _resistance)
            {
                below = middle;
            }
            else
            {
                above = middle;
            }

            if (above / below - 1 < 1e-12)
            {
                Running = _balance;
                return;
            }
        }
    }
}
