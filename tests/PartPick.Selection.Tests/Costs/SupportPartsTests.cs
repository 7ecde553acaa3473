using PartPick.Catalog;

namespace PartPick.Selection.Tests.Costs;

public class SupportPartsTests
{
    // EIA-198 letter table: Y5V may lose 82 % over temperature, X7R 15 %.
    [Theory]
    [InlineData(CircuitKind.Gate)]
    [InlineData(CircuitKind.Counter)]
    [InlineData(CircuitKind.Follower)]
    public void Decoupling_holds_its_value_over_temperature_even_where_a_cheaper_capacitor_does_not(CircuitKind kind)
    {
        PartsCatalog catalog = PartsCatalog.BuiltIn();
        var market = new Market(catalog, 200);
        CapacitorPart chosen = SupportParts.For(kind, 4e6, market).Decoupling!;

        Assert.Equal("X7R", chosen.Dielectric);
        Assert.Contains(catalog.Capacitors, part => part.Dielectric == "Y5V" && part.ValueFarads >= 100e-9
            && market.UnitCost(part, 1) < market.UnitCost(chosen, 1));
    }

    // ST AN2867, Table 3.
    [Theory]
    [InlineData(32768, 10e6, 25e6)]
    [InlineData(1e6, 4.7e6, 10e6)]
    [InlineData(10e6, 1e6, 5e6)]
    [InlineData(20e6, 0.47e6, 5e6)]
    public void The_feedback_resistor_is_within_the_usual_range_for_the_frequency(double hertz, double least, double most)
    {
        ResistorPart feedback = SupportParts.For(CircuitKind.Gate, hertz, new Market(PartsCatalog.BuiltIn(), 1)).Feedback!;
        Assert.InRange(feedback.ValueOhms, least, most);
    }
}
