using PartPick.Output;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>
/// What a candidate of a list costs over the number of boards, and which candidate is the best there. The cost comes first; the
/// best candidates need rankings, and follow from the background.
/// </summary>
/// <param name="desk">Where the lists are kept.</param>
/// <param name="work">Does what takes long.</param>
/// <param name="ascii">Whether only ASCII may be used.</param>
internal sealed class QuantityPage(IShortlistDesk desk, ScreenWork work, bool ascii)
{
    private const int MostBuilds = 10_000;

    private readonly LatestWork _search = new(work);

    /// <summary>Raised when there is something else to show.</summary>
    public event Action? Changed;

    /// <summary>Whether it is open.</summary>
    public bool IsOpen { get; private set; }

    /// <summary>What is shown; null until the candidate is read.</summary>
    public QuantityView? View { get; private set; }

    /// <summary>Why nothing can be shown; null where something can.</summary>
    public Problem? Problem { get; private set; }

    /// <summary>Whether something is being read or looked for.</summary>
    public bool IsLooking => _search.IsRunning;

    /// <summary>Where it is scrolled to.</summary>
    public PageScroll Scroll { get; } = new();

    /// <summary>Opens it.</summary>
    /// <param name="list">The name of the list.</param>
    /// <param name="number">The candidate's number.</param>
    public void Open(string list, int number)
    {
        (IsOpen, View, Problem) = (true, null, null);
        Scroll.Reset();
        _search.Start(
            stop => desk.Circuit(list, number, stop)
                .Map(circuit => (Circuit: circuit, Curve: CostCurve.Of(circuit.Chosen.Board, MostBuilds))),
            read =>
            {
                Problem = read.Problem;
                if (read.IsOk)
                {
                    Take(list, read.Value.Circuit, read.Value.Curve);
                }

                Changed?.Invoke();
            });
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
        if (!Scroll.Press(key) && key is { Name: KeyName.Escape or KeyName.Enter or KeyName.Backspace } or { Letter: 'b' })
        {
            Close();
        }

        return key is not { Name: KeyName.Letter, Letter: '?' or 'q' };
    }

    private void Take(string list, ListCircuit circuit, CostCurve? curve)
    {
        if (curve is null)
        {
            Problem = new Problem("cost", "a part of the circuit has no price, or one in another currency", "a candidate whose parts all have one");
            return;
        }

        Requirement wanted = circuit.Review.Requirement;
        View = new QuantityView(list, circuit.Review, circuit.Chosen, curve, null, QuantityView.UsualRows(wanted.Builds, MostBuilds), ascii);
        var options = new QuantityOptions { Most = MostBuilds };
        _search.Start(
            stop => QuantitySearch.Find(wanted, circuit.Catalog, circuit.Chosen.Candidate, options, null, stop),
            choice =>
            {
                View = new QuantityView(list, circuit.Review, circuit.Chosen, curve, choice, View.Rows, ascii);
                Changed?.Invoke();
            });
    }
}
