namespace PartPick.Selection.Tests.Alternates;

/// <summary>How much a change of parts changes (arithmetic, worked by hand).</summary>
public class CandidateChangeTests
{
    // 100 ppm allowed, 60 used; a margin of 10 where 5 is wanted; 400 of 500 µW; 20 of 50 ms; 0.50 of 1.00 each.
    private static readonly Requirement Wanted = Sample.Requirement with
    {
        BudgetRatio = 100e-6,
        Margin = 5,
        StartUpTimeSeconds = 50e-3,
        CostLimit = 1,
    };

    private static Candidate Before { get; } = AlternatesBench.Chosen().Candidate with
    {
        Budget = new ErrorBudget(10e-6, [new BudgetTerm("all", 50e-6)]),
        Margin = new AtCorner(10, ""),
        Drive = new AtCorner(400e-6, ""),
        RatedDriveWatts = 500e-6,
        StartUpTime = new AtCorner(20e-3, ""),
        Cost = 0.5m,
    };

    [Fact]
    public void Nothing_changes_where_nothing_changes() => Assert.Equal(0, CandidateChange.Between(Before, Before, Wanted).Size);

    [Fact]
    public void An_error_is_taken_over_what_the_budget_had_left()
    {
        // 10 ppm more of 40 ppm left.
        Candidate after = Before with { Budget = new ErrorBudget(10e-6, [new BudgetTerm("all", 60e-6)]) };
        Is(after, ChangedFigure.Error, 0.25);
    }

    [Fact]
    public void A_frequency_that_moves_through_the_target_counts_though_the_error_stays()
    {
        // From +10 to -10 ppm: 20 ppm of 40 ppm left.
        Candidate after = Before with { Budget = new ErrorBudget(-10e-6, [new BudgetTerm("all", 50e-6)]) };
        Is(after, ChangedFigure.Frequency, 0.5);
    }

    [Fact]
    public void A_margin_is_taken_as_its_limit_over_it()
    {
        // From 5/10 to 5/8 of the limit: 0.125 of 0.5 left.
        Is(Before with { Margin = new AtCorner(8, "") }, ChangedFigure.Margin, 0.25);
    }

    [Fact]
    public void A_drive_level_is_taken_over_the_rating_of_its_own_crystal()
    {
        // From 0.8 to 400/1000 of the rating: 0.4 of 0.2 left.
        Is(Before with { RatedDriveWatts = 1e-3 }, ChangedFigure.Drive, 2);
    }

    [Fact]
    public void Start_up_time_and_cost_count_over_their_limits()
    {
        Is(Before with { StartUpTime = new AtCorner(35e-3, "") }, ChangedFigure.StartUpTime, 0.5);
        Is(Before with { Cost = 0.4m }, ChangedFigure.Cost, 0.2);
    }

    [Fact]
    public void A_cost_without_a_limit_is_taken_over_itself()
    {
        CandidateChange change = CandidateChange.Between(Before, Before with { Cost = 0.4m }, Wanted with { CostLimit = null });
        Assert.Equal((ChangedFigure.Cost, 0.2, -0.1m), (change.Most, Math.Round(change.Size, 12), change.Cost));
    }

    [Fact]
    public void At_its_limit_a_hundredth_of_the_limit_counts_as_left()
    {
        Candidate full = Before with { Budget = new ErrorBudget(0, [new BudgetTerm("all", 120e-6)]) };
        Candidate after = Before with { Budget = new ErrorBudget(0, [new BudgetTerm("all", 119e-6)]) };
        Assert.Equal(1, CandidateChange.Between(full, after, Wanted).Size, 9);
    }

    private static void Is(Candidate after, ChangedFigure most, double size)
    {
        CandidateChange change = CandidateChange.Between(Before, after, Wanted);
        Assert.Equal(most, change.Most);
        Assert.Equal(size, change.Size, 9);
    }
}
