using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Catalog.Browsing;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>The list of the parts of a kind: its filter, its order, and which part is chosen.</summary>
public sealed class PartList
{
    private readonly PartListSource _source;
    private string? _picked;
    private string _before = "";
    private PartFilter _filter = PartFilter.All(PartKind.Crystal);
    private int _height = 10;

    /// <summary>Makes the list.</summary>
    /// <param name="source">Where its rows come from.</param>
    public PartList(PartListSource source)
    {
        ArgumentNullException.ThrowIfNull(source);
        _source = source;
        source.Changed += Hold;
    }

    /// <summary>The kind.</summary>
    public PartKind Kind { get; private set; } = PartKind.Crystal;

    /// <summary>The columns of the kind.</summary>
    public ImmutableArray<ListColumn> Columns => ListColumns.Of(Kind);

    /// <summary>The column that is marked, from zero.</summary>
    public int Marked { get; private set; }

    /// <summary>The column that gives the order, from zero.</summary>
    public int Ordered { get; private set; }

    /// <summary>Whether the order is turned round.</summary>
    public bool IsDescending { get; private set; }

    /// <summary>What is typed into the filter; null while nothing is.</summary>
    public TypedText? Typed { get; private set; }

    /// <summary>The filter's text.</summary>
    public string FilterText { get; private set; } = "";

    /// <summary>What is wrong with the filter's text; null for nothing.</summary>
    public Problem? Problem { get; private set; }

    /// <summary>The rows.</summary>
    public PartView View => _source.View;

    /// <summary>Whether the rows are those of another filter, kind or order than the one asked for.</summary>
    public bool IsStale => _source.IsViewing && (View.Filter != _filter || View.Column != Columns[Ordered]);

    /// <summary>Whether rows are still being read.</summary>
    public bool IsReading => _source.IsReading;

    /// <summary>The place of the chosen row, from zero.</summary>
    public int At { get; private set; }

    /// <summary>The first row in sight.</summary>
    public int Top { get; private set; }

    /// <summary>The chosen row; null while there is none.</summary>
    public PartRow? Chosen => At < View.Count && View.Rows.Kind == Kind ? View[At] : null;

    /// <summary>Shows the list from its beginning, or again.</summary>
    public void Begin()
    {
        if (!_source.IsBegun)
        {
            _filter = PartFilter.All(Kind);
            Ask();
            _source.Read();
        }
    }

    /// <summary>Reads everything again, as after an import.</summary>
    /// <param name="kind">The kind to show.</param>
    public void BeginAgain(PartKind kind)
    {
        if (kind != Kind)
        {
            Turn(kind);
        }

        _source.Read();
    }

    /// <summary>Takes a key.</summary>
    /// <param name="key">The key.</param>
    public PartsAnswer Press(KeyPress key) => Typed is null ? PressInRows(key) : PressInFilter(key);

    /// <summary>Moves the choice.</summary>
    /// <param name="step">How many rows down; negative goes up.</param>
    public void Move(int step)
    {
        At = (int)Math.Clamp((long)At + step, 0, Math.Max(0, View.Count - 1));
        _picked = Chosen?.Id;
    }

    /// <summary>Fits the rows in sight to a height, with the chosen one among them.</summary>
    /// <param name="height">Number of rows.</param>
    public void Fit(int height)
    {
        _height = Math.Max(1, height);
        Top = Math.Clamp(Top, Math.Max(0, At - _height + 1), At);
        Top = Math.Clamp(Top, 0, Math.Max(0, View.Count - _height));
    }

    private PartsAnswer PressInRows(KeyPress key)
    {
        switch (key)
        {
            case { Name: KeyName.Up } when At == 0:
            case { Name: KeyName.Letter, Letter: 'f' }:
            case { Name: KeyName.Tab or KeyName.BackTab }:
                _before = FilterText;
                Typed = new TypedText(FilterText, 120);
                return PartsAnswer.Taken;
            case { Name: KeyName.Up }:
                Move(-1);
                return PartsAnswer.Taken;
            case { Name: KeyName.Down }:
                Move(1);
                return PartsAnswer.Taken;
            case { Name: KeyName.PageUp }:
                Move(1 - _height);
                return PartsAnswer.Taken;
            case { Name: KeyName.PageDown } or { Name: KeyName.Letter, Letter: ' ' }:
                Move(_height - 1);
                return PartsAnswer.Taken;
            case { Name: KeyName.Home }:
                Move(-View.Count);
                return PartsAnswer.Taken;
            case { Name: KeyName.End }:
                Move(View.Count);
                return PartsAnswer.Taken;
            case { Name: KeyName.Left }:
                Marked = Math.Max(0, Marked - 1);
                return PartsAnswer.Taken;
            case { Name: KeyName.Right }:
                Marked = Math.Min(Columns.Length - 1, Marked + 1);
                return PartsAnswer.Taken;
            case { Name: KeyName.Letter, Letter: 'o' }:
                IsDescending = Ordered == Marked && !IsDescending;
                Ordered = Marked;
                Ask();
                return PartsAnswer.Taken;
            case { Name: KeyName.Letter, Letter: 'k' }:
                Turn(PartKinds.All[((int)Kind + 1) % PartKinds.All.Count]);
                return PartsAnswer.Taken;
            case { Name: KeyName.Enter }:
                return Chosen is null ? PartsAnswer.Taken : PartsAnswer.Open;
            case { Name: KeyName.Escape } when FilterText.Length > 0:
                Filter("");
                return PartsAnswer.Taken;
            case { Name: KeyName.Escape }:
                return PartsAnswer.Leave;
            default:
                return PartsAnswer.NotMine;
        }
    }

    private PartsAnswer PressInFilter(KeyPress key)
    {
        switch (key.Name)
        {
            case KeyName.Enter or KeyName.Down or KeyName.Tab or KeyName.BackTab:
                if (Problem is null)
                {
                    Typed = null;
                }

                break;
            case KeyName.Escape:
                Typed = null;
                Filter(_before);
                break;
            case KeyName.PageDown or KeyName.PageUp or KeyName.Up:
                break;
            default:
                if (Typed!.Press(key))
                {
                    Filter(Typed.Text);
                }

                break;
        }

        return PartsAnswer.Taken;
    }

    private void Filter(string text)
    {
        FilterText = text;
        Result<PartFilter> read = PartFilter.Read(Kind, text, "filter");
        Problem = read.Problem;
        if (read.IsOk)
        {
            _filter = read.Value;
            Ask();
        }
    }

    private void Turn(PartKind kind)
    {
        (Kind, Marked, Ordered, IsDescending, At, Top, _picked) = (kind, 0, 0, false, 0, 0, null);
        (FilterText, Problem, _filter) = ("", null, PartFilter.All(kind));
        Ask();
    }

    private void Ask() => _source.Show(_filter, Columns[Ordered], IsDescending);

    // The part that was chosen stays chosen as long as it is there.
    private void Hold()
    {
        int place = _picked is null ? -1 : View.PlaceOf(_picked);
        At = place >= 0 ? place : _picked is null ? 0 : Math.Clamp(At, 0, Math.Max(0, View.Count - 1));
        if (Typed is not null && place < 0)
        {
            At = 0;
        }
    }
}
