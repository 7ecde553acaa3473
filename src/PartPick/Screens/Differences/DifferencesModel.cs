using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>Two circuits side by side: one is marked, the other is the chosen or the open one.</summary>
/// <param name="list">The list in which a circuit is marked.</param>
internal sealed class DifferencesModel(CandidateList list)
{
    /// <summary>The circuits; null while they are not shown.</summary>
    public CircuitPair? Pair { get; private set; }

    /// <summary>Where the page is scrolled to.</summary>
    public PageScroll Scroll { get; } = new();

    /// <summary>Marks a circuit, or shows it beside another one.</summary>
    /// <param name="ranked">The circuit as it was ranked.</param>
    /// <param name="shown">The circuit as it now is.</param>
    /// <param name="requirement">What is needed of it.</param>
    /// <returns>A line to show; null for none.</returns>
    public string? Ask(Candidate ranked, Candidate shown, Requirement requirement)
    {
        bool changed = !ReferenceEquals(ranked, shown);
        if (list.Marked is { } marked && !CircuitPair.IsSame(marked, shown))
        {
            Show(new CircuitPair(marked, "marked", shown, changed ? "changed" : "chosen", requirement));
            return null;
        }

        if (changed)
        {
            Show(new CircuitPair(ranked, "ranked", shown, "changed", requirement));
            return null;
        }

        list.Marked = list.Marked is null ? shown : null;
        return list.Marked is null ? "It is marked no more." : "Marked with =. d on another circuit shows the two side by side.";
    }

    /// <summary>Takes a whole answer: the marked circuit is the one of it, if it is there.</summary>
    /// <param name="result">The answer.</param>
    /// <returns>A line to show; null for none.</returns>
    public string? Take(RankingResult result)
    {
        if (!result.IsComplete || list.Marked is not { } marked)
        {
            return null;
        }

        list.Marked = list.Candidates.FirstOrDefault(one => CircuitPair.IsSame(one, marked))
            ?? list.Candidates.FirstOrDefault(one => CandidateList.SameGroup(one, marked));
        return list.Marked is null ? "The marked circuit is not in the list any more." : null;
    }

    /// <summary>Takes a key, if two circuits are shown.</summary>
    /// <param name="key">The key.</param>
    /// <returns>Whether it was taken.</returns>
    public bool Press(KeyPress key)
    {
        if (Pair is null)
        {
            return false;
        }

        if (key is { Name: KeyName.Escape or KeyName.Enter or KeyName.Backspace } or { Name: KeyName.Letter, Letter: 'd' })
        {
            Pair = null;
            return true;
        }

        return Scroll.Press(key) || key is not { Name: KeyName.Letter, Letter: '?' or 'q' };
    }

    private void Show(CircuitPair pair)
    {
        Scroll.Reset();
        Pair = pair;
    }
}
