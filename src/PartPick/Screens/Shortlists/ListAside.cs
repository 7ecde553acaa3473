using PartPick.Values;

namespace PartPick.Screens;

/// <summary>The list that was last used, at a glance, for a screen that has room for it. It is read when it is first drawn.</summary>
/// <param name="desk">Where the lists are kept.</param>
/// <param name="reading">Reads it.</param>
internal sealed class ListAside(IShortlistDesk desk, LatestWork reading)
{
    private string _list = Catalog.ShortlistName.Usual;
    private bool _isAsked;

    /// <summary>Raised when there is something else to show.</summary>
    public event Action? Changed;

    /// <summary>What was read; null before.</summary>
    public ListGlance? Glance { get; private set; }

    /// <summary>Why it cannot be read; null where it can.</summary>
    public Problem? Problem { get; private set; }

    /// <summary>Sees to it that it is read.</summary>
    public void Ask()
    {
        if (!_isAsked)
        {
            _isAsked = true;
            string list = _list;
            reading.Start(_ => desk.Glance(list), Take);
        }
    }

    /// <summary>Shows another list, or the same as it is now.</summary>
    /// <param name="list">The name of the list.</param>
    public void Show(string list)
    {
        bool wasAsked = _isAsked;
        (_list, _isAsked) = (list, false);
        if (wasAsked)
        {
            Ask();
        }
    }

    /// <summary>Reads it anew, as after the parts have changed.</summary>
    public void Refresh() => Show(_list);

    /// <summary>Reads it again if it could not be read, as where the catalogue was in use.</summary>
    public void TryAgain()
    {
        if (Problem is not null)
        {
            Refresh();
        }
    }

    /// <summary>Ends the reading.</summary>
    public void Stop() => reading.Stop();

    private void Take(Result<ListGlance> read)
    {
        (Glance, Problem) = (read.ValueOr(ListGlance.None), read.Problem);
        Changed?.Invoke();
    }
}
