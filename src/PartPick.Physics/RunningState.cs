using PartPick.Physics.Steady;

namespace PartPick.Physics;

/// <summary>
/// A running oscillator's periodic state, kept as the starting point for a circuit that differs a little: another corner,
/// the next capacitor. What comes of it is the other circuit's own state, solved in full.
/// </summary>
public sealed class RunningState
{
    private readonly double[] _state;

    internal RunningState(
        Type kind, int points, bool reverse, bool holdsCurrent, double radians, double peakAmps, double[] state)
    {
        Kind = kind;
        Points = points;
        Reverse = reverse;
        HoldsCurrent = holdsCurrent;
        Radians = radians;
        PeakAmps = peakAmps;
        _state = state;
    }

    internal Type Kind { get; }

    internal int Points { get; }

    internal bool Reverse { get; }

    internal bool HoldsCurrent { get; }

    internal double Radians { get; }

    internal double PeakAmps { get; }

    internal AmplitudeBalance PutInto(AmplitudeBalance balance)
    {
        balance.TakeState(Radians, PeakAmps, _state);
        return balance;
    }
}
