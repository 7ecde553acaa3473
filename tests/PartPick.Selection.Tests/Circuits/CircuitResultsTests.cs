using System.Text.Json.Nodes;
using PartPick.Physics;

namespace PartPick.Selection.Tests.Circuits;

public class CircuitResultsTests
{
    private static readonly string[] Keys =
    [
        "frequency", "outputFrequency", "error", "negativeResistance", "startUpMargin", "gainMargin", "criticalTransconductance",
        "upperTransconductance", "growthRate", "start", "runningMargin", "startUpTime", "motionalCurrent", "driveLevel",
        "outputSwing", "loadCapacitance", "limitedBySupply", "warnings",
    ];

    [Fact]
    public void Keys_are_those_of_the_contract_and_no_others() =>
        Assert.Equal(Keys, Json(CircuitTexts.Read(CircuitTexts.Gate)).Select(pair => pair.Key));

    [Fact]
    public void Error_is_in_ppm_against_the_target_through_the_divider()
    {
        CircuitDescription read = CircuitTexts.Read(
            CircuitTexts.GateWith("\"tap\": 0, \"target\": \"4 MHz\"", "\"tap\": 12, \"target\": 1000"));

        JsonObject json = Json(read);

        double frequency = (double)json["frequency"]!;
        Assert.Equal(frequency / 4096, (double)json["outputFrequency"]!, 1e-9);
        Assert.Equal((frequency / 4.096e6 - 1) * 1e6, (double)json["error"]!, 1e-6);
    }

    [Fact]
    public void Error_without_a_target_is_against_the_nominal_frequency()
    {
        JsonObject json = Json(CircuitTexts.Read(CircuitTexts.GateWith(", \"target\": \"4 MHz\"", "")));

        Assert.Equal(((double)json["frequency"]! / 4e6 - 1) * 1e6, (double)json["error"]!, 1e-6);
    }

    [Fact]
    public void Circuit_without_steady_state_has_nulls_where_the_steady_state_would_be()
    {
        JsonObject json = Json(CircuitTexts.Read(CircuitTexts.GateWith("\"10 mS\"", "\"1 uS\"")));

        Assert.Equal("none", (string)json["start"]!);
        string[] nulls = ["frequency", "outputFrequency", "error", "startUpTime", "motionalCurrent", "driveLevel", "outputSwing",
            "loadCapacitance", "limitedBySupply"];
        Assert.Equal(nulls, json.Where(pair => pair.Value is null).Select(pair => pair.Key));
    }

    [Fact]
    public void Written_circuit_answers_with_the_same_results()
    {
        CircuitDescription read = CircuitTexts.Read(CircuitTexts.Gate);
        CircuitDescription again = CircuitTexts.Read(CircuitFile.Write(read).ToJsonString());

        Assert.Equal(Json(read).ToJsonString(), Json(again).ToJsonString());
    }

    private static JsonObject Json(CircuitDescription description) =>
        CircuitResults.ToJson(description, OscillatorAnalysis.Analyse(description.Circuit), ["one"]);
}
