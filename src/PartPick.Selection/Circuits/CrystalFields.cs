using System.Text.Json.Nodes;
using PartPick.Physics;
using PartPick.Selection.Files;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>The keys of a crystal in a file.</summary>
internal static class CrystalFields
{
    private static readonly string[] Keys =
        ["frequency", "load", "shunt", "motional", "resistance", "driveLevel", "tolerance", "stability", "ageing"];

    /// <summary>Reads plain values.</summary>
    public static (Crystal Crystal, CrystalRatings Ratings) Read(FieldReader fields)
    {
        fields.Allow("a crystal", Keys);
        var crystal = new Crystal
        {
            NominalHz = fields.Needed("frequency", Dimension.Frequency),
            LoadFarads = fields.Optional("load", Dimension.Capacitance, positive: true),
            ShuntFarads = fields.Optional("shunt", Dimension.Capacitance) ?? 0,
            MotionalFarads = fields.Needed("motional", Dimension.Capacitance),
            ResistanceOhms = fields.Needed("resistance", Dimension.Resistance),
        };
        var ratings = new CrystalRatings
        {
            DriveLevelWatts = fields.Optional("driveLevel", Dimension.Power, positive: true),
            ToleranceRatio = fields.Optional("tolerance", Dimension.Relative),
            StabilityRatio = fields.Optional("stability", Dimension.Relative),
            AgeingRatio = fields.Optional("ageing", Dimension.Relative),
        };
        return (crystal, ratings);
    }

    /// <summary>Writes plain SI values.</summary>
    public static JsonObject Write(Crystal crystal, CrystalRatings ratings) => new JsonObjectOf()
        .Add("frequency", crystal.NominalHz)
        .Add("load", crystal.LoadFarads)
        .Add("shunt", crystal.ShuntFarads)
        .Add("motional", crystal.MotionalFarads)
        .Add("resistance", crystal.ResistanceOhms)
        .Add("driveLevel", ratings.DriveLevelWatts)
        .Add("tolerance", ratings.ToleranceRatio)
        .Add("stability", ratings.StabilityRatio)
        .Add("ageing", ratings.AgeingRatio)
        .Done;
}
