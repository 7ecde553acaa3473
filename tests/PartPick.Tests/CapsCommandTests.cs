using System.Text.Json;

namespace PartPick.Tests;

public class CapsCommandTests
{
    // NXP IMXRT500HDG, p. 19: 2·12.5 − 3 = 22 pF.
    [Fact]
    public void Published_pair_comes_first()
    {
        JsonElement pair = Run.Of("caps", "--load", "12.5p", "--stray", "3p", "--series", "E24", "--format", "json").Json.GetProperty("pairs")[0];

        Assert.Equal((22e-12, 22e-12), (pair.GetProperty("c1").GetDouble(), pair.GetProperty("c2").GetDouble()));
        Assert.Equal(JsonValueKind.Null, pair.GetProperty("error").ValueKind);
    }

    // Arithmetic: a load of 20 instead of 18 pF is −22.715 ppm with Cm 12 fF and C0 4 pF.
    [Fact]
    public void Crystal_adds_its_frequency_and_its_load()
    {
        string crystal = Run.File("""{ "frequency": 4e6, "load": "18p", "shunt": "4p", "motional": "12f", "resistance": 50 }""");

        Run moved = Run.Of("caps", "--crystal", crystal, "--load", "20p", "--stray", "7p", "--series", "E6");
        Run own = Run.Of("caps", "--crystal", crystal, "--format", "csv", "--top", "1");

        Assert.Matches(@"33 +33 +20\.000 +0\.00 +-22\.71|33 +33 +20\.000 +0\.00 +-22\.72", moved.Output);
        Assert.StartsWith("c1 (F),c2 (F),load (F),deviation (%),error (ppm)\n3.6E-11,3.6E-11,1.8E-11,", own.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void Two_in_parallel_are_shown_as_a_sum() =>
        Assert.Contains(" + ", Run.Of("caps", "--load", "17.3p", "--stray", "4p", "--series", "E6", "--parallel").Output, StringComparison.Ordinal);

    [Theory]
    [InlineData("--load: is missing", "caps")]
    [InlineData("--load: '18 kHz'", "caps", "--load", "18 kHz")]
    [InlineData("--load: is no load", "caps", "--load", "0")]
    [InlineData("--stray: the strays alone make the load", "caps", "--load", "5p", "--stray", "12p")]
    [InlineData("--series: 'E7' is no series", "caps", "--load", "18p", "--series", "E7")]
    [InlineData("--top: is zero", "caps", "--load", "18p", "--top", "0")]
    public void Wrong_options_are_one_line(string expected, params string[] arguments) =>
        Assert.StartsWith(expected, Run.Of(arguments).WrongLine(), StringComparison.Ordinal);
}
