using System.Collections.Immutable;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>The page of one list: its candidates, which of them is chosen, and writing it to a file.</summary>
/// <param name="desk">Where the lists are kept; null where there are none.</param>
/// <param name="replacements">What may replace the parts of a candidate; null where there are no lists.</param>
/// <param name="quantity">What a candidate costs over the number of boards; null where there are no lists.</param>
internal sealed class ShortlistPage(IShortlistDesk? desk, ReplacementsPage? replacements, QuantityPage? quantity)
{
    private ImmutableArray<string> _names = [];
    private bool _replaces;
    private int? _leaving;

    /// <summary>Whether it is open.</summary>
    public bool IsOpen { get; private set; }

    /// <summary>The name of the list.</summary>
    public string Name { get; private set; } = "";

    /// <summary>Its candidates.</summary>
    public ImmutableArray<ShortlistReview> Candidates { get; private set; } = [];

    /// <summary>Number of the chosen one, from zero.</summary>
    public int At { get; private set; }

    /// <summary>The chosen candidate; null where the list is empty.</summary>
    public ShortlistReview? Chosen => Candidates.IsEmpty ? null : Candidates[At];

    /// <summary>Which list of how many.</summary>
    public string Position => FormattableString.Invariant($"list {_names.IndexOf(Name) + 1} of {_names.Length}");

    /// <summary>The file that is asked for; null where none is.</summary>
    public AskedFields? Asking { get; private set; }

    /// <summary>Where the words about the chosen candidate are scrolled to.</summary>
    public PageScroll Scroll { get; } = new();

    /// <summary>What may replace the parts of the chosen candidate; null where it is not open.</summary>
    public ReplacementsPage? Replacements => replacements is { IsOpen: true } ? replacements : null;

    /// <summary>What the chosen candidate costs over the number of boards; null where it is not open.</summary>
    public QuantityPage? Quantity => quantity is { IsOpen: true } ? quantity : null;

    /// <summary>Opens it.</summary>
    /// <param name="list">The list to show; where it is not there, the first one.</param>
    /// <returns>A line to show; null for none.</returns>
    public string? Open(string list)
    {
        Result<ImmutableArray<string>> names = desk!.Names();
        if (!names.IsOk)
        {
            return names.Problem.ToString();
        }

        _names = names.Value;
        if (_names.IsEmpty)
        {
            IsOpen = false;
            return "There is no list yet; s puts the chosen circuit on one.";
        }

        return Show(_names.Contains(list) ? list : _names[0]);
    }

    /// <summary>Takes a key.</summary>
    /// <param name="key">The key.</param>
    /// <param name="notice">A line to show; null for none.</param>
    /// <returns>Whether it was taken.</returns>
    public bool Press(KeyPress key, out string? notice)
    {
        int? leaving = _leaving;
        _leaving = null;
        if (Asking is not null)
        {
            notice = PressInFile(key, Asking);
            return true;
        }

        if (Replacements is not null || Quantity is not null)
        {
            notice = null;
            return Replacements?.Press(key) ?? Quantity!.Press(key);
        }

        notice = key switch
        {
            { Name: KeyName.Escape or KeyName.Enter or KeyName.Backspace } => Close(),
            { Name: KeyName.Letter, Letter: 'l' } => Close(),
            { Name: KeyName.Up } => Move(-1),
            { Name: KeyName.Down } => Move(1),
            { Name: KeyName.Home } => Move(-Candidates.Length),
            { Name: KeyName.End } => Move(Candidates.Length),
            { Name: KeyName.Left } => Turn(-1),
            { Name: KeyName.Right } => Turn(1),
            { Name: KeyName.Delete } => Remove(leaving),
            { Name: KeyName.Letter, Letter: 'x' } => AskFile(),
            { Name: KeyName.Letter, Letter: 'r' } => Study(replacements!.Open),
            { Name: KeyName.Letter, Letter: 'b' } => Study(quantity!.Open),
            _ => null,
        };
        return (key.Name is KeyName.PageUp or KeyName.PageDown && Scroll.Press(key))
            || key is not { Name: KeyName.Letter, Letter: '?' or 'q' };
    }

    private string? Show(string list)
    {
        Result<ImmutableArray<ShortlistReview>> read = desk!.Read(list);
        if (!read.IsOk)
        {
            return read.Problem.ToString();
        }

        (IsOpen, Name, Candidates) = (true, list, read.Value);
        At = Math.Clamp(At, 0, Candidates.Length - 1);
        Scroll.Reset();
        return null;
    }

    private string? Close()
    {
        IsOpen = false;
        At = 0;
        return null;
    }

    private string? Move(int step)
    {
        At = Math.Clamp(At + step, 0, Math.Max(0, Candidates.Length - 1));
        Scroll.Reset();
        return null;
    }

    private string? Turn(int step)
    {
        int at = _names.IndexOf(Name) + step;
        At = at >= 0 && at < _names.Length ? 0 : At;
        return at >= 0 && at < _names.Length ? Show(_names[at]) : null;
    }

    private string? Remove(int? leaving)
    {
        if (Chosen is not { } chosen)
        {
            return null;
        }

        int number = chosen.Entry.Number;
        if (leaving != number)
        {
            _leaving = number;
            return FormattableString.Invariant($"Del once more takes candidate {number} off the list.");
        }

        return desk!.Remove(Name, number) is { } problem
            ? problem.ToString()
            : Open(Name) ?? FormattableString.Invariant($"Candidate {number} was taken off.");
    }

    private string? Study(Action<string, int> open)
    {
        if (Chosen is { } chosen)
        {
            open(Name, chosen.Entry.Number);
        }

        return null;
    }

    private string? AskFile()
    {
        string stem = new([.. Name.Select(sign => char.IsLetterOrDigit(sign) || sign is '-' or '_' or '.' ? sign : '-')]);
        Asking = new AskedFields(("file (.csv, .md or .html)", stem + ".html", 500));
        _replaces = false;
        return null;
    }

    private string? PressInFile(KeyPress key, AskedFields fields)
    {
        switch (key.Name)
        {
            case KeyName.Escape:
                Asking = null;
                return null;
            case KeyName.Enter:
                return Write(fields);
            default:
                _replaces = false;
                fields.Press(key);
                return null;
        }
    }

    private string? Write(AskedFields fields)
    {
        string path = fields.Fields[0].Text.Trim();
        if (!_replaces && desk!.IsThere(path))
        {
            fields.Problem = "It is there already: Enter once more replaces it, another name does not.";
            _replaces = true;
            return null;
        }

        Result<string> written = desk!.Export(Name, path, _replaces);
        if (!written.IsOk)
        {
            fields.Problem = written.Problem.ToString();
            return null;
        }

        Asking = null;
        return written.Value + ".";
    }
}
