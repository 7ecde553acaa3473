using CsCheck;
using PartPick.Physics.Circuits;
using PartPick.Values;

namespace PartPick.Selection.Tests.Requirements;

public class RequirementFileTests
{
    private const string Logger = """
        {
          "name": "river logger time base", "output": "1 kHz", "waveform": "square", "budget": "80 ppm",
          "supply": ["4.5 V", "5.5 V"], "temperature": [-10, 50], "years": 5,
          "margin": 5, "allowDisturbance": false, "startUpTime": "50 ms", "builds": 200, "costLimit": 2.50,
          "board": "two-layer", "capacitorSeries": "E12", "circuits": ["gate", "counter", "follower", "port"],
          "weights": { "error": 1, "margin": 1, "cost": 1 }
        }
        """;

    [Fact]
    public void Every_key_of_the_file_is_read()
    {
        Requirement read = Read(Logger);

        Assert.Equal(
            ("river logger time base", 1000.0, Waveform.Square, 80e-6), (read.Name, read.OutputHz, read.Waveform, read.BudgetRatio));
        Assert.Equal((4.5, 5.5, -10.0, 50.0),
            (read.SupplyMinVolts, read.SupplyMaxVolts, read.TemperatureMinCelsius, read.TemperatureMaxCelsius));
        Assert.Equal((5.0, 5.0, false, 50e-3, 200, 2.50m),
            (read.Years, read.Margin, read.AllowDisturbance, read.StartUpTimeSeconds!.Value, read.Builds, read.CostLimit!.Value));
        Assert.Equal((Board.TwoLayer, "E12", new Weights(1, 1, 1)), (read.Board, read.CapacitorSeries, read.Weights));
        Assert.Equal([CircuitKind.Gate, CircuitKind.Counter, CircuitKind.Follower, CircuitKind.Port], read.Circuits);
    }

    [Fact]
    public void Output_alone_is_enough() =>
        Same(new Requirement { OutputHz = 32768 }, Read("""{ "output": 32768 }"""));

    [Fact]
    public void Option_counts_instead_of_the_file()
    {
        Requirement read = Read(Logger, ("output", "2 kHz"), ("supply", "3 V..3.6 V"), ("temperature", "-20..60"),
            ("allowDisturbance", null), ("circuits", "gate counter"), ("weights", "2 1 0.5"), ("board", "breadboard"));

        Assert.Equal((2000.0, 3.0, 3.6, -20.0, 60.0, true), (read.OutputHz, read.SupplyMinVolts, read.SupplyMaxVolts,
            read.TemperatureMinCelsius, read.TemperatureMaxCelsius, read.AllowDisturbance));
        Assert.Equal([CircuitKind.Gate, CircuitKind.Counter], read.Circuits);
        Assert.Equal((new Weights(2, 1, 0.5), Board.Breadboard, 80e-6), (read.Weights, read.Board, read.BudgetRatio));
    }

    [Fact]
    public void Options_alone_make_a_requirement() => Assert.Equal(1000, Read(null, ("output", "1 kHz")).OutputHz);

    [Fact]
    public void Own_board_is_an_object_of_strays() =>
        Assert.Equal(new Strays(2e-12, 4e-12, 0),
            Read("""{ "output": 1000, "board": { "input": "2 pF", "output": "4 pF", "uncertainty": "20 %" } }""").Board.Strays);

