using System.Collections.Concurrent;
using System.Diagnostics;
using System.Globalization;
using PartPick.Catalog;
using PartPick.Screens;
using PartPick.Selection;

namespace PartPick.Benchmarks;

/// <summary>
/// Ranking with a large catalogue, without a terminal: how long until the first candidates and the answer are there, with and without
/// the directory beside the catalogue, and how long a key in the sentence takes until the lines of the screen are there while
/// rankings begin and are cancelled. Times of one run.
/// </summary>
internal sealed class LargeTable
{
    private static readonly Requirement Wanted = new() { OutputHz = 1000, Waveform = Waveform.Square };

    private readonly ConcurrentQueue<Action> _posted = new();
    private readonly string _catalog;
    private readonly TextWriter _output;

    private LargeTable(string catalog, TextWriter output) => (_catalog, _output) = (catalog, output);

    /// <summary>Measures and prints.</summary>
    /// <param name="arguments">The number of rows, 1000000 when left out.</param>
    /// <param name="output">Where to print.</param>
    public static int Print(string[] arguments, TextWriter output)
    {
        using var catalog = new LargeCatalog(LargeCatalog.RowsOf(arguments, 1_000_000));
        output.WriteLine(string.Create(
            CultureInfo.InvariantCulture, $"{catalog.Added} parts beside the built-in ones, 120 x 40, ms"));
        var table = new LargeTable(catalog.Path, output);
        output.WriteLine("                              parts read     first   answer");
        table.Start("without a directory");
        table.Start("with the directory");
        output.WriteLine("keys                              median     worst");
        table.Type();
        return 0;
    }

    private void Start(string name)
    {
        long start = Stopwatch.GetTimestamp();
        double Since() => Stopwatch.GetElapsedTime(start).TotalMilliseconds;
        var parts = new PartsOnDemand(new StoredParts(_catalog));
        if (!parts.Open(CancellationToken.None).IsOk)
        {
            throw new InvalidOperationException("The catalogue cannot be read.");
        }

        double read = Since();
        double first = 0;
        var progress = new FirstReport(() => first = Since());
        Ranker.Rank(Wanted, parts, null, progress);
        double answer = Since();
        _output.WriteLine(string.Create(
            CultureInfo.InvariantCulture, $"{name,-30}{read,10:F0}{(first > 0 ? first : answer),10:F0}{answer,9:F0}"));
    }

    // The screen as the program runs it, but for the terminal: each key may start a ranking, and the next one cancels it.
    private void Type()
    {
        var ranking = new CatalogRanking(new PartsOnDemand(new StoredParts(_catalog)));
        Task opening = ranking.Open();
        using var live = new LiveRanking(ranking, _posted.Enqueue, TimeProvider.System);
        var model = new MainModel(Wanted, live, Glyphs.Drawn);
        model.Press(KeyPress.Of('e'));
        Row(model, "typed while the parts are read", 40, 10);
        opening.Wait();
        Row(model, "typed, 20 a second", 120, 50);
        Row(model, "typed, 2 a second: all rank", 40, 500);
        model.Stop();
    }

    private void Row(MainModel model, string name, int count, int pause)
    {
        var shown = new List<double>();
        for (int i = 0; i < count; i++)
        {
            long start = Stopwatch.GetTimestamp();
            model.Press(Key(i));
            model.Draw(120, 40);
            shown.Add(Stopwatch.GetElapsedTime(start).TotalMilliseconds);
            for (long from = Stopwatch.GetTimestamp(); Stopwatch.GetElapsedTime(from).TotalMilliseconds < pause;)
            {
                // What the rankings post is drawn on the same thread, and a key would wait for it.
                long drawing = Stopwatch.GetTimestamp();
                if (_posted.TryDequeue(out Action? posted))
                {
                    posted();
                    model.Draw(120, 40);
                    shown.Add(Stopwatch.GetElapsedTime(drawing).TotalMilliseconds);
                }
                else
                {
                    Thread.Sleep(1);
                }
            }
        }

        shown.Sort();
        _output.WriteLine(string.Create(CultureInfo.InvariantCulture, $"{name,-30}{shown[shown.Count / 2],10:F1}{shown[^1],10:F1}"));
    }

    // Another output frequency each time: 1 kHz, 2 kHz and so on.
    private static KeyPress Key(int number) => (number % 6) switch
    {
        0 => KeyPress.Of((char)('1' + number / 6 % 9)),
        1 => KeyPress.Of(' '),
        2 => KeyPress.Of('k'),
        3 => KeyPress.Of('H'),
        4 => KeyPress.Of('z'),
        _ => new KeyPress(KeyName.Enter),
    };

    private sealed class FirstReport(Action take) : IProgress<RankingResult>
    {
        private int _taken;

        public void Report(RankingResult value)
        {
            if (!value.Candidates.IsEmpty && Interlocked.Exchange(ref _taken, 1) == 0)
            {
                take();
            }
        }
    }
}
