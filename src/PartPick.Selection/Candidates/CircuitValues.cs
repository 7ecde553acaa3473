namespace PartPick.Selection;

/// <summary>The nominal values of what a ranking varies in a circuit, SI.</summary>
/// <param name="C1Farads">C1.</param>
/// <param name="C2Farads">C2.</param>
/// <param name="SeriesOhms">Rs of a gate; zero for a direct connection.</param>
/// <param name="BaseTopOhms">Bias resistor to the supply of a follower.</param>
/// <param name="BaseBottomOhms">Bias resistor to ground of a follower; positive infinity where there is none.</param>
/// <param name="EmitterOhms">RE of a follower.</param>
public readonly record struct CircuitValues(
    double C1Farads,
    double C2Farads,
    double SeriesOhms = 0,
    double BaseTopOhms = double.PositiveInfinity,
    double BaseBottomOhms = double.PositiveInfinity,
    double EmitterOhms = double.PositiveInfinity)
{
    /// <summary>The values of a choice of parts.</summary>
    public static CircuitValues Of(CandidateParts choice)
    {
        ArgumentNullException.ThrowIfNull(choice);
        return new CircuitValues(
            choice.C1.ValueFarads,
            choice.C2.ValueFarads,
            choice.Series?.ValueOhms ?? 0,
            choice.BaseTop?.ValueOhms ?? double.PositiveInfinity,
            choice.BaseBottom?.ValueOhms ?? double.PositiveInfinity,
            choice.Emitter?.ValueOhms ?? double.PositiveInfinity);
    }
}
