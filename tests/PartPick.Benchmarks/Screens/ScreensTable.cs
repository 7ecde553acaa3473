using System.Diagnostics;
using System.Globalization;

namespace PartPick.Benchmarks;

/// <summary>
/// The program in a pseudo-terminal beside an empty program of the toolkit, driven by keys: the first frame, the processor time of doing
/// nothing, how long a key waits for its answer, and what is sent for it. One run, both programs by turns, so that ratios compare.
/// </summary>
internal sealed class ScreensTable
{
    private const string Down = "\x1b[B";
    private const string Up = "\x1b[A";
    private const string PageDown = "\x1b[6~";
    private const string PageUp = "\x1b[5~";

    private static readonly TimeSpan Patience = TimeSpan.FromSeconds(60);
    private static readonly TimeSpan Still = TimeSpan.FromMilliseconds(700);

    private readonly TextWriter _output;
    private readonly string _catalog;

    private ScreensTable(string catalog, TextWriter output)
    {
        _catalog = catalog;
        _output = output;
    }

    /// <summary>Measures and prints.</summary>
    /// <param name="arguments">Rows of the large catalogue, 500000 when left out, 0 for none; then the starts of each program, 9.</param>
    /// <param name="output">Where to print.</param>
    public static int Print(string[] arguments, TextWriter output)
    {
        int rows = LargeCatalog.RowsOf(arguments, 500_000);
        int starts = arguments.Length > 1 ? int.Parse(arguments[1], CultureInfo.InvariantCulture) : 9;
        string folder = Directory.CreateTempSubdirectory("partpick-screens-bench-").FullName;
        try
        {
            var small = new ScreensTable(Path.Combine(folder, "small.db"), output);
            small.FirstFrames(starts);
            small.Idle();
            output.WriteLine("120 x 40                          ms, median     worst   over 50 ms   bytes, median     worst");
            small.Keys("");
            if (rows > 0)
            {
                using var catalog = new LargeCatalog(rows);
                new ScreensTable(catalog.Path, output).Keys(string.Create(CultureInfo.InvariantCulture, $", {rows} parts"));
            }

            return 0;
        }
        finally
        {
            Directory.Delete(folder, recursive: true);
        }
    }

    private static string[] Program(string name, params string[] arguments) =>
        Environment.ProcessPath is { } running && Path.GetFileNameWithoutExtension(running) == "dotnet"
            ? [running, Path.Combine(AppContext.BaseDirectory, name + ".dll"), .. arguments]
            : [Path.Combine(AppContext.BaseDirectory, name), .. arguments];

    private static double Median(List<double> values)
    {
        values.Sort();
        return values[values.Count / 2];
    }

    private PseudoTerminal PartPick() => new(Program("partpick"), _catalog);

    private PseudoTerminal Empty() => new(Program("PartPick.Benchmarks", "--empty-screen"), _catalog);

    private static double Until(PseudoTerminal terminal, string text)
    {
        Need(terminal.WaitFor(text, 0, Patience), text);
        return Stopwatch.GetElapsedTime(terminal.Started).TotalMilliseconds;
    }

    private static void Need(bool came, string what)
    {
        if (!came)
        {
            throw new InvalidOperationException($"It never came: {what}.");
        }
    }

    private void FirstFrames(int starts)
    {
        var ours = new List<double>();
        var empty = new List<double>();
        var answers = new List<double>();
        var work = new List<double>();
        var emptyWork = new List<double>();

        // The first start of each reads its files from the disk.
        for (int i = 0; i <= starts; i++)
        {
            double noneCame, noneWorked;
            using (PseudoTerminal none = Empty())
            {
                noneCame = Until(none, EmptyScreen.Words);
                noneWorked = none.Work.TotalMilliseconds;
            }

            using PseudoTerminal terminal = PartPick();
            double came = Until(terminal, "river logger"), worked = terminal.Work.TotalMilliseconds;
            double answered = Until(terminal, "best first");
            if (i > 0)
            {
                empty.Add(noneCame);
                emptyWork.Add(noneWorked);
                ours.Add(came);
                work.Add(worked);
                answers.Add(answered);
            }
        }

        double unit = Median(empty);
        _output.WriteLine(string.Create(
            CultureInfo.InvariantCulture,
            $"first frame over that of an empty program: {Median(ours) / unit:F2}, "
            + $"in processor time {Median(work) / Median(emptyWork):F2}; "
            + $"first circuits: {Median(answers) / unit:F2}"));
        _output.WriteLine(string.Create(
            CultureInfo.InvariantCulture,
            $"  (medians of {starts} starts; the empty program: {unit:F0} ms, of which it computed {Median(emptyWork):F0})"));
    }

