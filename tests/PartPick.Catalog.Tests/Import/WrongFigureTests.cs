using PartPick.Catalog.Import;

namespace PartPick.Catalog.Tests.Import;

/// <summary>What is left out rather than taken for what it may not be.</summary>
public sealed class WrongFigureTests : IDisposable
{
    private readonly ImportBench _bench = new();

    public void Dispose() => _bench.Dispose();

    [Fact]
    public void A_price_beside_a_column_of_hundreds_that_is_not_known_is_left_out()
    {
        ImportReport report = _bench.Run(
            "Part No,Frequency,Net price,Currency,Zz9\nA1,4 MHz,31.50,EUR,100\nA2,8 MHz,0.27,EUR,1\n");
        ImportColumn price = report.Columns.Single(column => column.Header == "Net price");
        Assert.Null(price.Field);
        Assert.Contains("Zz9 may say for how many pieces", price.Why, StringComparison.Ordinal);
        Assert.False(_bench.Crystal("A1").Offer.HasPrices);
    }

    [Fact]
    public void The_same_price_is_taken_where_the_user_says_what_the_other_column_is()
    {
        _bench.Run(
            _bench.Request() with { Columns = ["Zz9=priceFor"] },
            "Part No,Frequency,Net price,Currency,Zz9\nA1,4 MHz,31.50,EUR,100\nA2,8 MHz,0.27,EUR,1\n");
        Assert.Equal(0.315m, _bench.Crystal("A1").Offer.Prices[0].UnitPrice);
    }

    [Fact]
    public void A_shelf_is_no_stock()
    {
        ImportReport report = _bench.Run("Part No,Frequency,Stock\nA1,4 MHz,G1\nA2,8 MHz,M2\n");
        Assert.Null(report.Columns.Single(column => column.Header == "Stock").Field);
        Assert.Null(_bench.Crystal("A1").Stock);
    }

    [Fact]
    public void A_temperature_that_is_no_least_one_is_not_taken_as_it()
    {
        ImportReport report = _bench.Run("Part No,Frequency,Temp min\nA1,4 MHz,85\nA2,8 MHz,105\n");
        Assert.Null(report.Columns.Single(column => column.Header == "Temp min").Field);
    }

    [Fact]
    public void A_gate_without_a_transconductance_is_refused_and_told_why()
    {
        ImportReport report = _bench.Run(
            "Part No,Type,Supply (V),Output resistance\nI1,unbuffered,5,1.8 kOhm\n", PartKind.Inverter);
        RowRejection row = Assert.Single(report.Rejections);
        Assert.StartsWith("gm 1 is missing: whether an oscillator starts rests on", row.Reason, StringComparison.Ordinal);
    }

    [Fact]
    public void The_oscillator_of_a_controller_is_assumed_to_be_one_stage()
    {
        _bench.Run("Part No,gm crit max (mA/V),Supply (V)\nM1,1,3.3\n", PartKind.Port);
        var port = (PortPart)_bench.Entry("M1").Part;
        Assert.Equal((1, Basis.Assumed), (port.Stages, port.BasisOf("stages")));
    }
}
