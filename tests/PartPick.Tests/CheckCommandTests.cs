using System.Text.Json;

namespace PartPick.Tests;

public class CheckCommandTests
{
    internal const string Circuit = """
        {
          "circuit": "gate",
          "crystal": { "frequency": "4 MHz", "load": "18 pF", "shunt": "5 pF", "motional": "12 fF", "resistance": "100",
                       "driveLevel": "500 uW", "tolerance": "30 ppm", "stability": "50 ppm", "ageing": "3 ppm" },
          "amplifier": { "gm": "10 mS", "ro": "2k", "vt": "0.8 V", "cin": "3 pF", "cout": "5 pF", "cf": "0.5 pF" },
          "c1": "22 pF", "c2": "22 pF", "rs": "220", "rf": "1M",
          "strays": { "input": "3 pF", "output": "3 pF", "across": "1 pF" },
          "supply": "5 V", "temperature": 25, "tap": 0, "target": "4 MHz"
        }
        """;

    internal static readonly string[] Keys =
    [
        "frequency", "outputFrequency", "error", "negativeResistance", "startUpMargin", "gainMargin", "criticalTransconductance",
        "upperTransconductance", "growthRate", "start", "runningMargin", "startUpTime", "motionalCurrent", "driveLevel",
        "outputSwing", "loadCapacitance", "limitedBySupply", "warnings",
    ];

    [Fact]
    public void Json_stands_alone_on_standard_output_with_exactly_the_fixed_keys()
    {
        Run run = Run.Of("check", Run.File(Circuit), "--format", "json");

        Assert.Equal((0, ""), (run.Status, run.Error));
        Assert.Equal(Keys, run.Json.EnumerateObject().Select(property => property.Name));
        Assert.Equal("builds-up", run.Json.GetProperty("start").GetString());
    }

    [Fact]
    public void Hyphen_reads_standard_input_and_gives_the_same() =>
        Assert.Equal(
            Run.Of("check", Run.File(Circuit), "--format", "json").Output,
            Run.WithInput(Circuit, "check", "-", "--format", "json").Output);

    [Fact]
    public void Table_names_figures_units_and_warnings()
    {
        Run run = Run.Of("check", Run.File(Circuit));

        Assert.Equal(0, run.Status);
        Assert.Contains("it builds up from noise", run.Output, StringComparison.Ordinal);
        Assert.Matches(@"Drive level +\d+ µW \(rated 500 µW\)", run.Output);
        Assert.Contains("Warnings:\n- The crystal is stated at a load of 18 pF", run.Output, StringComparison.Ordinal);
        Assert.DoesNotContain('\u001b', run.Output);
    }

    [Fact]
    public void Csv_has_units_in_its_header_and_the_numbers_of_the_json()
    {
        string path = Run.File(Circuit);
        string[] lines = Run.Of("check", path, "--format", "csv").Output.Split('\n');
        JsonElement json = Run.Of("check", path, "--format", "json").Json;

        Assert.StartsWith("frequency (Hz),outputFrequency (Hz),error (ppm),", lines[0], StringComparison.Ordinal);
        Assert.StartsWith(json.GetProperty("frequency").GetRawText() + ",", lines[1], StringComparison.Ordinal);
    }

