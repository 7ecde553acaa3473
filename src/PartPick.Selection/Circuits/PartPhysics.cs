using PartPick.Catalog;
using PartPick.Physics;
using PartPick.Physics.Devices;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>Parts that a circuit file names, as typical devices of the model.</summary>
internal static class PartPhysics
{
    public static Crystal Crystal(CrystalPart part) => CrystalModel.From(part).Crystal;

    public static CrystalRatings Ratings(CrystalPart part) => new()
    {
        DriveLevelWatts = part.DriveLevelWatts,
        ToleranceRatio = part.ToleranceRatio,
        StabilityRatio = part.StabilityRatio,
        AgeingRatio = part.AgeingRatio,
    };

    public static Result<Inverter> Inverter(AmplifierPart part, double supplyVolts) =>
        InverterModel.At(part, supplyVolts, DeviceStrength.Typical) is { } inverter
            ? Result.Ok(inverter)
            : Result.Fail<Inverter>(
                "supply",
                $"{Say.Volts(supplyVolts)} is outside what {part.Id} is specified for",
                $"{Say.Volts(part.Points[0].SupplyVolts)} to {Say.Volts(part.Points[^1].SupplyVolts)}");

    public static Transistor Transistor(TransistorPart part) => TransistorModel.At(part, DeviceStrength.Typical);
}
