using PartPick.Catalog;

namespace PartPick.Selection.Tests.Pictures;

/// <summary>Candidates of built-in parts, analysed in full.</summary>
internal static class PicturedCandidates
{
    private static readonly PartsCatalog Parts = PartsCatalog.BuiltIn();

    public static Requirement Wanted { get; } = new()
    {
        OutputHz = 4e6, BudgetRatio = 150e-6, TemperatureMinCelsius = -10, TemperatureMaxCelsius = 60, Builds = 100,
        SupplyMinVolts = 4.5, SupplyMaxVolts = 5.5,
    };

    public static Requirement ForFork { get; } = Wanted with { OutputHz = 32768, SupplyMinVolts = 3, SupplyMaxVolts = 3.6 };

    public static Candidate Gate { get; } = Build(Wanted, new CandidateParts
    {
        Circuit = CircuitKind.Gate, Crystal = Quartz, Amplifier = Parts.Find("INV-HC-U-1")!,
        C1 = Capacitor(22e-12), C2 = Capacitor(22e-12), Series = Resistor(470),
    });

    public static Candidate Follower { get; } = Build(Wanted, new CandidateParts
    {
        Circuit = CircuitKind.Follower, Crystal = Quartz, Amplifier = Parts.Find("TR-GP-0300-A")!,
        C1 = Capacitor(100e-12), C2 = Capacitor(100e-12),
        BaseTop = Resistor(100e3), BaseBottom = Resistor(100e3), Emitter = Resistor(2200),
    });

    public static Candidate Fork { get; } = Build(ForFork, new CandidateParts
    {
        Circuit = CircuitKind.Port, Crystal = Parts.Crystals.First(part => part.Cut == CrystalCut.Fork && part.LoadFarads == 9e-12),
        Amplifier = Parts.Find("MCU-KHZ-B")!, C1 = Capacitor(12e-12), C2 = Capacitor(12e-12),
    });

    public static Candidate Named(string name) => name switch { "gate" => Gate, "follower" => Follower, _ => Fork };

    public static Requirement For(string name) => name == "fork" ? ForFork : Wanted;

    private static CrystalPart Quartz => Parts.Crystals.First(
        part => part.FrequencyHz == 4e6 && part.LoadFarads == 18e-12 && part.Overtone == 1 && part.StabilityRatio > 0);

    private static CapacitorPart Capacitor(double farads) =>
        Parts.Capacitors.First(part => Math.Abs(part.ValueFarads / farads - 1) < 1e-6 && part.TemperatureCoefficientPerKelvin > 0);

    private static ResistorPart Resistor(double ohms) => Parts.Resistors.First(part => Math.Abs(part.ValueOhms / ohms - 1) < 1e-6);

    private static Candidate Build(Requirement requirement, CandidateParts choice) =>
        new CandidateBuilder(requirement, new Market(Parts, requirement.Builds)).Build(choice)!;
}
