using System.Globalization;
using PartPick.Catalog;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>Putting a candidate on a list, and the page of a list. Takes the keys while it asks or is open.</summary>
internal sealed class ShortlistModel
{
    private readonly IShortlistDesk? _desk;
    private readonly ReplacementsPage? _replacements;
    private readonly QuantityPage? _quantity;
    private readonly ShortlistPage _page;
    private string _list = ShortlistName.Usual;
    private AskedFields _fields = new();
    private (Candidate Candidate, Requirement Requirement, bool Changed)? _asked;

    /// <summary>Without any lists.</summary>
    public ShortlistModel() => _page = new ShortlistPage(null, null, null);

    /// <summary>With lists.</summary>
    /// <param name="desk">Where they are kept.</param>
    /// <param name="work">Does what takes long.</param>
    /// <param name="ascii">Whether only ASCII may be used.</param>
    public ShortlistModel(IShortlistDesk desk, ScreenWork work, bool ascii)
    {
        _desk = desk;
        _replacements = new ReplacementsPage(desk, work);
        _quantity = new QuantityPage(desk, work, ascii);
        _replacements.Changed += () => Redraw?.Invoke();
        _quantity.Changed += () => Redraw?.Invoke();
        _page = new ShortlistPage(desk, _replacements, _quantity);
    }

    /// <summary>Raised when the screen looks different without a key having been pressed.</summary>
    public event Action? Redraw;

    /// <summary>The fields that are asked for; null where nothing is.</summary>
    public AskedFields? Asking => _asked is null ? _page.Asking : _fields;

    /// <summary>What Enter does while something is asked.</summary>
    public string Enter => _asked is null ? "write" : "put it on the list";

    /// <summary>Whether the page of a list is open.</summary>
    public bool IsOpen => _page.IsOpen;

    /// <summary>The page.</summary>
    public ShortlistPage Page => _page;

    /// <summary>Asks on which list a candidate goes, and for how many boards.</summary>
    /// <param name="candidate">The candidate.</param>
    /// <param name="requirement">What is wanted.</param>
    /// <param name="changed">Whether its parts were changed, so that all of them go on the list as they are.</param>
    public void Ask(Candidate candidate, Requirement requirement, bool changed = false)
    {
        if (_desk is not null)
        {
            _asked = (candidate, requirement, changed);
            _fields = new AskedFields(
                ("list", _list, 60), ("boards", requirement.Builds.ToString(CultureInfo.InvariantCulture), 10), ("note", "", 200));
        }
    }

    /// <summary>Opens the page of the list that was last used.</summary>
    /// <returns>A line to show; null for none.</returns>
    public string? Open() => _desk is null ? null : _page.Open(_list);

    /// <summary>Ends what is being looked for.</summary>
    public void Stop()
    {
        _replacements?.Close();
        _quantity?.Close();
    }

    /// <summary>Takes a key, if something is asked or the page is open.</summary>
    /// <param name="key">The key.</param>
    /// <param name="notice">A line to show; null for none.</param>
    /// <returns>Whether the key was taken.</returns>
    public bool Press(KeyPress key, out string? notice)
    {
        notice = null;
        if (_asked is { } asked)
        {
            notice = PressInFields(key, asked);
            return true;
        }

        return _page.IsOpen && _page.Press(key, out notice);
    }

    private string? PressInFields(KeyPress key, (Candidate Candidate, Requirement Requirement, bool Changed) asked)
    {
        switch (key.Name)
        {
            case KeyName.Escape:
                _asked = null;
                return null;
            case KeyName.Enter:
                return Put(asked.Candidate, asked.Requirement, asked.Changed);
            default:
                _fields.Press(key);
                return null;
        }
    }

    private string? Put(Candidate candidate, Requirement requirement, bool changed)
    {
        Result<string> name = ShortlistName.Read(_fields.Fields[0].Text, "list");
        Result<int> boards = Boards(_fields.Fields[1].Text);
        if (!name.IsOk || !boards.IsOk)
        {
            _fields.Problem = (name.Problem ?? boards.Problem)!.ToString();
            return null;
        }

        string note = _fields.Fields[2].Text.Trim();
        Result<ShortlistEntry> put = _desk!.Put(
            name.Value, candidate.Choice, requirement with { Builds = boards.Value }, note.Length == 0 ? null : note,
            changed ? BoardParts.Of(candidate).Support : null);
        if (!put.IsOk)
        {
            _fields.Problem = put.Problem.ToString();
            return null;
        }

        _asked = null;
        _list = name.Value;
        return FormattableString.Invariant($"Candidate {put.Value.Number} of the list {name.Value}; l shows the list.");
    }

    private static Result<int> Boards(string text) => ValueText.Parse(text, Dimension.Count, "boards").Then(count => count >= 1
        ? Result.Ok((int)count)
        : Result.Fail<int>("boards", "is zero", "a whole number from 1"));
}
