using PartPick.Physics.Bias;
using PartPick.Physics.Circuits;
using PartPick.Physics.Devices;
using PartPick.Physics.Growth;
using PartPick.Physics.Network;
using PartPick.Physics.SmallSignal;
using PartPick.Physics.Steady;

namespace PartPick.Physics;

/// <summary>The one door to the figures of a circuit: every screen, command and ranking calls it.</summary>
public static class OscillatorAnalysis
{
    /// <summary>Analyses a circuit at its supply and temperature: start-up, running margin and steady state.</summary>
    /// <param name="circuit">The circuit; its values must be finite and positive where the model needs them.</param>
    public static OscillatorResult Analyse(OscillatorCircuit circuit) => Analyse(circuit, out _);

    /// <summary>Analyses a circuit, and keeps its running state as a starting point for circuits like it.</summary>
    /// <param name="circuit">The circuit.</param>
    /// <param name="state">The running state; null where there is none.</param>
    public static OscillatorResult Analyse(OscillatorCircuit circuit, out RunningState? state) => circuit switch
    {
        GateCircuit gate => Analyse(gate, out state),
        FollowerCircuit follower => Analyse(follower, out state),
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

    /// <summary>
    /// The steady state of a circuit like one whose running state is known: many times cheaper than from nothing. Where it is
    /// not found from there, it is sought from nothing, to the same fineness.
    /// </summary>
    /// <param name="circuit">The circuit.</param>
    /// <param name="near">The running state of a circuit like it.</param>
    /// <param name="fineness">How finely it is resolved.</param>
    /// <param name="state">The running state; null where there is none.</param>
    public static RunningFigures? FindSteadyState(OscillatorCircuit circuit, RunningState near, Fineness fineness, out RunningState? state)
    {
        ArgumentNullException.ThrowIfNull(near);
        state = null;
        if (Balances(circuit) is not { } refinement)
        {
            return null;
        }

        RunningFigures? figures = SteadySolver.Follow(circuit.Crystal, refinement, near, fineness, out state);
        if (figures is not null || fineness == Fineness.OneFinerRoughly)
        {
            return figures;
        }

        switch (circuit)
        {
            case GateCircuit gate:
                return SteadySolver.Seek(gate.Crystal, SmallSignals(gate), Transconductance(gate), refinement, near, fineness, out state);
            case FollowerCircuit follower:
                double siemens = FollowerBias.Solve(follower).TransconductanceSiemens;
                return SteadySolver.Seek(follower.Crystal, new FollowerNetwork(follower), siemens, refinement, near, fineness, out state);
            default:
                throw new ArgumentException("Unknown kind of circuit.", nameof(circuit));
        }
    }

    /// <summary>A quick estimate of the steady state; null where there is none.</summary>
    /// <param name="circuit">The circuit.</param>
    /// <param name="near">The state of an estimate of a circuit like it; null to start from nothing.</param>
    /// <param name="state">The state, for the next estimate.</param>
    public static SteadyEstimate? EstimateSteadyState(OscillatorCircuit circuit, RunningState? near, out RunningState? state) =>
        EstimateSteadyState(circuit, near, null, out state);

    /// <summary>A quick estimate of the steady state from one of two others; null where there is none.</summary>
    /// <param name="circuit">The circuit.</param>
    /// <param name="near">The state of an estimate of a circuit like it; null to start from nothing.</param>
    /// <param name="other">Another such state, for where it is not found from the first.</param>
    /// <param name="state">The state, for the next estimate.</param>
    public static SteadyEstimate? EstimateSteadyState(
        OscillatorCircuit circuit, RunningState? near, RunningState? other, out RunningState? state)
    {
        state = null;
        if (Balances(circuit) is not { } refinement)
        {
            return null;
        }

        switch (circuit)
        {
            case GateCircuit gate:
                return SteadySolver.Estimate(gate.Crystal, SmallSignals(gate), Transconductance(gate), refinement, near, other, out state);
            case FollowerCircuit follower:
                double siemens = FollowerBias.Solve(follower).TransconductanceSiemens;
                return SteadySolver.Estimate(follower.Crystal, new FollowerNetwork(follower), siemens, refinement, near, other, out state);
            default:
                throw new ArgumentException("Unknown kind of circuit.", nameof(circuit));
        }
    }

    /// <summary>
    /// The frequency in hertz of a circuit that differs little from one whose running state is known, right to the first order of
    /// the difference: many times cheaper than its steady state. Null where it is not found.
    /// </summary>
    /// <param name="circuit">The circuit.</param>
    /// <param name="near">The running state of a circuit like it.</param>
    public static double? FindFirstOrderFrequencyHz(OscillatorCircuit circuit, RunningState near)
    {
        ArgumentNullException.ThrowIfNull(near);
        return Balances(circuit) is { } refinement ? SteadySolver.FirstOrder(circuit.Crystal, refinement, near) : null;
    }

    /// <summary>Start-up margin and growth rate alone, the cheapest figures of all.</summary>
    /// <param name="circuit">The circuit.</param>
    public static StartFigures FindStartFigures(OscillatorCircuit circuit) => circuit switch
    {
        GateCircuit gate => StartUpSolver.Figures(gate.Crystal, SmallSignals(gate), Transconductance(gate)),
        FollowerCircuit follower => StartUpSolver.Figures(
            follower.Crystal, new FollowerNetwork(follower), FollowerBias.Solve(follower).TransconductanceSiemens),
        _ => throw new ArgumentException("Unknown kind of circuit.", nameof(circuit)),
    };

    /// <summary>
    /// −Re Zc(jω)/Rm at a given frequency instead of the natural mode's: the margin but for what the negative resistance changes
    /// between the two, at a fraction of the work.
    /// </summary>
    /// <param name="circuit">The circuit.</param>
    /// <param name="hertz">Frequency in hertz, near the crystal's.</param>
    public static double FindMarginAt(OscillatorCircuit circuit, double hertz)
    {
        ArgumentNullException.ThrowIfNull(circuit);
        var s = new System.Numerics.Complex(0, 2 * Math.PI * hertz);
        System.Numerics.Complex impedance = circuit switch
        {
            GateCircuit gate => SmallSignals(gate).At(s).Impedance(Transconductance(gate)),
            FollowerCircuit follower => new FollowerNetwork(follower).At(s).Impedance(FollowerBias.Solve(follower).TransconductanceSiemens),
            _ => throw new ArgumentException("Unknown kind of circuit.", nameof(circuit)),
        };
        return -impedance.Real / circuit.Crystal.ResistanceOhms;
    }

    /// <summary>
    /// The load capacitance in farads that the crystal would see with the critical transconductance, to which limiting brings the
    /// device down: near that of the steady state, at a fraction of the work. Null where no transconductance starts it.
    /// </summary>
    /// <param name="circuit">The circuit.</param>
    /// <param name="hertz">Frequency in hertz, near the crystal's.</param>
    public static double? FindCriticalLoadFarads(OscillatorCircuit circuit, double hertz)
    {
        ArgumentNullException.ThrowIfNull(circuit);
        double radians = 2 * Math.PI * hertz;
        double ohms = circuit.Crystal.ResistanceOhms;
        double? reactance = circuit switch
        {
            GateCircuit gate => GrowthWindow.CriticalReactance(SmallSignals(gate), radians, ohms),
            FollowerCircuit follower => GrowthWindow.CriticalReactance(new FollowerNetwork(follower), radians, ohms),
            _ => throw new ArgumentException("Unknown kind of circuit.", nameof(circuit)),
        };
        return -1 / (radians * reactance);
    }

    /// <summary>ln(Î/Î0)/σ with the thermal current Î0 of the motional branch, in seconds.</summary>
    /// <param name="circuit">The circuit.</param>
    /// <param name="growthRatePerSecond">Growth rate σ in 1/s, above zero.</param>
    /// <param name="currentRmsAmps">Steady motional current in amperes rms.</param>
    public static double StartUpTimeSeconds(OscillatorCircuit circuit, double growthRatePerSecond, double currentRmsAmps) =>
        Math.Log(currentRmsAmps * Math.Sqrt(2) / ThermalPeakAmps(circuit)) / growthRatePerSecond;

    /// <summary>The thermal current Î0 = √(kT/Lm) of the motional branch, in amperes.</summary>
    /// <param name="circuit">The circuit.</param>
    public static double ThermalPeakAmps(OscillatorCircuit circuit)
    {
        ArgumentNullException.ThrowIfNull(circuit);
        double kelvins = circuit.TemperatureCelsius + PhysicalConstants.ZeroCelsiusKelvins;
        return Math.Sqrt(PhysicalConstants.BoltzmannJoulesPerKelvin * kelvins / circuit.Crystal.InductanceHenries);
    }

    /// <summary>
    /// The growth of the amplitude after switch-on; null where it does not build up from noise, has no steady state, or is held at
    /// an amplitude on the way.
    /// </summary>
    /// <param name="circuit">The circuit.</param>
    /// <param name="cancellation">Ends it.</param>
    public static AmplitudeGrowth? FindGrowth(OscillatorCircuit circuit, CancellationToken cancellation = default)
    {
        OscillatorResult result = Analyse(circuit, out RunningState? state);
        if (result is not { Start: StartKind.BuildsUp, Steady: { } steady } || state is null || Balances(circuit) is not { } refinement)
        {
            return null;
        }

        double ohms = circuit.Crystal.ResistanceOhms;
        double linear = (FindMarginAt(circuit, steady.FrequencyHz) - 1) * ohms;
        return linear > 0 && ExcessCurve.Follow(refinement, state, ohms, linear, cancellation) is { } curve
            ? GrowthSolver.Integrate(
                ThermalPeakAmps(circuit),
                steady.CurrentRmsAmps * Math.Sqrt(2),
                result.StartUp.GrowthRatePerSecond,
                depth => curve.At(depth) / linear)
            : null;
    }

    private static OscillatorResult Analyse(GateCircuit gate, out RunningState? state)
    {
        GateNetwork network = SmallSignals(gate);
        StartUp startUp = StartUpSolver.Solve(gate.Crystal, network, Transconductance(gate));
        double largest = double.NegativeInfinity;
        state = null;
        SteadyState? steady = Balances(gate) is { } refinement
            ? SteadySolver.Solve(gate.Crystal, network, startUp.TransconductanceSiemens, refinement, out largest, out state)
            : null;
        return Combine(gate, startUp, steady, largest, null);
    }

    private static OscillatorResult Analyse(FollowerCircuit follower, out RunningState? state)
    {
        FollowerBias bias = FollowerBias.Solve(follower);
        var network = new FollowerNetwork(follower);
        StartUp startUp = StartUpSolver.Solve(follower.Crystal, network, bias.TransconductanceSiemens);
        double largest = double.NegativeInfinity;
        state = null;
        SteadyState? steady = bias.EmitterAmps > 0
            ? SteadySolver.Solve(
                follower.Crystal, network, bias.TransconductanceSiemens, new FollowerRefinement(follower, bias), out largest, out state)
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
            StartUpTimeSeconds = start == StartKind.BuildsUp && steady is not null
                ? StartUpTimeSeconds(circuit, startUp.GrowthRatePerSecond, steady.CurrentRmsAmps)
                : null,
            Steady = steady,
            EmitterCurrentAmps = emitterAmps,
        };
    }

    private static GateNetwork SmallSignals(GateCircuit gate) => new(gate, 1 / gate.Inverter.OutputOhms);

    private static double Transconductance(GateCircuit gate) =>
        gate.Inverter is OneStageInverter oneStage && SquareLaw.Fit(oneStage, gate.SupplyVolts) is null
            ? 0
            : gate.Inverter.TransconductanceSiemens;

    private static Refinement? Balances(OscillatorCircuit circuit)
    {
        switch (circuit)
        {
            case GateCircuit gate:
                return Balances(gate);
            case FollowerCircuit follower:
                FollowerBias bias = FollowerBias.Solve(follower);
                return bias.EmitterAmps > 0 ? new FollowerRefinement(follower, bias) : null;
            default:
                throw new ArgumentException("Unknown kind of circuit.", nameof(circuit));
        }
    }

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
