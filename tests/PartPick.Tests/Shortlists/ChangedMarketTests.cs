using System.Globalization;
using System.Text.Json;

namespace PartPick.Tests.Shortlists;

/// <summary>What a list shows after an import changed prices, stock and data of its parts.</summary>
public sealed class ChangedMarketTests
{
    [Fact]
    public void Four_circuits_export_in_all_three_forms_and_new_prices_mark_exactly_the_changed_ones()
    {
        ShortlistBench bench = new ShortlistBench().With(4);
        foreach (string ending in new[] { "csv", "md", "html" })
        {
            string path = bench.NewFile("out." + ending);
            Run run = bench.Of("shortlist", "export", "logger", "--to", path);
            Assert.True(run.Status == 0, run.Error);
            Assert.True(new FileInfo(path).Length > 500);
        }

        Assert.Empty(bench.List().GetProperty("changed").EnumerateArray());

        // C1 of the first candidate and of the third: whoever else uses them changes too, and no one else.
        JsonElement[] before = [.. bench.List().GetProperty("candidates").EnumerateArray()];
        string[] dearer = [.. new[] { 0, 2 }.Select(i => ShortlistBench.PartOf(before[i], "C1")).Distinct()];
        bool[] uses = [.. before.Select(each => dearer.Any(part => Uses(each, part)))];
        Assert.Contains(false, uses);
        bench.Reimport("capacitors", dearer, "prices", _ => "1:0.9;100:0.75");

        JsonElement after = bench.List();
        Assert.Equal(
            before.Where((_, i) => uses[i]).Select(each => each.GetProperty("number").GetInt32()),
            after.GetProperty("changed").EnumerateArray().Select(each => each.GetInt32()));
        JsonElement change = after.GetProperty("candidates")[0].GetProperty("changes")[0];
        Assert.Equal(dearer[0], change.GetProperty("part").GetString());
        Assert.Equal(("price", "prices", "1:0.9;100:0.75"), (Text(change, "kind"), Text(change, "key"), Text(change, "new")));
        Assert.StartsWith("1:", Text(change, "old"), StringComparison.Ordinal);

        // 200 of them at 0.75 in the place of the old price from 100 on.
        decimal old = decimal.Parse(Text(change, "old").Split(';').Last(each => each.StartsWith("100:", StringComparison.Ordinal))[4..],
            CultureInfo.InvariantCulture);
        JsonElement candidate = after.GetProperty("candidates")[0];
        Assert.Equal(
            candidate.GetProperty("then").GetProperty("cost").GetDecimal() + 0.75m - old,
            candidate.GetProperty("now").GetProperty("cost").GetDecimal());
        Assert.Contains("changed", bench.Of("shortlist", "list", "logger").Output, StringComparison.Ordinal);
    }

    [Fact]
    public void Importing_the_same_prices_again_marks_nothing()
    {
        ShortlistBench bench = new ShortlistBench().With(2);
        string file = Run.File(bench.Of("catalog", "export", "crystals").Output, "same.csv");
        Assert.Equal(0, bench.Of("catalog", "import", file, "--kind", "crystals").Status);
        Assert.Empty(bench.List().GetProperty("changed").EnumerateArray());
    }

    [Fact]
    public void Changed_data_recomputes_the_figures_and_says_which_limit_no_longer_holds()
    {
        ShortlistBench bench = new ShortlistBench().With(1);
        string crystal = bench.List().GetProperty("candidates")[0].GetProperty("crystal").GetString()!;
        bench.Reimport("crystals", [crystal], "tolerance (ppm)", _ => "60");
        JsonElement candidate = bench.List().GetProperty("candidates")[0];
        Assert.False(candidate.GetProperty("fit").GetBoolean());
        Assert.Equal("no longer fits, changed", candidate.GetProperty("state").GetString());
        Assert.Equal("error", Text(Assert.Single(candidate.GetProperty("misses").EnumerateArray()), "limit"));
        JsonElement change = Assert.Single(candidate.GetProperty("changes").EnumerateArray());
        Assert.Equal(
            ("data", "tolerance", "10 ppm", "60 ppm"),
            (Text(change, "kind"), Text(change, "key"), Text(change, "old"), Text(change, "new")));
        double then = candidate.GetProperty("then").GetProperty("errorWorst").GetDouble();
        Assert.Equal(then + 50, candidate.GetProperty("now").GetProperty("errorWorst").GetDouble(), 1e-6);
    }

