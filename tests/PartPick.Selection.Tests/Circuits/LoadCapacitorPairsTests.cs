using System.Collections.Immutable;
using PartPick.Physics;
using PartPick.Values;

namespace PartPick.Selection.Tests.Circuits;

public class LoadCapacitorPairsTests
{
    // ST AN2867, section 3.3: a load of 15 pF with 5 pF of stray beside the pair asks for 20 pF each.
    // NXP IMXRT500HDG, p. 19: 2·12.5 − 3 = 22 pF and 2·9 − 3 = 15 pF, with 3 pF at each pin.
    [Theory]
    [InlineData(15e-12, 5e-12, 0, 20e-12)]
    [InlineData(12.5e-12, 0, 3e-12, 22e-12)]
    [InlineData(9e-12, 0, 3e-12, 15e-12)]
    public void Published_pairs_are_found_first(double load, double stray, double pin, double expected)
    {
        LoadPairRequest request = Request(load) with { StrayFarads = stray, PinStrayFarads = pin };

        LoadPair best = LoadCapacitorPairs.Find(request)[0];

        Assert.Equal(expected, request.ExactFarads, 1e-18);
        Assert.Equal((expected, expected), (best.C1.Farads, best.C2.Farads));
        Assert.Equal(load, best.LoadFarads, 1e-18);
        Assert.Equal(0, best.DeviationRatio, 1e-12);
    }

    [Theory]
    [InlineData(18e-12, "E24", false)]
    [InlineData(9.3e-12, "E12", false)]
    [InlineData(20.7e-12, "E6", true)]
    [InlineData(6e-12, "E12", true)]
    public void Nearest_pairs_are_the_same_as_trying_every_pair(double load, string series, bool parallel)
    {
        LoadPairRequest request = Request(load, series) with { PinStrayFarads = 4e-12, StrayFarads = 1e-12, Parallel = parallel, Top = 6 };

        double[] found = [.. LoadCapacitorPairs.Find(request).Select(pair => Math.Abs(pair.DeviationRatio))];

        double[] all = [.. EveryDeviation(request).Order()];
        // The nearest equal pair may take the last place.
        Assert.Equal(all.Take(5), found.Take(5), (a, b) => Math.Abs(a - b) < 1e-9);
    }

    [Fact]
    public void Nearest_equal_pair_is_always_listed() =>
        Assert.Contains(LoadCapacitorPairs.Find(Request(18e-12) with { PinStrayFarads = 4e-12, Top = 3 }), pair => pair.IsEqual);

    [Fact]
    public void Two_in_parallel_come_nearer_than_one()
    {
        LoadPairRequest one = Request(17.3e-12, "E6") with { PinStrayFarads = 4e-12 };

        Assert.True(Best(one with { Parallel = true }) < Best(one) / 2);
    }

    // Arithmetic: 18 → 20 pF with Cm 12 fF and C0 4 pF is −22.715 ppm by the exact formula.
    [Fact]
    public void Frequency_comes_from_the_crystals_exact_formula()
    {
        var crystal = new Crystal
        {
            NominalHz = 4e6, LoadFarads = 18e-12, ShuntFarads = 4e-12, MotionalFarads = 12e-15, ResistanceOhms = 50,
        };

        LoadPair pair = LoadCapacitorPairs.Find(Request(20e-12, "E6") with { PinStrayFarads = 7e-12, Crystal = crystal })
            .First(pair => pair is { IsEqual: true, C1.Farads: 33e-12 });

        Assert.Equal(20e-12, pair.LoadFarads, 1e-18);
        Assert.Equal(-22.715e-6, pair.ShiftRatio!.Value, 1e-9);
    }

    [Fact]
    public void Strays_that_make_the_load_leave_no_pair() =>
        Assert.Empty(LoadCapacitorPairs.Find(Request(5e-12) with { StrayFarads = 5e-12 }));

    private static LoadPairRequest Request(double load, string series = "E24") =>
        new() { LoadFarads = load, Series = PreferredSeries.Named(series).Value };

    private static double Best(LoadPairRequest request) => Math.Abs(LoadCapacitorPairs.Find(request)[0].DeviationRatio);

    private static IEnumerable<double> EveryDeviation(LoadPairRequest request)
    {
        double[] values = [.. request.Series.ValuesBetween(1e-12, 1e-9)];
        double[] sums = request.Parallel ? [.. values, .. values.SelectMany((a, i) => values.Skip(i).Select(b => a + b))] : values;
        ImmutableArray<double> sides = [.. sums.Order().Aggregate(new List<double>(), (kept, sum) =>
        {
            if (kept.Count == 0 || sum > kept[^1] * (1 + 1e-9))
            {
                kept.Add(sum);
            }

            return kept;
        })];
        return from a in sides
               from b in sides
               where b >= a && b <= a * request.LargestRatio * (1 + 1e-9)
               let first = a + request.PinStrayFarads
               let second = b + request.PinStrayFarads
               select Math.Abs((1 / (1 / first + 1 / second) + request.StrayFarads) / request.LoadFarads - 1);
    }
}
