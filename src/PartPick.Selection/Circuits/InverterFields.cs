using System.Text.Json.Nodes;
using PartPick.Physics.Devices;
using PartPick.Selection.Files;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>The keys of an inverter in a file: one stage (gm, ro, vt), or buffered (gain, ron).</summary>
internal static class InverterFields
{
    private static readonly string[] Pins = ["cin", "cout", "cf", "delay"];
    private static readonly string[] OneStage = ["gm", "ro", "vt", .. Pins];
    private static readonly string[] Buffered = ["gain", "ron", .. Pins];

    /// <summary>Reads plain values.</summary>
    public static Inverter Read(FieldReader fields, CircuitKind kind)
    {
        bool buffered = fields.Has("gain") || fields.Has("ron");
        if (buffered && fields.Has("gm"))
        {
            fields.Reject("gm", "is given beside gain or ron", "either gm (one stage), or gain and ron (buffered)");
        }
        else if (!buffered && !fields.Has("gm"))
        {
            fields.Allow("an inverter", [.. OneStage, .. Buffered, .. Swing(kind)]);
            fields.Reject("gm", "is missing", "gm such as 10 mS (one stage), or gain and ron (buffered)");
        }
        else
        {
            fields.Allow(
                buffered ? "a buffered inverter" : "an inverter of one stage",
                buffered ? Buffered : [.. OneStage, .. Swing(kind)]);
        }

        Inverter bare = buffered
            ? new BufferedInverter(fields.Needed("gain", Dimension.Number), fields.Needed("ron", Dimension.Resistance))
            : ReadOneStage(fields);
        return bare with
        {
            InputFarads = fields.Optional("cin", Dimension.Capacitance) ?? 0,
            OutputFarads = fields.Optional("cout", Dimension.Capacitance) ?? 0,
            FeedbackFarads = fields.Optional("cf", Dimension.Capacitance) ?? 0,
            DelaySeconds = fields.Optional("delay", Dimension.Time) ?? 0,
        };
    }

    /// <summary>Writes plain SI values.</summary>
    public static JsonObject Write(Inverter inverter)
    {
        JsonObjectOf made = inverter switch
        {
            OneStageInverter one => new JsonObjectOf().Add("gm", one.Gm).Add("ro", one.Ro).Add("vt", one.ThresholdVolts)
                .Add("swing", one.SwingVolts),
            BufferedInverter buffered => new JsonObjectOf().Add("gain", buffered.Gain).Add("ron", buffered.Ron),
            _ => throw new ArgumentException("Unknown kind of inverter.", nameof(inverter)),
        };
        return made.Add("cin", inverter.InputFarads)
            .Add("cout", inverter.OutputFarads)
            .Add("cf", inverter.FeedbackFarads)
            .Add("delay", inverter.DelaySeconds)
            .Done;
    }

    private static OneStageInverter ReadOneStage(FieldReader fields)
    {
        var typical = new OneStageInverter(
            fields.Optional("gm", Dimension.Transconductance, positive: true) ?? 1,
            fields.Optional("ro", Dimension.Resistance, positive: true) ?? double.PositiveInfinity);
        return typical with
        {
            ThresholdVolts = fields.Optional("vt", Dimension.Voltage) ?? typical.ThresholdVolts,
            SwingVolts = fields.Optional("swing", Dimension.Voltage, positive: true),
        };
    }

    private static string[] Swing(CircuitKind kind) => kind == CircuitKind.Port ? ["swing"] : [];
}
