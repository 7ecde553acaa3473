using System.Globalization;
using System.Text.Json;

namespace PartPick.Tests.Shortlists;

public sealed class AlternatesCommandTests
{
    private const string Parts = "C1, C2, C3, R1, R2, U1, Y1, crystal, amplifier, rs, rf, decoupling or an id";

    private const string Numbers = "whole numbers from 1 to 10000 such as 50,75,300";

    private static readonly string[] Alternates = ["shortlist", "alternates", "logger"];

    [Fact]
    public void Every_part_of_a_candidate_gets_its_replacements_with_what_they_change()
    {
        ShortlistBench bench = new ShortlistBench().With(1);
        Run run = bench.Of([.. Alternates, "--format", "json", "--top", "1000"]);

        Assert.Equal((0, ""), (run.Status, run.Error));
        JsonElement found = Assert.Single(run.Json.EnumerateArray());
        JsonElement listed = bench.List().GetProperty("candidates")[0];
        Assert.Equal(
            listed.GetProperty("parts").EnumerateArray().Select(part => part.GetProperty("designator").GetString())
                .Order(StringComparer.Ordinal),
            found.GetProperty("parts").EnumerateArray().SelectMany(part => part.GetProperty("designators").EnumerateArray())
                .Select(designator => designator.GetString()).Order(StringComparer.Ordinal));
        foreach (JsonElement part in found.GetProperty("parts").EnumerateArray())
        {
            JsonElement[] replacements = [.. part.GetProperty("replacements").EnumerateArray()];
            Assert.NotEmpty(replacements);
            Assert.Equal(part.GetProperty("fit").GetInt32(), replacements.Length);
            int leftOut = part.GetProperty("leftOut").EnumerateObject().Sum(reason => reason.Value.GetInt32());
            int unfit = part.GetProperty("unfit").EnumerateObject().Sum(limit => limit.Value.GetInt32());
            Assert.Equal(part.GetProperty("considered").GetInt32(), part.GetProperty("analysed").GetInt32() + leftOut);
            Assert.Equal(part.GetProperty("analysed").GetInt32(), replacements.Length + unfit);
            double[] sizes = [.. replacements.Select(one => one.GetProperty("change").GetProperty("size").GetDouble())];
            Assert.Equal(sizes.Order(), sizes);
            Assert.All(replacements, one => Assert.InRange(one.GetProperty("figures").GetProperty("errorWorst").GetDouble(), 0, 80));
            double before = found.GetProperty("figures").GetProperty("errorWorst").GetDouble();
            Assert.All(replacements, one => Assert.Equal(
                one.GetProperty("figures").GetProperty("errorWorst").GetDouble(),
                before + one.GetProperty("change").GetProperty("errorWorst").GetDouble(),
                1e-6));
        }
    }

    [Fact]
    public void A_replacement_put_on_the_list_has_the_figures_that_were_said()
    {
        ShortlistBench bench = new ShortlistBench().With(1);
        JsonElement first = bench.Of([.. Alternates, "--part", "C1", "--format", "json"]).Json[0].GetProperty("parts")[0]
            .GetProperty("replacements")[0];
        System.Text.Json.Nodes.JsonObject changed = ShortlistBench.Candidate(1);
        changed["parts"]!.AsArray().Single(part => part!["designator"]!.GetValue<string>() == "C1")!["part"] =
            first.GetProperty("part").GetString();

        string river = Run.File(ShortlistBench.River);
        Run added = bench.WithInput(changed.ToJsonString(), "shortlist", "add", "other", "-", "--requirement", river);

        Assert.True(added.Status == 0, added.Error);
        JsonElement now = bench.List("other").GetProperty("candidates")[0].GetProperty("now");
        JsonElement said = first.GetProperty("figures");
        Assert.All(new[] { "errorWorst", "startUpMargin", "driveLevel", "startUpTime", "cost" }, key =>
            Assert.Equal(said.GetProperty(key).GetDouble(), now.GetProperty(key).GetDouble(), 1e-9));
    }

