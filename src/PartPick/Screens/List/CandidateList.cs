using System.Collections.Immutable;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>The ranked candidates and which of them is chosen.</summary>
public sealed class CandidateList
{
    private const int BarCells = 4;

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

    /// <summary>The heading.</summary>
    /// <param name="glyphs">The signs.</param>
    public Line Heading(Glyphs glyphs)
    {
        string currency = Chosen?.Currency ?? "";
        return new LineBuilder(glyphs).Add("  circuit  crystal MHz CL pF amplifier    ", Tone.Quiet)
            .Column(glyphs.IsAscii ? "div" : "÷", 5, Tone.Quiet, true)
            .Add("  error ppm  margin    ", Tone.Quiet)
            .Column(currency.Length > 3 ? "cost" : "cost " + currency, 8, Tone.Quiet, true)
            .Build();
    }

    /// <summary>The rows that fit a height, with the chosen one among them.</summary>
    /// <param name="height">Number of rows.</param>
    /// <param name="chosen">Whether the keys go to the list.</param>
    /// <param name="stale">Whether the answer is one to an older requirement.</param>
    /// <param name="glyphs">The signs.</param>
    public ImmutableArray<Line> Draw(int height, bool chosen, bool stale, Glyphs glyphs)
    {
        ArgumentNullException.ThrowIfNull(glyphs);
        if (Result is null || height < 1)
        {
            return [];
        }

        _top = Math.Clamp(_top, Math.Max(0, At - height + 1), At);
        _top = Math.Clamp(_top, 0, Math.Max(0, Candidates.Length - height));
        CandidateColumns columns = CandidateColumns.Of(Candidates, Result.Requirement);
        var lines = ImmutableArray.CreateBuilder<Line>();
        for (int i = _top; i < Math.Min(Candidates.Length, _top + height); i++)
        {
            bool here = i == At;
            Line line = Row(columns.Rows[i], here, glyphs);
            lines.Add(here && chosen ? line.In(Tone.Chosen) : here ? line.In(Tone.Strong) : stale ? line.In(Tone.Quiet) : line);
        }

        return lines.ToImmutable();
    }

    private static Line Row(CandidateCells cells, bool here, Glyphs glyphs)
    {
        LimitUse? nearest = LimitUses.Nearest(cells.Uses);
        LineBuilder line = new LineBuilder(glyphs).Column(here ? glyphs.Chosen : "", 2)
            .Column(cells.Circuit, 9)
            .Column(cells.FrequencyMegaHertz, 11, right: true).Add(" ")
            .Column(cells.LoadPicofarads, 5, right: true).Add(" ")
            .Column(cells.Amplifier, 12).Add(" ")
            .Column(cells.Divider, 5, right: true).Add(" ");
        Figure(line, cells.ErrorPpm, 6, LimitName.Error);
        Figure(line, cells.Margin, 5, LimitName.Margin);
        LimitUse cost = cells.Uses.First(use => use.Name == LimitName.Cost);
        return line.Column(cells.Cost, 7, ToneOf(cost), right: true).Build();

        void Figure(LineBuilder target, string text, int width, LimitName name)
        {
            LimitUse use = cells.Uses.First(other => other.Name == name);
            target.Column(text, width, ToneOf(use), right: true).Add(" ")
                .Add(Bars.Bar(use.Used, BarCells, glyphs), ToneOf(use)).Add(" ");
        }

        Tone ToneOf(LimitUse use) =>
            use.IsBroken ? Tone.Warning : ReferenceEquals(use, nearest) ? Tone.Accent : Tone.Normal;
    }

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

    private static bool SameGroup(Candidate one, Candidate other) =>
        one.Choice.Circuit == other.Choice.Circuit
        && one.Choice.Crystal.Id == other.Choice.Crystal.Id
        && one.Choice.Amplifier.Id == other.Choice.Amplifier.Id
        && one.Choice.Tap == other.Choice.Tap;
}