    private void Idle()
    {
        using PseudoTerminal none = Empty();
        using PseudoTerminal terminal = PartPick();
        Need(terminal.WaitFor("circuits", 0, Patience), "an answer");
        terminal.WaitForRest(TimeSpan.FromSeconds(3));
        TimeSpan oursBefore = terminal.Work, emptyBefore = none.Work;
        int sentBefore = terminal.Sent, emptySent = none.Sent;
        long start = Stopwatch.GetTimestamp();
        Thread.Sleep(TimeSpan.FromSeconds(30));
        double passed = Stopwatch.GetElapsedTime(start).TotalSeconds;
        double ours = (terminal.Work - oursBefore).TotalSeconds, empty = (none.Work - emptyBefore).TotalSeconds;
        _output.WriteLine(string.Create(
            CultureInfo.InvariantCulture,
            $"idle: {ours / empty:F2} of the empty program's processor time ({ours / passed:P2} and {empty / passed:P2} of a core); "
            + $"sent meanwhile: {terminal.Sent - sentBefore} and {none.Sent - emptySent} bytes"));
    }

    private void Keys(string which)
    {
        using PseudoTerminal terminal = PartPick();
        Need(terminal.WaitFor("best first", 0, Patience), "the list");

        // Typing begins at once: parts may still be read, and every value starts a ranking that the next one ends.
        int from = terminal.Type("e");
        Need(terminal.WaitFor("output frequency", from, Patience), "the sentence");
        Row("typed in the sentence, 20 a second" + which, terminal, 240, 50, Typed);
        terminal.Type("1kHz\r");
        terminal.WaitForRest(Still);
        terminal.Type("\x1b");
        terminal.WaitForRest(TimeSpan.FromSeconds(3));
        Row("Down, Up in the list" + which, terminal, 40, 100, i => (i % 2 == 0 ? Down : Up, "►"));
        terminal.Type("c");
        terminal.WaitForRest(TimeSpan.FromSeconds(3));
        Row("Down in the catalogue" + which, terminal, 60, 100, _ => (Down, ""));
        Row("PgDn, PgUp in the catalogue" + which, terminal, 40, 100, i => (i % 4 < 2 ? PageDown : PageUp, ""));
    }

    // Another output frequency each time: 1 kHz, 2 kHz and so on. What is typed has to be seen.
    private static (string Key, string Shown) Typed(int number) => (number % 5) switch
    {
        0 => (((char)(0x31 + number / 5 % 9)).ToString(), ((char)(0x31 + number / 5 % 9)).ToString()),
        1 => ("k", "k"),
        2 => ("H", "H"),
        3 => ("z", "z"),
        _ => ("\r", ""),
    };

    private void Row(string name, PseudoTerminal terminal, int count, int pause, Func<int, (string Key, string Shown)> key)
    {
        var times = new List<double>();
        var bytes = new List<double>();
        for (int i = 0; i < count; i++)
        {
            (string press, string shown) = key(i);
            long start = Stopwatch.GetTimestamp();
            int from = terminal.Type(press);
            Need(terminal.WaitFor(shown, from, Patience), $"the answer to key {i} of '{name}', after {terminal.Last}");
            times.Add(Stopwatch.GetElapsedTime(start).TotalMilliseconds);
            Thread.Sleep(pause);
            bytes.Add(terminal.Sent - from);
        }

        double worst = times.Max(), worstBytes = bytes.Max();
        int late = times.Count(time => time > 50);
        _output.WriteLine(string.Create(
            CultureInfo.InvariantCulture,
            $"{name,-46}{Median(times),8:F1}{worst,10:F1}{late,8} of {count,-5}{Median(bytes),10:F0}{worstBytes,10:F0}"));
    }
}
