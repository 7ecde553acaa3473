using PartPick.Catalog;
using PartPick.Physics;

namespace PartPick.Selection.Search;

/// <summary>
/// By how much an estimate may be off from the full analysis, by the device: about twice what was ever seen over the rankings of the
/// built-in catalogue.
/// </summary>
/// <param name="PullShare">Share of the pull from series resonance.</param>
/// <param name="Ratio">What else the frequency may be off, as a ratio.</param>
/// <param name="DriveShare">Share by which the drive level may be too high.</param>
internal readonly record struct EstimateQuality(double PullShare, double Ratio, double DriveShare)
{
    private static readonly EstimateQuality Follower = new(0.002, 0.5e-6, 0.02);
    private static readonly EstimateQuality OneStage = new(0.012, 0.3e-6, 0.08);
    private static readonly EstimateQuality Buffered = new(0.06, 1e-6, 0.3);

    /// <summary>The quality of an amplifier's estimates.</summary>
    public static EstimateQuality Of(Part amplifier) => amplifier switch
    {
        TransistorPart => Follower,
        AmplifierPart { Stages: > 1 } => Buffered,
        _ => OneStage,
    };

    /// <summary>Largest error of an estimated frequency, as a ratio.</summary>
    /// <param name="crystal">The crystal.</param>
    /// <param name="hertz">The estimate.</param>
    public double ErrorRatio(Crystal crystal, double hertz) => PullShare * Math.Abs(hertz / crystal.SeriesHz - 1) + Ratio;
}
