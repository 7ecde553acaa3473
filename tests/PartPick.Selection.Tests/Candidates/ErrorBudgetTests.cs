using PartPick.Catalog;
using PartPick.Physics;

namespace PartPick.Selection.Tests.Candidates;

public class ErrorBudgetTests
{
    // Worst case of 1, 1, 1.5 % is 3.5 %, RSS 2.06 %; ten of ±0.1 are 0.316 RSS (arithmetic).
    [Fact]
    public void Worst_case_is_the_sum_and_RSS_the_root_of_the_squares()
    {
        var three = new ErrorBudget(0, [new("a", 0.01), new("b", 0.01), new("c", 0.015)]);
        var ten = new ErrorBudget(0, [.. Enumerable.Range(0, 10).Select(k => new BudgetTerm($"t{k}", 0.1))]);

        Assert.Equal(0.035, three.WorstRatio, 1e-15);
        Assert.Equal(0.0206, three.RssRatio, 5e-5);
        Assert.Equal("c", three.Largest.Term);
        Assert.Equal(0.316, ten.RssRatio, 5e-4);
    }

    [Theory]
    [InlineData(20e-6)]
    [InlineData(-20e-6)]
    public void The_centre_counts_in_full_whichever_way_it_is_off(double centre)
    {
        var budget = new ErrorBudget(centre, [new("a", 3e-6), new("b", 4e-6)]);

        Assert.Equal(27e-6, budget.WorstRatio, 1e-18);
        Assert.Equal(25e-6, budget.RssRatio, 1e-18);
    }

    // A crystal that runs at its rated load is on its nominal frequency whatever its Cm and C0 (arithmetic).
    [Fact]
    public void At_the_rated_load_motional_and_shunt_capacitance_do_not_matter()
    {
        Crystal crystal = CrystalModel.From(Sample.Crystal).Crystal;
        var steady = new RunningFigures(crystal.FrequencyAtLoadHz(18e-12), 18e-12, 1e-3, 1e-6);

        Assert.Equal(0, BudgetBuilder.ShiftOf(crystal, steady, 1.3, 1), 1e-15);
        Assert.Equal(0, BudgetBuilder.ShiftOf(crystal, steady, 1, 0.8), 1e-15);
    }

    // 18 → 20 pF with Cm 12 fF and C0 4 pF is −22.715 ppm (arithmetic): 30 % of Cm is 30 % of that, to first order.
    [Fact]
    public void Off_the_rated_load_the_shift_itself_is_uncertain()
    {
        Crystal crystal = CrystalModel.From(Sample.Crystal).Crystal;
        var steady = new RunningFigures(crystal.FrequencyAtLoadHz(20e-12), 20e-12, 1e-3, 1e-6);

        Assert.Equal(0.3 * 22.715e-6, BudgetBuilder.ShiftOf(crystal, steady, 1.3, 1), 0.05e-6);
        Assert.InRange(BudgetBuilder.ShiftOf(crystal, steady, 1, 0.8), 0.5e-6, 3e-6);
    }

    [Fact]
    public void A_capacitor_that_states_its_tolerance_in_farads_or_not_at_all_has_one()
    {
        CapacitorPart part = Sample.Capacitor(4.7e-12, "C") with { ToleranceRatio = null };

        Assert.Equal(0.25 / 4.7, BudgetBuilder.Tolerance(part with { ToleranceFarads = 0.25e-12 }), 1e-12);
        Assert.Equal(0.2, BudgetBuilder.Tolerance(part));
    }

    [Fact]
    public void Temperatures_reach_from_25_degrees_to_the_farther_end() =>
        Assert.Equal(35, BudgetBuilder.TemperatureReach(Sample.Requirement));
}
