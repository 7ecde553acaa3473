using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Values;

namespace PartPick.Selection.Tests.Purchasing;

public sealed class PurchaseListTests
{
    [Fact]
    public void One_line_a_part_is_merged_over_all_circuits_and_totals_agree_to_the_cent()
    {
        // By hand, without attrition. C-A stands twice on 150 boards and once on 75: 375 at 0.0126 = 4.725 -> 4.73.
        // C-B once on 150: 150 at 0.025 = 3.75. X once on both: 225 at 0.333 = 74.925 -> 74.93. Sum 83.41.
        CapacitorPart a = Sample.Capacitor(15e-12, "C-A", "1:0.028;100:0.0126"), b = Sample.Capacitor(22e-12, "C-B", "1:0.025");
        CrystalPart x = Sample.Crystal with { Offer = Sample.Price("1:0.5;100:0.333") };
        PurchaseList list = Build(
            AttritionRates.None, [a, b, x],
            new PurchaseCircuit("1", "one", 150, [Use("C1", a), Use("C2", a), Use("C3", b), Use("Y1", x)]),
            new PurchaseCircuit("2", "two", 75, [Use("C1", a), Use("Y1", x)]));

        Assert.Equal(["C-A", "C-B", "X"], list.Lines.Select(line => line.Parts.Single().Id));
        Assert.Equal([375, 150, 225], list.Lines.Select(line => line.Orders.Single().Quantity));
        Assert.Equal([4.73m, 3.75m, 74.93m], list.Lines.Select(line => line.Total!.Value));
        Assert.Equal(83.41m, list.Total);
        Assert.Equal("EUR", list.Currency);
        Assert.Equal(["C1", "C2"], list.Lines[0].Uses[0].Designators);
        Assert.Equal(["C1"], list.Lines[0].Uses[1].Designators);
    }

    [Fact]
    public void Attrition_is_added_before_minimum_order_and_multiple()
    {
        // 101 boards and 3 %: 104.03 -> 105; sold from 50 in packs of 20: 120.
        ResistorPart r = Sample.Resistor(680, "R-A") with { Offer = Sample.Price("1:0.01", 50, 20) };
        PurchaseLine line = Build(AttritionRates.Usual, [r], new PurchaseCircuit("1", "", 101, [Use("R1", r)])).Lines.Single();
        Assert.Equal((101, 105, 120), (line.Needed, line.Required, line.Orders[0].Quantity));
        Assert.Equal(1.20m, line.Total);
    }

    [Fact]
    public void More_is_bought_where_a_lower_price_makes_it_cheaper_and_the_stock_allows_it()
    {
        // 90 at 0.10 are 9; 100 at 0.08 are 8. With only 95 in stock the 90 have to do.
        CapacitorPart c = Sample.Capacitor(1e-11, "C", "1:0.10;100:0.08");
        Assert.Equal(100, Order(c).Quantity);
        Assert.Equal(0.08m, Order(c).UnitPrice);
        Assert.Equal(90, Order(c with { Stock = 95 }).Quantity);
        Assert.Equal(Coverage.Yes, Order(c with { Stock = 95 }).Covered);
        Assert.Equal(Coverage.Unknown, Order(c).Covered);

        static PurchaseOrder Order(CapacitorPart part) =>
            Build(AttritionRates.None, [part], new PurchaseCircuit("1", "", 90, [Use("C1", part)])).Lines.Single().Orders.Single();
    }

    [Fact]
    public void A_stock_that_does_not_cover_is_split_with_an_equal_part_and_not_with_another()
    {
        // Single buying: only C-2 has 500, at 0.20: 100. Together 300 x 0.10 + 200 x 0.20 = 70.
        CapacitorPart first = Sample.Capacitor(1e-11, "C-1", "1:0.10", 300), second = Sample.Capacitor(1e-11, "C-2", "1:0.20", 900);
        CapacitorPart coarse = Sample.Capacitor(1e-11, "C-3", "1:0.01", 9000) with { ToleranceRatio = 0.1 };
        PurchaseLine line = Build(AttritionRates.None, [first, second, coarse], new PurchaseCircuit("1", "", 500, [Use("C1", first)]))
            .Lines.Single();
        Assert.Equal([("C-1", 300), ("C-2", 200)], line.Orders.Select(order => (order.Part.Id, order.Quantity)));
        Assert.Equal((70m, 100m, 30m), (line.Total, line.SingleTotal, line.Saving));
        Assert.Equal(Coverage.Yes, line.Covered);
    }

    [Fact]
    public void Equal_parts_that_run_short_together_are_one_line_and_share_their_stock()
    {
        CapacitorPart first = Sample.Capacitor(1e-11, "C-1", "1:0.10", 300), second = Sample.Capacitor(1e-11, "C-2", "1:0.20", 350);
        PurchaseList list = Build(
            AttritionRates.None, [first, second],
            new PurchaseCircuit("1", "", 400, [Use("C1", first)]), new PurchaseCircuit("2", "", 200, [Use("C1", second)]));
        PurchaseLine line = Assert.Single(list.Lines);
        Assert.Equal(["C-1", "C-2"], line.Parts.Select(part => part.Id));
        Assert.Equal([300, 300], line.Orders.Select(order => order.Quantity));
    }

