using PartPick.Catalog;

namespace PartPick.Selection.Tests.Costs;

/// <summary>The parts of a circuit, and equal ones bought together (arithmetic).</summary>
public class BillOfPartsTests
{
    private static readonly CapacitorPart Load = Sample.Capacitor(22e-12, "C22", "1:0.10;20:0.04");
    private static readonly SupportParts None = new(null, null, null);

    private static CandidateParts Choice => new()
    {
        Circuit = CircuitKind.Gate, Crystal = Sample.Crystal, Amplifier = Sample.Inverter, C1 = Load, C2 = Load,
    };

    [Fact]
    public void Two_equal_capacitors_are_bought_together()
    {
        var market = new Market(new PartsCatalog([Load]), 10);

        // Twenty at 0.04 for ten boards: 0.08 a board. Bought apart it would be 2 · 0.08, twenty at 0.04 for each.
        Assert.Equal(0.5m + 0.2m + 0.08m, BillOfParts.UnitCost(Choice, None, market));
    }

    [Fact]
    public void Two_different_capacitors_of_one_price_are_bought_apart()
    {
        CandidateParts choice = Choice with { C2 = Sample.Capacitor(27e-12, "C27", "1:0.10;20:0.04") };

        Assert.Equal(0.5m + 0.2m + 0.08m + 0.08m, BillOfParts.UnitCost(choice, None, new Market(PartsCatalog.Empty, 10)));
    }

    [Fact]
    public void Stock_is_asked_for_equal_parts_together()
    {
        var market = new Market(PartsCatalog.Empty, 10);
        CapacitorPart scarce = Load with { Stock = 15 };

        Assert.Same(scarce, BillOfParts.FirstShortage(Choice with { C1 = scarce, C2 = scarce }, None, market));
        Assert.Null(BillOfParts.FirstShortage(Choice with { C1 = scarce }, None, market));
    }

    [Fact]
    public void Support_parts_are_on_the_list_and_in_the_cost()
    {
        var support = new SupportParts(Sample.Resistor(1e6, "R1M", "1:0.03"), Sample.Capacitor(100e-9, "C100n", "1:0.05"), null);
        CandidateParts choice = Choice with { Series = Sample.Resistor(470, "R470", "1:0.02") };
        var market = new Market(PartsCatalog.Empty, 1);

        Assert.Equal(0.5m + 0.2m + 0.2m + 0.03m + 0.05m + 0.02m, BillOfParts.UnitCost(choice, support, market));
        Assert.Equal(
            ["C1 C22 22 pF", "C2 C22 22 pF", "C3 C100n 100 nF", "R1 R470 470 Ω", "R2 R1M 1 MΩ", "U1 U ", "Y1 X 4 MHz"],
            BillOfParts.List(choice, support).Select(use => $"{use.Designator} {use.Part.Id} {use.Value}"));
    }

    [Fact]
    public void Usual_feedback_resistors_follow_the_frequency()
    {
        // ST AN2867, Table 3: 10 to 25 MΩ at 32.768 kHz, 5 to 10 MΩ at 1 MHz, 1 to 5 MΩ at 10 MHz, 0.47 to 5 MΩ at 20 MHz.
        Assert.InRange(SupportParts.UsualFeedbackOhms(32768), 10e6, 25e6);
        Assert.InRange(SupportParts.UsualFeedbackOhms(1e6), 4.7e6, 10e6);
        Assert.InRange(SupportParts.UsualFeedbackOhms(10e6), 1e6, 5e6);
        Assert.InRange(SupportParts.UsualFeedbackOhms(20e6), 0.47e6, 5e6);
    }
}
