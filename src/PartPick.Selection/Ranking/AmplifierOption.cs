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

    /// <summary>What the option adds to the cost per unit of a circuit; equal parts are bought together.</summary>
    /// <param name="feedback">The feedback resistor that the circuit has besides.</param>
    /// <param name="market">What is on offer.</param>
    public decimal Cost(ResistorPart? feedback, Market market)
    {
        if (Series is { } series)
        {
            return ReferenceEquals(series, feedback)
                ? market.UnitCost(series, 2) - market.UnitCost(series, 1)
                : market.UnitCost(series, 1);
        }

        if (BaseTop is not { } top || Emitter is not { } emitter)
        {
            return 0;
        }

        int tops = BaseBottom is null ? 1 : 2;
        return ReferenceEquals(top, emitter)
            ? market.UnitCost(top, tops + 1)
            : market.UnitCost(top, tops) + market.UnitCost(emitter, 1);
    }
}
