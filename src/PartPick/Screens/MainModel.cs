using System.Collections.Immutable;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>Where the keys go.</summary>
public enum Place
{
    /// <summary>The ranked list.</summary>
    List,

    /// <summary>The wanted sentence.</summary>
    Sentence,

    /// <summary>The page of one circuit.</summary>
    Circuit,
}

/// <summary>The screen: sentence, list and circuit, and what the keys do. Knows nothing of the terminal.</summary>
public sealed class MainModel
{
    private static readonly TimeSpan AfterChoice = TimeSpan.FromMilliseconds(150);
    private static readonly TimeSpan WhileTyping = TimeSpan.FromMilliseconds(400);

    private readonly PageScroll _circuitScroll = new();
    private readonly PageScroll _keysScroll = new();
    private readonly LiveRanking _ranking;
    private readonly Glyphs _glyphs;
    private readonly bool _waits;
    private string? _notice;
    private bool _stale;

    /// <summary>Makes the screen of a requirement and starts ranking.</summary>
    /// <param name="requirement">The requirement.</param>
    /// <param name="ranking">What ranks; the screen ends it with <see cref="Stop"/>.</param>
    /// <param name="glyphs">The signs.</param>
    /// <param name="notice">A line to show until the first key; null for none.</param>
    /// <param name="waits">Whether a change waits a moment for the next one before it is ranked.</param>
    public MainModel(Requirement requirement, LiveRanking ranking, Glyphs glyphs, string? notice = null, bool waits = true)
    {
        ArgumentNullException.ThrowIfNull(ranking);
        _ranking = ranking;
        _glyphs = glyphs;
        _notice = notice;
        _waits = waits;
        Wanted = new SentenceModel(requirement, glyphs);
        Wanted.Changed += Rank;
        _ranking.Answered += Take;
        _ranking.Ask(requirement, TimeSpan.Zero);
    }

    /// <summary>Raised when the screen looks different without a key having been pressed.</summary>
    public event Action? Redraw;

    /// <summary>Raised with a requirement that is worth keeping.</summary>
    public event Action<Requirement>? Settled;

    /// <summary>The sentence.</summary>
    public SentenceModel Wanted { get; }

    /// <summary>The list.</summary>
    public CandidateList List { get; } = new();

    /// <summary>Where the keys go.</summary>
    public Place Place { get; private set; }

    /// <summary>Whether the page of keys is shown, over whatever is below.</summary>
    public bool ShowsKeys { get; private set; }

    /// <summary>Whether the program is to end.</summary>
    public bool IsDone { get; private set; }

    /// <summary>Ends the ranking.</summary>
    public void Stop() => _ranking.Stop();

    /// <summary>Takes a key.</summary>
    /// <param name="key">The key.</param>
    public void Press(KeyPress key)
    {
        _notice = null;
        if (ShowsKeys)
        {
            PressInKeys(key);
            return;
        }

        switch (Place)
        {
            case Place.Sentence:
                PressInSentence(key);
                break;
            case Place.Circuit:
                PressInCircuit(key);
                break;
            default:
                PressInList(key);
                break;
        }
    }

    /// <summary>The screen as lines, each as wide as the screen.</summary>
    /// <param name="width">Width in cells.</param>
    /// <param name="height">Height in rows.</param>
    public ImmutableArray<Line> Draw(int width, int height)
    {
        if (width < 40 || height < 12)
        {
            return Filled([Line.Empty, new LineBuilder(_glyphs).Add(" PartPick needs 40 x 12 at least.").Build()], width, height);
        }

        ImmutableArray<Line> sentence = Wanted.Draw(width - 1, Place == Place.Sentence && !ShowsKeys);
        int room = height - sentence.Length - 1;
        ImmutableArray<Line> body = ShowsKeys ? KeysBody(width, room)
            : Place == Place.Circuit && List.Chosen is not null ? CircuitBody(List.Chosen, width, room)
            : width >= 120 ? WideBody(width, room)
            : NarrowBody(width, room);
        return [.. Filled([.. sentence, .. body], width, height - 1), Foot(width).Fit(width)];
    }

    private void PressInKeys(KeyPress key)
    {
        if (!_keysScroll.Press(key) && key is not { Name: KeyName.Letter, Letter: not ('?' or 'q') })
        {
            ShowsKeys = false;
        }
    }

