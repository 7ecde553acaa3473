using BenchmarkDotNet.Attributes;
using PartPick.Physics;
using PartPick.Selection;

namespace PartPick.Benchmarks;

/// <summary>The small-signal figures of one circuit.</summary>
public class StartUpBenchmarks
{
    private Subject _subject = null!;

    /// <summary>The circuit.</summary>
    [ParamsSource(nameof(Names))]
    public string Circuit { get; set; } = "";

    /// <summary>The circuits.</summary>
    public static IEnumerable<string> Names => Subject.Names;

    [GlobalSetup]
    public void Prepare() => _subject = Subject.Named(Circuit);

    /// <summary>Margin, growth, critical and upper transconductance: one small-signal analysis.</summary>
    [Benchmark(Baseline = true)]
    public StartUp OneAnalysis() => OscillatorAnalysis.AnalyseStartUp(_subject.Circuit);

    /// <summary>What the search asks first: margin and growth alone.</summary>
    [Benchmark]
    public StartFigures MarginAndGrowth() => OscillatorAnalysis.FindStartFigures(_subject.Circuit);

    /// <summary>The least margin over all corners.</summary>
    [Benchmark]
    public AtCorner MarginAtAllCorners() => _subject.Corners().Margin;
}
