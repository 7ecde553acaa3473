using System.Collections.Immutable;

namespace PartPick.Physics;

/// <summary>The amplitude of the motional current at a moment after switch-on.</summary>
/// <param name="Seconds">Time in seconds from a settled supply.</param>
/// <param name="PeakAmps">Peak motional current in amperes.</param>
public readonly record struct GrowthPoint(double Seconds, double PeakAmps);

/// <summary>
/// The growth of the motional current from its thermal amplitude to the running one: the slow envelope
/// dI/dt = −(Re Zc(I) + Rm)/(2 Lm) · I (slowly varying amplitude: van der Pol 1920; Bogoliubov and Mitropolsky, averaging; from
/// memory). Its rate at small amplitudes is the growth rate of the natural mode.
/// </summary>
public sealed record AmplitudeGrowth
{
    /// <summary>Amplitude at the beginning: the thermal current of the motional branch, in amperes peak.</summary>
    public required double StartPeakAmps { get; init; }

    /// <summary>Running amplitude in amperes peak.</summary>
    public required double SteadyPeakAmps { get; init; }

    /// <summary>Growth rate σ of small amplitudes in 1/s, above zero.</summary>
    public required double GrowthRatePerSecond { get; init; }

    /// <summary>Time in seconds at which growth at σ alone would reach the running amplitude: the start-up time.</summary>
    public required double StartUpTimeSeconds { get; init; }

    /// <summary>Time in seconds at which the amplitude is nine tenths of the running one.</summary>
    public required double NinetyPercentSeconds { get; init; }

    /// <summary>The growth, from zero on in rising order, to within half a per cent of the running amplitude.</summary>
    public required ImmutableArray<GrowthPoint> Points { get; init; }
}