    [Fact]
    public void Working_names_formulas_numbers_and_sources()
    {
        Run run = Run.Of("check", Run.File(Circuit), "--working");

        Assert.Contains("= 4 MHz / sqrt(1 + 12 fF/(5 pF + 18 pF))", run.Output, StringComparison.Ordinal);
        Assert.Contains("Vittoz, Degrauwe, Bitz", run.Output, StringComparison.Ordinal);
        Assert.Contains("Shichman and Hodges 1968", run.Output, StringComparison.Ordinal);
        Assert.Contains("drive level P: Rm I^2", run.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void Working_of_a_follower_starts_from_its_bias()
    {
        const string follower = """
            { "circuit": "follower", "supply": 5, "c1": "100p", "c2": "100p", "rb": "220k", "re": "2k2",
              "crystal": { "frequency": 8e6, "load": "20p", "shunt": "4p", "motional": "15f", "resistance": 30 },
              "amplifier": { "beta": 200, "cje": "9 pF", "tf": "0.6 ns", "cmu": "3 pF", "rbb": 90 } }
            """;

        // SI exact constants: kT/q at 298.15 K is 25.692579 mV.
        Assert.Contains("= 25.6926 mV", Run.Of("check", Run.File(follower), "--working").Output, StringComparison.Ordinal);
    }

    [Fact]
    public void Circuit_that_does_not_start_is_status_1_with_its_figures()
    {
        Run run = Run.Of("check", Run.File(Circuit.Replace("10 mS", "1 uS", StringComparison.Ordinal)), "--format", "json");

        Assert.Equal(1, run.Status);
        Assert.Equal("none", run.Json.GetProperty("start").GetString());
        Assert.Equal(JsonValueKind.Null, run.Json.GetProperty("frequency").ValueKind);
    }

    [Fact]
    public void Part_of_the_catalogue_is_looked_up_there()
    {
        string json = Circuit.Replace("\"gate\"", "\"counter\"", StringComparison.Ordinal);
        int from = json.IndexOf("{ \"gm\"", StringComparison.Ordinal);
        json = json[..from] + "{ \"part\": \"CNT-14-HC\" }" + json[(json.IndexOf('}', from) + 1)..];

        Assert.Equal(0, Run.Of("check", Run.File(json)).Status);
        Assert.Equal(3, Run.Of("check", Run.File(json), "--catalog", Run.File("junk", "catalog.db")).Status);
    }

    public static TheoryData<string, string, string> Wrong => new()
    {
        { "\"load\"", "\"laod\"", "crystal.laod: is no key" },
        { "\"4 MHz\", \"load\"", "\"4 pF\", \"load\"", "crystal.frequency: " },
        { "\"motional\": \"12 fF\", ", "", "crystal.motional: is missing" },
        { "\"100\"", "-100", "crystal.resistance: '-100' is negative" },
        { "\"c1\": \"22 pF\"", "\"c1\": \"NaN\"", "c1: " },
        { "\"c1\": \"22 pF\"", "\"c1\": \"pF\"", "c1: " },
        { "\"c1\": \"22 pF\"", "\"c1\": {}", "c1.part: is missing" },
        { "\"gate\"", "\"gait\"", "circuit: 'gait' is unknown" },
        { "\"supply\": \"5 V\", ", "", "supply: is missing" },
        { "\"tap\": 0", "\"tap\": \"many\"", "tap: " },
        { "\"rf\": \"1M\",", "\"rf\": \"1M\"", "line 7, column 3: is not valid JSON" },
        { "\"temperature\": 25", "\"temperature\": 25, \"temperature\": 26", "temperature: is given twice" },
        { "\"strays\": {", "\"strays\": { \"part\": 1, ", "strays.part: is no key" },
    };

    [Theory]
    [MemberData(nameof(Wrong))]
    public void Wrong_file_is_one_line_and_status_2(string old, string replacement, string expected)
    {
        Assert.Contains(old, Circuit, StringComparison.Ordinal);

        string line = Run.Of("check", Run.File(Circuit.Replace(old, replacement, StringComparison.Ordinal), "bad.json")).WrongLine();

        Assert.StartsWith("bad.json", line, StringComparison.Ordinal);
        Assert.Contains(expected, line, StringComparison.Ordinal);
        Assert.Contains("; fits ", line, StringComparison.Ordinal);
    }

    [Fact]
    public void Missing_file_is_one_line() =>
        Assert.StartsWith("/no/such.json: is not there", Run.Of("check", "/no/such.json").WrongLine(), StringComparison.Ordinal);
}
