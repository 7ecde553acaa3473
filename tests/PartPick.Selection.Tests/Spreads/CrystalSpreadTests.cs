using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection.Tests.Spreads;

public class CrystalSpreadTests
{
    private static readonly CrystalPart Stated = Sample.Crystal with
    {
        ToleranceRatio = 30e-6,
        StabilityRatio = 50e-6,
        AgeingRatio = 3e-6,
        AgeingYearlyRatio = 1e-6,
    };

    private static readonly Dictionary<string, Basis> Typical = new() { ["tolerance"] = Basis.Typical };

    [Fact]
    public void Stated_figures_are_taken_as_they_are_and_rest_on_nothing()
    {
        ImmutableArray<BudgetTerm> terms = CrystalSpread.Of(Stated, Sample.Requirement);

        Assert.Equal(["crystal tolerance", "crystal over temperature", "crystal ageing"], terms.Select(term => term.Term));
        Assert.Equal(30e-6, terms[0].Ratio);
        Assert.Equal(50e-6, terms[1].Ratio);
        Assert.All(terms, term => Assert.Null(term.RestsOn));
    }

    // First year 3 ppm, then 1 ppm a year: 3 + 4·1 = 7 ppm in five years. Without a yearly figure 5·3 = 15 ppm (arithmetic).
    [Theory]
    [InlineData(5, 1e-6, 7e-6)]
    [InlineData(5, null, 15e-6)]
    [InlineData(1, 1e-6, 3e-6)]
    [InlineData(0.5, 1e-6, 1.5e-6)]
    [InlineData(0, 1e-6, 0)]
    public void Ageing_counts_the_first_year_and_the_later_ones(double years, double? yearly, double expected) => Assert.Equal(
        expected,
        CrystalSpread.Of(Stated with { AgeingYearlyRatio = yearly }, Sample.Requirement with { Years = years })[2].Ratio,
        1e-15);

    // Tuning fork: −0.030 ppm/K² about 25 °C is −12.0 ppm at 45 °C (CTS TF20 data sheet).
    [Theory]
    [InlineData(25, 45, 12e-6)]
    [InlineData(5, 25, 12e-6)]
    [InlineData(-10, 50, 36.75e-6)]
    public void A_fork_follows_its_parabola_to_the_farther_end(double coldest, double hottest, double expected)
    {
        CrystalPart fork = Sample.Crystal with { Cut = CrystalCut.Fork, ParabolaPerSquareKelvin = -0.030e-6, TurnoverCelsius = 25 };
        Requirement requirement = Sample.Requirement with { TemperatureMinCelsius = coldest, TemperatureMaxCelsius = hottest };

        Assert.Equal(expected, CrystalSpread.Of(fork, requirement)[1].Ratio, 1e-15);
    }

    [Fact]
    public void What_a_part_does_not_state_is_assumed_and_says_so()
    {
        ImmutableArray<BudgetTerm> terms = CrystalSpread.Of(Sample.Crystal, Sample.Requirement);

        Assert.All(terms, term => Assert.Equal("assumed", term.RestsOn));
        Assert.All(terms, term => Assert.True(term.Ratio > 0));
    }

    [Fact]
    public void A_typical_figure_carries_that_word() => Assert.Equal(
        "typical",
        CrystalSpread.Of(Stated with { Basis = Typical }, Sample.Requirement)[0].RestsOn);
}
