using System.Text.Json;

namespace PartPick.Tests;

public class CapsCommandTests
{
    // ST AN2867, section 3.3: a load of 15 pF with a stray of 5 pF asks for 20 pF each.
    // NXP IMXRT500HDG, p. 19: 2·12.5 − 3 = 22 pF and 2·9 − 3 = 15 pF, with 3 pF at each pin.
    [Theory]
    [InlineData("15p", "--stray", "5p", 20e-12)]
    [InlineData("12.5p", "--pin-stray", "3p", 22e-12)]
    [InlineData("9p", "--pin-stray", "3p", 15e-12)]
    public void Published_pair_comes_first(string load, string option, string stray, double expected)
    {
        JsonElement json = Run.Of("caps", "--load", load, option, stray, "--series", "E24", "--format", "json").Json;
        JsonElement pair = json.GetProperty("pairs")[0];

        Assert.Equal((expected, expected), (pair.GetProperty("c1").GetDouble(), pair.GetProperty("c2").GetDouble()));
        Assert.Equal(expected, json.GetProperty("exact").GetDouble(), 1e-18);
        Assert.Equal(JsonValueKind.Null, pair.GetProperty("error").ValueKind);
    }

    [Fact]
    public void Table_says_which_stray_was_meant()
    {
        Assert.StartsWith("A load of 18 pF with a stray of 4 pF asks for two capacitors of 28 pF.",
            Run.Of("caps", "--load", "18p", "--stray", "4p").Output, StringComparison.Ordinal);
        Assert.StartsWith("A load of 18 pF with a stray of 1 pF and 4 pF at each pin asks for two capacitors of 30 pF.",
            Run.Of("caps", "--load", "18p", "--stray", "1p", "--pin-stray", "4p").Output, StringComparison.Ordinal);
    }

    // Arithmetic: a load of 20 instead of 18 pF is −22.715 ppm with Cm 12 fF and C0 4 pF.
    [Fact]
    public void Crystal_adds_its_frequency_and_its_load()
    {
        string crystal = Run.File("""{ "frequency": 4e6, "load": "18p", "shunt": "4p", "motional": "12f", "resistance": 50 }""");

        Run moved = Run.Of("caps", "--crystal", crystal, "--load", "20p", "--pin-stray", "7p", "--series", "E6");
        Run own = Run.Of("caps", "--crystal", crystal, "--format", "csv", "--top", "1");

        Assert.Matches(@"33 +33 +20\.000 +0\.00 +-22\.71|33 +33 +20\.000 +0\.00 +-22\.72", moved.Output);
        Assert.StartsWith(
            "c1 (F),c2 (F),load (F),deviation (%),error (ppm)\n3.6E-11,3.6E-11,1.8E-11,", own.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void Two_in_parallel_are_shown_as_a_sum() =>
        Assert.Contains(
            " + ",
            Run.Of("caps", "--load", "17.3p", "--stray", "4p", "--series", "E6", "--parallel").Output,
            StringComparison.Ordinal);

    [Theory]
    [InlineData("--load: is missing", "caps")]
    [InlineData("--load: '18 kHz'", "caps", "--load", "18 kHz")]
    [InlineData("--load: is no load", "caps", "--load", "0")]
    [InlineData("--stray: the strays alone make the load", "caps", "--load", "5p", "--stray", "5p")]
    [InlineData("--pin-stray: the strays alone make the load", "caps", "--load", "5p", "--pin-stray", "12p")]
    [InlineData("--stray: '-2p' is negative", "caps", "--load", "18p", "--stray=-2p")]
    [InlineData("--series: 'E7' is no series", "caps", "--load", "18p", "--series", "E7")]
    [InlineData("--top: is zero", "caps", "--load", "18p", "--top", "0")]
    public void Wrong_options_are_one_line(string expected, params string[] arguments) =>
        Assert.StartsWith(expected, Run.Of(arguments).WrongLine(), StringComparison.Ordinal);
}
