using BenchmarkDotNet.Attributes;
using BenchmarkDotNet.Engines;
using PartPick.Selection;

namespace PartPick.Benchmarks;

/// <summary>The ranking over the built-in catalogue, on all cores.</summary>
[SimpleJob(RunStrategy.Monitoring, launchCount: 1, warmupCount: 1, iterationCount: 5)]
public class RankingBenchmarks
{
    private Requirement _requirement = null!;

    /// <summary>The requirement.</summary>
    [ParamsSource(nameof(Names))]
    public string Requirement { get; set; } = "";

    /// <summary>The requirements.</summary>
    public static IEnumerable<string> Names => Wanted.All.Select(wanted => wanted.Name);

    [GlobalSetup]
    public void Prepare() => _requirement = Wanted.Named(Requirement)!;

    /// <summary>The exact answer.</summary>
    [Benchmark(Baseline = true)]
    public object ExactAnswer() => RankingRun.ToTheEnd(_requirement);

    /// <summary>The first best-so-far with a candidate in it, and stopped there.</summary>
    [Benchmark]
    public void FirstBestSoFar() => RankingRun.ToTheFirst(_requirement);
}
