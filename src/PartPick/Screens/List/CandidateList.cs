using System.Collections.Immutable;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>The ranked candidates and which of them is chosen.</summary>
public sealed class CandidateList
{
    private const int Page = 8;

    private Candidate? _picked;
    private int _top;

    /// <summary>The answer that is shown; null before the first one.</summary>
    public RankingResult? Result { get; private set; }

    /// <summary>What is listed: the fit candidates, or the nearest misses where nothing is fit.</summary>
    public ImmutableArray<Candidate> Candidates { get; private set; } = [];

    /// <summary>Number of the chosen one, from zero.</summary>
    public int At { get; private set; }

    /// <summary>The chosen candidate; null while there is none.</summary>
    public Candidate? Chosen => Candidates.IsEmpty ? null : Candidates[At];

    /// <summary>The candidate that is marked, to be set beside another one; null for none.</summary>
    public Candidate? Marked { get; set; }

    /// <summary>Whether something was changed by hand in a candidate of the list.</summary>
    public Func<Candidate, bool> IsChanged { get; set; } = _ => false;

    /// <summary>Whether the list shows nearest misses because nothing is fit.</summary>
    public bool ShowsMisses => Result is { Candidates.IsEmpty: true } && !Candidates.IsEmpty;

    /// <summary>
    /// Shows another answer. The first stays chosen until another one has been; then that one stays chosen,
    /// or its group (circuit, crystal and amplifier), as long as it is there.
    /// </summary>
    /// <param name="result">The answer.</param>
    public void Show(RankingResult result)
    {
        ArgumentNullException.ThrowIfNull(result);
        Result = result;
        Candidates = result.Candidates.IsEmpty ? result.NearestMisses : result.Candidates;
        int at = _picked is null ? 0 : IndexOf(candidate => candidate.Id == _picked.Id);
        At = Math.Max(0, at >= 0 ? at : IndexOf(candidate => SameGroup(candidate, _picked!)));
    }

    /// <summary>Moves the choice.</summary>
    /// <param name="step">How many rows down; negative goes up.</param>
    public void Move(int step)
    {
        At = Candidates.IsEmpty ? 0 : Math.Clamp(At + step, 0, Candidates.Length - 1);
        _picked = At > 0 ? Chosen : null;
    }

    /// <summary>Moves the choice with the keys that everywhere do so.</summary>
    /// <param name="key">The key.</param>
    /// <returns>Whether it was one of them.</returns>
    public bool Press(KeyPress key)
    {
        int? step = key.Name switch
        {
            KeyName.Up => -1,
            KeyName.Down => 1,
            KeyName.PageUp => -Page,
            KeyName.PageDown => Page,
            KeyName.Home => -Candidates.Length,
            KeyName.End => Candidates.Length,
            _ => null,
        };
        if (step is { } rows)
        {
            Move(rows);
        }

        return step is not null;
    }

    /// <summary>Keeps the chosen one chosen, as long as it or its group is there.</summary>
    public void Hold() => _picked = Chosen;

    /// <summary>The heading.</summary>
    /// <param name="glyphs">The signs.</param>
    /// <param name="width">Width in cells.</param>
    public Line Heading(Glyphs glyphs, int width = ListShape.Full) =>
        ListDrawing.Heading(Chosen?.Currency ?? "", new ListShape(width), glyphs);

    /// <summary>The rows that fit a height, with the chosen one among them.</summary>
    /// <param name="height">Number of rows.</param>
    /// <param name="chosen">Whether the keys go to the list.</param>
    /// <param name="stale">Whether the answer is one to an older requirement.</param>
    /// <param name="glyphs">The signs.</param>
    /// <param name="width">Width in cells.</param>
    public ImmutableArray<Line> Draw(int height, bool chosen, bool stale, Glyphs glyphs, int width = ListShape.Full)
    {
        ArgumentNullException.ThrowIfNull(glyphs);
        if (Result is null || height < 1)
        {
            return [];
        }

        _top = Math.Clamp(_top, Math.Max(0, At - height + 1), At);
        _top = Math.Clamp(_top, 0, Math.Max(0, Candidates.Length - height));
        CandidateColumns columns = CandidateColumns.Of(Candidates, Result.Requirement);
        var shape = new ListShape(width);
        var lines = ImmutableArray.CreateBuilder<Line>();
        for (int i = _top; i < Math.Min(Candidates.Length, _top + height); i++)
        {
            bool here = i == At;
            Line line = ListDrawing.Row(columns.Rows[i], here, Sign(Candidates[i]), shape, glyphs);
            lines.Add(here && chosen ? line.Chosen() : here ? line.In(Tone.Strong) : stale ? line.In(Tone.Quiet) : line);
        }

        return lines.ToImmutable();
    }

    private string Sign(Candidate candidate) => candidate.Id == Marked?.Id ? "=" : IsChanged(candidate) ? "*" : "";

    private int IndexOf(Func<Candidate, bool> wanted)
    {
        for (int i = 0; i < Candidates.Length; i++)
        {
            if (wanted(Candidates[i]))
            {
                return i;
            }
        }

        return -1;
    }

    /// <summary>Whether two candidates are of one group: circuit, crystal, amplifier and stage.</summary>
    /// <param name="one">One of them.</param>
    /// <param name="other">The other one.</param>
    public static bool SameGroup(Candidate one, Candidate other) =>
        one.Choice.Circuit == other.Choice.Circuit
        && one.Choice.Crystal.Id == other.Choice.Crystal.Id
        && one.Choice.Amplifier.Id == other.Choice.Amplifier.Id
        && one.Choice.Tap == other.Choice.Tap;
}
