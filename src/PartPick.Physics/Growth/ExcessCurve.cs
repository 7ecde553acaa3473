using PartPick.Physics.Steady;

namespace PartPick.Physics.Growth;

/// <summary>
/// The excess of negative resistance, −Re Zc(I) − Rm in ohms, over the depth ln(Î/I) below the running amplitude Î: zero at the
/// running amplitude, and its small-signal value far below. Solved along the amplitude by the engine's own periodic states.
/// </summary>
internal sealed class ExcessCurve
{
    private const double FirstStep = 0.02;
    private const double LargestStep = 0.25;
    private const double SmallestStep = 0.004;
    private const double WidestGap = 0.5;
    private readonly List<Sample> _samples = [];
    private readonly double _linearOhms;

    private ExcessCurve(double linearOhms) => _linearOhms = linearOhms;

    private readonly record struct Sample(double Depth, double Ohms, double Slope);

    /// <summary>Follows the curve from the running amplitude down; null where it cannot be followed to small signals.</summary>
    /// <param name="refinement">The periodic states of the circuit.</param>
    /// <param name="running">The running state.</param>
    /// <param name="resistanceOhms">Rm in ohms.</param>
    /// <param name="linearOhms">The excess of small signals, above zero.</param>
    /// <param name="cancellation">Ends it.</param>
    public static ExcessCurve? Follow(
        Refinement refinement, RunningState running, double resistanceOhms, double linearOhms, CancellationToken cancellation)
    {
        if (refinement.From(running) is not { } state || !state.SolveRunning(resistanceOhms))
        {
            return null;
        }

        var curve = new ExcessCurve(linearOhms);
        double peak = state.PeakAmps;
        if (!state.SolveAt(peak))
        {
            return null;
        }

        curve._samples.Add(Take(state, 0, resistanceOhms) with { Ohms = 0 });
        double bottom = Math.Log(peak / state.LinearPeakAmps);
        curve.Walk(state, peak, 0, Math.Max(bottom, LargestStep), resistanceOhms, cancellation);
        if (curve._samples[^1].Depth < bottom && !curve.WalkUp(refinement, state.Radians, peak, bottom, resistanceOhms, cancellation))
        {
            return null;
        }

        // At a smaller amplitude that it holds, the growth would end there.
        return curve._samples.Skip(1).All(sample => sample.Ohms > 0) ? curve : null;
    }

    /// <summary>The excess in ohms at a depth; cubic between solved amplitudes, and below them quadratic in the amplitude.</summary>
    /// <param name="depth">ln(Î/I), zero or more.</param>
    public double At(double depth)
    {
        Sample last = _samples[^1];
        if (depth >= last.Depth)
        {
            return _linearOhms + (last.Ohms - _linearOhms) * Math.Exp(-2 * (depth - last.Depth));
        }

        int at = 1;
        while (_samples[at].Depth < depth)
        {
            at++;
        }

        (Sample left, Sample right) = (_samples[at - 1], _samples[at]);
        double width = right.Depth - left.Depth;
        double x = (depth - left.Depth) / width;
        double rest = 1 - x;
        return rest * rest * (1 + 2 * x) * left.Ohms + x * x * (3 - 2 * x) * right.Ohms
            + width * x * rest * (rest * left.Slope - x * right.Slope);
    }

    // From a state that is solved at a depth towards another; where a step fails, smaller ones are tried.
    private void Walk(ForcedState state, double peak, double from, double to, double resistanceOhms, CancellationToken cancellation)
    {
        double step = FirstStep;
        double depth = from;
        double way = Math.Sign(to - from);
        while (way * (to - depth) > 0)
        {
            cancellation.ThrowIfCancellationRequested();
            state.Remember();
            double next = way * Math.Min(way * (depth + way * step), way * to);
            if (!state.SolveAt(peak * Math.Exp(-next)))
            {
                state.Recall();
                step /= 2;
                if (step < SmallestStep)
                {
                    return;
                }

                continue;
            }

            depth = next;
            _samples.Add(Take(state, depth, resistanceOhms));
            step = Math.Min(LargestStep, 1.5 * step);
        }
    }

    // From small signals up to where the way down ended.
    private bool WalkUp(
        Refinement refinement, double radians, double peak, double bottom, double resistanceOhms, CancellationToken cancellation)
    {
        double top = _samples[^1].Depth;
        ForcedState state = refinement.Coarse();
        state.SetFrequency(radians);
        state.StartLinear(peak * Math.Exp(-bottom));
        if (!state.SolveAt(peak * Math.Exp(-bottom)))
        {
            return bottom - top < WidestGap;
        }

        int known = _samples.Count;
        _samples.Add(Take(state, bottom, resistanceOhms));
        Walk(state, peak, bottom, top + SmallestStep, resistanceOhms, cancellation);
        bool meets = _samples[^1].Depth - top < WidestGap;
        _samples.Reverse(known, _samples.Count - known);
        return meets;
    }

    private static Sample Take(ForcedState state, double depth, double resistanceOhms) =>
        new(depth, -state.Impedance.Real - resistanceOhms, state.ResistanceSlope);
}
