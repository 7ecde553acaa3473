using System.Globalization;
using PartPick.Catalog;

namespace PartPick.Benchmarks;

/// <summary>Makes a part like another: its figures moved by steps in which makers differ, its price by as much as dealers do.</summary>
internal sealed class PartVariation(Random random)
{
    private static readonly double[] Steps = [0.8, 0.9, 1, 1, 1.1, 1.25];
    private static readonly double[] Loads = [12e-12, 16e-12, 18e-12, 20e-12, 30e-12];
    private static readonly double[] Tolerances = [10e-6, 20e-6, 30e-6, 50e-6];
    private static readonly double[] CapacitorTolerances = [0.01, 0.02, 0.05, 0.10];

    /// <summary>The id of a generated part.</summary>
    public static string Id(string kind, int number) => string.Create(CultureInfo.InvariantCulture, $"{kind}-G{number + 1:00000}");

    /// <summary>A crystal of the same frequency.</summary>
    public CrystalPart Crystal(CrystalPart near, string id) => near with
    {
        Id = id,
        Offer = Priced(near.Offer),
        Stock = Stock(),
        LoadFarads = near.Cut == CrystalCut.Fork ? near.LoadFarads : Any(Loads),
        ShuntFarads = Step(near.ShuntFarads),
        MotionalFarads = Step(near.MotionalFarads),
        ResistanceOhms = Step(near.ResistanceOhms),
        ToleranceRatio = Any(Tolerances),
    };

    /// <summary>A capacitor of the same value; of 10 pF and more the tolerance differs.</summary>
    public CapacitorPart Capacitor(CapacitorPart near, string id) => near with
    {
        Id = id,
        Offer = Priced(near.Offer),
        Stock = Stock(),
        ToleranceRatio = near.ToleranceRatio is null ? null : near.Dielectric == "C0G" ? Any(CapacitorTolerances) : near.ToleranceRatio,
    };

    /// <summary>A resistor of the same value.</summary>
    public ResistorPart Resistor(ResistorPart near, string id) =>
        near with { Id = id, Offer = Priced(near.Offer), Stock = Stock() };

    /// <summary>An inverter of the same kind.</summary>
    public InverterPart Inverter(InverterPart near, string id) => (InverterPart)Amplifier(near, id);

    /// <summary>A counter with the same stages.</summary>
    public CounterPart Counter(CounterPart near, string id) => (CounterPart)Amplifier(near, id);

    /// <summary>A port of the same range.</summary>
    public PortPart Port(PortPart near, string id)
    {
        var part = (PortPart)Amplifier(near, id);
        return part with { CriticalTransconductanceMaxSiemens = Step(part.CriticalTransconductanceMaxSiemens) };
    }

    /// <summary>A transistor of the same class.</summary>
    public TransistorPart Transistor(TransistorPart near, string id)
    {
        double gain = Any(Steps);
        double speed = Any(Steps);
        return near with
        {
            Id = id,
            Offer = Priced(near.Offer),
            Stock = Stock(),
            BetaMin = near.BetaMin * gain,
            Beta = near.Beta * gain,
            BetaMax = near.BetaMax * gain,
            TransitionFrequencyHz = near.TransitionFrequencyHz * speed,
            TfSeconds = near.TfSeconds / speed,
            CjeFarads = Step(near.CjeFarads),
            CmuFarads = Step(near.CmuFarads),
        };
    }

    private AmplifierPart Amplifier(AmplifierPart near, string id)
    {
        double strength = Any(Steps);
        return near with
        {
            Id = id,
            Offer = Priced(near.Offer),
            Stock = Stock(),
            InputFarads = Step(near.InputFarads),
            OutputFarads = Step(near.OutputFarads),
            FeedbackFarads = Step(near.FeedbackFarads),
            Points =
            [
                .. near.Points.Select(point => point with
                {
                    GmMinSiemens = point.GmMinSiemens * strength,
                    GmSiemens = point.GmSiemens * strength,
                    GmMaxSiemens = point.GmMaxSiemens * strength,
                    RoOhms = point.RoOhms / strength,
                    RonOhms = point.RonOhms / strength,
                    DelaySeconds = point.DelaySeconds / strength,
                }),
            ],
        };
    }

    private double? Step(double? figure) => figure * Any(Steps);

    private int Stock() => random.Next(500, 50_000);

    private Offer Priced(Offer near)
    {
        // In hundredths of the built-in price: some cost exactly the same.
        decimal factor = random.Next(70, 181) / 100m;
        return near with
        {
            Prices = [.. near.Prices.Select(price => price with { UnitPrice = decimal.Round(price.UnitPrice * factor, 4) })],
        };
    }

    private T Any<T>(T[] from) => from[random.Next(from.Length)];
}
