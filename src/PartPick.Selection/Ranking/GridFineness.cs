using PartPick.Catalog;

namespace PartPick.Selection.Search;

/// <summary>
/// How far apart the nodes of a grid of estimates are, and what may be left between them after interpolation, as shares of the
/// critical load; set against the estimates of whole tables of values of the built-in catalogue's families, not proved.
/// </summary>
/// <param name="Step">Every how many-eth value of C1 and C2 is a node.</param>
/// <param name="LoadSlack">What may be left everywhere.</param>
/// <param name="RangeSlack">What more, as a share of the range over the nodes round a combination.</param>
/// <param name="SharpSlack">What may be left after the bending between the nodes is taken into account.</param>
/// <param name="SharpRange">What more than the bending itself, as a share of the range over the nodes round a combination.</param>
/// <param name="Least">Least load, with the shunt capacitance, as a share of the critical one.</param>
/// <param name="Most">Largest.</param>
/// <param name="MostHarmonics">Third harmonic of a buffered inverter's input over its first that is reckoned with where unknown.</param>
/// <param name="SlopeShare">Least slope of the load by C1 and C2 over that of the critical load.</param>
/// <param name="AcrossShare">The same by what stands across the crystal.</param>
internal readonly record struct GridFineness(
    int Step,
    double LoadSlack,
    double RangeSlack,
    double SharpSlack,
    double SharpRange,
    double Least,
    double Most,
    double MostHarmonics,
    double SlopeShare,
    double AcrossShare)
{
    private static readonly GridFineness Follower = new(6, 0.035, 0.6, 0.018, 0.2, 0.6, 1.4, 0, 0.88, 0.4);
    private static readonly GridFineness OneStage = new(3, 0.01, 0.25, 0.002, 0.2, 0.22, 1.25, 0, 0.8, 0.3);
    private static readonly GridFineness Buffered = new(3, 0.015, 0.6, 0.012, 0.42, 0.6, 1.1, 0.3, 0.68, 0.6);

    /// <summary>The grid for an amplifier.</summary>
    public static GridFineness Of(Part amplifier) => amplifier switch
    {
        TransistorPart => Follower,
        AmplifierPart { Stages: > 1 } => Buffered,
        _ => OneStage,
    };
}
