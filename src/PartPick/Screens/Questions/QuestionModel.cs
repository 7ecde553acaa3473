using System.Collections.Immutable;
using PartPick.Selection;
using PartPick.WhyNot;

namespace PartPick.Screens;

/// <summary>What can be asked of the list and of a circuit: why a part is not in it, and how a figure comes about.</summary>
internal sealed class QuestionModel
{
    private readonly WhyNotPage? _whyNot;
    private readonly FigurePage? _figures;

    /// <summary>Without anything that answers.</summary>
    public QuestionModel()
    {
    }

    /// <param name="desk">What answers why a part is not in the list.</param>
    /// <param name="work">Does what takes long.</param>
    public QuestionModel(IWhyNotDesk desk, ScreenWork work)
    {
        _whyNot = new WhyNotPage(desk, work);
        _figures = new FigurePage(work);
        _whyNot.Changed += () => Redraw?.Invoke();
        _figures.Changed += () => Redraw?.Invoke();
    }

    /// <summary>Raised when the screen looks different without a key having been pressed.</summary>
    public event Action? Redraw;

    /// <summary>Whether a question is open.</summary>
    public bool IsOpen => _whyNot is { IsOpen: true } || _figures is { Candidate: not null };

    /// <summary>Whether what is open needs its own columns.</summary>
    public bool IsTable => _figures is { Candidate: not null };

    /// <summary>Asks why a part is not in the list.</summary>
    /// <param name="wanted">The requirement.</param>
    /// <param name="ranked">The complete answer to it; null where there is none yet.</param>
    /// <param name="id">The part; null to ask for it.</param>
    public void AskWhyNot(Requirement wanted, RankingResult? ranked, string? id = null) => _whyNot?.Open(wanted, ranked, id);

    /// <summary>Shows how the figures of a candidate come about.</summary>
    public void ShowFigures(Candidate candidate, RankingResult result) => _figures?.Open(candidate, result);

    /// <summary>Takes a key, if a question is open.</summary>
    /// <returns>Whether it was taken.</returns>
    public bool Press(KeyPress key) => _whyNot is { IsOpen: true } whyNot ? whyNot.Press(key)
        : _figures is { Candidate: not null } figures && figures.Press(key);

    /// <summary>Ends what is being looked for.</summary>
    /// <returns>Whether there was such a thing.</returns>
    public bool Interrupt() => _whyNot?.Interrupt() == true;

    /// <summary>Ends everything.</summary>
    public void Stop()
    {
        _whyNot?.Close();
        _figures?.Close();
    }

    /// <summary>The lines of the open question.</summary>
    public ImmutableArray<Line> Draw(int width, int height, Glyphs glyphs) => _whyNot is { IsOpen: true } whyNot
        ? WhyNotDrawing.Draw(whyNot, width, height, glyphs)
        : FigureDrawing.Draw(_figures!, width, height, glyphs);

    /// <summary>The keys that work in the open question.</summary>
    public (string Key, string Does)[] Keys(Glyphs glyphs) => this switch
    {
        { _whyNot: { IsOpen: true, Id: null } } =>
            [("words", "of a part"), (glyphs.Up + " " + glyphs.Down, "choose"), ("Enter", "ask"), ("Esc", "back")],
        { _whyNot: { IsOpen: true, IsLooking: true } } => [("Esc", "stop it"), ("?", "keys")],
        { _whyNot.IsOpen: true } => [(glyphs.Up + " " + glyphs.Down, "scroll"), ("Esc", "back"), ("?", "keys")],
        _ => [(glyphs.Up + " " + glyphs.Down, "other figures"), ("PgDn", "further down"), ("Esc", "back"), ("?", "keys")],
    };
}
