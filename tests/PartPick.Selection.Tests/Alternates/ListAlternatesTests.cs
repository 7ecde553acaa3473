using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection.Tests.Alternates;

/// <summary>Replacements for several circuits together, and for a circuit of which a part is gone (arithmetic).</summary>
public class ListAlternatesTests
{
    private static CancellationToken Cancellation => TestContext.Current.CancellationToken;

    [Fact]
    public void A_replacement_keeps_every_circuit_fit()
    {
        ChosenCircuit chosen = AlternatesBench.Chosen();
        // Twenty pieces for ten boards; 0.77 each with the dearer capacitor.
        Requirement cheap = AlternatesBench.Requirement with { CostLimit = 0.75m };

        ImmutableArray<string> one = Of((chosen, AlternatesBench.Requirement));
        ImmutableArray<string> both = Of((chosen, AlternatesBench.Requirement), (chosen, cheap));

        Assert.Equal(["C22-B", "C27"], one);
        Assert.Equal(["C27"], both);

        static ImmutableArray<string> Of(params (ChosenCircuit, Requirement)[] circuits) =>
            ListAlternates.Of(circuits, AlternatesBench.Parts, cancellation: Cancellation)["C22"];
    }

    [Fact]
    public void No_more_are_named_than_are_wanted() => Assert.Equal(
        ["C22-B"],
        ListAlternates.Of(
            [(AlternatesBench.Chosen(), AlternatesBench.Requirement)], AlternatesBench.Parts, 1, cancellation: Cancellation)["C22"]);

    [Fact]
    public void A_part_that_the_catalogue_has_no_more_is_replaced_as_it_was()
    {
        var reviewer = new ShortlistReviewer(AlternatesBench.Parts);
        ShortlistEntry entry = reviewer.Make(
            AlternatesBench.Choice, null, AlternatesBench.Requirement, null, new DateOnly(2026, 3, 1)).Value;
        PartsCatalog today = new(AlternatesBench.Parts.All.Where(part => part.Id != "C22"));
        ShortlistReview review = new ShortlistReviewer(today).Review("list", entry).Value;
        Assert.True(review.HasGoneParts);

        ChosenCircuit chosen = ChosenCircuit.Of(review, today).Value;

        Assert.Equal(AlternatesBench.Chosen().Candidate.Margin, chosen.Candidate.Margin);
        Assert.Equal(
            ["C22-B", "C27"],
            new Selection.Alternates(chosen, review.Requirement, today).Find(BoardLine.Of(chosen.Board)[0], Cancellation)
                .Replacements.Select(one => one.Part.Id));
    }
}
