using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Catalog.Browsing;
using PartPick.Values;
using PartPick.WhyNot;

namespace PartPick.Screens;

/// <summary>Asks for a crystal or an amplifier: what is typed narrows the list, in the background.</summary>
/// <param name="desk">Where the parts are read.</param>
/// <param name="work">Does what takes long.</param>
internal sealed class PartPicker(IWhyNotDesk desk, ScreenWork work)
{
    private const int Most = 200;
    private const int Leap = 8;
    private const int LeastKindWord = 4;

    private static readonly ImmutableArray<PartKind> Kinds =
        [PartKind.Crystal, PartKind.Inverter, PartKind.Counter, PartKind.Port, PartKind.Transistor];

    private readonly LatestWork _reading = new(work);
    private readonly LatestWork _matching = new(work);
    private ImmutableDictionary<PartKind, PartRows>? _rows;

    /// <summary>Raised when there is something else to show.</summary>
    public event Action? Changed;

    /// <summary>What is typed.</summary>
    public TypedText Typed { get; private set; } = new("");

    /// <summary>The first parts that match.</summary>
    public ImmutableArray<PartRow> Matches { get; private set; } = [];

    /// <summary>How many match.</summary>
    public int Count { get; private set; }

    /// <summary>Number of the chosen one, from zero.</summary>
    public int At { get; private set; }

    /// <summary>The chosen part; null for none.</summary>
    public PartRow? Chosen => At < Matches.Length ? Matches[At] : null;

    /// <summary>Why the parts cannot be read, or what is wrong with a condition; null for nothing.</summary>
    public Problem? Problem { get; private set; }

    /// <summary>Whether parts are being read or looked through.</summary>
    public bool IsLooking => _reading.IsRunning || _matching.IsRunning;

    /// <summary>Begins, with what was typed before.</summary>
    public void Open()
    {
        Problem = null;
        Typed = new TypedText(Typed.Text);
        _reading.Start(desk.Rows, read =>
        {
            (_rows, Problem) = (read.ValueOr(null!), read.Problem);
            Match();
            Changed?.Invoke();
        });
    }

    /// <summary>Ends, and lets the parts go.</summary>
    public void Close()
    {
        _reading.Stop();
        _matching.Stop();
        (_rows, Matches, Count, At) = (null, [], 0, 0);
    }

    /// <summary>Takes a key that is not Enter or Esc.</summary>
    public void Press(KeyPress key)
    {
        int? step = key.Name switch
        {
            KeyName.Up => -1,
            KeyName.Down => 1,
            KeyName.PageUp => -Leap,
            KeyName.PageDown => Leap,
            _ => null,
        };
        if (step is { } rows)
        {
            At = Math.Clamp(At + rows, 0, Math.Max(0, Matches.Length - 1));
        }
        else if (Typed.Press(key))
        {
            Match();
        }
    }

    private void Match()
    {
        if (_rows is not { } rows)
        {
            return;
        }

        string text = Typed.Text;
        _matching.Start(stop => Find(rows, text, stop), found =>
        {
            (Matches, Count, Problem) = found;
            At = 0;
            Changed?.Invoke();
        });
    }

    // A condition that a kind has no figure for leaves that kind out; a word that is a kind's own leaves the others out.
    private static (ImmutableArray<PartRow> Matches, int Count, Problem? Problem) Find(
        ImmutableDictionary<PartKind, PartRows> rows, string text, CancellationToken stop)
    {
        string[] words = text.Split(' ', StringSplitOptions.RemoveEmptyEntries);
        string? kindWord = words.FirstOrDefault(word => word.Length >= LeastKindWord
            && Kinds.Any(kind => kind.Word().StartsWith(word, StringComparison.OrdinalIgnoreCase)));
        string left = string.Join(' ', words.Where(word => word != kindWord));
        var matches = ImmutableArray.CreateBuilder<PartRow>();
        int count = 0;
        Problem? problem = null;
        bool anyRead = false;
        foreach (PartKind kind in Kinds.Where(kind =>
            kindWord is null || kind.Word().StartsWith(kindWord, StringComparison.OrdinalIgnoreCase)))
        {
            Result<PartFilter> filter = PartFilter.Read(kind, left, "part");
            problem ??= filter.Problem;
            if (filter.IsOk && rows.TryGetValue(kind, out PartRows? all))
            {
                anyRead = true;
                int[] found = filter.Value.Find(all, stop);
                count += found.Length;
                matches.AddRange(found.Take(Most - matches.Count).Select(row => all[row]));
            }
        }

        return (matches.ToImmutable(), count, anyRead ? null : problem);
    }
}
