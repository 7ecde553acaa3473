using BenchmarkDotNet.Attributes;
using PartPick.Physics;
using PartPick.Physics.Circuits;

namespace PartPick.Benchmarks;

/// <summary>The steady state of one circuit: from nothing, from a circuit like it, and as a quick estimate.</summary>
public class SteadyStateBenchmarks
{
    private Subject _subject = null!;
    private RunningState _neighbour = null!;
    private RunningState _own = null!;
    private RunningState _estimate = null!;

    /// <summary>The circuit.</summary>
    [ParamsSource(nameof(Names))]
    public string Circuit { get; set; } = "";

    /// <summary>The circuits.</summary>
    public static IEnumerable<string> Names => Subject.Names;

    [GlobalSetup]
    public void Prepare()
    {
        _subject = Subject.Named(Circuit);
        _neighbour = StateOf(_subject.Neighbour);
        _own = StateOf(_subject.Circuit);
        OscillatorAnalysis.EstimateSteadyState(_subject.Neighbour, null, out RunningState? estimate);
        _estimate = estimate ?? throw new InvalidOperationException($"The neighbour of the {Circuit} has no estimate.");
    }

    /// <summary>Start-up figures and steady state, from nothing.</summary>
    [Benchmark(Baseline = true)]
    public OscillatorResult FromNothing() => OscillatorAnalysis.Analyse(_subject.Circuit);

    /// <summary>From the circuit with the next smaller C1, as finely as from nothing.</summary>
    [Benchmark]
    public RunningFigures? FromNeighbour() =>
        OscillatorAnalysis.FindSteadyState(_subject.Circuit, _neighbour, Fineness.Converged, out _);

    /// <summary>The strongest device at the highest supply, from the nominal state.</summary>
    [Benchmark]
    public RunningFigures? OneCorner() => OscillatorAnalysis.FindSteadyState(_subject.Corner, _own, Fineness.Same, out _);

    /// <summary>A quick estimate, from nothing.</summary>
    [Benchmark]
    public SteadyEstimate? EstimateFromNothing() => OscillatorAnalysis.EstimateSteadyState(_subject.Circuit, null, out _);

    /// <summary>A quick estimate from a neighbour's.</summary>
    [Benchmark]
    public SteadyEstimate? EstimateFromNeighbour() => OscillatorAnalysis.EstimateSteadyState(_subject.Circuit, _estimate, out _);

    private RunningState StateOf(OscillatorCircuit circuit)
    {
        OscillatorAnalysis.Analyse(circuit, out RunningState? state);
        return state ?? throw new InvalidOperationException($"The {Circuit} does not run.");
    }
}
