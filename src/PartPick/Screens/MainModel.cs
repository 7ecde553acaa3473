using System.Collections.Immutable;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>The screen: sentence, list and circuit, and what the keys do. Knows nothing of the terminal.</summary>
public sealed partial class MainModel
{
    private static readonly TimeSpan AfterChoice = TimeSpan.FromMilliseconds(150);
    private static readonly TimeSpan WhileTyping = TimeSpan.FromMilliseconds(400);

    private readonly LiveRanking _ranking;
    private readonly Glyphs _glyphs;
    private readonly bool _waits;
    private readonly Reading _reading;

    /// <summary>Makes the screen of a requirement and starts ranking.</summary>
    /// <param name="requirement">The requirement.</param>
    /// <param name="ranking">What ranks; the screen ends it with <see cref="Stop"/>.</param>
    /// <param name="glyphs">The signs.</param>
    /// <param name="notice">A line to show until the first key; null for none.</param>
    /// <param name="currency">The currency of the cost limit; empty where it is not known.</param>
    /// <param name="waits">Whether a change waits a moment for the next one before it is ranked.</param>
    /// <param name="parts">The screens of the catalogue; null for none.</param>
    public MainModel(
        Requirement requirement,
        LiveRanking ranking,
        Glyphs glyphs,
        string? notice = null,
        string currency = "",
        bool waits = true,
        PartsModel? parts = null)
    {
        ArgumentNullException.ThrowIfNull(ranking);
        _ranking = ranking;
        _glyphs = glyphs;
        Notice = notice;
        _waits = waits;
        _reading = new Reading(List);
        Differences = new DifferencesModel(List);
        Wanted = SentenceOf(requirement, currency);
        _ranking.Answered += Take;
        _ranking.Failed += problem => Say($"! {problem}");
        Parts = parts;
        if (parts is not null)
        {
            parts.Redraw += () => Redraw?.Invoke();
        }

        _ranking.Ask(requirement, TimeSpan.Zero);
    }

    /// <summary>Raised when the screen looks different without a key having been pressed.</summary>
    public event Action? Redraw;

    /// <summary>Raised with a requirement that is worth keeping.</summary>
    public event Action<Requirement>? Settled;

    /// <summary>Raised when the parts of the catalogue are other ones than those that are ranked.</summary>
    public event Action? PartsChanged;

    /// <summary>The screens of the catalogue; null where there are none.</summary>
    public PartsModel? Parts { get; }

    /// <summary>The sentence.</summary>
    public SentenceModel Wanted { get; private set; }

    /// <summary>The list.</summary>
    public CandidateList List { get; } = new();

    /// <summary>Where the keys go.</summary>
    public Place Place { get; private set; }

    /// <summary>Whether the page of keys is shown, over whatever is below.</summary>
    public bool ShowsKeys { get; private set; }

    /// <summary>A line to show until the next key; null for none.</summary>
    public string? Notice { get; private set; }

    /// <summary>Whether a circuit is open, though its page may be away while the sentence is edited.</summary>
    public bool IsReading => _reading.IsOpen;

    /// <summary>Whether the open circuit stays in sight, where there is room, while the sentence is edited.</summary>
    internal bool KeepsReading => Place == Place.Sentence && _reading.IsThere;

    /// <summary>Whether the keys go to the list, with nothing open beside it.</summary>
    internal bool IsInList => Place == Place.List && !ShowsKeys && !Shortlists.IsOpen && !Kept.IsOpen && Differences.Pair is null;

    /// <summary>Whether the list answers an older requirement.</summary>
    public bool IsStale { get; private set; }

    /// <summary>Whether the parts are still being read.</summary>
    public bool ReadsParts { get; set; }

    /// <summary>Whether a better or newer answer is being computed.</summary>
    public bool IsRanking => _ranking.IsRunning;

    /// <summary>Where the page of the circuit is scrolled to.</summary>
    public PageScroll CircuitScroll { get; } = new();

    /// <summary>Where the page of keys is scrolled to.</summary>
    public PageScroll KeysScroll { get; } = new();

    /// <summary>Whether the program is to end.</summary>
    public bool IsDone { get; private set; }

    /// <summary>Ends the ranking, and what is being looked for.</summary>
    public void Stop()
    {
        Kept.Stop();
        Shortlists.Stop();
        Pictures.Close();
        Swaps.Forget();
        Questions.Stop();
        _ranking.Stop();
    }

    /// <summary>Ranks again, as after the parts have changed.</summary>
    public void RankAgain() => Rank(false);

    /// <summary>Takes that the parts have been read.</summary>
    /// <param name="currency">Their main currency.</param>
    public void PartsAreRead(string currency)
    {
        ReadsParts = false;
        Wanted.Currency = currency;
        Shortlists.Aside?.TryAgain();
        Redraw?.Invoke();
    }

    /// <summary>Says something until the next key.</summary>
    /// <param name="notice">The line.</param>
    public void Say(string notice)
    {
        Notice = notice;
        Redraw?.Invoke();
    }

    /// <summary>Stops what the user may want to stop without leaving: an import that runs, an answer that is looked for.</summary>
    /// <returns>Whether there was such a thing.</returns>
    public bool Interrupt() => Questions.Interrupt() || Place == Place.Parts && Parts!.Interrupt();

