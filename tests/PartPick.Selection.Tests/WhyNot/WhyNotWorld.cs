using PartPick.Catalog;

namespace PartPick.Selection.Tests.WhyNot;

/// <summary>A catalogue small enough to know what keeps a part out: one crystal, one inverter, and what they need.</summary>
internal static class WhyNotWorld
{
    public static Requirement Wanted { get; } = Sample.Requirement with { BudgetRatio = 150e-6, Margin = 3, Circuits = [CircuitKind.Gate] };

    public static Part[] Others { get; } =
    [
        Sample.Capacitor(15e-12, "C-15p"), Sample.Capacitor(22e-12, "C-22p"), Sample.Capacitor(33e-12, "C-33p"),
        Sample.Capacitor(47e-12, "C-47p"), Sample.Capacitor(100e-9, "C-100n") with { Dielectric = "X7R" },
        Sample.Resistor(470, "R-470"), Sample.Resistor(1000, "R-1k"), Sample.Resistor(2200, "R-2k2"), Sample.Resistor(1e6, "R-1M"),
    ];

    public static CrystalPart Crystal { get; } = Sample.Crystal with
    {
        ToleranceRatio = 30e-6,
        StabilityRatio = 30e-6,
        AgeingRatio = 3e-6,
        AgeingYearlyRatio = 1e-6,
    };

    public static PartsCatalog Of(params Part[] parts) => new([.. Others.Select(Steady), .. parts]);

    public static PartsCatalog Usual { get; } = Of(Crystal, Sample.Inverter);

    public static WhyNotAnswer Ask(Requirement requirement, PartsCatalog catalog, string id) => WhyNotSearch.Find(
        requirement, new WholeCatalog(catalog), catalog.Find(id)!, null, TestContext.Current.CancellationToken);

    /// <summary>The requirement with a change as the command's option takes it.</summary>
    public static Requirement With(this Requirement requirement, NeededChange change) => RequirementFile.Read(
        RequirementFile.Write(requirement).ToJsonString(), "wanted", [new RequirementOption(change.Key!, change.Becomes)]).Value;

    /// <summary>The ids of crystals and amplifiers that a ranking of all parts lists.</summary>
    public static string[] Listed(Requirement requirement, PartsCatalog catalog) =>
    [
        .. Ranker.Rank(requirement, catalog, cancellation: TestContext.Current.CancellationToken).Candidates
            .SelectMany(candidate => new[] { candidate.Choice.Crystal.Id, candidate.Choice.Amplifier.Id }).Distinct(),
    ];

    private static Part Steady(Part part) =>
        part is CapacitorPart { Dielectric: "C0G" } capacitor ? capacitor with { TemperatureCoefficientPerKelvin = 30e-6 } : part;
}
