using PartPick.Catalog;
using PartPick.Physics;

namespace PartPick.Selection.Search;

/// <summary>
/// By how much an estimate may be off from the full analysis, by the device: chosen above what was seen over rankings of the built-in
/// catalogue, not proved.
/// </summary>
/// <param name="PullShare">Share of the pull from series resonance.</param>
/// <param name="PerHarmonic">Share of the pull by the third harmonic of a buffered inverter's input over its first.</param>
/// <param name="Ratio">What else the frequency may be off, as a ratio.</param>
/// <param name="DriveShare">Share by which the drive level may be too high.</param>
/// <param name="SlopeShare">Least slopes of the frequency by the capacitances, over those of the first order.</param>
internal readonly record struct EstimateQuality(double PullShare, double PerHarmonic, double Ratio, double DriveShare, double SlopeShare)
{
    // With so small a third harmonic the few harmonics of an estimate leave next to nothing, or little.
    private const double Sinusoidal = 0.012;
    private const double SinusoidalShare = 0.001;
    private const double NearlySinusoidal = 0.02;
    private const double NearlySinusoidalShare = 0.006;

    // Beyond this third harmonic the few harmonics of an estimate may have found another state than the circuit's own.
    private const double Trusted = 0.15;
    private static readonly EstimateQuality Follower = new(0.001, 0, 0.5e-6, 0.02, 0.95);
    private static readonly EstimateQuality OneStage = new(0.012, 0, 0.3e-6, 0.08, 0.86);
    private static readonly EstimateQuality Buffered = new(0.005, 1.7, 1e-6, 0.3, 0.75);

    /// <summary>The quality of an amplifier's estimates.</summary>
    public static EstimateQuality Of(Part amplifier) => amplifier switch
    {
        TransistorPart => Follower,
        AmplifierPart { Stages: > 1 } => Buffered,
        _ => OneStage,
    };

    /// <summary>Whether an estimate with such harmonics says anything of its circuit.</summary>
    /// <param name="harmonicShare">The estimate's harmonics.</param>
    public static bool Trusts(double harmonicShare) => harmonicShare < Trusted;

    /// <summary>Largest error of an estimated frequency, as a ratio.</summary>
    /// <param name="crystal">The crystal.</param>
    /// <param name="hertz">The estimate.</param>
    /// <param name="harmonicShare">The estimate's harmonics.</param>
    public double ErrorRatio(Crystal crystal, double hertz, double harmonicShare) =>
        Share(harmonicShare) * Math.Abs(hertz / crystal.SeriesHz - 1) + Ratio;

    private double Share(double harmonicShare) =>
        !Trusts(harmonicShare) ? 1
        : PerHarmonic == 0 || harmonicShare >= NearlySinusoidal ? PullShare + PerHarmonic * harmonicShare
        : harmonicShare >= Sinusoidal ? NearlySinusoidalShare
        : SinusoidalShare;
}