    /// <summary>Takes a key.</summary>
    /// <param name="key">The key.</param>
    public void Press(KeyPress key)
    {
        Notice = null;
        if (ShowsKeys)
        {
            PressInKeys(key);
            return;
        }

        if (Questions.Press(key))
        {
            return;
        }

        if (Shortlists.Press(key, out string? notice) || Kept.Press(key, out notice) || Pictures.Press(key, out notice))
        {
            Notice = notice;
            return;
        }

        if (Differences.Press(key))
        {
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
            case Place.Parts:
                PressInParts(key);
                break;
            default:
                PressInList(key);
                break;
        }
    }

    /// <summary>The screen as lines, each as wide as the screen.</summary>
    /// <param name="width">Width in cells.</param>
    /// <param name="height">Height in rows.</param>
    public ImmutableArray<Line> Draw(int width, int height) => new MainPicture(this, _glyphs, width, height).Draw();

    private void PressInKeys(KeyPress key)
    {
        if (!KeysScroll.Press(key) && key is not { Name: KeyName.Letter, Letter: not ('?' or 'q') })
        {
            ShowsKeys = false;
        }
    }

    private void PressInSentence(KeyPress key)
    {
        switch (Wanted.Press(key))
        {
            case SentenceAnswer.Leave:
                LeaveSentence();
                break;
            case SentenceAnswer.NotMine:
                PressAnywhere(key);
                break;
        }
    }

    // What was ranked for a comparison may be what the list was waiting for.
    private void TakeInstead(RankingResult result)
    {
        if (_putOff && RankedFigures.AreSame(result.Requirement, Wanted.Current))
        {
            _putOff = false;
            Take(result);
        }
    }

    // Another requirement becomes the sentence; a circuit that was open belongs to the one before.
    private void Begin(Requirement requirement)
    {
        Wanted.Changed -= Rank;
        Wanted = SentenceOf(requirement, Wanted.Currency);
        _reading.Close();
        Place = Place.List;
        _putOff = false;
        IsStale = List.Result is not null;
        _ranking.Ask(requirement, TimeSpan.Zero);
    }

    private SentenceModel SentenceOf(Requirement requirement, string currency)
    {
        var sentence = new SentenceModel(requirement, _glyphs, currency);
        sentence.Changed += Rank;
        return sentence;
    }

    private void LeaveSentence()
    {
        Place = _reading.IsThere ? Place.Circuit : Place.List;
        SayWhereItIsGone();
    }

    private void SayWhereItIsGone()
    {
        if (_reading is { IsOpen: true, IsThere: false })
        {
            Notice = $"{_reading.Name} is not in the list any more.";
            _reading.Close();
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
            case KeyName.Enter when List.Chosen is not null:
                CircuitScroll.Reset();
                OpenCircuit();
                Place = Place.Circuit;
                break;
            case KeyName.Escape:
                Notice = "q quits; the wanted sentence is kept.";
                break;
            default:
                if (!List.Press(key))
                {
                    PressAnywhere(key);
                }

                break;
        }
    }

    private void PressAnywhere(KeyPress key)
    {
        switch (key)
        {
            case { Name: KeyName.Letter, Letter: '?' }:
                KeysScroll.Reset();
                ShowsKeys = true;
                break;
            case { Name: KeyName.Letter, Letter: 's' } when List is { Chosen: { } chosen, Result: { } result }:
                PutOnList(chosen, result.Requirement);
                break;
            case { Name: KeyName.Letter, Letter: 'd' } when List is { Chosen: { } chosen, Result: { } result }:
                SetBeside(chosen, result.Requirement);
                break;
            case { Name: KeyName.Letter, Letter: 'l' }:
                Shortlists.Open();
                break;
            case { Name: KeyName.Letter, Letter: 'w' }:
                Kept.Open(Wanted.Accepted);
                break;
            case { Name: KeyName.Letter, Letter: 'p' } when List is { Chosen: { } chosen, Result: { } result }:
                Pictures.Open(chosen, result);
                break;
            case { Name: KeyName.Letter, Letter: 'y' }:
                Questions.AskWhyNot(Wanted.Accepted, IsStale ? null : List.Result);
                break;
            case { Name: KeyName.Letter, Letter: 'h' } when List is { Chosen: { } shown, Result: { } ranked }:
                Questions.ShowFigures(shown, ranked);
                break;
            case { Name: KeyName.Letter, Letter: 'q' }:
                IsDone = true;
                break;
            case { Name: KeyName.Letter, Letter: 'e' }:
                Place = Place.Sentence;
                break;
            case { Name: KeyName.Letter, Letter: 'c' } when Parts is not null:
                EnterParts();
                break;
            case { Name: KeyName.Tab or KeyName.BackTab } when Place == Place.Circuit:
                Place = Place.Sentence;
                break;
        }
    }

    private void Rank(bool typing)
    {
        Swaps.Forget();
        IsStale = List.Result is not null;
        _ranking.Ask(Wanted.Current, !_waits ? TimeSpan.Zero : typing ? WhileTyping : AfterChoice);
    }

    private void Take(RankingResult result)
    {
        IsStale = false;
        List.Show(result);
        Kept.Figures.Take(result);
        Pictures.Follow(result);
        if (Place == Place.Circuit && !_reading.IsThere)
        {
            Place = Place.List;
            SayWhereItIsGone();
        }

        TakeInCircuit(result);
        if (result.IsComplete)
        {
            Settled?.Invoke(Wanted.Accepted);
        }

        Redraw?.Invoke();
    }
}
