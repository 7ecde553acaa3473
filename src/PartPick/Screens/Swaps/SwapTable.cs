using System.Collections.Immutable;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>Draws the parts of the open circuit that can be changed, with what was changed and what stands beside the chosen one.</summary>
internal static class SwapTable
{
    private const int Name = 10;
    private const int Value = 7;

    private static readonly Dictionary<SwapPlace, PartPlace> Places = new()
    {
        [SwapPlace.C1] = PartPlace.C1, [SwapPlace.C2] = PartPlace.C2, [SwapPlace.Series] = PartPlace.Series,
        [SwapPlace.Feedback] = PartPlace.Feedback, [SwapPlace.BaseTop] = PartPlace.BaseTop, [SwapPlace.BaseBottom] = PartPlace.BaseBottom,
        [SwapPlace.Emitter] = PartPlace.Emitter, [SwapPlace.Crystal] = PartPlace.Crystal, [SwapPlace.Amplifier] = PartPlace.Amplifier,
    };

    /// <summary>The lines.</summary>
    /// <param name="swaps">The circuit.</param>
    /// <param name="width">Width in cells.</param>
    /// <param name="glyphs">The signs.</param>
    public static ImmutableArray<Line> Draw(SwapModel swaps, int width, Glyphs glyphs)
    {
        if (swaps is not { Board: { } board, Before: { } before })
        {
            return [];
        }

        var lines = ImmutableArray.CreateBuilder<Line>();
        for (int i = 0; i < swaps.Places.Length; i++)
        {
            SwapPlace place = swaps.Places[i];
            Line line = Row(place, board, before, i == swaps.At, width, glyphs);
            lines.Add(i == swaps.At ? line.Fit(width).Chosen() : line);
        }

        lines.Add(Line.Empty);
        lines.AddRange(Beside(swaps, board, width, glyphs));
        if (swaps is { IsChanged: true, IsComputing: false })
        {
            lines.AddRange(Paragraph.Of(Whole(swaps.Ranked!, swaps.Shown!), width, glyphs, " ", 1));
        }

        return lines.ToImmutable();
    }

    /// <summary>The name of a place: the designator on the drawing, and what it is called.</summary>
    /// <param name="place">The place.</param>
    /// <param name="board">The circuit.</param>
    public static string NameOf(SwapPlace place, BoardParts board)
    {
        string designator = board.At(place) is { } part && Places.TryGetValue(place, out PartPlace stands)
            ? board.Places.Zip(BillOfParts.List(board.Choice, board.Support)).First(pair => pair.First == stands).Second.Designator
            : "";
        string word = place switch
        {
            SwapPlace.Series => "Rs",
            SwapPlace.Feedback => "Rf",
            SwapPlace.BaseTop => board.Choice.BaseBottom is null ? "RB" : "RB top",
            SwapPlace.BaseBottom => "RB low",
            SwapPlace.Emitter => "RE",
            SwapPlace.Stage => "stage",
            _ => "",
        };
        return (designator + " " + word).Trim();
    }

    private static Line Row(SwapPlace place, BoardParts board, BoardParts before, bool here, int width, Glyphs glyphs)
    {
        (string now, string was) = (Words(place, board), Words(place, before));
        LineBuilder line = new LineBuilder(glyphs).Column(here ? glyphs.Chosen : "", 2)
            .Column(NameOf(place, board), Name, Tone.Strong)
            .Column(now, Math.Max(Value, glyphs.Show(now).Length));
        return now == was ? line.Build() : line.Add(" * ", Tone.Accent).Column("was " + was, Math.Max(0, width - line.Width)).Build();
    }

    private static string Words(SwapPlace place, BoardParts board) => place == SwapPlace.Stage
        ? Trade.Stage(board.Choice.Tap).Replace("stage ", "", StringComparison.Ordinal)
        : board.Words(place);

    // What the arrows lead to, and which part stands there now.
    private static ImmutableArray<Line> Beside(SwapModel swaps, BoardParts board, int width, Glyphs glyphs)
    {
        if (swaps.Problem is { } problem)
        {
            return Paragraph.Of(problem, width, glyphs, " ", 3, Tone.Warning);
        }

        ImmutableArray<SwapOption> options = swaps.Options;
        int at = options.IsEmpty ? -1 : options.IndexOf(options.First(option => option.StandsIn(board)));
        string count = at < 0 ? "reading the parts" : FormattableString.Invariant($"{at + 1} of {options.Length}");
        string part = board.At(swaps.Places[swaps.At]) is { } one ? one.Id + ", " : "";
        return
        [
            new LineBuilder(glyphs).Add(" ").Words(part + count, width - 1, Tone.Quiet).Build(),
            Neighbour(glyphs.Left, at > 0 ? options[at - 1].Words : null),
            Neighbour(glyphs.Right, at >= 0 && at < options.Length - 1 ? options[at + 1].Words : null),
        ];

        Line Neighbour(string key, string? words) => new LineBuilder(glyphs).Add(" ")
            .Column(key, 6, Tone.Strong).Column(words ?? "-", width - 7, words is null ? Tone.Quiet : Tone.Normal).Build();
    }

    private static string Whole(Candidate from, Candidate to)
    {
        if (to.Budget?.CentreRatio - from.Budget?.CentreRatio is not { } shift)
        {
            return to.Budget is null ? "No frequency: it does not run." : "The ranked one does not run.";
        }

        string score = to.IsFit && from.IsFit ? FormattableString.Invariant($", score {to.Score:F3}, ranked {from.Score:F3}") : "";
        return $"Frequency {Signed.Of(shift * 1e6)} ppm against the ranked{score}.";
    }
}
