using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection.Tests.WhyNot;

public class WhyNotHurdleTests
{
    [Fact]
    public void A_supply_outside_the_device_is_narrowed_to_it()
    {
        Requirement wanted = WhyNotWorld.Wanted with { SupplyMinVolts = 5, SupplyMaxVolts = 7 };

        WhyNotAnswer answer = WhyNotWorld.Ask(wanted, WhyNotWorld.Usual, "U");

        Hurdle hurdle = Assert.Single(answer.Hurdles);
        Assert.Equal(HurdleName.Supply, hurdle.Name);
        Assert.Equal("ends 1 V too low", hurdle.Distance);
        Assert.Equal("5 V..6 V", Lifting(answer, wanted, WhyNotWorld.Usual, "supply").Becomes);
    }

    [Fact]
    public void A_temperature_outside_the_part_is_narrowed_to_it()
    {
        PartsCatalog catalog = WhyNotWorld.Of(WhyNotWorld.Crystal with { TemperatureMinCelsius = 0, TemperatureMaxCelsius = 70 },
            Sample.Inverter);

        WhyNotAnswer answer = WhyNotWorld.Ask(WhyNotWorld.Wanted, catalog, "X");

        Assert.Equal("starts 10 K too high", Assert.Single(answer.Hurdles).Distance);
        Assert.Equal("0..60", Lifting(answer, WhyNotWorld.Wanted, catalog, "temperature").Becomes);
    }

    [Fact]
    public void A_clock_that_is_not_guaranteed_needs_a_higher_supply()
    {
        InverterPart slow = Sample.Inverter with
        {
            Points = [Sample.Inverter.Points[0] with { ClockMinHz = 1e6 }, Sample.Inverter.Points[1] with { ClockMinHz = 5e6 }],
        };
        PartsCatalog catalog = WhyNotWorld.Of(WhyNotWorld.Crystal, slow);

        WhyNotAnswer answer = WhyNotWorld.Ask(WhyNotWorld.Wanted, catalog, "U");

        // 1 MHz at 2 V and 5 MHz at 6 V, in between linear: 4 MHz at 5 V.
        Assert.Equal(HurdleName.Clock, Assert.Single(answer.Hurdles).Name);
        Assert.Equal("5 V..5.5 V", Lifting(answer, WhyNotWorld.Wanted, catalog, "supply").Becomes);
    }

    [Fact]
    public void A_stock_that_is_too_small_serves_fewer_boards()
    {
        PartsCatalog catalog = WhyNotWorld.Of(WhyNotWorld.Crystal with { Stock = 7 }, Sample.Inverter);

        WhyNotAnswer answer = WhyNotWorld.Ask(WhyNotWorld.Wanted, catalog, "X");

        Assert.Equal((HurdleName.Stock, "3 too few"), (answer.Hurdles[0].Name, answer.Hurdles[0].Distance));
        Assert.Equal("7", Lifting(answer, WhyNotWorld.Wanted, catalog, "builds").Becomes);
    }

    [Fact]
    public void What_is_excluded_by_hand_would_be_let_in_by_taking_it_in_again()
    {
        PartsCatalog catalog = WhyNotWorld.Of(WhyNotWorld.Crystal with { Excluded = true }, Sample.Inverter);

        WhyNotAnswer answer = WhyNotWorld.Ask(WhyNotWorld.Wanted, catalog, "X");

        Assert.False(answer.Fits);
        Assert.Equal(HurdleName.Excluded, Assert.Single(answer.Hurdles).Name);
        ChangeSet set = Assert.Single(answer.Changes);
        Assert.False(set.IsOfRequirement);
        Assert.Equal("X excluded yes -> no", set.ToString());
        Assert.True(set.Candidate.IsFit);
    }

    [Fact]
    public void Without_a_price_or_on_an_overtone_nothing_lets_it_in()
    {
        PartsCatalog catalog = WhyNotWorld.Of(
            WhyNotWorld.Crystal, WhyNotWorld.Crystal with { Id = "X-none", Offer = Offer.Unknown },
            WhyNotWorld.Crystal with { Id = "X-dollar", Offer = Sample.Price("1:0.1", currency: "USD") },
            WhyNotWorld.Crystal with { Id = "X-3rd", Overtone = 3 }, Sample.Inverter);

        Assert.Equal([HurdleName.Price, HurdleName.Price, HurdleName.Overtone], new[] { "X-none", "X-dollar", "X-3rd" }.Select(id =>
        {
            WhyNotAnswer answer = WhyNotWorld.Ask(WhyNotWorld.Wanted, catalog, id);
            Assert.Empty(answer.Changes);
            return Assert.Single(answer.Hurdles).Name;
        }));
    }

    [Fact]
    public void A_circuit_that_is_not_wanted_is_named_with_the_circuit_that_it_needs()
    {
        Requirement wanted = WhyNotWorld.Wanted with { Circuits = [CircuitKind.Port] };

        WhyNotAnswer answer = WhyNotWorld.Ask(wanted, WhyNotWorld.Usual, "U");

        Assert.Equal((HurdleName.Circuit, "port", "gate"), (answer.Hurdles[0].Name, answer.Hurdles[0].Wanted, answer.Hurdles[0].Has));
        Assert.Equal("port gate", Lifting(answer, wanted, WhyNotWorld.Usual, "circuits").Becomes);
    }

    [Fact]
    public void A_frequency_that_no_stage_gives_is_named_with_the_nearest_one()
    {
        Requirement wanted = WhyNotWorld.Wanted with { OutputHz = 3.9e6 };

        WhyNotAnswer answer = WhyNotWorld.Ask(wanted, WhyNotWorld.Usual, "X");

        Assert.Equal((HurdleName.Frequency, "2.56 % above"), (answer.Hurdles[0].Name, answer.Hurdles[0].Distance));
        Assert.Equal("4 MHz", Lifting(answer, wanted, WhyNotWorld.Usual, "output").Becomes);
    }

    [Fact]
    public void A_hurdle_and_a_broken_limit_are_one_set_of_changes()
    {
        PartsCatalog catalog = WhyNotWorld.Of(WhyNotWorld.Crystal with { TemperatureMinCelsius = 0, TemperatureMaxCelsius = 70 },
            Sample.Inverter);
        Requirement wanted = WhyNotWorld.Wanted with { BudgetRatio = 70e-6 };

        WhyNotAnswer answer = WhyNotWorld.Ask(wanted, catalog, "X");

        ImmutableArray<NeededChange> changes = answer.Changes[0].Changes;
        Assert.Equal(["temperature", "budget"], changes.Select(change => change.Key!.Name));
        Assert.NotEmpty(WhyNotWorld.Listed(changes.Aggregate(wanted, WhyNotWorld.With), catalog));
        Assert.All(changes, change => Assert.Empty(WhyNotWorld.Listed(wanted.With(change), catalog)));
    }

    // The only change of the smallest set: without it nothing is listed, with it, typed as an option, the part is.
    private static NeededChange Lifting(WhyNotAnswer answer, Requirement wanted, PartsCatalog catalog, string key)
    {
        NeededChange change = Assert.Single(answer.Changes[0].Changes);
        Assert.Equal(key, change.Key!.Name);
        Assert.Empty(WhyNotWorld.Listed(wanted, catalog));
        Assert.Contains(answer.Part.Id, WhyNotWorld.Listed(wanted.With(change), catalog));
        return change;
    }
}
