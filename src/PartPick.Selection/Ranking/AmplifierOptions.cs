using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Physics.Bias;
using PartPick.Physics.Circuits;

namespace PartPick.Selection.Search;

/// <summary>The resistors that a search tries round an amplifier.</summary>
internal sealed class AmplifierOptions
{
    // The emitter stands between these shares of the supply, so that it can swing, with a current that a small transistor bears.
    private const double LowestEmitterShare = 0.2;
    private const double HighestEmitterShare = 0.7;
    private const double SmallestEmitterAmps = 100e-6;
    private const double LargestEmitterAmps = 5e-3;
    private readonly Requirement _requirement;
    private readonly ImmutableArray<ResistorPart> _bias;

    public AmplifierOptions(Requirement requirement, Market market)
    {
        _requirement = requirement;
        Series = [new AmplifierOption(null), .. ByValue(market, requirement.ResistorSeries).Select(part => new AmplifierOption(part))];
        _bias = ByValue(market, requirement.BiasSeries);
    }

    /// <summary>A direct connection and every damping resistor, by value.</summary>
    public ImmutableArray<AmplifierOption> Series { get; }

    /// <summary>
    /// Bias networks of a follower: one base resistor, or a divider of two equal ones, with an emitter resistor; those that put
    /// the typical transistor's emitter between 0.2 and 0.7 of the supply at 0.1 to 5 mA. A divider that takes more
    /// current than the emitter wastes supply and shunts the crystal (common practice).
    /// </summary>
    public ImmutableArray<AmplifierOption> BiasFor(TransistorPart transistor)
    {
        double most = Math.Min(LargestEmitterAmps, transistor.CurrentMaxAmperes ?? LargestEmitterAmps);
        return
        [
            .. from emitter in _bias
               from top in _bias
               from bottom in new[] { null, top }
               let amps = EmitterAmps(transistor, emitter, top, bottom)
               let share = amps * emitter.ValueOhms / _requirement.NominalSupplyVolts
               where amps >= SmallestEmitterAmps && amps <= most && share >= LowestEmitterShare && share <= HighestEmitterShare
               where bottom is null || _requirement.NominalSupplyVolts / (top.ValueOhms + bottom.ValueOhms) <= amps
               select new AmplifierOption(null, top, bottom, emitter),
        ];
    }

    private double EmitterAmps(TransistorPart transistor, ResistorPart emitter, ResistorPart top, ResistorPart? bottom) =>
        FollowerBias.Solve(new FollowerCircuit
        {
            // The crystal and the capacitors carry no direct current.
            Crystal = new Physics.Crystal { NominalHz = 1e6, MotionalFarads = 1e-14, ResistanceOhms = 100 },
            C1Farads = 0,
            C2Farads = 0,
            SupplyVolts = _requirement.NominalSupplyVolts,
            Transistor = TransistorModel.At(transistor, DeviceStrength.Typical),
            BaseTopOhms = top.ValueOhms,
            BaseBottomOhms = bottom?.ValueOhms ?? double.PositiveInfinity,
            EmitterOhms = emitter.ValueOhms,
        }).EmitterAmps;

    /// <summary>
    /// The resistors of a series, one a value: a resistor's tolerance does not enter the model, so of one value the cheapest is taken.
    /// </summary>
    internal static ImmutableArray<ResistorPart> ByValue(Market market, string series)
    {
        SeriesMembership membership = new(series);
        return
        [
            .. market.Resistors
                .Where(part => membership.Contains(part.ValueOhms))
                .GroupBy(part => part.ValueOhms)
                .OrderBy(group => group.Key)
                .Select(group => group.OrderBy(part => market.UnitCost(part, 1)).ThenBy(part => part.Id, StringComparer.Ordinal).First()),
        ];
    }
}
