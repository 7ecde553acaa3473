using System.Diagnostics;
using System.Globalization;
using PartPick.Catalog;
using PartPick.Selection;

namespace PartPick.Benchmarks;

/// <summary>
/// A large generated catalogue ranked beside what trying every combination would take, the same with ten times the capacitors, the
/// built-in catalogue, and single evaluations: all in one run, so that they compare.
/// </summary>
internal sealed class ScaleTable(ScaleArguments arguments, TextWriter output)
{
    /// <summary>Measures and prints.</summary>
    /// <param name="arguments">See <see cref="ScaleArguments"/>.</param>
    /// <param name="output">Where the table goes.</param>
    /// <param name="error">Where mistakes go.</param>
    /// <returns>0; 2 for a wrong argument.</returns>
    public static int Print(string[] arguments, TextWriter output, TextWriter error)
    {
        if (ScaleArguments.Read(arguments) is not { } read)
        {
            error.WriteLine("--scale [RUNS] [--quick] [--limit SECONDS]");
            return 2;
        }

        new ScaleTable(read, output).Write();
        return 0;
    }

    private static string PeakMemory()
    {
        using var process = Process.GetCurrentProcess();
        process.Refresh();
        return Text($"{process.PeakWorkingSet64 / 1e6:0} MB");
    }

    private static string Text(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);

    private static double Median(IEnumerable<double> values)
    {
        double[] sorted = [.. values.Order()];
        return sorted.Length % 2 == 1 ? sorted[sorted.Length / 2] : (sorted[sorted.Length / 2 - 1] + sorted[sorted.Length / 2]) / 2;
    }

    private void Write()
    {
        // The built-in catalogue first: it compiles what the large one is timed with.
        Requirement river = Wanted.Named("river")!;
        RankingRun.ToTheEnd(river);
        double builtIn = Median(Enumerable.Range(0, Math.Max(3, arguments.Runs)).Select(_ => RankingRun.ToTheEnd(river).ExactMilliseconds));
        Line("cores", Text($"{Environment.ProcessorCount}"));
        Line("built-in catalogue, river logger, exact", Text($"{builtIn:0} ms (aim: 200)"));
        (double one, double space, bool whole) = WriteCatalog(arguments.Size, "the catalogue");
        ScaleSize longer = arguments.Size with { Capacitors = arguments.Size.Capacitors * 10 };
        (double ten, double wider, bool wholeToo) = WriteCatalog(longer, "ten times the capacitors");
        string growth = whole && wholeToo ? Text($"{ten / one:0.00}") : "not known: not both finished";
        Line("time with ten times the capacitors over the other", Text($"{growth} (sqrt 10: {Math.Sqrt(10):0.00}")
            + (space > 0 && wider > 0 ? Text($"; square root of the space's growth: {Math.Sqrt(wider / space):0.00})") : ")"));
        output.WriteLine();
        foreach ((string name, double aim, Action call) in PerCallRows.All())
        {
            PerCall measured = PerCall.Of(call);
            Line(name, Text($"{measured.Microseconds:0.00} µs (aim: {aim:0}), {measured.Bytes:0} bytes"));
        }
    }

    private (double Seconds, double Space, bool IsWhole) WriteCatalog(ScaleSize size, string name)
    {
        Requirement requirement = GeneratedCatalog.Wanted;
        PartsCatalog catalog = GeneratedCatalog.Of(size);
        output.WriteLine();
        output.WriteLine(Text($"{name}: {catalog.Crystals.Length} crystals, {catalog.Capacitors.Length} capacitors, ")
            + Text($"{catalog.Inverters.Length} inverters, {catalog.Counters.Length} counters, {catalog.Ports.Length} ports, ")
            + Text($"{catalog.Transistors.Length} transistors, {catalog.Resistors.Length} resistors; {requirement.Name}, ")
            + Text($"{requirement.BudgetRatio * 1e6:0} ppm, {requirement.SupplyMinVolts} to {requirement.SupplyMaxVolts} V"));
        Line("memory before the ranking, peak of the process", PeakMemory());
        LimitedRun[] runs = [.. Enumerable.Range(0, arguments.Runs).Select(_ => LimitedRun.Of(requirement, catalog, arguments.Limit))];
        string peak = PeakMemory();
        Sampled sample = Sampled.Of(requirement, catalog, arguments.Drawn);
        ScaleSpace space = ScaleSpace.Of(requirement, catalog);
        Line("crystals that match", Text($"{space.Crystals} (aim: about 400)"));
        Line("combinations of the space",
            Text($"{space.Combinations:0.00e0}, of which {sample.Admitted:0.00e0} within the stated limits of their parts"));
        double[] firsts = [.. runs.Select(run => run.FirstSeconds).OfType<double>()];
        Line("first best-so-far", firsts.Length == 0 ? "none" : Text($"{Median(firsts) * 1000:0} ms (aim: 100)"));
        bool whole = runs.All(run => run.Answer is not null);
        double seconds = Median(runs.Select(run => run.Seconds));
        Line("exact front and first 50", whole
            ? Text($"{seconds:0.00} s (aim: 3), {runs[0].Answer!.Front.Length} on the front, {runs[0].Answer!.Candidates.Length} listed, ")
                + Text($"{runs[0].Answer!.Analysed} full analyses")
            : NotFinished(runs, space.Combinations));
        Line("peak memory of the process", Text($"{peak} (aim: 300 MB)"));
        WriteBruteForce(sample, seconds, whole);
        return (seconds, space.Combinations, whole);
    }

    private void WriteBruteForce(Sampled sample, double seconds, bool whole)
    {
        string than = whole ? "" : "less than ";
        Line("brute force, every figure of every combination",
            Text($"{sample.FullSeconds:0.0e0} s (NOT run: {sample.Drawn} drawn evenly, timed on all cores, scaled)"));
        Line("  over the exact search", Text($"{than}{sample.FullSeconds / seconds:0.0e0} (aim: 1e5)"));
        Line("brute force, margin first", Text($"{sample.MarginFirstSeconds:0.0e0} s (scaled in the same way)"));
        Line("  over the exact search", Text($"{than}{sample.MarginFirstSeconds / seconds:0.0e0}"));
    }

    private static string NotFinished(LimitedRun[] runs, double space)
    {
        LimitedRun run = runs.First(one => one.Answer is null);
        double percent = space > 0 ? run.Covered / space * 100 : 0;
        return Text($"not finished in {run.Seconds:0} s, {percent:0.00} % covered; ended {run.EndedSeconds * 1000:0} ms after cancelling");
    }

    private void Line(string name, string value)
    {
        output.WriteLine($"{name,-52}{value}");
        output.Flush();
    }
}
