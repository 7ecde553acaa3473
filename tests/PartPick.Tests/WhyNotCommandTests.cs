using System.Text.Json;

namespace PartPick.Tests;

public class WhyNotCommandTests
{
    // A small space: the counters of the built-in parts with capacitors and resistors of E3.
    private static readonly string[] Small =
    [
        "rank", "--output", "1 kHz", "--circuits", "counter", "--capacitorSeries", "E3", "--resistor-series", "E3", "--budget", "80 ppm",
        "--temperature", "-10..50",
    ];

    [Fact]
    public void A_part_that_fits_is_status_0_and_has_its_place()
    {
        string first = Run.Of([.. Small, "--top", "1", "--format",
            "json"]).Json.GetProperty("candidates")[0].GetProperty("crystal").GetString()!;

        Run run = Run.Of([.. Small, "--why-not", first, "--format", "json"]);

        Assert.Equal((0, ""), (run.Status, run.Error));
        Assert.True(run.Json.GetProperty("fits").GetBoolean());
        Assert.Equal(1, run.Json.GetProperty("place").GetProperty("number").GetInt32());
        Assert.Empty(run.Json.GetProperty("changes").EnumerateArray());
    }

    [Fact]
    public void A_part_that_does_not_is_status_1_and_the_change_typed_as_an_option_lets_it_in()
    {
        const string Id = "X-04M096-30-H49-30";
        Assert.DoesNotContain(Id, Run.Of([.. Small]).Output, StringComparison.Ordinal);

        Run run = Run.Of([.. Small, "--why-not", Id, "--format", "json"]);

        Assert.Equal((1, ""), (run.Status, run.Error));
        JsonElement change = run.Json.GetProperty("changes")[0].GetProperty("changes")[0];
        Assert.Equal(("budget", "80 ppm"), (change.GetProperty("key").GetString(), change.GetProperty("was").GetString()));
        Run changed = Run.Of([.. Small.Where(word => word is not ("--budget" or "80 ppm")), "--" + change.GetProperty("key").GetString(),
            change.GetProperty("becomes").GetString()!, "--format", "json"]);
        string[] crystals = [.. changed.Json.GetProperty("candidates").EnumerateArray().Select(one =>
            one.GetProperty("crystal").GetString()!)];
        Assert.Equal(Array.IndexOf(crystals, Id) + 1, run.Json.GetProperty("placeThen").GetProperty("number").GetInt32());
        JsonElement error = run.Json.GetProperty("limits")[0];
        Assert.Equal(("error", true), (error.GetProperty("limit").GetString(), error.GetProperty("broken").GetBoolean()));
    }

    [Fact]
    public void The_table_says_it_in_words()
    {
        Run run = Run.Of([.. Small, "--why-not", "INV-HC-U-1"]);

        Assert.Equal(1, run.Status);
        Assert.Contains("INV-HC-U-1 is not in the list: circuit (wanted counter, gate", run.Output, StringComparison.Ordinal);
        Assert.Matches(@"what +wanted or rated +has or reaches +distance", run.Output);
    }

    [Theory]
    [InlineData("--why-not: 'CNT-14-H' is no part of the catalogue; fits the id of a crystal or an amplifier, such as CNT-14-HC",
        "CNT-14-H")]
    [InlineData("--why-not: 'C-015p-C0G-1-0603' is one of the capacitors", "C-015p-C0G-1-0603")]
    [InlineData("--why-not: '' is no part of the catalogue", "")]
    public void What_is_no_such_part_is_one_line(string expected, string id) =>
        Assert.StartsWith(expected, Run.Of([.. Small, "--why-not", id]).WrongLine(), StringComparison.Ordinal);

    [Fact]
    public void A_damaged_catalogue_is_status_3() =>
        Run.Of([.. Small, "--why-not", "X", "--catalog", Run.File("junk", "catalog.db")]).WrongLine(status: 3);
}