    [Fact]
    public void Where_nothing_covers_the_line_says_so_and_orders_what_is_needed()
    {
        CapacitorPart c = Sample.Capacitor(1e-11, "C", "1:0.10", 30);
        PurchaseList list = Build(AttritionRates.None, [c], new PurchaseCircuit("1", "", 50, [Use("C1", c)]));
        Assert.Equal(Coverage.No, list.Uncovered.Single().Covered);
        Assert.Equal((50, 5m), (list.Lines[0].Orders[0].Quantity, list.Total));
    }

    [Fact]
    public void A_part_that_is_gone_has_no_price_and_an_equal_one_takes_its_place()
    {
        CapacitorPart gone = Sample.Capacitor(1e-11, "C-1", "1:0.10"), equal = Sample.Capacitor(1e-11, "C-2", "1:0.20");
        Assert.Equal("C-2", Build(AttritionRates.None, [equal], new PurchaseCircuit("1", "", 5, [Use("C1", gone)]))
            .Lines.Single().Orders.Single().Part.Id);
        PurchaseList list = Build(AttritionRates.None, [], new PurchaseCircuit("1", "", 5, [Use("C1", gone)]));
        Assert.True(list.Lines[0].IsGone);
        Assert.Null(list.Lines[0].Total);
        Assert.Single(list.Unpriced);
    }

    [Fact]
    public void Mixed_currencies_are_refused_with_their_rows_unless_a_rate_is_given()
    {
        CapacitorPart euro = Sample.Capacitor(1e-11, "C-E");
        CapacitorPart dollar = Sample.Capacitor(2e-11, "C-D") with { Offer = Sample.Price("1:0.50", currency: "USD") };
        var circuit = new PurchaseCircuit("1", "", 100, [Use("C1", euro), Use("C2", dollar)]);
        Problem problem = Try(PurchaseOptionsOf(AttritionRates.None), [euro, dollar], circuit).Problem!;
        Assert.Contains("EUR: C-E (C1); USD: C-D (C2)", problem.What, StringComparison.Ordinal);

        // 100 x 0.01 + 100 x 0.50 x 0.9 = 46.
        PurchaseOptions rated = PurchaseOptionsOf(AttritionRates.None) with
        {
            Rates = new CurrencyRates(null, ImmutableSortedDictionary<string, decimal>.Empty.Add("USD", 0.9m)),
        };
        PurchaseList list = Try(rated, [euro, dollar], circuit).Value;
        Assert.Equal(("EUR", 46m), (list.Currency, list.Total));
        Assert.Equal(0.45m, list.Lines[1].Orders[0].UnitPrice);
    }

    [Fact]
    public void More_than_can_be_counted_is_a_problem() => Assert.False(Try(
        PurchaseOptionsOf(AttritionRates.Usual), [Sample.Crystal],
        new PurchaseCircuit("1", "", int.MaxValue, [Use("Y1", Sample.Crystal)])).IsOk);

    [Fact]
    public void A_description_says_what_a_buyer_needs()
    {
        Assert.Equal("Capacitor 15 pF ±5 %, C0G", BuyerText.Of(Sample.Capacitor(15e-12, "C")));
        Assert.Equal("Resistor 4.7 kΩ ±5 %", BuyerText.Of(Sample.Resistor(4700, "R")));
        Assert.Equal(
            "Quartz crystal 4 MHz, AT cut, fundamental, load 18 pF, ±30 ppm at 25 °C, ±50 ppm from -20 to 70 °C, at most 60 Ω, "
            + "drive level 500 µW, holder HC-49/U",
            BuyerText.Of(Sample.Crystal with
            {
                ToleranceRatio = 30e-6, StabilityRatio = 50e-6, TemperatureMinCelsius = -20, TemperatureMaxCelsius = 70, Holder = "HC-49/U",
            }));
    }

    [Fact]
    public void Built_in_parts_that_differ_in_tolerance_or_package_are_not_equal() =>
        Assert.All(
            PartsCatalog.BuiltIn().All.GroupBy(EqualParts.KeyOf).Where(group => group.Count() > 1),
            group => Assert.Single(group.Select(part => (part.Package, (part as CapacitorPart)?.ToleranceRatio)).Distinct()));

    private static PurchaseOptions PurchaseOptionsOf(AttritionRates rates) => new() { Attrition = rates };

    private static PurchaseList Build(AttritionRates rates, Part[] catalog, params PurchaseCircuit[] circuits) =>
        Try(PurchaseOptionsOf(rates), catalog, circuits).Value;

    private static Result<PurchaseList> Try(PurchaseOptions options, Part[] catalog, params PurchaseCircuit[] circuits) =>
        new PurchaseListBuilder(new PartsCatalog(catalog), options).Build("list", [.. circuits]);

    private static PartUse Use(string designator, Part part) => new(designator, "", part, "");
}
