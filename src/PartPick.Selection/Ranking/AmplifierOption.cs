using PartPick.Catalog;

namespace PartPick.Selection.Search;

/// <summary>A choice of the resistors round the amplifier: Rs of a gate, or the bias network of a follower.</summary>
/// <param name="Series">Rs; null for a direct connection or in a follower.</param>
/// <param name="BaseTop">Follower: supply to base.</param>
/// <param name="BaseBottom">Follower: base to ground; null with one base resistor.</param>
/// <param name="Emitter">Follower: RE.</param>
internal sealed record AmplifierOption(
    ResistorPart? Series, ResistorPart? BaseTop = null, ResistorPart? BaseBottom = null, ResistorPart? Emitter = null)
{
    /// <summary>The values of a circuit with this option and two load capacitances in farads.</summary>
    public CircuitValues With(double c1Farads, double c2Farads) => new(
        c1Farads,
        c2Farads,
        Series?.ValueOhms ?? 0,
        BaseTop?.ValueOhms ?? double.PositiveInfinity,
        BaseBottom?.ValueOhms ?? double.PositiveInfinity,
        Emitter?.ValueOhms ?? double.PositiveInfinity);
}