    [Theory]
    [InlineData("""{ }""", "r.json: output: is missing")]
    [InlineData("""{ "output": 0 }""", "r.json: output: is zero")]
    [InlineData("""{ "output": "1 kF" }""", "r.json: output: '1 kF'")]
    [InlineData("""{ "output": 1, "ouput": 2 }""", "r.json: ouput: is no key of a requirement; fits 'output'")]
    [InlineData("""{ "output": 1, "supply": [5, 3] }""", "r.json: supply: runs from 5 V down to 3 V")]
    [InlineData("""{ "output": 1, "supply": [5, 3, 1] }""", "r.json: supply: has 3 values")]
    [InlineData("""{ "output": 1, "supply": 0 }""", "r.json: supply: is zero")]
    [InlineData("""{ "output": 1, "temperature": [50, -10] }""", "r.json: temperature: runs from 50 °C down to -10 °C")]
    [InlineData("""{ "output": 1, "budget": 80 }""", "r.json: budget: ")]
    [InlineData("""{ "output": 1, "builds": 0 }""", "r.json: builds: is zero")]
    [InlineData("""{ "output": 1, "builds": 1.5 }""", "r.json: builds: '1.5' is not a whole number")]
    [InlineData("""{ "output": 1, "capacitorSeries": "E7" }""", "r.json: capacitorSeries: 'E7' is no series")]
    [InlineData("""{ "output": 1, "circuits": [] }""", "r.json: circuits: names none")]
    [InlineData("""{ "output": 1, "circuits": ["gates"] }""", "r.json: circuits: 'gates' is unknown; fits 'gate'")]
    [InlineData("""{ "output": 1, "waveform": "triangle" }""", "r.json: waveform: 'triangle' is unknown")]
    [InlineData("""{ "output": 1, "allowDisturbance": "maybe" }""", "r.json: allowDisturbance: is the text 'maybe'")]
    [InlineData("""{ "output": 1, "board": "six-layer" }""", "r.json: board: 'six-layer' is unknown")]
    [InlineData("""{ "output": 1, "board": { "uncertainty": 1 } }""", "r.json: board.uncertainty: ")]
    [InlineData("""{ "output": 1, "weights": { "error": 0, "margin": 0, "cost": 0 } }""", "r.json: weights: are all zero")]
    [InlineData("""{ "output": 1, "weights": [1, 2] }""", "r.json: weights: has 2 values")]
    [InlineData("""{ "output": 1, "weights": { "error": -1 } }""", "r.json: weights.error: '-1' is negative")]
    public void Wrong_requirement_gives_one_line(string json, string expected)
    {
        Result<Requirement> read = RequirementFile.Read(json, "r.json");

        Assert.StartsWith(expected, read.Problem!.ToString(), StringComparison.Ordinal);
    }

    [Fact]
    public void Wrong_option_is_named_as_an_option() => Assert.StartsWith(
        "--builds: 'many'",
        RequirementFile.Read(Logger, "r.json", [new RequirementOption(RequirementKeys.Of("builds"), "many")]).Problem!.ToString(),
        StringComparison.Ordinal);

    [Fact]
    public void Written_requirement_holds_every_key() =>
        Assert.Equal(RequirementKeys.Names, RequirementFile.Write(Read("""{ "output": 1 }""")).Select(pair => pair.Key));

    [Fact]
    public void Reading_what_was_written_gives_the_same_requirement() =>
        (from output in Gen.Double[0.1, 1e8]
         from budget in Gen.Double[1e-8, 0.01]
         from low in Gen.Double[1, 5]
         from span in Gen.Double[0, 10]
         from coldest in Gen.Double[-60, 60]
         from wave in Gen.Enum<Waveform>()
         from start in Gen.Double[1e-4, 10].Nullable()
         from cents in Gen.Int[1, 100000].Nullable()
         from builds in Gen.Int[1, 1000000]
         from strays in Gen.Double[0, 1e-11].Array[4]
         from preset in Gen.Int[0, 3]
         from circuit in Gen.Enum<CircuitKind>()
         from weight in Gen.Double[0, 10]
         select new Requirement
         {
             Name = "a \"name\"",
             OutputHz = output,
             BudgetRatio = budget,
             SupplyMinVolts = low,
             SupplyMaxVolts = low + span,
             TemperatureMinCelsius = coldest,
             TemperatureMaxCelsius = coldest + span,
             Waveform = wave,
             StartUpTimeSeconds = start,
             CostLimit = cents / 100m,
             Builds = builds,
             Board = preset < 3 ? Board.Presets[preset] : new Board("own", new Strays(strays[0], strays[1], strays[2]), strays[3]),
             Circuits = [circuit],
             Weights = new Weights(weight, 1, 0),
             AllowDisturbance = preset == 0,
         }).Sample(
            requirement => Same(requirement, Read(RequirementFile.Write(requirement).ToJsonString())), iter: 1000);

    private static Requirement Read(string? json, params (string Key, string? Text)[] options)
    {
        Result<Requirement> read = RequirementFile.Read(json, "r.json",
            [.. options.Select(option => new RequirementOption(RequirementKeys.Of(option.Key), option.Text))]);
        Assert.True(read.IsOk, read.ToString());
        return read.Value;
    }

    // The list of circuits compares by reference: take it out and compare it by itself.
    private static void Same(Requirement expected, Requirement actual)
    {
        Assert.Equal(expected.Circuits, actual.Circuits);
        Assert.Equal(expected, actual with { Circuits = expected.Circuits });
    }
}
