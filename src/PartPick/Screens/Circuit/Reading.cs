using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>The circuit that is being read: it stays chosen, whatever better ones are found meanwhile.</summary>
/// <param name="list">The list that it was opened from.</param>
internal sealed class Reading(CandidateList list)
{
    private Candidate? _circuit;

    /// <summary>Whether a circuit is open.</summary>
    public bool IsOpen => _circuit is not null;

    /// <summary>Whether the open circuit, or the best of its group, is still the chosen one of the list.</summary>
    public bool IsThere => _circuit is not null && list.Chosen is { } chosen && CandidateList.SameGroup(chosen, _circuit);

    /// <summary>The open circuit in a few words; empty where none is open.</summary>
    public string Name => _circuit is null ? "" : CircuitPane.ShortTitle(_circuit);

    /// <summary>Opens the chosen circuit.</summary>
    public void Open()
    {
        list.Hold();
        _circuit = list.Chosen;
    }

    /// <summary>Closes it.</summary>
    public void Close() => _circuit = null;
}
