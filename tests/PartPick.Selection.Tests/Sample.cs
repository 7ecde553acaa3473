using PartPick.Catalog;
using PartPick.Physics.Circuits;

namespace PartPick.Selection.Tests;

/// <summary>Parts and requirements of the tests' own, with nothing but what a test needs.</summary>
internal static class Sample
{
    public static Requirement Requirement { get; } = new()
    {
        OutputHz = 4e6,
        BudgetRatio = 100e-6,
        TemperatureMinCelsius = -10,
        TemperatureMaxCelsius = 60,
        Years = 5,
        Builds = 10,
        Board = new Board("own", new Strays(3e-12, 3e-12, 1e-12), 0.3),
    };

    public static CrystalPart Crystal { get; } = new()
    {
        Id = "X", Description = "", Offer = Price("1:0.5"), Cut = CrystalCut.AT, Overtone = 1, FrequencyHz = 4e6, LoadFarads = 18e-12,
        ShuntFarads = 4e-12, MotionalFarads = 12e-15, ResistanceOhms = 60, DriveLevelWatts = 500e-6,
    };

    public static InverterPart Inverter { get; } = new()
    {
        Id = "U", Description = "", Offer = Price("1:0.2"), Stages = 1, ThresholdVolts = 0.7, InputFarads = 4e-12, OutputFarads = 5e-12,
        FeedbackFarads = 1e-12,
        Points =
        [
            new SupplyPoint
            {
                SupplyVolts = 2, GmMinSiemens = 1e-3, GmSiemens = 2e-3, GmMaxSiemens = 3e-3, RoOhms = 10e3,
                ClockMinHz = 6e6, ClockHz = 15e6,
            },
            new SupplyPoint
            {
                SupplyVolts = 6, GmMinSiemens = 9e-3, GmSiemens = 18e-3, GmMaxSiemens = 27e-3, RoOhms = 1e3,
                ClockMinHz = 30e6, ClockHz = 95e6,
            },
        ],
    };

    public static CapacitorPart Capacitor(double farads, string id, string prices = "1:0.01", int? stock = null) =>
        new()
        {
            Id = id,
            Description = "",
            Offer = Price(prices),
            ValueFarads = farads,
            ToleranceRatio = 0.05,
            Dielectric = "C0G",
            Stock = stock,
        };

    public static ResistorPart Resistor(double ohms, string id, string prices = "1:0.01", int? stock = null) =>
        new() { Id = id, Description = "", Offer = Price(prices), ValueOhms = ohms, ToleranceRatio = 0.05, Stock = stock };

    public static Offer Price(string prices, int minimum = 1, int multiple = 1, string currency = "EUR") => new(
        currency,
        [
            .. prices.Split(';').Select(pair => pair.Split(':')).Select(pair => new PriceBreak(
                int.Parse(pair[0], System.Globalization.CultureInfo.InvariantCulture),
                decimal.Parse(pair[1], System.Globalization.CultureInfo.InvariantCulture))),
        ],
        minimum,
        multiple);
}
