using PartPick.Catalog;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>Putting a candidate on a list, and the page of a list. Takes the keys while it asks or is open.</summary>
internal sealed class ShortlistModel
{
    private readonly ReplacementsPage? _replacements;
    private readonly QuantityPage? _quantity;
    private readonly ShortlistPage _page;
    private readonly ListPutting? _putting;
    private string _list = ShortlistName.Usual;

    /// <summary>Without any lists.</summary>
    public ShortlistModel() => _page = new ShortlistPage(null, null, null, null);

    /// <summary>With lists.</summary>
    /// <param name="desk">Where they are kept.</param>
    /// <param name="work">Does what takes long.</param>
    /// <param name="ascii">Whether only ASCII may be used.</param>
    public ShortlistModel(IShortlistDesk desk, ScreenWork work, bool ascii)
    {
        _replacements = new ReplacementsPage(desk, work);
        _quantity = new QuantityPage(desk, work, ascii);
        _page = new ShortlistPage(desk, new LatestWork(work), _replacements, _quantity);
        _putting = new ListPutting(desk, work);
        Aside = new ListAside(desk, new LatestWork(work));
        _replacements.Changed += () => Redraw?.Invoke();
        _quantity.Changed += () => Redraw?.Invoke();
        Aside.Changed += () => Redraw?.Invoke();
        _page.Changed += said =>
        {
            Aside.Show(_page.IsOpen ? _page.Name : _list);
            Say(said);
        };
        _putting.Put += (list, said) =>
        {
            _list = list;
            Aside.Show(list);
            _page.Refresh(list);
            Say(said);
        };
        _putting.Failed += Say;
    }

    /// <summary>Raised when the screen looks different without a key having been pressed.</summary>
    public event Action? Redraw;

    /// <summary>Raised with something to say that no key was pressed for.</summary>
    public event Action<string>? Said;

    /// <summary>The fields that are asked for; null where nothing is.</summary>
    public AskedFields? Asking => _putting?.Asking ?? _page.Asking;

    /// <summary>What Enter does while something is asked.</summary>
    public string Enter => _putting?.Asking is null ? "write" : "put it on the list";

    /// <summary>Whether the page of a list is open.</summary>
    public bool IsOpen => _page.IsOpen;

    /// <summary>The page.</summary>
    public ShortlistPage Page => _page;

    /// <summary>The list at a glance; null without lists.</summary>
    public ListAside? Aside { get; }

    /// <summary>Asks on which list a candidate goes, and for how many boards.</summary>
    /// <param name="candidate">The candidate.</param>
    /// <param name="requirement">What is wanted.</param>
    /// <param name="changed">Whether its parts were changed, so that all of them go on the list as they are.</param>
    public void Ask(Candidate candidate, Requirement requirement, bool changed = false) =>
        _putting?.Ask(candidate, requirement, _list, changed ? BoardParts.Of(candidate).Support : null);

    /// <summary>Opens the page of the list that was last used.</summary>
    public void Open()
    {
        if (_putting is not null)
        {
            _page.Open(_list);
        }
    }

    /// <summary>Ends what is being looked for.</summary>
    public void Stop()
    {
        _replacements?.Close();
        _quantity?.Close();
        _page.Stop();
        Aside?.Stop();
    }

    /// <summary>Takes a key, if something is asked or the page is open.</summary>
    /// <param name="key">The key.</param>
    /// <param name="notice">A line to show; null for none.</param>
    /// <returns>Whether the key was taken.</returns>
    public bool Press(KeyPress key, out string? notice)
    {
        notice = null;
        return (_putting is not null && _putting.Press(key, IsOpen, out notice)) || (_page.IsOpen && _page.Press(key, out notice));
    }

    private void Say(string? said)
    {
        if (said is not null)
        {
            Said?.Invoke(said);
        }

        Redraw?.Invoke();
    }
}
