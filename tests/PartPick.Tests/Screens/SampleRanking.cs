using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Physics;
using PartPick.Physics.Circuits;
using PartPick.Selection;

namespace PartPick.Tests.Screens;

/// <summary>Answers made of a few analysed circuits of built-in parts: enough to draw, no ranking.</summary>
internal static class SampleRanking
{
    private static readonly PartsCatalog Parts = PartsCatalog.BuiltIn();

    public static Requirement Wanted { get; } = new()
    {
        OutputHz = 1000, Waveform = Waveform.Square, BudgetRatio = 80e-6, TemperatureMinCelsius = -10,
        StartUpTimeSeconds = 0.05, Builds = 200, CostLimit = 2.5m,
    };

    public static Candidate Counter { get; } = Gate(CircuitKind.Counter, "CNT-14-HC", 4.096e6, 12, "C-015p", "C-018p", true);

    public static Candidate SecondCounter { get; } = Gate(CircuitKind.Counter, "CNT-14-HC", 16.384e6, 14, "C-010p", "C-008p2", true);

    public static Candidate Undamped { get; } = Gate(CircuitKind.Gate, "INV-HC-U-1", 4e6, 0, "C-020p", "C-018p", false);

    public static Candidate Port { get; } = Gate(CircuitKind.Port, "MCU-KHZ-C", 32768, 0, "C-012p", "C-012p", false);

    public static Candidate Follower { get; } = MakeFollower();

    public static ImmutableArray<Candidate> All { get; } = [Counter, SecondCounter, Undamped, Port, Follower];

    public static RankingResult Answer(Requirement requirement, params Candidate[] candidates) => new()
    {
        Requirement = requirement,
        Combinations = 4_123_000,
        Covered = 4_123_000,
        Fit = 8200,
        Candidates = [.. candidates],
        Front = [.. candidates.Where(candidate => candidate.OnFront).Select(candidate => candidate.Id)],
        NearestMisses = [],
        Rejections = ImmutableDictionary<Limit, double>.Empty,
        IsComplete = true,
        ElapsedSeconds = 0.8,
    };

    public static RankingResult Nothing(Requirement requirement) => Answer(requirement) with
    {
        Fit = 0,
        NearestMisses = [Missing(Counter), Missing(Undamped)],
        Rejections = ImmutableDictionary<Limit, double>.Empty.Add(Limit.Cost, 1200).Add(Limit.Error, 3_400_000),
    };

    private static Candidate Missing(Candidate candidate) => candidate with
    {
        Misses = [new Miss(Limit.Error, "The frequency error is 74.9 ppm, the budget 20 ppm.", 3.7)],
        Score = double.NaN,
        OnFront = false,
    };

    private static Candidate Gate(
        CircuitKind kind, string amplifierId, double hertz, int tap, string c1, string c2, bool damped)
    {
        CrystalPart crystal = Parts.Crystals.First(part => part.FrequencyHz == hertz && part.LoadFarads > 0 && part.DriveLevelWatts > 0);
        var amplifier = (AmplifierPart)Parts.Find(amplifierId)!;
        var choice = new CandidateParts
        {
            Circuit = kind, Crystal = crystal, Amplifier = amplifier, Tap = tap,
            C1 = Capacitor(c1), C2 = Capacitor(c2), Series = damped ? Resistor(1000) : null,
        };
        double feedback = hertz < 1e5 ? 10e6 : 1e6;
        var circuit = new GateCircuit
        {
            Crystal = CrystalModel.From(crystal).Crystal,
            Inverter = InverterModel.At(amplifier, 5, DeviceStrength.Typical)!,
            C1Farads = choice.C1.ValueFarads, C2Farads = choice.C2.ValueFarads,
            SeriesOhms = choice.Series?.ValueOhms ?? 0, FeedbackOhms = feedback,
            Strays = Board.TwoLayer.Strays, SupplyVolts = 5,
        };
        PartUse[] resistors = choice.Series is { } series
            ? [new("R1", "feedback Rf", Resistor(feedback), "1 MΩ"), new("R2", "damping Rs", series, "1 kΩ")]
            : [new("R1", "feedback Rf", Resistor(feedback), hertz < 1e5 ? "10 MΩ" : "1 MΩ")];
        return Make(choice, circuit,
        [
            new("C1", "load capacitor", choice.C1, Value(choice.C1)), new("C2", "load capacitor", choice.C2, Value(choice.C2)),
            new("C3", "decoupling", Capacitor("C-100n"), "100 nF"), .. resistors,
            new("U1", "amplifier", amplifier, ""),
            new("Y1", "crystal", crystal, Values.ValueText.FormatExact(hertz, Values.Dimension.Frequency)),
        ]);
    }

