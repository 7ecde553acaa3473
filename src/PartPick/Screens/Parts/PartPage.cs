using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Catalog.Browsing;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>One part, figure by figure, each with its origin; figures are changed in place.</summary>
/// <param name="path">The path of the catalogue.</param>
/// <param name="work">Reads and writes.</param>
/// <param name="today">The day, for what is set by hand.</param>
public sealed class PartPage(string path, ScreenWork work, Func<DateOnly> today)
{
    private int _number;

    /// <summary>Raised when the page looks different without a key having been pressed.</summary>
    public event Action? Changed;

    /// <summary>Raised with the row of a part that was changed.</summary>
    public event Action<PartRow>? Saved;

    /// <summary>The id of the part; null while none is open.</summary>
    public string? Id { get; private set; }

    /// <summary>Its figures.</summary>
    public ImmutableArray<PartFigureRow> Figures { get; private set; } = [];

    /// <summary>The chosen figure, from zero.</summary>
    public int At { get; private set; }

    /// <summary>The chosen figure; null while there is none.</summary>
    public PartFigureRow? Chosen => At < Figures.Length ? Figures[At] : null;

    /// <summary>What is typed in the place of the chosen figure; null while nothing is.</summary>
    public TypedText? Typed { get; private set; }

    /// <summary>What is wrong; null for nothing.</summary>
    public Problem? Problem { get; private set; }

    /// <summary>Whether something is being read or written.</summary>
    public bool IsBusy { get; private set; }

    /// <summary>Where the page is scrolled to.</summary>
    public int Top { get; private set; }

    /// <summary>Opens a part.</summary>
    /// <param name="id">Its id.</param>
    public void Open(string id)
    {
        (Id, Problem, Typed, IsBusy) = (id, null, null, true);
        int number = ++_number;
        work.Start(_ => CatalogReading.Find(path, id), found => Take(number, found));
    }

    /// <summary>Closes it; what is being written is written.</summary>
    public void Close()
    {
        (Id, Figures, Typed, Problem, IsBusy, At, Top) = (null, [], null, null, false, 0, 0);
        _number++;
    }

    /// <summary>Takes a key.</summary>
    /// <param name="key">The key.</param>
    public PartsAnswer Press(KeyPress key)
    {
        if (Typed is not null)
        {
            PressInTyped(key);
            return PartsAnswer.Taken;
        }

        Problem = null;
        switch (key)
        {
            case { Name: KeyName.Up or KeyName.Down or KeyName.PageUp or KeyName.PageDown or KeyName.Home or KeyName.End }:
                Move(key.Name);
                return PartsAnswer.Taken;
            case { Name: KeyName.Enter } when Chosen is { CanBeSet: true }:
                Begin(Chosen.Value ?? "");
                return PartsAnswer.Taken;
            case { Name: KeyName.Letter, Letter: (>= '0' and <= '9') or '+' or '-' or '.' or '±' } when Chosen is { Dimension: not null }:
                Begin(key.Letter.ToString());
                return PartsAnswer.Taken;
            case { Name: KeyName.Delete } when Chosen is { CanBeSet: true, Value: not null }:
                Set(Chosen.Key, "");
                return PartsAnswer.Taken;
            case { Name: KeyName.Letter, Letter: 'b' } when Chosen is { CanBeSet: true }:
                Set(Chosen.Key, null);
                return PartsAnswer.Taken;
            case { Name: KeyName.Letter, Letter: 'n' } when IndexOf("note") is >= 0 and int note:
                At = note;
                Begin(Figures[note].Value ?? "");
                return PartsAnswer.Taken;
            case { Name: KeyName.Letter, Letter: 'x' } when IndexOf("excluded") is >= 0 and int excluded:
                Exclude(Figures[excluded]);
                return PartsAnswer.Taken;
            case { Name: KeyName.Escape or KeyName.Backspace }:
                return PartsAnswer.Leave;
            default:
                return PartsAnswer.NotMine;
        }
    }

    /// <summary>Fits the figures in sight to a height, with the chosen one among them.</summary>
    /// <param name="height">Number of rows.</param>
    public void Fit(int height)
    {
        Top = Math.Clamp(Top, Math.Max(0, At - height + 1), At);
        Top = Math.Clamp(Top, 0, Math.Max(0, Figures.Length - height));
    }

    private void PressInTyped(KeyPress key)
    {
        switch (key.Name)
        {
            case KeyName.Escape:
                (Typed, Problem) = (null, null);
                break;
            case KeyName.Enter when !IsBusy:
                Set(Chosen!.Key, Typed!.Text);
                break;
            default:
                Problem = null;
                Typed!.Press(key);
                break;
        }
    }

    private void Move(KeyName key)
    {
        const int page = 10;
        int to = key switch
        {
            KeyName.Up => At - 1,
            KeyName.Down => At + 1,
            KeyName.PageUp => At - page,
            KeyName.PageDown => At + page,
            KeyName.Home => 0,
            _ => Figures.Length - 1,
        };
        At = Math.Clamp(to, 0, Math.Max(0, Figures.Length - 1));
    }

    private void Begin(string text) => Typed = new TypedText(text, 500);

    // A part that was excluded by hand is taken in by forgetting that; one that its list excluded, by saying so.
    private void Exclude(PartFigureRow excluded) => Set(
        "excluded",
        excluded.Value is null ? "yes" : excluded.Origin.StartsWith("set by hand", StringComparison.Ordinal) ? null : "");

    private int IndexOf(string key)
    {
        for (int i = 0; i < Figures.Length; i++)
        {
            if (Figures[i].Key == key)
            {
                return i;
            }
        }

        return -1;
    }

    private void Set(string key, string? value)
    {
        if (Id is not { } id || IsBusy)
        {
            return;
        }

        IsBusy = true;
        int number = ++_number;
        DateOnly date = today();
        work.Start(
            _ => CatalogEdit.Set(path, id, [(key, value)], date)
                .Then(_ => PartListing.ReadOne(path, id))
                .Then(row => CatalogReading.Find(path, id).Map(entry => (Row: row, Entry: entry))),
            done =>
            {
                if (done is { IsOk: true, Value.Row: { } row })
                {
                    Saved?.Invoke(row);
                }

                Take(number, done.Map(both => both.Entry));
            });
    }

    private void Take(int number, Result<CatalogEntry?> found)
    {
        if (number != _number)
        {
            return;
        }

        IsBusy = false;
        if (found is { IsOk: true, Value: { } entry })
        {
            (Figures, Typed, Problem) = (PartFigureRow.Of(entry), null, null);
            At = Math.Clamp(At, 0, Figures.Length - 1);
        }
        else
        {
            Problem = found.Problem ?? new Problem(Id!, "is not in the catalogue any more", "a part of the list");
        }

        Changed?.Invoke();
    }
}
