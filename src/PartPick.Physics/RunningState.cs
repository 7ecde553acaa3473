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

    internal RunningState(Type kind, int points, double radians, double peakAmps, double[] state, DenseSolver? factors)
    {
        Kind = kind;
        Points = points;
        Radians = radians;
        PeakAmps = peakAmps;
        _state = state;
        _factors = factors;
    }

    internal RunningState(
        double radians, double peakAmps, double[] state, PeriodMesh mesh, bool holdsCurrent, FollowerFundamentals fundamentals)
        : this(typeof(FollowerPeriod), mesh.Count, radians, peakAmps, state, null)
    {
        Mesh = mesh;
        HoldsCurrent = holdsCurrent;
        Fundamentals = fundamentals;
    }

    /// <summary>The same starting point without what makes a solution quicker from it: much smaller, to keep many.</summary>
    public RunningState Slim() => Mesh is null ? new(Kind, Points, Radians, PeakAmps, _state, null) : this;

    internal Type Kind { get; }

    internal int Points { get; }

    internal int Unknowns => _state.Length;

    internal bool HoldsCurrent { get; }

    internal FollowerFundamentals Fundamentals { get; }

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
