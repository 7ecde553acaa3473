using System.Collections.Immutable;

namespace PartPick.Catalog.Tests;

/// <summary>One part of each kind with every figure filled in, each figure different.</summary>
internal static class Samples
{
    public static Offer Offer { get; } = new("EUR", [new(1, 0.42m), new(10, 0.31m), new(100, 0.205m)], 1, 5);

    public static CrystalPart Crystal { get; } = new()
    {
        Id = "Y-4M-18",
        Description = "4 MHz, \"AT\", 18 pF",
        Offer = Offer,
        Supplier = "shop",
        SupplierPart = "A-1",
        Package = "HC-49/U",
        Stock = 120,
        Excluded = true,
        Note = "µ, Ω and a comma",
        Basis = new Dictionary<string, Basis> { ["shunt"] = Basis.Typical, ["resistance"] = Basis.Maximum, ["motional"] = Basis.Assumed },
        Cut = CrystalCut.Fork,
        Overtone = 3,
        FrequencyHz = 4e6,
        Holder = "HC-49/U",
        LoadFarads = 18e-12,
        ShuntFarads = 5.5e-12,
        MotionalFarads = 12e-15,
        ResistanceOhms = 100,
        DriveLevelWatts = 500e-6,
        ToleranceRatio = 30e-6,
        StabilityRatio = 50e-6,
        AgeingRatio = 3e-6,
        AgeingYearlyRatio = 1e-6,
        TemperatureMinCelsius = -20,
        TemperatureMaxCelsius = 70,
        ParabolaPerSquareKelvin = -0.034e-6,
        TurnoverCelsius = 25,
    };

    public static CapacitorPart Capacitor { get; } = new()
    {
        Id = "C-22p",
        Description = "22 pF",
        Offer = Offer,
        ValueFarads = 22e-12,
        ToleranceRatio = 0.05,
        Dielectric = "C0G",
        TemperatureCoefficientPerKelvin = 30e-6,
        VoltageVolts = 50,
    };

    public static CapacitorPart SmallCapacitor { get; } =
        Capacitor with { Id = "C-4p7", ValueFarads = 4.7e-12, ToleranceRatio = null, ToleranceFarads = 0.25e-12 };

    public static ResistorPart Resistor { get; } = new()
    {
        Id = "R-4k7",
        Description = "4.7 kΩ",
        Offer = Offer.Unknown,
        ValueOhms = 4700,
        ToleranceRatio = 0.01,
    };

    public static InverterPart Inverter { get; } = new()
    {
        Id = "U-buffered",
        Description = "buffered inverter",
        Offer = Offer,
        Stages = 3,
        ThresholdVolts = 0.7,
        InputFarads = 3.5e-12,
        OutputFarads = 5e-12,
        FeedbackFarads = 0.5e-12,
        TemperatureMinCelsius = -40,
        TemperatureMaxCelsius = 85,
        Basis = new Dictionary<string, Basis> { ["gm"] = Basis.Typical, ["gmMin"] = Basis.Assumed, ["clockMin"] = Basis.Minimum },
        Points =
        [
            new() { SupplyVolts = 2, GmMinSiemens = 1, GmSiemens = 2, GmMaxSiemens = 3, RonOhms = 500, Gain = 1000, DelaySeconds = 12e-9 },
            new()
            {
                SupplyVolts = 5, GmMinSiemens = 6, GmSiemens = 10, GmMaxSiemens = 14, RonOhms = 100.5, Gain = 1005, DelaySeconds = 7e-9,
                ClockMinHz = 30e6, ClockHz = 60e6,
            },
        ],
    };

    public static CounterPart Counter { get; } = new()
    {
        Id = "U-counter",
        Description = "14-stage counter",
        Offer = Offer,
        Stages = 1,
        InputFarads = 5e-12,
        Taps = [4, 5, 6, 7, 8, 9, 10, 12, 13, 14],
        Points = [new() { SupplyVolts = 5, GmSiemens = 7e-3, RoOhms = 2200 }],
    };

    public static PortPart Port { get; } = new()
    {
        Id = "U-port",
        Description = "oscillator port",
        Offer = Offer,
        Stages = 1,
        CriticalTransconductanceMaxSiemens = 1.5e-3,
        SwingVolts = 0.9,
        FrequencyMinHz = 4e6,
        FrequencyMaxHz = 48e6,
        Points = [new() { SupplyVolts = 1.8 }, new() { SupplyVolts = 3.6 }],
    };

    public static TransistorPart Transistor { get; } = new()
    {
        Id = "Q-npn",
        Description = "small-signal NPN",
        Offer = Offer,
        BetaMin = 70,
        Beta = 150,
        BetaMax = 300,
        TransitionFrequencyHz = 300e6,
        CjeFarads = 8e-12,
        TfSeconds = 0.4e-9,
        CmuFarads = 3e-12,
        RbbOhms = 50,
        VbeVolts = 0.65,
        CurrentMaxAmperes = 0.2,
        VoltageMaxVolts = 40,
        TemperatureMinCelsius = -55,
        TemperatureMaxCelsius = 150,
    };

    public static ImmutableArray<Part> All { get; } =
        [Crystal, Capacitor, SmallCapacitor, Resistor, Inverter, Counter, Port, Transistor];

    public static string Csv(PartKind kind, params IEnumerable<Part> parts)
    {
        var text = new StringWriter();
        PartCsv.Write(kind, parts, text);
        return text.ToString();
    }

    public static BuiltInFiles BuiltIn(params IEnumerable<Part> parts) =>
        new(parts.GroupBy(part => part.Kind).ToDictionary(group => group.Key, group => Csv(group.Key, group)));

    /// <summary>A catalogue as text, for comparing every figure of two of them.</summary>
    public static string Text(PartsCatalog catalog) =>
        string.Join("\n", PartKinds.All.Select(kind => Csv(kind, catalog.OfKind(kind))));
}
