using PartPick.Catalog;
using PartPick.Physics.Circuits;
using PartPick.Physics.Devices;
using PartPick.Selection.Files;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>The keys of a follower circuit in a file.</summary>
internal static class FollowerFields
{
    private const string Fits = "an object with beta, or with the id of a transistor";

    /// <summary>Reads the circuit.</summary>
    public static FollowerCircuit Read(FieldReader fields, CircuitCommon common, PartsCatalog? catalog, out Part? amplifier)
    {
        double? current = fields.Optional("emitterCurrent", Dimension.Current, positive: true);
        CheckBias(fields, current is not null);
        return new FollowerCircuit
        {
            Crystal = common.Crystal,
            C1Farads = common.C1Farads,
            C2Farads = common.C2Farads,
            Strays = common.Strays,
            SupplyVolts = common.SupplyVolts,
            TemperatureCelsius = common.TemperatureCelsius,
            BaseTopOhms = Resistor(fields, fields.Has("rb") ? "rb" : "rbTop"),
            BaseBottomOhms = Resistor(fields, "rbBottom"),
            EmitterOhms = Resistor(fields, "re"),
            LoadOhms = Resistor(fields, "rl"),
            EmitterCurrentAmps = current,
            Transistor = ReadTransistor(fields, catalog, out amplifier),
        };
    }

    private static double Resistor(FieldReader fields, string key) =>
        fields.Optional(key, Dimension.Resistance, positive: true) ?? double.PositiveInfinity;

    private static void CheckBias(FieldReader fields, bool currentGiven)
    {
        if (fields.Has("rb") && (fields.Has("rbTop") || fields.Has("rbBottom")))
        {
            fields.Reject("rb", "is given beside rbTop or rbBottom", "either rb, or rbTop and rbBottom");
        }

        if (!currentGiven && !fields.Has("rb") && !fields.Has("rbTop"))
        {
            fields.Reject("rb", "is missing", "a base resistor such as 220k, rbTop and rbBottom, or emitterCurrent");
        }

        if (!currentGiven && !fields.Has("re"))
        {
            fields.Reject("re", "is missing", "an emitter resistor such as 2k2, or emitterCurrent");
        }
    }

    private static Transistor ReadTransistor(FieldReader fields, PartsCatalog? catalog, out Part? amplifier)
    {
        amplifier = null;
        FieldReader? inner = fields.Object("amplifier", Fits);
        if (inner is null)
        {
            fields.Reject("amplifier", "is missing", Fits);
            return new Transistor { Beta = 1 };
        }

        if (!inner.Has(PartReference.Key))
        {
            return TransistorFields.Read(inner);
        }

        TransistorPart? part = PartReference.Find<TransistorPart>(inner, catalog, "a transistor of the catalogue");
        amplifier = part;
        return part is null ? new Transistor { Beta = 1 } : PartPhysics.Transistor(part);
    }
}
