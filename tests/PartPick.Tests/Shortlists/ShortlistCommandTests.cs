using System.Text.Json;
using System.Text.Json.Nodes;

namespace PartPick.Tests.Shortlists;

public sealed class ShortlistCommandTests
{
    [Fact]
    public void A_ranked_candidate_comes_back_with_the_figures_that_the_ranking_gave()
    {
        var bench = new ShortlistBench();
        Assert.Equal(0, bench.WithInput(
            ShortlistBench.Ranking, "shortlist", "add", "logger", "-", "--candidate", "2", "--note", "second").Status);
        JsonElement candidate = bench.List().GetProperty("candidates")[0];
        JsonObject ranked = ShortlistBench.Candidate(2);
        JsonElement now = candidate.GetProperty("now");
        Assert.Equal(ranked["errorWorst"]!.GetValue<double>(), now.GetProperty("errorWorst").GetDouble(), 1e-9);
        Assert.Equal(ranked["startUpMargin"]!.GetValue<double>(), now.GetProperty("startUpMargin").GetDouble(), 1e-9);
        Assert.Equal(ranked["cost"]!.GetValue<decimal>(), now.GetProperty("cost").GetDecimal());
        Assert.Equal("second", candidate.GetProperty("note").GetString());
        Assert.Equal(200, candidate.GetProperty("builds").GetInt32());
        Assert.Equal("fits", candidate.GetProperty("state").GetString());
        Assert.Equal(
            ranked["parts"]!.AsArray().Select(part => part!["part"]!.GetValue<string>()),
            candidate.GetProperty("parts").EnumerateArray().Select(part => part.GetProperty("part").GetString()));

        // The circuit that the list gives is one for check, with the same nominal frequency as the ranking's.
        Run check = bench.WithInput(candidate.GetProperty("circuitFile").GetRawText(), "check", "-", "--format", "json");
        Assert.Equal(ranked["frequency"]!.GetValue<double>(), check.Json.GetProperty("frequency").GetDouble(), 1e-6);
    }

    [Fact]
    public void One_candidate_and_its_circuit_file_can_be_added_too()
    {
        var bench = new ShortlistBench();
        string requirement = Run.File(ShortlistBench.River);
        JsonObject candidate = ShortlistBench.Candidate(1);
        Run alone = bench.WithInput(candidate.ToJsonString(), "shortlist", "add", "a", "-", "--builds", "70");
        Assert.Equal(0, alone.Status);
        Assert.Contains("No requirement is given: 1 kHz", alone.Error, StringComparison.Ordinal);
        Run circuit = bench.WithInput(
            candidate["circuitFile"]!.ToJsonString(), "shortlist", "add", "a", "-", "--requirement", requirement);
        Assert.Equal(0, circuit.Status);
        Assert.Contains("is the cheapest of", circuit.Error, StringComparison.Ordinal);
        JsonElement list = bench.List("a").GetProperty("candidates");
        Assert.Equal(70, list[0].GetProperty("builds").GetInt32());
        Assert.Equal(candidate["crystal"]!.GetValue<string>(), list[1].GetProperty("crystal").GetString());
        Assert.Equal(candidate["amplifier"]!.GetValue<string>(), list[1].GetProperty("amplifier").GetString());
        foreach (string key in new[] { "c1", "c2", "rs" })
        {
            Assert.Equal(
                candidate["circuitFile"]![key]!.GetValue<double>(), list[1].GetProperty("circuitFile").GetProperty(key).GetDouble(), 1e-20);
        }
    }

    [Fact]
    public void A_follower_and_a_port_come_back_from_their_circuit_files()
    {
        var bench = new ShortlistBench();
        foreach ((string output, string circuit) in new[] { ("4 MHz", "follower"), ("32.768 kHz", "port") })
        {
            Run ranked = bench.Of("rank", "--output", output, "--circuits", circuit, "--budget", "200 ppm",
                "--format", "json", "--top", "1");
            Assert.Equal(0, ranked.Status);
            JsonObject candidate = JsonNode.Parse(ranked.Output)!["candidates"]![0]!.AsObject();
            Run added = bench.WithInput(candidate["circuitFile"]!.ToJsonString(), "shortlist", "add", circuit, "-");
            Assert.True(added.Status == 0, added.Error);
            JsonElement found = bench.List(circuit).GetProperty("candidates")[0];
            Assert.Equal(circuit, found.GetProperty("circuit").GetString());
            Assert.Equal(candidate["crystal"]!.GetValue<string>(), found.GetProperty("crystal").GetString());
            Assert.Equal(candidate["amplifier"]!.GetValue<string>(), found.GetProperty("amplifier").GetString());
            Assert.Equal(0, bench.WithInput(ranked.Output, "shortlist", "add", circuit, "-").Status);
            Assert.True(bench.List(circuit).GetProperty("candidates")[1].GetProperty("fit").GetBoolean());
        }
    }

