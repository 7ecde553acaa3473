using System.Text.Json;

namespace PartPick.Tests;

public class RankCommandTests
{
    // A small space: the counters of the built-in parts with capacitors and resistors of E3.
    private static readonly string[] Small =
        ["rank", "--output", "1 kHz", "--circuits", "counter", "--capacitorSeries", "E3", "--resistor-series", "E3", "--top", "2"];

    private static readonly string[] CandidateKeys =
    [
        "id", "circuit", "crystal", "amplifier", "tap", "parts", "errorWorst", "errorRss", "startUpMargin", "startUpMarginNominal",
        "cost", "currency", "score", "onFront", "budget", "frequency", "outputFrequency", "error", "negativeResistance", "gainMargin",
        "criticalTransconductance", "upperTransconductance", "growthRate", "start", "runningMargin", "startUpTime", "motionalCurrent",
        "driveLevel", "outputSwing", "loadCapacitance", "limitedBySupply", "warnings", "circuitFile",
    ];

    [Fact]
    public void Json_holds_the_complete_requirement_and_candidates_that_check_answers_alike()
    {
        Run run = Run.Of([.. Small, "--format", "json"]);

        Assert.Equal((0, ""), (run.Status, run.Error));
        string[] keys = ["requirement", "combinations", "fit", "candidates", "front", "rejections", "elapsed"];
        Assert.Equal(keys, run.Json.EnumerateObject().Select(property => property.Name));
        Assert.Equal("two-layer", run.Json.GetProperty("requirement").GetProperty("board").GetString());
        JsonElement first = run.Json.GetProperty("candidates")[0];
        Assert.Equal(CandidateKeys, first.EnumerateObject().Select(property => property.Name));
        JsonElement[] candidates = [.. run.Json.GetProperty("candidates").EnumerateArray()];
        Assert.Equal(2, candidates.Length);
        Assert.All(candidates, candidate =>
        {
            string circuit = candidate.GetProperty("circuitFile").GetRawText();
            JsonElement check = Run.WithInput(circuit, "check", "-", "--format", "json").Json;
            string[] figures = [.. CheckCommandTests.Keys.Except(["startUpMargin", "warnings"])];
            Assert.All(figures, key => Assert.Equal(check.GetProperty(key).GetRawText(), candidate.GetProperty(key).GetRawText()));
            Assert.Equal(check.GetProperty("startUpMargin").GetRawText(), candidate.GetProperty("startUpMarginNominal").GetRawText());
        });
        Assert.Contains(first.GetProperty("budget").EnumerateArray(), term => term.GetProperty("term").GetString() == "crystal tolerance");
    }

    [Fact]
    public void Table_names_the_requirement_the_units_and_the_front()
    {
        Run run = Run.Of(Small);

        Assert.StartsWith("1 kHz within 100 ppm from 4.5 to 5.5 V", run.Output, StringComparison.Ordinal);
        Assert.Matches(@"error \(ppm\) +RSS \(ppm\) +margin +start-up \(ms\) +drive \(uW\) +cost \(EUR\)", run.Output);
        Assert.Matches(@"\n1  \*  counter ", run.Output);
        Assert.Contains("needs a licence", run.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void Csv_has_a_row_for_each_candidate()
    {
        string[] lines = Run.Of([.. Small, "--format", "csv"]).Output.TrimEnd('\n').Split('\n');

        Assert.Equal(3, lines.Length);
        Assert.Contains("errorWorst (ppm)", lines[0], StringComparison.Ordinal);
    }

    [Fact]
    public void Nothing_that_fits_is_status_1_and_names_the_limit()
    {
        Run run = Run.Of([.. Small, "--budget", "1 ppm"]);

        Assert.Equal(1, run.Status);
        Assert.Contains("Nothing fits. The limit that removed most is the ", run.Output, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("--output: is missing", "rank")]
    [InlineData("--supply: runs from 5.5 V down to 4.5 V", "rank", "--output", "1 kHz", "--supply", "5.5", "4.5")]
    [InlineData("--budget: ", "rank", "--output", "1 kHz", "--budget", "80 MHz")]
    [InlineData("--circuits: 'gates' is unknown; fits 'gate'", "rank", "--output", "1 kHz", "--circuits", "gates")]
    [InlineData("--top: 'few'", "rank", "--output", "1 kHz", "--top", "few")]
    public void Wrong_options_are_one_line(string expected, params string[] arguments) =>
        Assert.StartsWith(expected, Run.Of(arguments).WrongLine(), StringComparison.Ordinal);

    [Fact]
    public void File_after_an_option_of_several_values_is_still_the_file()
    {
        string path = Run.File("""{ "output": "1 kHz", "builds": 0 }""", "need.json");

        Assert.StartsWith("need.json: builds: is zero",
            Run.Of("rank", "--supply", "4.5", "5.5", "--temperature", "-10", "50", "--allowDisturbance", path).WrongLine(),
            StringComparison.Ordinal);
        Assert.StartsWith(
            "need.json: builds: is zero", Run.Of("rank", "--supply", "4.5 V..5.5 V", path).WrongLine(), StringComparison.Ordinal);
        Assert.StartsWith(
            "need.json: builds: is zero", Run.Of("rank", "--circuits", "gate", "counter", path).WrongLine(), StringComparison.Ordinal);
    }

    [Fact]
    public void Damaged_catalogue_is_status_3() =>
        Run.Of("rank", "--output", "1 kHz", "--catalog", Run.File("junk", "catalog.db")).WrongLine(status: 3);
}
