using PartPick.Selection;
using PartPick.Values;
using PartPick.WhyNot;

namespace PartPick.Screens;

/// <summary>Why a part is not in the list: first which part, then the answer, looked for in the background.</summary>
internal sealed class WhyNotPage
{
    private readonly IWhyNotDesk _desk;
    private readonly ScreenWork _work;
    private readonly LatestWork _search;
    private Requirement? _requirement;
    private RankingResult? _ranked;
    private bool _picks;
    private int _number;

    /// <param name="desk">What answers.</param>
    /// <param name="work">Does what takes long.</param>
    public WhyNotPage(IWhyNotDesk desk, ScreenWork work)
    {
        (_desk, _work) = (desk, work);
        _search = new LatestWork(work);
        Picker = new PartPicker(desk, work);
        Picker.Changed += () => Changed?.Invoke();
    }

    /// <summary>Raised when there is something else to show.</summary>
    public event Action? Changed;

    /// <summary>Asks for the part.</summary>
    public PartPicker Picker { get; }

    /// <summary>Whether it is open.</summary>
    public bool IsOpen { get; private set; }

    /// <summary>The id of the part that is asked about; null while it is being picked.</summary>
    public string? Id { get; private set; }

    /// <summary>The answer; null until it is there.</summary>
    public WhyNotAnswer? Answer { get; private set; }

    /// <summary>Why there is none; null where there is no such reason.</summary>
    public Problem? Problem { get; private set; }

    /// <summary>What is being looked for; empty while nothing is.</summary>
    public string Doing { get; private set; } = "";

    /// <summary>Whether something is being looked for.</summary>
    public bool IsLooking => _search.IsRunning;

    /// <summary>Where the answer is scrolled to.</summary>
    public PageScroll Scroll { get; } = new();

    /// <summary>Opens it.</summary>
    /// <param name="requirement">The requirement that is asked about.</param>
    /// <param name="ranked">The complete answer to it, where there is one: what it lists needs no search.</param>
    /// <param name="id">The part; null to ask for it.</param>
    public void Open(Requirement requirement, RankingResult? ranked, string? id)
    {
        (_requirement, _ranked, _picks, IsOpen) = (requirement, ranked, id is null, true);
        if (id is null)
        {
            Pick();
        }
        else
        {
            Ask(id);
        }
    }

    /// <summary>Closes it, and ends what is being looked for.</summary>
    public void Close()
    {
        Stop();
        Picker.Close();
        (IsOpen, Id, Answer, Problem) = (false, null, null, null);
    }

    /// <summary>Ends what is being looked for, if there is such a thing; the page goes back to where the part was chosen.</summary>
    /// <returns>Whether there was.</returns>
    public bool Interrupt()
    {
        bool looked = IsOpen && IsLooking;
        if (looked)
        {
            Back();
        }

        return looked;
    }

    /// <summary>Takes a key.</summary>
    /// <returns>Whether it was taken.</returns>
    public bool Press(KeyPress key)
    {
        if (Id is null)
        {
            PressInPicker(key);
            return true;
        }

        if (key.Name is KeyName.Escape or KeyName.Backspace or KeyName.Enter)
        {
            Back();
            return true;
        }

        return Scroll.Press(key) || key is not { Name: KeyName.Letter, Letter: '?' or 'q' };
    }

    private void PressInPicker(KeyPress key)
    {
        switch (key.Name)
        {
            case KeyName.Escape:
                Close();
                break;
            case KeyName.Enter when Picker.Chosen is { } row:
                Ask(row.Id);
                break;
            case KeyName.Enter:
                break;
            default:
                Picker.Press(key);
                break;
        }
    }

    private void Back()
    {
        Stop();
        if (_picks)
        {
            Pick();
        }
        else
        {
            Close();
        }
    }

    private void Pick()
    {
        (Id, Answer, Problem) = (null, null, null);
        Picker.Open();
    }

    private void Stop()
    {
        _number++;
        _search.Stop();
        Doing = "";
    }

    private void Ask(string id)
    {
        Picker.Close();
        (Id, Problem, Doing) = (id, null, "reading the parts");
        Scroll.Reset();
        Answer = _ranked is null ? null : WhyNotSearch.InList(_ranked, id);
        if (Answer is not null)
        {
            Doing = "";
            return;
        }

        int number = ++_number;
        var progress = new Posted(doing => _work.Post(() => Note(number, doing)));
        Requirement requirement = _requirement!;
        _search.Start(stop => _desk.Ask(requirement, id, progress, stop), found =>
        {
            (Answer, Problem, Doing) = (found.ValueOr(null!), found.Problem, "");
            Changed?.Invoke();
        });
    }

    private void Note(int number, string doing)
    {
        if (number == _number && IsLooking)
        {
            Doing = doing;
            Changed?.Invoke();
        }
    }

    private sealed class Posted(Action<string> take) : IProgress<string>
    {
        public void Report(string value) => take(value);
    }
}