    [Fact]
    public void Numbers_stay_when_a_candidate_is_taken_off_and_a_list_goes_with_all()
    {
        ShortlistBench bench = new ShortlistBench().With(3);
        Assert.Equal(0, bench.Of("shortlist", "remove", "logger", "2").Status);
        Assert.Equal([1, 3], bench.List().GetProperty("candidates").EnumerateArray().Select(each => each.GetProperty("number").GetInt32()));
        JsonElement lists = bench.Of("shortlist", "list", "--format", "json").Json;
        Assert.Equal(2, lists[0].GetProperty("candidates").GetInt32());
        Assert.Contains("one of 1, 3", bench.Of("shortlist", "remove", "logger", "2").WrongLine(), StringComparison.Ordinal);
        Assert.Equal(0, bench.Of("shortlist", "remove", "logger", "--all").Status);
        Assert.Contains("no list 'logger'", bench.Of("shortlist", "list", "logger").WrongLine(), StringComparison.Ordinal);
        Assert.Equal(0, bench.Of("shortlist", "list").Status);
    }

    [Fact]
    public void Wrong_input_is_one_line_each_and_changes_nothing()
    {
        ShortlistBench bench = new ShortlistBench().With(1);
        string before = bench.Of("shortlist", "list", "logger", "--format", "json").Output;
        JsonObject unknown = ShortlistBench.Candidate(1);
        unknown["parts"]![0]!["part"] = "no-such";
        JsonObject own = ShortlistBench.Candidate(1)["circuitFile"]!.DeepClone().AsObject();
        own["c1"] = 15.5e-12;
        (string Input, string Says, string[] Arguments)[] cases =
        [
            ("", "is not valid JSON", ["logger", "-"]),
            ("[]", "holds a list", ["logger", "-"]),
            ("{}", "circuit", ["logger", "-"]),
            ("{\"candidates\": 3, \"requirement\": {\"output\": 1000}}", "holds none", ["logger", "-"]),
            ("{\"candidates\": [3], \"requirement\": {\"output\": 1000}}", "holds the number", ["logger", "-"]),
            ("{\"candidates\": []}", "requirement", ["logger", "-"]),
            ("{\"candidates\": [{\"circuit\": \"gate\"}], \"requirement\": {\"output\": 1000}}", "parts", ["logger", "-"]),
            (unknown.ToJsonString(), "'no-such' is not in the catalogue", ["logger", "-"]),
            (own.ToJsonString(), "no capacitor of 15.5 pF", ["logger", "-"]),
            (ShortlistBench.Ranking, "none of its candidates", ["logger", "-", "--candidate", "99"]),
            (ShortlistBench.Ranking, "none of its candidates", ["logger", "-", "--candidate", "x"]),
            (ShortlistBench.Ranking, "--builds", ["logger", "-", "--builds", "0"]),
            (ShortlistBench.Ranking, "--builds", ["logger", "-", "--builds", "1.5"]),
            (ShortlistBench.Ranking, "is no note", ["logger", "-", "--note", "a\nb"]),
            (ShortlistBench.Ranking, "is empty", [" ", "-"]),
            (ShortlistBench.Ranking, "no name may hold", ["a/b", "-"]),
            (ShortlistBench.Ranking, "is too long", [new string('a', 61), "-"]),
            (ShortlistBench.Ranking, "standard input is already FILE", ["logger", "-", "--requirement", "-"]),
            ("", "is not there", ["logger", "/no/such.json"]),
            (ShortlistBench.Candidate(1).ToJsonString(), "not a ranking", ["logger", "-", "--candidate", "2"]),
        ];
        foreach ((string input, string says, string[] arguments) in cases)
        {
            Assert.Contains(says, bench.WithInput(input, ["shortlist", "add", .. arguments]).WrongLine(), StringComparison.Ordinal);
        }

        Assert.Contains("NUMBER", bench.Of("shortlist", "remove", "logger").WrongLine(), StringComparison.Ordinal);
        Assert.Contains("beside --all", bench.Of("shortlist", "remove", "logger", "1", "--all").WrongLine(), StringComparison.Ordinal);
        Assert.Contains("NUMBER", bench.Of("shortlist", "remove", "logger", "zero").WrongLine(), StringComparison.Ordinal);
        Assert.Contains("no list", bench.Of("shortlist", "remove", "other", "--all").WrongLine(), StringComparison.Ordinal);
        Assert.Equal(before, bench.Of("shortlist", "list", "logger", "--format", "json").Output);
    }

    [Fact]
    public void A_damaged_catalogue_is_status_3()
    {
        string path = Run.File(new string('x', 8192), "broken.db");
        Assert.Contains("damaged", Run.Of("shortlist", "list", "--catalog", path).WrongLine(3), StringComparison.Ordinal);
    }
}
