using System.Collections.Immutable;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>What may replace the parts of a candidate of a list: one part at a time, looked for in the background.</summary>
/// <param name="desk">Where the lists are kept.</param>
/// <param name="work">Does what takes long.</param>
internal sealed class ReplacementsPage(IShortlistDesk desk, ScreenWork work)
{
    private const int Leap = 10;

    private readonly LatestWork _search = new(work);
    private readonly Dictionary<int, LineAlternates> _found = [];

    /// <summary>Raised when there is something else to show.</summary>
    public event Action? Changed;

    /// <summary>Whether it is open.</summary>
    public bool IsOpen { get; private set; }

    /// <summary>The candidate; null until it is read.</summary>
    public ListCircuit? Circuit { get; private set; }

    /// <summary>Its parts; equal ones stand together.</summary>
    public ImmutableArray<BoardLine> Lines { get; private set; } = [];

    /// <summary>Number of the part that is to be replaced, from zero.</summary>
    public int Part { get; private set; }

    /// <summary>Number of the chosen replacement, from zero.</summary>
    public int At { get; private set; }

    /// <summary>Why nothing can be shown; null where something can.</summary>
    public Problem? Problem { get; private set; }

    /// <summary>Whether something is being read or looked for.</summary>
    public bool IsLooking => _search.IsRunning;

    /// <summary>What was found for the part; null until it is.</summary>
    public LineAlternates? Found => _found.GetValueOrDefault(Part);

    /// <summary>The chosen replacement; null for none.</summary>
    public Replacement? Chosen => Found is { Replacements.IsEmpty: false } found ? found.Replacements[At] : null;

    /// <summary>Opens it.</summary>
    /// <param name="list">The name of the list.</param>
    /// <param name="number">The candidate's number.</param>
    public void Open(string list, int number)
    {
        (IsOpen, Circuit, Lines, Part, At, Problem) = (true, null, [], 0, 0, null);
        _found.Clear();
        _search.Start(stop => desk.Circuit(list, number, stop), Take);
    }

    /// <summary>Closes it, and ends what is being looked for.</summary>
    public void Close()
    {
        IsOpen = false;
        _search.Stop();
    }

    /// <summary>Takes a key.</summary>
    /// <param name="key">The key.</param>
    /// <returns>Whether it was taken.</returns>
    public bool Press(KeyPress key)
    {
        switch (key)
        {
            case { Name: KeyName.Escape or KeyName.Enter or KeyName.Backspace }:
            case { Name: KeyName.Letter, Letter: 'r' }:
                Close();
                break;
            case { Name: KeyName.Left or KeyName.Right }:
                Turn(key.Name == KeyName.Left ? -1 : 1);
                break;
            default:
                Move(key.Name);
                break;
        }

        return key is not { Name: KeyName.Letter, Letter: '?' or 'q' };
    }

    private void Take(Result<ListCircuit> read)
    {
        Problem = read.Problem;
        if (read.IsOk)
        {
            Circuit = read.Value;
            Lines = BoardLine.Of(read.Value.Chosen.Board);
            Look();
        }

        Changed?.Invoke();
    }

    private void Turn(int step)
    {
        int part = Math.Clamp(Part + step, 0, Math.Max(0, Lines.Length - 1));
        if (part != Part)
        {
            (Part, At) = (part, 0);
            Look();
        }
    }

    private void Look()
    {
        _search.Stop();
        if (Circuit is { } circuit && Found is null)
        {
            int part = Part;
            BoardLine line = Lines[part];
            _search.Start(
                stop => new Alternates(circuit.Chosen, circuit.Review.Requirement, circuit.Catalog).Find(line, stop),
                found =>
                {
                    _found[part] = found;
                    Changed?.Invoke();
                });
        }
    }

    private void Move(KeyName key)
    {
        int last = Math.Max(0, (Found?.Replacements.Length ?? 0) - 1);
        At = Math.Clamp(
            key switch
            {
                KeyName.Up => At - 1,
                KeyName.Down => At + 1,
                KeyName.PageUp => At - Leap,
                KeyName.PageDown => At + Leap,
                KeyName.Home => 0,
                KeyName.End => last,
                _ => At,
            },
            0,
            last);
    }
}