    private void PressInSentence(KeyPress key)
    {
        switch (Wanted.Press(key))
        {
            case SentenceAnswer.Leave:
                Place = Place.List;
                break;
            case SentenceAnswer.NotMine:
                PressAnywhere(key);
                break;
        }
    }

    private void PressInCircuit(KeyPress key)
    {
        if (_circuitScroll.Press(key))
        {
            return;
        }

        switch (key.Name)
        {
            case KeyName.Escape or KeyName.Enter or KeyName.Backspace:
                Place = Place.List;
                break;
            case KeyName.Left or KeyName.Right:
                List.Move(key.Name == KeyName.Left ? -1 : 1);
                _circuitScroll.Reset();
                break;
            default:
                PressAnywhere(key);
                break;
        }
    }

    private void PressInList(KeyPress key)
    {
        switch (key.Name)
        {
            case KeyName.Up when List.At == 0:
            case KeyName.Tab or KeyName.BackTab:
                Place = Place.Sentence;
                break;
            case KeyName.Up or KeyName.Down:
                List.Move(key.Name == KeyName.Up ? -1 : 1);
                break;
            case KeyName.PageUp or KeyName.PageDown:
                List.Move(key.Name == KeyName.PageUp ? -8 : 8);
                break;
            case KeyName.Home or KeyName.End:
                List.Move(key.Name == KeyName.Home ? -List.Candidates.Length : List.Candidates.Length);
                break;
            case KeyName.Enter when List.Chosen is not null:
                _circuitScroll.Reset();
                Place = Place.Circuit;
                break;
            case KeyName.Escape:
                _notice = "q quits; the wanted sentence is kept.";
                break;
            default:
                PressAnywhere(key);
                break;
        }
    }

    private void PressAnywhere(KeyPress key)
    {
        switch (key)
        {
            case { Name: KeyName.Letter, Letter: '?' }:
                _keysScroll.Reset();
                ShowsKeys = true;
                break;
            case { Name: KeyName.Letter, Letter: 'q' }:
                IsDone = true;
                break;
            case { Name: KeyName.Letter, Letter: 'e' }:
                Place = Place.Sentence;
                break;
            case { Name: KeyName.Tab or KeyName.BackTab } when Place == Place.Circuit:
                Place = Place.Sentence;
                break;
        }
    }

    private void Rank(bool typing)
    {
        _stale = List.Result is not null;
        _ranking.Ask(Wanted.Current, !_waits ? TimeSpan.Zero : typing ? WhileTyping : AfterChoice);
    }

    private void Take(RankingResult result)
    {
        _stale = false;
        List.Show(result);
        if (result.IsComplete)
        {
            Settled?.Invoke(Wanted.Accepted);
        }

        Redraw?.Invoke();
    }

    private ImmutableArray<Line> NarrowBody(int width, int room)
    {
        ImmutableArray<Line> pane = List.Chosen is { } candidate
            ? CircuitPane.Below(candidate, List.Result!.Requirement, width, _glyphs)
            : [];
        int rows = Math.Max(1, room - pane.Length - 3);
        return
        [
            AnswerRule(width), List.Heading(_glyphs), .. Filled(Rows(rows), width, rows),
            List.Chosen is { } chosen ? Rule(CircuitPane.Title(chosen), "", width) : Line.Empty,
            .. pane,
        ];
    }

    private ImmutableArray<Line> WideBody(int width, int room)
    {
        const int left = 79;
        int right = width - left - 1;
        ImmutableArray<Line> list = [AnswerRule(left), List.Heading(_glyphs), .. Rows(room - 2)];
        ImmutableArray<Line> pane = List.Chosen is { } candidate
            ?
            [
                Rule(CircuitPane.ShortTitle(candidate), "", right),
                .. CircuitPane.Beside(candidate, List.Result!.Requirement, right, _glyphs),
            ]
            : [Rule("", "", right)];
        var bar = new Line([new Span(_glyphs.Vertical.ToString(), Tone.Quiet)]);
        var lines = ImmutableArray.CreateBuilder<Line>();
        for (int i = 0; i < room; i++)
        {
            Line middle = i == 0 ? new Line([new Span(_glyphs.TeeDown.ToString(), Tone.Quiet)]) : bar;
            lines.Add((i < list.Length ? list[i] : Line.Empty)
                .Beside(left, middle)
                .Beside(left + 1, i < pane.Length ? pane[i] : Line.Empty));
        }

        return lines.ToImmutable();
    }

