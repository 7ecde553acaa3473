using System.Globalization;
using PartPick.Selection;

namespace PartPick.Benchmarks;

/// <summary>A plain table of the rankings: medians over warm runs in one process.</summary>
internal static class RankingTable
{
    private const string Row = "{0,-16}  {1,22}  {2,12}  {3,12}  {4,13}";

    /// <summary>Prints the table.</summary>
    /// <param name="arguments">The number of runs (5), then parts of the names of requirements (all).</param>
    /// <param name="output">Where the table goes.</param>
    /// <param name="error">Where mistakes go.</param>
    /// <returns>0; 2 for a wrong argument.</returns>
    public static int Print(string[] arguments, TextWriter output, TextWriter error)
    {
        int runs = 5;
        string[] names = arguments;
        if (arguments.Length > 0 && int.TryParse(arguments[0], NumberStyles.None, CultureInfo.InvariantCulture, out int given))
        {
            runs = Math.Max(1, given);
            names = arguments[1..];
        }

        if (names.FirstOrDefault(name => Wanted.Named(name) is null) is { } unknown)
        {
            error.WriteLine($"{unknown} is none of {string.Join(", ", Wanted.All.Select(wanted => wanted.Name))}");
            return 2;
        }

        Write(output, Row, "requirement", "first best-so-far (ms)", "exact (ms)", "combinations", "full analyses");
        foreach (Requirement wanted in names.Length == 0 ? Wanted.All : names.Select(name => Wanted.Named(name)!))
        {
            // The first run compiles and fills the caches.
            RankingRun.ToTheEnd(wanted);
            RankingRun[] timed = [.. Enumerable.Range(0, runs).Select(_ => RankingRun.ToTheEnd(wanted))];
            Write(
                output,
                Row,
                wanted.Name,
                Median(timed.Select(run => run.FirstMilliseconds)).ToString("0", CultureInfo.InvariantCulture),
                Median(timed.Select(run => run.ExactMilliseconds)).ToString("0", CultureInfo.InvariantCulture),
                timed[0].Answer.Combinations.ToString("0", CultureInfo.InvariantCulture),
                Median(timed.Select(run => (double)run.Answer.Analysed)).ToString("0", CultureInfo.InvariantCulture));
        }

        Write(output, "Medians of {0} warm runs on {1} cores.", runs, Environment.ProcessorCount);
        return 0;
    }

    private static double Median(IEnumerable<double> values)
    {
        double[] sorted = [.. values.Order()];
        int middle = sorted.Length / 2;
        return sorted.Length % 2 == 1 ? sorted[middle] : (sorted[middle - 1] + sorted[middle]) / 2;
    }

    private static void Write(TextWriter output, string format, params object[] values)
    {
        output.WriteLine(string.Format(CultureInfo.InvariantCulture, format, values).TrimEnd());
        output.Flush();
    }
}
