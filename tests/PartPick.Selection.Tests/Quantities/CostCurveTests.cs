using PartPick.Catalog;

namespace PartPick.Selection.Tests.Quantities;

/// <summary>Cost per unit over the number of boards and where it turns (arithmetic, worked by hand or by trying every quantity).</summary>
public class CostCurveTests
{
    private static readonly SupportParts None = new(null, null, null);

    public static TheoryData<int> Seeds => [.. Enumerable.Range(0, 20)];

    // What is not looked at costs one a hundred pieces, so that the rest of the circuit does not turn.
    private static CandidateParts Choice(CapacitorPart c1, CapacitorPart c2) => new()
    {
        Circuit = CircuitKind.Gate,
        Crystal = Sample.Crystal with { Offer = Sample.Price("1:0.5") },
        Amplifier = Sample.Inverter with { Offer = Sample.Price("1:0.2") },
        C1 = c1,
        C2 = c2,
    };

    private static CapacitorPart Plain { get; } = Sample.Capacitor(33e-12, "C33", "1:0.01");

    [Fact]
    public void Prices_turn_where_the_next_break_is_cheaper_in_total_and_where_it_is_used_up()
    {
        // Eight at 0.10 cost as much as ten at 0.08, nine cost more: from nine on, ten are bought. 62 at 0.08 cost 4.96 and 63
        // cost 5.04: from 63 on, a hundred at 0.05.
        CapacitorPart stepped = Sample.Capacitor(22e-12, "C22", "1:0.10;10:0.08;100:0.05");

        CostCurve curve = CostCurve.Of(new BoardParts(Choice(stepped, Plain), None), 150)!;

        Assert.Equal(
            [
                (9, CostBreakKind.Price, 10, 0.08m), (10, CostBreakKind.UsedUp, 10, 0.08m),
                (63, CostBreakKind.Price, 100, 0.05m), (100, CostBreakKind.UsedUp, 100, 0.05m),
            ],
            curve.Breaks.Select(turn => (turn.Builds, turn.Kind, turn.Ordered, turn.UnitPrice)));
        Assert.Equal(0.71m + 0.10m, curve.UnitCost(1));
        Assert.Equal(0.71m + 0.10m, curve.UnitCost(8));
        Assert.Equal(0.71m + 0.80m / 9, curve.UnitCost(9));
        Assert.Equal(0.71m + 0.08m, curve.UnitCost(62));
        Assert.Equal(0.71m + 5m / 63, curve.UnitCost(63));
        Assert.Equal(0.71m + 0.05m, curve.UnitCost(100));
        Assert.Equal((0.79m, 0.71m + 5m / 63), (curve.Breaks[2].Before, curve.Breaks[2].After));
    }

    [Fact]
    public void A_minimum_order_is_paid_in_full_until_it_is_used_up()
    {
        CapacitorPart least = Sample.Capacitor(22e-12, "C22") with { Offer = Sample.Price("1:0.02", minimum: 50) };

        CostCurve curve = CostCurve.Of(new BoardParts(Choice(least, Plain), None), 60)!;

        Assert.Equal([(50, CostBreakKind.UsedUp)], curve.Breaks.Select(turn => (turn.Builds, turn.Kind)));
        Assert.Equal((0.71m + 1m, 0.71m + 1m / 49), (curve.UnitCost(1), curve.UnitCost(49)));
        Assert.Equal((0.73m, 0.73m), (curve.UnitCost(50), curve.UnitCost(60)));
    }

    [Fact]
    public void A_multiple_makes_a_step_whenever_one_more_is_needed()
    {
        // Two on every board: 26 for 13 boards do not fit into one multiple of 25, 52 for 26 boards not into two.
        CapacitorPart reel = Sample.Capacitor(22e-12, "C22") with { Offer = Sample.Price("1:0.02", multiple: 25) };

        CostCurve curve = CostCurve.Of(new BoardParts(Choice(reel, reel), None), 40)!;

        Assert.Equal(
            [(13, CostBreakKind.Multiple, 50), (26, CostBreakKind.Multiple, 75), (38, CostBreakKind.Multiple, 100)],
            curve.Breaks.Select(turn => (turn.Builds, turn.Kind, turn.Ordered)));
        Assert.Equal(0.7m + 0.5m / 12, curve.UnitCost(12));
        Assert.Equal(0.7m + 1m / 13, curve.UnitCost(13));
    }