    [Theory]
    [InlineData("temperatureMax (degC)", "40", "temperature")]
    [InlineData("stock", "150", "stock")]
    [InlineData("excluded", "yes", "stock")]
    [InlineData("driveLevel (uW)", "5", "drive")]
    public void A_limit_that_the_search_settles_early_is_seen_too(string column, string value, string limit)
    {
        ShortlistBench bench = new ShortlistBench().With(1);
        string crystal = bench.List().GetProperty("candidates")[0].GetProperty("crystal").GetString()!;
        bench.Reimport("crystals", [crystal], column, _ => value);
        JsonElement candidate = bench.List().GetProperty("candidates")[0];
        Assert.Contains(limit, candidate.GetProperty("misses").EnumerateArray().Select(miss => Text(miss, "limit")));
    }

    [Fact]
    public void A_clock_or_supply_that_is_not_guaranteed_any_more_is_seen_too()
    {
        ShortlistBench bench = new ShortlistBench().With(1);
        string amplifier = bench.List().GetProperty("candidates")[0].GetProperty("amplifier").GetString()!;
        Assert.Equal(0, bench.Of("catalog", "set", amplifier, "clockMin 3=1 MHz").Status);
        Assert.Contains("clock", Limits(bench));
        Assert.Equal(0, bench.Of("catalog", "set", amplifier, "supply 1=4.8 V", "supply 2=4.9 V", "supply 3=5 V").Status);
        Assert.Contains("supply", Limits(bench));
        Assert.Equal(0, bench.Of("shortlist", "export", "logger", "--format", "html").Status);

        static IEnumerable<string> Limits(ShortlistBench bench) =>
            bench.List().GetProperty("candidates")[0].GetProperty("misses").EnumerateArray().Select(miss => Text(miss, "limit"));
    }

    [Fact]
    public void A_part_that_is_gone_is_said_and_the_list_still_exports()
    {
        var bench = new ShortlistBench();
        string own = Run.File(
            "Part Number,Capacitance (pF),Tolerance,Dielectric,Voltage,Price (EUR),Stock\nMINE-1,15,2%,C0G,50 V,0.01,9000\n", "own.csv");
        Run imported = bench.Of("catalog", "import", own, "--kind", "capacitors", "--format", "json");
        Assert.Equal(1, imported.Json.GetProperty("added").GetInt32());
        var candidate = ShortlistBench.Candidate(1);
        candidate["parts"]!.AsArray().Single(part => part!["designator"]!.GetValue<string>() == "C1")!["part"] = "MINE-1";
        Assert.Equal(0, bench.WithInput(candidate.ToJsonString(), "shortlist", "add", "logger", "-").Status);
        Assert.Equal(0, bench.Of("catalog", "undo").Status);

        JsonElement gone = bench.List().GetProperty("candidates")[0];
        Assert.Equal("part gone", Text(gone, "state"));
        JsonElement change = Assert.Single(gone.GetProperty("changes").EnumerateArray());
        Assert.Equal(("gone", "MINE-1", "C1"), (Text(change, "kind"), Text(change, "part"), Text(change, "designators")));
        Run table = bench.Of("shortlist", "list", "logger");
        Assert.Contains("C1 MINE-1: not in the catalogue any more", table.Output, StringComparison.Ordinal);
        foreach (string form in new[] { "csv", "markdown", "html", "json", "table" })
        {
            Run export = bench.Of("shortlist", "export", "logger", "--format", form);
            Assert.True(export.Status == 0, export.Error);
            Assert.Contains("MINE-1", export.Output + export.Error, StringComparison.Ordinal);
        }
    }

    private static bool Uses(JsonElement candidate, string part) =>
        candidate.GetProperty("parts").EnumerateArray().Any(use => Text(use, "part") == part);

    private static string Text(JsonElement element, string key) => element.GetProperty(key).GetString()!;
}
