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
        Type kind, int points, bool reverse, bool holdsCurrent, double radians, double peakAmps, double[] state, DenseSolver? factors)
    {
        Kind = kind;
        Points = points;
        Reverse = reverse;
        HoldsCurrent = holdsCurrent;
        Radians = radians;
        PeakAmps = peakAmps;
        _state = state;
        _factors = factors;
    }

    /// <summary>The same starting point without what makes a solution quicker from it: much smaller, to keep many.</summary>
    public RunningState Slim() => new(Kind, Points, Reverse, HoldsCurrent, Radians, PeakAmps, _state, null);

    internal Type Kind { get; }

    internal int Points { get; }

    internal int Unknowns => _state.Length;

    internal bool Reverse { get; }

    internal bool HoldsCurrent { get; }

    internal double Radians { get; }

    internal double PeakAmps { get; }

    internal AmplitudeBalance PutInto(AmplitudeBalance balance)
    {
        balance.TakeState(Radians, PeakAmps, _state, _factors);
        return balance;
    }
}
