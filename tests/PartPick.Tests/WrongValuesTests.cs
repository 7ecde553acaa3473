namespace PartPick.Tests;

/// <summary>Wrong values in a requirement, through the program's own entry: one line with the key, and status 2.</summary>
public class WrongValuesTests
{
    private const string Requirement = """
        { "output": "1 kHz", "budget": "80 ppm", "supply": ["4.5 V", "5.5 V"], "temperature": [-10, 50], "years": 5, "margin": 5,
          "startUpTime": "50 ms", "builds": 200, "costLimit": 2.50, "board": "two-layer", "capacitorSeries": "E12",
          "circuits": ["counter"], "weights": { "error": 1, "margin": 1, "cost": 1 } }
        """;

    public static TheoryData<string, string, string> Wrong => new()
    {
        // The key, its wrong value, and what the one line has to hold.
        { "output", "0", "output: is zero" },
        { "output", "-1000", "output: '-1000' is negative" },
        { "output", "\"1 kohm\"", "output: '1 kohm'" },
        { "output", "1e300", "output: '1e300' is beyond" },
        { "output", "1e999", "output: " },
        { "output", "null", "output: is missing" },
        { "output", "\"NaN\"", "output: " },
        { "budget", "80", "budget: " },
        { "budget", "\"80 MHz\"", "budget: '80 MHz'" },
        { "supply", "[\"5.5 V\", \"4.5 V\"]", "supply: runs from 5.5 V down to 4.5 V" },
        { "supply", "[]", "supply: has 0 values" },
        { "supply", "[1, 2, 3]", "supply: has 3 values" },
        { "supply", "[0, 5]", "supply: is zero" },
        { "supply", "[-5, 5]", "supply: '-5' is negative" },
        { "supply", "[null, 5]", "supply: is nothing" },
        { "supply", "{ \"from\": 1 }", "supply: is an object" },
        { "temperature", "[50, -10]", "temperature: runs from 50 °C down to -10 °C" },
        { "temperature", "[-400, 50]", "temperature: '-400' is below absolute zero" },
        { "temperature", "[0, 1000]", "temperature: '1000' is beyond" },
        { "years", "-1", "years: '-1' is negative" },
        { "years", "1000", "years: is beyond" },
        { "margin", "0", "margin: is zero" },
        { "startUpTime", "\"50 mV\"", "startUpTime: '50 mV'" },
        { "builds", "1.5", "builds: '1.5' is not a whole number" },
        { "builds", "3000000000", "builds: " },
        { "costLimit", "1e12", "costLimit: is beyond any price" },
        { "board", "\"ten-layer\"", "board: " },
        { "board", "{ \"input\": -1 }", "board.input: '-1' is negative" },
        { "board", "{ \"uncertainty\": 2 }", "board.uncertainty: " },
        { "capacitorSeries", "\"E7\"", "capacitorSeries: 'E7' is no series" },
        { "capacitorSeries", "12", "capacitorSeries: is the number '12'" },
        { "circuits", "[]", "circuits: names none" },
        { "circuits", "[\"contr\"]", "circuits: 'contr' is unknown" },
        { "circuits", "[5]", "circuits: holds the number '5'" },
        { "weights", "[0, 0, 0]", "weights: are all zero" },
        { "weights", "{ \"errors\": 1 }", "weights.errors: is no key" },
    };

    [Theory]
    [MemberData(nameof(Wrong))]
    public void Wrong_value_is_one_line_with_its_key(string key, string value, string expected)
    {
        string line = Run.Of("rank", Run.File(Replaced(key, value), "need.json")).WrongLine();

        Assert.StartsWith("need.json: " + expected, line, StringComparison.Ordinal);
        Assert.Contains("; fits ", line, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("--board", "{")]
    [InlineData("--board", "{}{}")]
    [InlineData("--weights", "1 2")]
    [InlineData("--supply", "4.5..")]
    [InlineData("--temperature", "50..-10")]
    [InlineData("--years", "five")]
    public void Wrong_option_is_one_line_with_its_name(string option, string value)
    {
        string line = Run.Of("rank", "--output", "1 kHz", $"{option}={value}").WrongLine();

        Assert.StartsWith(option + ": ", line, StringComparison.Ordinal);
        Assert.Contains("; fits ", line, StringComparison.Ordinal);
    }

    private static string Replaced(string key, string value)
    {
        var json = System.Text.Json.Nodes.JsonNode.Parse(Requirement)!.AsObject();
        IEnumerable<string> fields = json.Select(field => $"\"{field.Key}\": {(field.Key == key ? value : field.Value!.ToJsonString())}");
        Assert.True(json.ContainsKey(key));
        return "{ " + string.Join(", ", fields) + " }";
    }
}
