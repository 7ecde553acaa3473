using PartPick.Physics;

namespace PartPick.Benchmarks;

/// <summary>The rows of one evaluation each: small-signal figures at all corners, and a steady state from a neighbour's.</summary>
internal static class PerCallRows
{
    /// <summary>Names, what is aimed at in microseconds, and the calls.</summary>
    public static IEnumerable<(string Name, double AimMicroseconds, Action Call)> All()
    {
        foreach (string name in Subject.Names)
        {
            Subject subject = Subject.Named(name);
            yield return ($"margin at all corners, {name}", 2, () => _ = subject.Corners().Margin);
        }

        foreach (string name in Subject.Names)
        {
            Subject subject = Subject.Named(name);
            double aim = name == "follower" ? 400 : 50;
            OscillatorAnalysis.Analyse(subject.Neighbour, out RunningState? neighbour);
            OscillatorAnalysis.Analyse(subject.Circuit, out RunningState? own);
            yield return ($"steady state from a neighbour, {name}", aim,
                () => OscillatorAnalysis.FindSteadyState(subject.Circuit, neighbour!, Fineness.Converged, out _));
            yield return ($"one corner from the nominal state, {name}", aim,
                () => OscillatorAnalysis.FindSteadyState(subject.Corner, own!, Fineness.Same, out _));
        }
    }
}
