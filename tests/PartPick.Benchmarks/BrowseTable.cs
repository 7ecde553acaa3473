using System.Collections.Concurrent;
using System.Diagnostics;
using System.Globalization;
using PartPick.Screens;

namespace PartPick.Benchmarks;

/// <summary>
/// The catalogue's screens on a large list, without a terminal: how long a key takes until the lines of the screen are there, and
/// until what it asked for is there too. Times of one run.
/// </summary>
internal sealed class BrowseTable
{
    private readonly ConcurrentQueue<Action> _posted = new();
    private readonly ScreenWork _work;
    private readonly PartsModel _model;
    private readonly TextWriter _output;

    private BrowseTable(string catalog, TextWriter output)
    {
        _work = new ScreenWork(_posted.Enqueue);
        _model = new PartsModel(catalog, _work, Glyphs.Drawn, () => new DateOnly(2026, 3, 1));
        _output = output;
    }

    /// <summary>Measures and prints.</summary>
    /// <param name="arguments">The number of rows, 500000 when left out.</param>
    /// <param name="output">Where to print.</param>
    public static int Print(string[] arguments, TextWriter output)
    {
        using var catalog = new LargeCatalog(LargeCatalog.RowsOf(arguments, 500_000));
        output.WriteLine(string.Create(
            CultureInfo.InvariantCulture, $"{catalog.Added} parts beside the built-in ones, 120 x 40, ms"));
        output.WriteLine("keys                        median     worst   worst until the answer");
        new BrowseTable(catalog.Path, output).Measure();
        return 0;
    }

    private void Measure()
    {
        long start = Stopwatch.GetTimestamp();
        _model.Enter();
        Wait(() => _model.List.View.Count > 0);
        double first = Stopwatch.GetElapsedTime(start).TotalMilliseconds;
        Row("Down while reading", 200, _ => Of(KeyName.Down), waits: false);
        Settle();
        double all = Stopwatch.GetElapsedTime(start).TotalMilliseconds;
        _output.WriteLine(string.Create(
            CultureInfo.InvariantCulture, $"first rows after {first:F0} ms, all {_model.List.View.Count} after {all:F0} ms"));
        Row("Down", 200, _ => Of(KeyName.Down));
        Row("PgDn", 200, _ => Of(KeyName.PageDown));
        Row("End, Home", 100, i => Of(i % 2 == 0 ? KeyName.End : KeyName.Home));
        Row("filter, typed", 18, i => KeyPress.Of("fnumber 4 load<10p"[i]));
        Row("filter, taken back", 17, _ => Of(KeyName.Backspace));
        Row("to the list", 1, _ => Of(KeyName.Enter));
        Row("mark a column", 5, _ => Of(KeyName.Right));
        Row("order by a number", 4, _ => KeyPress.Of('o'));
        Row("mark the description", 6, _ => Of(KeyName.Right));
        Row("order by a text", 4, _ => KeyPress.Of('o'));
        Row("open and leave a part", 20, i => Of(i % 2 == 0 ? KeyName.Enter : KeyName.Escape));
        Row(
            "open, write a note", 4,
            i => i switch { 0 or 3 => Of(KeyName.Enter), 1 => KeyPress.Of('n'), _ => KeyPress.Of('x') });
        _model.Stop();
    }

    private static KeyPress Of(KeyName name) => new(name);

    private void Row(string name, int count, Func<int, KeyPress> key, bool waits = true)
    {
        var shown = new List<double>();
        double answered = 0;
        for (int i = 0; i < count; i++)
        {
            long start = Stopwatch.GetTimestamp();
            Drain();
            _model.Press(key(i));
            _model.Draw(120, 40);
            shown.Add(Stopwatch.GetElapsedTime(start).TotalMilliseconds);
            if (waits)
            {
                Settle();
                answered = Math.Max(answered, Stopwatch.GetElapsedTime(start).TotalMilliseconds);
            }
            else
            {
                Thread.Sleep(5);
            }
        }

        shown.Sort();
        string answer = waits ? answered.ToString("F0", CultureInfo.InvariantCulture) : "";
        _output.WriteLine(string.Create(
            CultureInfo.InvariantCulture, $"{name,-24}{shown[count / 2],10:F1}{shown[^1],10:F1}{answer,25}"));
    }

    private void Drain()
    {
        while (_posted.TryDequeue(out Action? posted))
        {
            posted();
        }
    }

    private void Settle() => Wait(() => _work.IsIdle && _posted.IsEmpty);

    private void Wait(Func<bool> isSo)
    {
        while (!isSo())
        {
            Drain();
            Thread.Sleep(1);
        }

        _model.Draw(120, 40);
    }
}
