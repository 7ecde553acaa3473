using System.Text.Json.Nodes;
using PartPick.Physics.Circuits;
using PartPick.Selection.Files;

namespace PartPick.Selection;

/// <summary>Writes a circuit as a complete file of plain SI values.</summary>
internal static class CircuitWriter
{
    public static JsonObject Write(CircuitDescription description)
    {
        OscillatorCircuit circuit = description.Circuit;
        JsonObjectOf file = new JsonObjectOf()
            .Add("circuit", JsonValue.Create(description.Kind.Word()))
            .Add("crystal", CrystalFields.Write(circuit.Crystal, description.Ratings))
            .Add("amplifier", circuit switch
            {
                GateCircuit gate => InverterFields.Write(gate.Inverter),
                FollowerCircuit follower => TransistorFields.Write(follower.Transistor),
                _ => throw new ArgumentException("Unknown kind of circuit.", nameof(description)),
            })
            .Add("c1", circuit.C1Farads)
            .Add("c2", circuit.C2Farads);
        _ = circuit switch
        {
            GateCircuit gate => file.Add("rs", gate.SeriesOhms).Add("rf", gate.FeedbackOhms),
            FollowerCircuit follower => AddBias(file, follower),
            _ => file,
        };
        return file.Add("strays", StrayFields.Write(circuit.Strays))
            .Add("supply", circuit.SupplyVolts)
            .Add("temperature", circuit.TemperatureCelsius)
            .Add("tap", JsonValue.Create(description.Tap))
            .Add("target", description.TargetHz)
            .Done;
    }

    private static JsonObjectOf AddBias(JsonObjectOf file, FollowerCircuit follower) => file
        .Add("rbTop", follower.BaseTopOhms)
        .Add("rbBottom", follower.BaseBottomOhms)
        .Add("re", follower.EmitterOhms)
        .Add("rl", follower.LoadOhms)
        .Add("emitterCurrent", follower.EmitterCurrentAmps);
}
