using PartPick.Catalog;
using PartPick.Physics;
using PartPick.Physics.Devices;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>Parts of the catalogue as the nominal devices of the model.</summary>
internal static class PartPhysics
{
    public static Crystal Crystal(CrystalPart part) => new()
    {
        NominalHz = part.FrequencyHz,
        LoadFarads = part.LoadFarads,
        ShuntFarads = part.ShuntFarads ?? 0,
        MotionalFarads = part.MotionalFarads ?? 1e-15,
        ResistanceOhms = part.ResistanceOhms ?? 50,
    };

    public static CrystalRatings Ratings(CrystalPart part) => new()
    {
        DriveLevelWatts = part.DriveLevelWatts,
        ToleranceRatio = part.ToleranceRatio,
        StabilityRatio = part.StabilityRatio,
        AgeingRatio = part.AgeingRatio,
    };

    public static Result<Inverter> Inverter(AmplifierPart part, double supplyVolts) =>
        Result.Fail<Inverter>("supply", $"{part.Id} has no model at {supplyVolts} V", "plain values");

    public static Transistor Transistor(TransistorPart part) => new() { Beta = part.Beta };
}
