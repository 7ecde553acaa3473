using PartPick.Catalog;
using PartPick.Physics.Circuits;
using PartPick.Physics.Devices;
using PartPick.Selection.Files;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>The keys of a gate, counter or port circuit in a file.</summary>
internal static class GateFields
{
    private const string Fits = "an object with gm, or with gain and ron, or with the id of a part";

    /// <summary>Reads the circuit.</summary>
    public static GateCircuit Read(FieldReader fields, CircuitCommon common, PartsCatalog? catalog, out Part? amplifier) => new()
    {
        Crystal = common.Crystal,
        C1Farads = common.C1Farads,
        C2Farads = common.C2Farads,
        Strays = common.Strays,
        SupplyVolts = common.SupplyVolts,
        TemperatureCelsius = common.TemperatureCelsius,
        SeriesOhms = fields.Optional("rs", Dimension.Resistance) ?? 0,
        FeedbackOhms = fields.Optional("rf", Dimension.Resistance, positive: true) ?? double.PositiveInfinity,
        Inverter = ReadInverter(fields, common, catalog, out amplifier),
    };

    private static Inverter ReadInverter(FieldReader fields, CircuitCommon common, PartsCatalog? catalog, out Part? amplifier)
    {
        amplifier = null;
        FieldReader? inner = fields.Object("amplifier", Fits);
        if (inner is null)
        {
            fields.Reject("amplifier", "is missing", Fits);
            return new OneStageInverter(1, 1);
        }

        AmplifierPart? part = common.Kind switch
        {
            CircuitKind.Counter => PartReference.Find<CounterPart>(inner, catalog, "a counter of the catalogue"),
            CircuitKind.Port => PartReference.Find<PortPart>(inner, catalog, "a port of the catalogue"),
            _ => PartReference.Find<InverterPart>(inner, catalog, "an inverter of the catalogue"),
        };
        if (part is null)
        {
            return inner.Has(PartReference.Key) ? new OneStageInverter(1, 1) : InverterFields.Read(inner, common.Kind);
        }

        amplifier = part;
        Result<Inverter> model = PartPhysics.Inverter(part, common.SupplyVolts);
        if (!model.IsOk)
        {
            fields.Reject("supply", model.Problem.What, model.Problem.Fits);
        }

        return model.ValueOr(new OneStageInverter(1, 1));
    }
}
