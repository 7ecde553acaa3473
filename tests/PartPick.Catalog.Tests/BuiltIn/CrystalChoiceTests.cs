namespace PartPick.Catalog.Tests.BuiltIn;

public class CrystalChoiceTests
{
    // The usual frequencies of the trade, with the binary ones of time bases (common practice).
    private static readonly double[] UsualMegahertz =
    [
        0.032768, 1.024, 1.8432, 2, 2.048, 3, 3.2768, 3.6864, 4, 4.096, 4.194304, 5, 6, 7.3728, 8, 8.192, 10, 11.0592, 12, 14.31818,
        14.7456, 16, 16.384, 18.432, 20, 22, 22.1184, 24, 25, 26, 27, 32, 32.768, 40, 48, 50,
    ];

    private static IEnumerable<CrystalPart> Crystals => BuiltInParts.Catalog.Crystals;

    [Fact]
    public void Every_usual_frequency_comes_in_several_loads_or_grades() => Assert.All(UsualMegahertz, megahertz =>
    {
        CrystalPart[] same = [.. Crystals.Where(crystal => Math.Abs(crystal.FrequencyHz - (megahertz * 1e6)) < 0.5)];
        Assert.True(same.Length >= 3);
        Assert.True(same.Select(crystal => crystal.LoadFarads).Distinct().Count() >= 2);
        Assert.True(same.Select(crystal => crystal.ToleranceRatio).Distinct().Count() >= 2);
    });

    [Fact]
    public void Loads_are_the_usual_ones()
    {
        // Makers' tables; 6, 7, 9 and 12.5 pF: CTS TF20 data sheet.
        double[] at = [8, 9, 10, 12, 13, 16, 18, 20, 24, 30, 32];
        double[] fork = [6, 7, 9, 12.5];
        Assert.All(Crystals.Where(crystal => crystal.LoadFarads is not null), crystal => Assert.Contains(
            Math.Round(crystal.LoadFarads!.Value / BuiltInParts.Pico, 3), crystal.Cut == CrystalCut.Fork ? fork : at));
    }

    [Fact]
    public void Each_usual_fork_load_is_there() => Assert.Equal(
        [6, 7, 9, 12.5],
        Crystals.Where(crystal => crystal.Cut == CrystalCut.Fork)
            .Select(crystal => Math.Round(crystal.LoadFarads!.Value / BuiltInParts.Pico, 3)).Distinct().Order());

    [Fact]
    public void Some_crystals_are_for_series_resonance() =>
        Assert.InRange(Crystals.Count(crystal => crystal.LoadFarads is null), 10, 60);

    [Fact]
    public void Low_frequencies_need_the_large_holder()
    {
        Assert.All(Crystals.Where(crystal => crystal.Cut == CrystalCut.AT && crystal.FrequencyHz < 3.2e6),
            crystal => Assert.Equal("HC-49/U", crystal.Holder));
        Assert.All(Crystals.Where(crystal => crystal.Holder == "5032"), crystal => Assert.True(crystal.FrequencyHz >= 8e6));
        Assert.All(Crystals.Where(crystal => crystal.Holder == "3225"), crystal => Assert.True(crystal.FrequencyHz >= 12e6));
    }

    [Fact]
    public void High_frequencies_are_not_made_as_fundamentals_in_through_hole_holders() => Assert.All(
        Crystals.Where(crystal => crystal.FrequencyHz > 30e6), crystal => Assert.Contains(crystal.Holder, new[] { "5032", "3225" }));

    [Fact]
    public void Every_crystal_is_a_fundamental() => Assert.All(Crystals, crystal => Assert.Equal(1, crystal.Overtone));

    [Fact]
    public void A_tighter_tolerance_never_costs_less()
    {
        int compared = 0;
        foreach (var group in Crystals.GroupBy(crystal => (crystal.FrequencyHz, crystal.Holder, crystal.LoadFarads)))
        {
            foreach (var (tight, loose) in group.OrderBy(crystal => crystal.ToleranceRatio).Neighbours())
            {
                compared++;
                Assert.True(tight.StabilityRatio is null || tight.StabilityRatio <= loose.StabilityRatio, tight.Id);
                Assert.All([1, 10, 100, 1000], quantity => Assert.True(tight.CostEach(quantity) >= loose.CostEach(quantity), tight.Id));
            }
        }

        Assert.True(compared >= 40);
    }
}
