using PartPick.Catalog;
using PartPick.Selection.Search;

namespace PartPick.Selection.Tests.Ranking;

public class CrystalReachTests
{
    [Fact]
    public void Every_crystal_that_reaches_a_frequency_is_found_and_hardly_any_other()
    {
        CrystalPart sample = PartsCatalog.BuiltIn().Crystals[0];
        (int found, int reaching) = (0, 0);
        for (int seed = 0; seed < 40; seed++)
        {
            var random = new Random(seed);
            CrystalPart[] parts = [.. Enumerable.Range(0, 200).Select(_ => Draw(random, sample))];
            var reach = new CrystalReach(parts.Length, place => CrystalOutline.Of(parts[place]));
            CrystalModel[] models = [.. parts.Select(CrystalModel.From)];
            for (int i = 0; i < 50; i++)
            {
                double target = i % 2 == 0 ? Edge(random, models) : Math.Exp(Math.Log(30e3) + random.NextDouble() * Math.Log(1000));
                double budget = random.Next(4) switch { 0 => 20e-6, 1 => 1e-3, 2 => 0.3, _ => 1.5 };
                int[] expected =
                    [.. Enumerable.Range(0, parts.Length).Where(p => Specification.ReachesFrequency(models[p], target, budget))];
                int[] within = reach.Within(target, budget);
                Assert.Empty(expected.Except(within));
                Assert.Equal(within.Order(), within);
                reaching += expected.Length;
                found += within.Length;
            }
        }

        Assert.InRange(found, reaching, reaching * 1.01);
    }

    // A frequency at the very end of what a crystal can reach without any budget.
    private static double Edge(Random random, CrystalModel[] models)
    {
        CrystalModel model = models[random.Next(models.Length)];
        double series = model.Crystal.SeriesHz;
        return random.Next(2) == 0 ? series : series * Math.Sqrt(1 + model.Crystal.MotionalFarads / model.Crystal.ShuntFarads);
    }

    private static CrystalPart Draw(Random random, CrystalPart sample) => sample with
    {
        FrequencyHz = random.Next(3) == 0 ? 4e6 : 30e3 * Math.Pow(1000, random.NextDouble()),
        Cut = random.Next(2) == 0 ? CrystalCut.Fork : CrystalCut.AT,
        LoadFarads = random.Next(3) == 0 ? null : random.Next(4, 33) * 1e-12,
        ShuntFarads = random.Next(3) == 0 ? null : random.NextDouble() * 7e-12 + 1e-13,
        MotionalFarads = random.Next(3) == 0 ? null : Math.Exp(random.NextDouble() * 9) * 1e-15,
        Package = random.Next(3) switch { 0 => null, 1 => "SMD 3225", _ => "HC49" },
    };
}