    [Fact]
    public void The_table_names_each_part_what_was_left_out_and_the_changes()
    {
        Run run = new ShortlistBench().With(1).Of([.. Alternates, "1", "--part", "y1", "--part", "rs"]);

        Assert.Equal(0, run.Status);
        Assert.Matches(@"^logger, candidate 1: counter CNT-\S+ with X-\S+, stage \d+; error \d+\.\d of 80\.0 ppm, margin ", run.Output);
        Assert.Matches(@"\nY1, crystal, X-\S+: \d+ of 417 others keep the circuit fit; \d+ analysed\.\n", run.Output);
        Assert.Matches(@"\n  Left out: .*\d+ another frequency", run.Output);
        Assert.Matches(@"\nR\d, damping Rs, R-\S+: ", run.Output);
        Assert.DoesNotContain("load capacitor", run.Output, StringComparison.Ordinal);
        Assert.Matches(@"part +frequency \(ppm\) +error \(ppm\) +margin +drive \(uW\) +start-up \(ms\) +cost \(EUR\) +change", run.Output);
        Assert.Contains("needs a licence", run.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void Csv_has_a_row_for_each_replacement()
    {
        Run run = new ShortlistBench().With(1).Of([.. Alternates, "--part", "C2", "--same-package", "--top", "3", "--format", "csv"]);
        string[][] rows = CsvTexts.ByCsvHelper(run.Output, ',');

        Assert.Equal(4, rows.Length);
        int same = Array.IndexOf(rows[0], "samePackage");
        Assert.All(rows.Skip(1), row => Assert.Equal(("logger", "1", "C2", "true"), (row[0], row[1], row[2], row[same])));
    }

    [Fact]
    public void A_crystal_that_is_gone_from_the_catalogue_still_gets_its_replacements()
    {
        ShortlistBench bench = new ShortlistBench().With(1);
        string crystal = ShortlistBench.PartOf(bench.List().GetProperty("candidates")[0], "Y1");
        bench.Reimport("crystals", [crystal], "stock", _ => "0");

        JsonElement found = bench.Of([.. Alternates, "--part", "crystal", "--part", "C1", "--format", "json"]).Json[0];

        Assert.False(found.GetProperty("fit").GetBoolean());
        Assert.All(found.GetProperty("parts").EnumerateArray(), part => Assert.True(part.GetProperty("fit").GetInt32() > 0));
    }

    [Fact]
    public void Without_its_crystal_other_circuits_round_the_same_amplifier_are_ranked()
    {
        ShortlistBench bench = new ShortlistBench().With(1);
        JsonElement listed = bench.List().GetProperty("candidates")[0];
        string crystal = listed.GetProperty("crystal").GetString()!;
        string amplifier = listed.GetProperty("amplifier").GetString()!;

        JsonElement found = bench.Of([.. Alternates, "1", "--gone", "Y1", "--top", "3", "--format", "json"]).Json;

        Assert.Equal([crystal], found.GetProperty("gone").EnumerateArray().Select(part => part.GetString()!));
        Assert.Equal([amplifier], found.GetProperty("kept").EnumerateArray().Select(part => part.GetString()!));
        JsonElement[] candidates = [.. found.GetProperty("candidates").EnumerateArray()];
        Assert.Equal(3, candidates.Length);
        Assert.All(candidates, one => Assert.Equal(amplifier, one.GetProperty("amplifier").GetString()));
        Assert.All(candidates, one => Assert.NotEqual(crystal, one.GetProperty("crystal").GetString()));
        Assert.All(candidates, one => Assert.Equal(
            one.GetProperty("cost").GetDecimal() - found.GetProperty("figures").GetProperty("cost").GetDecimal(),
            one.GetProperty("change").GetProperty("cost").GetDecimal()));
    }

    [Fact]
    public void Where_nothing_else_fits_the_nearest_misses_are_said_with_status_1()
    {
        // Of the counters only one is specified at 3 V with its clock.
        var bench = new ShortlistBench();
        string path = Run.File("""{ "output": "1 kHz", "circuits": ["counter"], "supply": [3, 5.5], "budget": "150 ppm" }""");
        Run ranked = bench.Of("rank", path, "--top", "1", "--format", "json");
        Assert.Equal(0, ranked.Status);
        Assert.Equal(0, bench.WithInput(ranked.Output, "shortlist", "add", "strict", "-").Status);

        Run run = bench.Of("shortlist", "alternates", "strict", "1", "--gone", "amplifier");

        Assert.Equal(1, run.Status);
        Assert.Contains("Nothing fits.", run.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void Quantities_show_cost_breaks_and_the_best_candidate()
    {
        ShortlistBench bench = Small(out decimal cost);

        JsonElement found = bench.Of([.. Alternates, "1", "--builds", "--format", "json"]).Json;

        JsonElement[] rows = [.. found.GetProperty("rows").EnumerateArray()];
        Assert.Equal(
            [1, 2, 5, 10, 20, 50, 100, 200, 500, 1000, 2000, 5000, 10000],
            rows.Select(row => row.GetProperty("builds").GetInt32()));
        Assert.Equal(cost, rows[6].GetProperty("cost").GetDecimal());
        Assert.All(rows, row => Assert.Equal(
            row.GetProperty("cost").GetDecimal() * row.GetProperty("builds").GetInt32(), row.GetProperty("total").GetDecimal(), 5));
        // Ranked for 100 boards: there the first of that ranking is the best.
        Assert.Equal(found.GetProperty("id").GetString(), rows[6].GetProperty("best").GetString());
        Assert.Contains(found.GetProperty("rankedAt").EnumerateArray(), builds => builds.GetInt32() == 100);
        Assert.NotEmpty(found.GetProperty("breaks").EnumerateArray());
        JsonElement[] choices = [.. found.GetProperty("choices").EnumerateArray()];
        Assert.Equal((1, 10000), (choices[0].GetProperty("from").GetInt32(), choices[^1].GetProperty("to").GetInt32()));
        foreach (int builds in new[] { 7, 60, 300 })
        {
            string count = builds.ToString(CultureInfo.InvariantCulture);
            Run again = bench.Of([.. SmallRank, "--top", "1", "--builds", count, "--format", "json"]);
            JsonElement span = choices.Single(one =>
                one.GetProperty("from").GetInt32() <= builds && one.GetProperty("to").GetInt32() >= builds);
            Assert.Equal(again.Json.GetProperty("candidates")[0].GetProperty("id").GetString(), span.GetProperty("id").GetString());
        }
    }

    [Theory]
    [InlineData("C.UTF-8", '│')]
    [InlineData("C", '|')]
    public void The_picture_uses_what_the_locale_has(string locale, char axis)
    {
        ShortlistBench bench = Small(out _);
        Run run = Run.In(
            name => name == "LC_ALL" ? locale : null,
            "",
            [.. Alternates, "1", "--builds", "50,75", "--chosen-only", "--catalog", bench.Catalog]);

        Assert.Equal((0, ""), (run.Status, run.Error));
        string[] picture = [.. run.Output.Split('\n').Where(line => line.Length > 9 && line[9] == axis)];
        Assert.Equal(10, picture.Length);
        Assert.Matches(@"\n    50 +\d+\.\d{4} +\d+\.\d\d", run.Output);
        Assert.Matches(@"\n    75 +\d+\.\d{4} +\d+\.\d\d", run.Output);
        Assert.Matches(@"\n +7 +\d\.\d{4} +\d\.\d{4}  another price: ", run.Output);
        Assert.DoesNotContain("best", run.Output, StringComparison.Ordinal);
        Assert.Equal(locale == "C", picture.All(line => line.All(char.IsAscii)));
    }

    [Fact]
    public void The_design_record_draws_the_cost_through_the_cost_of_this_build()
    {
        ShortlistBench bench = Small(out decimal cost);
        string html = bench.Of("shortlist", "export", "logger", "--format", "html").Output;

        Assert.Contains(string.Create(CultureInfo.InvariantCulture, $">100 boards: {cost:0.000}</text>"), html, StringComparison.Ordinal);
        string points = html.Split("<polyline points=\"")[1].Split('"')[0];
        double[][] line = [.. points.Split(' ').Select(point => point.Split(',')
            .Select(number => double.Parse(number, CultureInfo.InvariantCulture)).ToArray())];
        Assert.Equal((60, 700), (line[0][0], line[^1][0]));
        Assert.Equal((8, 158), (line.Min(point => point[1]), line.Max(point => point[1])));
        Assert.Equal(line.Select(point => point[0]).Order(), line.Select(point => point[0]));
    }

    [Theory]
    [InlineData("NUMBER: 7 is no candidate of 'logger'; fits one of 1, 2", "logger", "7")]
    [InlineData("NUMBER: is missing: 'logger' holds 2 candidates; fits one of 1, 2", "logger", "--gone", "Y1")]
    [InlineData("NUMBER: is missing: 'logger' holds 2 candidates; fits one of 1, 2", "logger", "--builds")]
    [InlineData("NAME: there is no list 'nothing'; fits one of 'logger'", "nothing")]
    [InlineData("--part: 'C9' is no part of the circuit; fits " + Parts, "logger", "1", "--part", "C9")]
    [InlineData("--gone: 'coupling' is no part of the circuit; fits " + Parts, "logger", "1", "--gone", "coupling")]
    [InlineData("--builds: '0' is no number of boards; fits " + Numbers, "logger", "1", "--builds", "5,0")]
    [InlineData("--builds: 'many' is no number of boards; fits " + Numbers, "logger", "1", "--builds", "many")]
    [InlineData("--builds: does not go with --gone; fits one of the two", "logger", "1", "--gone", "Y1", "--builds")]
    [InlineData("--part: does not go with --gone; fits one of the two", "logger", "1", "--gone", "Y1", "--part", "C1")]
    [InlineData("--equal: says nothing without --gone; fits --gone PART --equal", "logger", "1", "--equal")]
    [InlineData("--chosen-only: says nothing without --builds; fits --builds --chosen-only", "logger", "1", "--chosen-only")]
    [InlineData("--same-package: goes with replacements only; fits no --gone and no --builds", "logger", "1", "--builds", "--same-package")]
    [InlineData("--top: is zero; fits a whole number from 1 such as 10", "logger", "1", "--top", "0")]
    public void Wrong_input_is_one_line(string line, params string[] arguments)
    {
        ShortlistBench bench = Two.Value;
        Assert.Equal(line, bench.Of(["shortlist", "alternates", .. arguments]).WrongLine());
    }

    [Fact]
    public void A_purchase_list_names_replacements_of_the_same_package()
    {
        ShortlistBench bench = new ShortlistBench().With(1);
        string[][] rows = CsvTexts.ByCsvHelper(bench.Of("shortlist", "export", "logger", "--alternates", "2").Output, ',');
        int at = Array.IndexOf(rows[0], "alternates");
        int references = Array.IndexOf(rows[0], "references");
        JsonElement[] parts =
        [
            .. bench.Of([.. Alternates, "--same-package", "--top", "2", "--format", "json"]).Json[0].GetProperty("parts").EnumerateArray(),
        ];

        Assert.Equal(parts.Length, rows.Length - 1);
        Assert.All(rows.Skip(1), row =>
        {
            JsonElement part = parts.Single(one =>
                string.Join(' ', one.GetProperty("designators").EnumerateArray().Select(each => each.GetString())) == row[references]);
            Assert.Equal(
                string.Join(' ', part.GetProperty("replacements").EnumerateArray().Select(one => one.GetProperty("part").GetString())),
                row[at]);
        });
    }

    private static readonly Lazy<ShortlistBench> Two = new(() => new ShortlistBench().With(2));

    // A small space: the counters of the built-in parts with capacitors and resistors of E3.
    private static readonly string[] SmallRank =
        ["rank", "--output", "1 kHz", "--circuits", "counter", "--capacitorSeries", "E3", "--resistor-series", "E3"];

    private static ShortlistBench Small(out decimal cost)
    {
        var bench = new ShortlistBench();
        Run ranked = bench.Of([.. SmallRank, "--top", "1", "--format", "json"]);
        Assert.Equal(0, ranked.Status);
        cost = ranked.Json.GetProperty("candidates")[0].GetProperty("cost").GetDecimal();
        Assert.Equal(0, bench.WithInput(ranked.Output, "shortlist", "add", "logger", "-").Status);
        return bench;
    }
}
