using PartPick.Physics.Bias;
using PartPick.Physics.Circuits;
using PartPick.Physics.Devices;
using PartPick.Physics.Network;
using PartPick.Physics.SmallSignal;
using PartPick.Physics.Steady;

namespace PartPick.Physics;

/// <summary>The one door to the figures of a circuit: every screen, command and ranking calls it.</summary>
public static class OscillatorAnalysis
{
    /// <summary>Analyses a circuit at its supply and temperature: start-up, running margin and steady state.</summary>
    /// <param name="circuit">The circuit; its values must be finite and positive where the model needs them.</param>
    public static OscillatorResult Analyse(OscillatorCircuit circuit) => circuit switch
    {
        GateCircuit gate => Analyse(gate),
        FollowerCircuit follower => Analyse(follower),
        _ => throw new ArgumentException("Unknown kind of circuit.", nameof(circuit)),
    };

    /// <summary>The small-signal figures alone: far cheaper than <see cref="Analyse(OscillatorCircuit)"/>.</summary>
    /// <param name="circuit">The circuit.</param>
    public static StartUp AnalyseStartUp(OscillatorCircuit circuit)
    {
        switch (circuit)
        {
            case GateCircuit gate:
                return StartUpSolver.Solve(gate.Crystal, SmallSignals(gate), Transconductance(gate));
            case FollowerCircuit follower:
                FollowerBias bias = FollowerBias.Solve(follower);
                return StartUpSolver.Solve(follower.Crystal, new FollowerNetwork(follower), bias.TransconductanceSiemens);
            default:
                throw new ArgumentException("Unknown kind of circuit.", nameof(circuit));
        }
    }

    /// <summary>The steady state alone; null where there is none.</summary>
    /// <param name="circuit">The circuit.</param>
    public static SteadyState? FindSteadyState(OscillatorCircuit circuit) => Analyse(circuit).Steady;

    private static OscillatorResult Analyse(GateCircuit gate)
    {
        GateNetwork network = SmallSignals(gate);
        StartUp startUp = StartUpSolver.Solve(gate.Crystal, network, Transconductance(gate));
        double largest = double.NegativeInfinity;
        SteadyState? steady = Balances(gate) is { } refinement
            ? SteadySolver.Solve(gate.Crystal, network, startUp.TransconductanceSiemens, refinement, out largest)
            : null;
        return Combine(gate, startUp, steady, largest, null);
    }

    private static OscillatorResult Analyse(FollowerCircuit follower)
    {
        FollowerBias bias = FollowerBias.Solve(follower);
        var network = new FollowerNetwork(follower);
        StartUp startUp = StartUpSolver.Solve(follower.Crystal, network, bias.TransconductanceSiemens);
        double largest = double.NegativeInfinity;
        SteadyState? steady = bias.EmitterAmps > 0
            ? SteadySolver.Solve(
                follower.Crystal, network, bias.TransconductanceSiemens, new FollowerRefinement(follower, bias), out largest)
            : null;
        return Combine(follower, startUp, steady, largest, bias.EmitterAmps);
    }

    private static OscillatorResult Combine(
        OscillatorCircuit circuit, StartUp startUp, SteadyState? steady, double largestNegativeOhms, double? emitterAmps)
    {
        StartKind start = startUp.GrowthRatePerSecond > 0 ? StartKind.BuildsUp
            : steady is not null ? StartKind.NeedsDisturbance
            : StartKind.None;
        return new OscillatorResult
        {
            StartUp = startUp,
            Start = start,
            RunningMargin = Math.Max(startUp.Margin, largestNegativeOhms / circuit.Crystal.ResistanceOhms),
            StartUpTimeSeconds = start == StartKind.BuildsUp && steady is not null ? StartUpTime(circuit, startUp, steady) : null,
            Steady = steady,
            EmitterCurrentAmps = emitterAmps,
        };
    }

    /// <summary>ln(Î/Î0)/σ with the thermal current Î0 = √(kT/Lm) of the motional branch.</summary>
    private static double StartUpTime(OscillatorCircuit circuit, StartUp startUp, SteadyState steady)
    {
        double kelvins = circuit.TemperatureCelsius + PhysicalConstants.ZeroCelsiusKelvins;
        double thermal = Math.Sqrt(PhysicalConstants.BoltzmannJoulesPerKelvin * kelvins / circuit.Crystal.InductanceHenries);
        return Math.Log(steady.CurrentRmsAmps * Math.Sqrt(2) / thermal) / startUp.GrowthRatePerSecond;
    }

    private static GateNetwork SmallSignals(GateCircuit gate) => new(gate, 1 / gate.Inverter.OutputOhms);

    private static double Transconductance(GateCircuit gate) =>
        gate.Inverter is OneStageInverter oneStage && SquareLaw.Fit(oneStage, gate.SupplyVolts) is null
            ? 0
            : gate.Inverter.TransconductanceSiemens;

    private static Refinement? Balances(GateCircuit gate) => gate.Inverter switch
    {
        OneStageInverter oneStage => SquareLaw.Fit(oneStage, gate.SupplyVolts) is { } law
            ? new OneStageRefinement(new GateNetwork(gate, law.LeftoverSiemens), law)
            : null,
        BufferedInverter buffered =>
            new BufferedRefinement(new GateNetwork(gate, 1 / buffered.Ron), buffered, gate.SupplyVolts),
        _ => throw new ArgumentException("Unknown kind of inverter.", nameof(gate)),
    };
}