    private ImmutableArray<Line> CircuitBody(Candidate candidate, int width, int room)
    {
        ImmutableArray<Line> page = CircuitPage.Draw(candidate, List.Result!, width, _glyphs);
        ImmutableArray<Line> shown = _circuitScroll.Cut(page, room - 1);
        string number = FormattableString.Invariant($"{List.At + 1} of {List.Candidates.Length}");
        return [Rule(CircuitPane.ShortTitle(candidate), _circuitScroll.HasMore ? number + ", more below" : number, width), .. shown];
    }

    private ImmutableArray<Line> KeysBody(int width, int room)
    {
        ImmutableArray<Line> shown = _keysScroll.Cut(KeysPage.Draw(width, _glyphs), room - 1);
        return [Rule("Keys", _keysScroll.HasMore ? "more below" : "", width), .. shown];
    }

    private ImmutableArray<Line> Rows(int height) =>
        List.Draw(height, Place == Place.List, _stale, _glyphs);

    private Line AnswerRule(int width) => Rule(
        AnswerWords.Of(List.Result, _ranking.IsRunning, _stale),
        List.ShowsMisses ? "nearest first" : List.Candidates.IsEmpty ? "" : "best first",
        width,
        _ranking.IsRunning ? Tone.Accent : Tone.Strong);

    private Line Rule(string left, string right, int width, Tone tone = Tone.Strong)
    {
        if (_glyphs.Show(left).Length + _glyphs.Show(right).Length + 8 > width)
        {
            right = "";
        }

        int end = width - (right.Length == 0 ? 1 : _glyphs.Show(right).Length + 4);
        LineBuilder line = new LineBuilder(_glyphs).RuleTo(1);
        if (left.Length > 0)
        {
            string shown = _glyphs.Show(left);
            line.Add(" ").Column(shown, Math.Clamp(shown.Length, 0, Math.Max(0, end - 4)), tone).Add(" ");
        }

        line.RuleTo(end);
        return right.Length == 0 ? line.RuleTo(width).Build() : line.Add(" ").Add(right, Tone.Quiet).Add(" ").RuleTo(width).Build();
    }

    private Line Foot(int width)
    {
        LineBuilder line = new LineBuilder(_glyphs).Add(" ");
        if (Wanted.Problem is { } problem && Place == Place.Sentence)
        {
            string whole = _glyphs.Show("! " + problem);
            string fits = whole.Length < width ? whole : $"! {problem.Where}: fits {problem.Fits}";
            return line.Column(fits, width - 1, Tone.Warning).Build();
        }

        if (_notice is { } notice)
        {
            return line.Column(notice, width - 1, Tone.Accent).Build();
        }

        if (ShowsKeys)
        {
            return Keys(line, (_glyphs.Up + " " + _glyphs.Down, "scroll"), ("Esc", "back"));
        }

        return Place switch
        {
            Place.Sentence when Wanted.Typed is not null => Typing(line, "Enter", "keep", "Esc", "as it was", width),
            Place.Sentence => Typing(line, "Tab", "next", "Esc", "list", width),
            Place.Circuit => Keys(
                line, (_glyphs.Up + " " + _glyphs.Down, "scroll"), (_glyphs.Left + " " + _glyphs.Right, "other circuits"),
                ("Esc", "list"), ("e", "edit"), ("?", "keys")),
            _ => Keys(
                line, (_glyphs.Up + " " + _glyphs.Down, "choose"), ("Enter", "open"), ("e", "edit the wanted"), ("?", "keys"),
                ("q", "quit")),
        };
    }

    private Line Typing(LineBuilder line, string key, string does, string other, string otherDoes, int width)
    {
        string name = Wanted.Field.Name;
        string help = Wanted.Field.Help(Wanted.Accepted);
        int tail = key.Length + does.Length + other.Length + otherDoes.Length + 6;
        line.Column($"{name}: {help}", Math.Max(10, width - tail - 3));
        return Keys(line.Add("  "), (key, does), (other, otherDoes));
    }

    private static Line Keys(LineBuilder line, params (string Key, string Does)[] keys)
    {
        foreach ((string key, string does) in keys)
        {
            line.Add(key, Tone.Strong).Add(" " + does + "   ");
        }

        return line.Build();
    }

    private static ImmutableArray<Line> Filled(ImmutableArray<Line> lines, int width, int height) =>
        [.. lines.Concat(Enumerable.Repeat(Line.Empty, Math.Max(0, height))).Take(Math.Max(0, height)).Select(line => line.Fit(width))];
}
