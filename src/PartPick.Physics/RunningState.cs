using PartPick.Physics.Numerics;
using PartPick.Physics.Steady;

namespace PartPick.Physics;

/// <summary>
/// A running oscillator's periodic state, kept as the starting point for a circuit that differs a little: another corner,
/// the next capacitor. What comes of it is the other circuit's own state, solved in full.
/// </summary>
public sealed class RunningState
{
    private readonly double[] _state;
    private readonly DenseSolver? _factors;

    internal RunningState(
        Type kind, int points, bool holdsCurrent, double radians, double peakAmps, double[] state, DenseSolver? factors, PeriodMesh? mesh = null)
    {
        Mesh = mesh;
        Kind = kind;
        Points = points;
        HoldsCurrent = holdsCurrent;
        Radians = radians;
        PeakAmps = peakAmps;
        _state = state;
        _factors = factors;
    }

    /// <summary>The same starting point without what makes a solution quicker from it: much smaller, to keep many.</summary>
    public RunningState Slim() => new(Kind, Points, HoldsCurrent, Radians, PeakAmps, _state, null, Mesh);

    internal Type Kind { get; }

    internal int Points { get; }

    internal bool HoldsCurrent { get; }

    internal PeriodMesh? Mesh { get; }

    internal ReadOnlySpan<double> State => _state;

    internal double Radians { get; }

    internal double PeakAmps { get; }

    internal AmplitudeBalance PutInto(AmplitudeBalance balance)
    {
        balance.TakeState(Radians, PeakAmps, _state, _factors);
        return balance;
    }
}