    [Fact]
    public void The_number_of_boards_that_the_stock_covers_is_that_of_the_scarcest_part()
    {
        CapacitorPart scarce = Sample.Capacitor(22e-12, "C22", stock: 31);

        CostCurve curve = CostCurve.Of(new BoardParts(Choice(scarce, scarce), None), 40)!;

        Assert.Equal(15, curve.CoveredTo);
        Assert.Equal([(16, CostBreakKind.Stock)], curve.Breaks.Select(turn => (turn.Builds, turn.Kind)));
        Assert.Null(CostCurve.Of(new BoardParts(Choice(Plain, Plain), None), 40)!.CoveredTo);
    }

    [Fact]
    public void A_part_without_a_price_has_no_curve() =>
        Assert.Null(CostCurve.Of(new BoardParts(Choice(Plain with { Offer = Offer.Unknown }, Plain), None), 40));

    [Theory]
    [MemberData(nameof(Seeds))]
    public void Every_cost_is_that_of_the_best_purchase_and_between_the_breaks_nothing_turns(int seed)
    {
        var random = new Random(seed);
        Offer offer = Draw(random);
        int count = random.Next(1, 3);
        CapacitorPart part = Sample.Capacitor(22e-12, "C22") with { Offer = offer };
        CapacitorPart other = count == 2 ? part : Plain;

        CostCurve curve = CostCurve.Of(new BoardParts(Choice(part, other), None), 130)!;

        decimal rest = count == 2 ? 0.7m : 0.71m;
        (int Quantity, decimal Total)[] best = [.. Enumerable.Range(0, 131).Select(builds => Best(offer, count * builds))];
        for (int builds = 1; builds <= 130; builds++)
        {
            Assert.Equal(rest + best[builds].Total / builds, curve.UnitCost(builds), 20);
        }

        int[] turns = [.. curve.Breaks.Select(turn => turn.Builds)];
        for (int builds = 2; builds <= 130; builds++)
        {
            decimal now = best[builds].Total / best[builds].Quantity;
            decimal before = best[builds - 1].Total / best[builds - 1].Quantity;
            bool stays = best[builds].Quantity == best[builds - 1].Quantity && best[builds].Quantity > count * builds;
            bool follows = best[builds].Quantity == count * builds && best[builds - 1].Quantity == count * (builds - 1);
            bool same = decimal.Round(now - before, 20) == 0;
            if (!turns.Contains(builds))
            {
                bool inMultiple = offer.Multiple > 1 && best[builds].Quantity == best[builds - 1].Quantity;
                Assert.True(same && (stays || follows || inMultiple), $"{builds} boards turn unseen");
            }
            else
            {
                Assert.False(same && (stays || follows) && offer.Multiple == 1, $"{builds} boards do not turn");
            }
        }
    }

    private static Offer Draw(Random random)
    {
        decimal price = random.Next(10, 30);
        var prices = new List<string>();
        foreach (int quantity in new[] { 1, 10, 25, 100, 250 })
        {
            if (quantity == 1 || random.Next(2) == 0)
            {
                prices.Add(FormattableString.Invariant($"{quantity}:{price / 100}"));
                price = Math.Max(1, price - random.Next(0, 8));
            }
        }

        int minimum = random.Next(3) == 0 ? random.Next(1, 60) : 1;
        return Sample.Price(string.Join(';', prices), minimum, random.Next(3) == 0 ? random.Next(2, 30) : 1);
    }

    // Every quantity that may be bought, at the price that holds for it.
    private static (int Quantity, decimal Total) Best(Offer offer, int needed) => needed == 0 ? (0, 0) : Enumerable.Range(needed, 700)
        .Where(quantity => quantity >= offer.MinimumOrder && quantity % offer.Multiple == 0)
        .Select(quantity => (quantity, quantity * offer.Prices.Last(price => price.Quantity <= quantity).UnitPrice))
        .OrderBy(way => way.Item2).ThenBy(way => way.quantity).First();
}
