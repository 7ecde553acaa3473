using PartPick.Catalog;

namespace PartPick.Selection.Tests.Alternates;

/// <summary>A gate with two equal load capacitors, and parts that may or may not stand in their place.</summary>
internal static class AlternatesBench
{
    /// <summary>Ten boards at 0.73 each: crystal 0.5, inverter 0.2, two capacitors of 0.01, a feedback resistor of 0.01.</summary>
    public static Requirement Requirement { get; } = Sample.Requirement with { BudgetRatio = 600e-6, Margin = 2, Builds = 10 };

    public static PartsCatalog Parts { get; } = new(
    [
        Sample.Crystal,
        Sample.Crystal with { Id = "X2", LoadFarads = 20e-12 },
        Sample.Crystal with { Id = "X3", FrequencyHz = 4.1e6 },
        Sample.Inverter,
        Load("C22", "1:0.01"),
        Load("C22-B", "1:0.03"),
        Load("C27", "1:0.01") with { ValueFarads = 27e-12, Package = "SMD 1206" },
        Load("C22-none", "1:0.01") with { Stock = 19 },
        Load("C22-lossy", "1:0.01") with { TemperatureCoefficientPerKelvin = null, Dielectric = "X7R" },
        Load("C22-low", "1:0.01") with { VoltageVolts = 4 },
        Sample.Resistor(1e6, "R1M"),
    ]);

    public static CandidateParts Choice { get; } = new()
    {
        Circuit = CircuitKind.Gate,
        Crystal = Sample.Crystal,
        Amplifier = Sample.Inverter,
        C1 = (CapacitorPart)Parts.Find("C22")!,
        C2 = (CapacitorPart)Parts.Find("C22")!,
    };

    public static ChosenCircuit Chosen()
    {
        ChosenCircuit chosen = ChosenCircuit.Of(BoardParts.Of(Choice, new Market(Parts, 10)), Requirement, Parts).Value;
        Assert.Equal([], chosen.Candidate.Misses.Select(miss => miss.Sentence));
        Assert.Equal(0.73m, chosen.Candidate.Cost);
        return chosen;
    }

    private static CapacitorPart Load(string id, string prices) => Sample.Capacitor(22e-12, id, prices) with
    {
        TemperatureCoefficientPerKelvin = 30e-6,
        Package = "SMD 0603",
    };
}
