using System.Text.Json.Nodes;
using PartPick.Physics.Devices;
using PartPick.Selection.Files;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>The keys of a transistor in a file.</summary>
internal static class TransistorFields
{
    private static readonly string[] Keys = ["beta", "cje", "tf", "cmu", "rbb", "vbe"];

    /// <summary>Reads plain values.</summary>
    public static Transistor Read(FieldReader fields)
    {
        fields.Allow("a transistor", Keys);
        var bare = new Transistor { Beta = fields.Needed("beta", Dimension.Number) };
        return bare with
        {
            JunctionFarads = fields.Optional("cje", Dimension.Capacitance) ?? 0,
            TransitSeconds = fields.Optional("tf", Dimension.Time) ?? 0,
            CollectorFarads = fields.Optional("cmu", Dimension.Capacitance) ?? 0,
            BaseSpreadingOhms = fields.Optional("rbb", Dimension.Resistance) ?? 0,
            BaseEmitterVolts = fields.Optional("vbe", Dimension.Voltage, positive: true) ?? bare.BaseEmitterVolts,
        };
    }

    /// <summary>Writes plain SI values.</summary>
    public static JsonObject Write(Transistor transistor) => new JsonObjectOf()
        .Add("beta", transistor.Beta)
        .Add("cje", transistor.JunctionFarads)
        .Add("tf", transistor.TransitSeconds)
        .Add("cmu", transistor.CollectorFarads)
        .Add("rbb", transistor.BaseSpreadingOhms)
        .Add("vbe", transistor.BaseEmitterVolts)
        .Done;
}