    private static Candidate MakeFollower()
    {
        CrystalPart crystal = Parts.Crystals.First(part => part.FrequencyHz == 4e6 && part.LoadFarads > 0 && part.DriveLevelWatts > 0);
        TransistorPart transistor = Parts.Transistors[0];
        var choice = new CandidateParts
        {
            Circuit = CircuitKind.Follower, Crystal = crystal, Amplifier = transistor, C1 = Capacitor("C-100p"), C2 = Capacitor("C-100p"),
            BaseTop = Resistor(100e3), BaseBottom = Resistor(100e3), Emitter = Resistor(2200),
        };
        var circuit = new FollowerCircuit
        {
            Crystal = CrystalModel.From(crystal).Crystal,
            Transistor = TransistorModel.At(transistor, DeviceStrength.Typical),
            C1Farads = 100e-12, C2Farads = 100e-12, BaseTopOhms = 100e3, BaseBottomOhms = 100e3, EmitterOhms = 2200,
            Strays = Board.TwoLayer.Strays, SupplyVolts = 5,
        };
        return Make(choice, circuit,
        [
            new("C1", "load capacitor", choice.C1, "100 pF"), new("C2", "load capacitor", choice.C2, "100 pF"),
            new("C3", "output coupling", Capacitor("C-10n-"), "10 nF"), new("C4", "decoupling", Capacitor("C-100n"), "100 nF"),
            new("Q1", "amplifier", transistor, ""), new("R1", "base resistor to the supply", choice.BaseTop, "100 kΩ"),
            new("R2", "base resistor to ground", choice.BaseBottom, "100 kΩ"), new("R3", "emitter resistor", choice.Emitter, "2.2 kΩ"),
            new("Y1", "crystal", crystal, "4 MHz"),
        ]);
    }

    private static Candidate Make(CandidateParts choice, OscillatorCircuit circuit, ImmutableArray<PartUse> parts)
    {
        OscillatorResult result = OscillatorAnalysis.Analyse(circuit);
        double tolerance = choice.Crystal.ToleranceRatio ?? 20e-6;
        double centre = result.Steady is { } steady ? steady.FrequencyHz / choice.Crystal.FrequencyHz - 1 : double.NaN;
        return new Candidate
        {
            Id = string.Join("+", parts.Select(use => use.Part.Id)),
            Choice = choice,
            Parts = parts,
            Nominal = circuit,
            Result = result,
            Budget = new ErrorBudget(centre,
            [
                new BudgetTerm("crystal tolerance", tolerance), new BudgetTerm("crystal over temperature", 1.1 * tolerance),
                new BudgetTerm("ageing over 5 years", 7e-6), new BudgetTerm("C1 tolerance", 2.1e-6), new BudgetTerm("C2 tolerance", 1.4e-6),
                new BudgetTerm("strays", 4.4e-6), new BudgetTerm("motional capacitance", 1.2e-6, "assumed"),
                new BudgetTerm("amplifier and supply", 0.6e-6, "typical"),
            ]),
            Margin = new AtCorner(result.StartUp.Margin * 0.7, "4.5 V, 50 °C, weakest device, capacitances high"),
            Drive = result.Steady is { } state
                ? new AtCorner(state.DriveWatts * 1.3, "5.5 V, -10 °C, strongest device, capacitances low")
                : null,
            StartUpTime = result.StartUpTimeSeconds is { } time
                ? new AtCorner(time * 1.6, "4.5 V, 50 °C, weakest device, capacitances high")
                : null,
            RatedDriveWatts = choice.Crystal.DriveLevelWatts,
            Cost = 0.83m,
            Currency = "EUR",
            Misses = [],
            Warnings = ["The motional capacitance of the crystal is assumed: 30 % off would move the frequency by 1.2 ppm."],
            Score = 1.9,
            OnFront = choice.Circuit == CircuitKind.Counter,
        };
    }

    private static string Value(CapacitorPart part) => Values.ValueText.Format(part.ValueFarads, Values.Dimension.Capacitance);

    private static CapacitorPart Capacitor(string id) => Parts.Capacitors.First(part => part.Id.StartsWith(id, StringComparison.Ordinal));

    private static ResistorPart Resistor(double ohms) => Parts.Resistors.First(part => part.ValueOhms == ohms);
}
