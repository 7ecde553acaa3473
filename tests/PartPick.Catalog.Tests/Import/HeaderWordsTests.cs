using PartPick.Catalog.Import;

namespace PartPick.Catalog.Tests.Import;

/// <summary>What headers name that are cut short, joined, without vowels or in another language.</summary>
public class HeaderWordsTests
{
    [Theory]
    [InlineData(PartKind.Crystal, "Temp.stab.", "stability", "")]
    [InlineData(PartKind.Crystal, "Temp stab", "stability", "")]
    [InlineData(PartKind.Crystal, "Frekv.tol.", "tolerance", "")]
    [InlineData(PartKind.Crystal, "Belastningskap.", "load", "")]
    [InlineData(PartKind.Crystal, "quarz.freq_mhz", "frequency", "mhz")]
    [InlineData(PartKind.Crystal, "ON_HAND_STK", "stock", "STK")]
    [InlineData(PartKind.Crystal, "FREE_STK", "stock", "")]
    [InlineData(PartKind.Crystal, "MAKTX", "description", "")]
    [InlineData(PartKind.Crystal, "MATNR", "supplierPart", "")]
    [InlineData(PartKind.Crystal, "LABST", "stock", "")]
    [InlineData(PartKind.Crystal, "PEINH", "priceFor", "")]
    [InlineData(PartKind.Crystal, "TEMP_DO", "temperatureMax", "")]
    [InlineData(PartKind.Crystal, "TEMP_OD", "temperatureMin", "")]
    [InlineData(PartKind.Capacitor, "ratedVoltageVdc", "voltage", "Vdc")]
    [InlineData(PartKind.Capacitor, "vltg_rtg_v", "voltage", "v")]
    [InlineData(PartKind.Capacitor, "diel_cd", "dielectric", "")]
    [InlineData(PartKind.Capacitor, "cap_val_pf", "value", "pf")]
    [InlineData(PartKind.Capacitor, "onhand_qty", "stock", "")]
    [InlineData(PartKind.Capacitor, "supp_nm", "supplier", "")]
    [InlineData(PartKind.Capacitor, "cost_per", "price", "")]
    [InlineData(PartKind.Capacitor, "P.U. HT (€)", "price", "€")]
    [InlineData(PartKind.Port, "gm_crit_max_ma_v", "criticalTransconductanceMax", "ma/v")]
    [InlineData(PartKind.Port, "pin_cap_in_pf", "cin", "pf")]
    [InlineData(PartKind.Inverter, "gm mini (mS)", "gmMin 1", "mS")]
    [InlineData(PartKind.Transistor, "Hinta alv 0 %, EUR", "price", "EUR")]
    public void Is_understood(PartKind kind, string header, string field, string unit)
    {
        FieldMatch best = FieldMatch.Of(kind, 0, HeaderCell.Of(header)).MaxBy(match => match.Score);
        Assert.Equal((field, unit), (best.Field, best.Reading.Unit));
    }

    [Theory]
    [InlineData(PartKind.Crystal, "Storage temp. min")]
    [InlineData(PartKind.Crystal, "Total stab 10 yr (ppm)")]
    [InlineData(PartKind.Crystal, "Insulation res (Mohm)")]
    [InlineData(PartKind.Crystal, "Test drive (uW)")]
    [InlineData(PartKind.Crystal, "Qty on order")]
    [InlineData(PartKind.Capacitor, "Test V")]
    [InlineData(PartKind.Capacitor, "Diel strength (V)")]
    [InlineData(PartKind.Resistor, "Reserved qty")]
    [InlineData(PartKind.Resistor, "TCR (ppm/K)")]
    [InlineData(PartKind.Transistor, "VCE(sat) (V)")]
    [InlineData(PartKind.Transistor, "IC peak (mA)")]
    [InlineData(PartKind.Inverter, "Vcc max (V)")]
    public void Is_nothing_where_one_word_makes_it_something_else(PartKind kind, string header) =>
        Assert.Empty(FieldMatch.Of(kind, 0, HeaderCell.Of(header)));

    [Theory]
    [InlineData("Pris v/100", 100)]
    [InlineData("Pris v. 50 stk.", 50)]
    [InlineData("P. 1000 pzas MXN", 1000)]
    [InlineData("unitPriceUsd100", 100)]
    [InlineData("Preço 100 un. R$", 100)]
    public void A_price_says_its_quantity(string header, int quantity) => Assert.Equal(quantity, PriceHeader.Of(header)?.Quantity);

    [Theory]
    [InlineData("Preis inkl. MwSt 100")]
    [InlineData("Weight 100")]
    public void Other_numbers_are_no_quantities(string header) => Assert.Null(PriceHeader.Of(header));

    [Fact]
    public void A_unit_behind_a_condition_is_not_lost() => Assert.Equal("mA", HeaderCell.Of("hFE @ IC (mA)").Unit);
}
