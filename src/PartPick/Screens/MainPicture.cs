using System.Collections.Immutable;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>Lays the screen out: the sentence above, the keys below, and between them the list, a circuit, or the page of keys.</summary>
/// <param name="model">The screen.</param>
/// <param name="glyphs">The signs.</param>
/// <param name="width">Width in cells.</param>
/// <param name="height">Height in rows.</param>
internal sealed class MainPicture(MainModel model, Glyphs glyphs, int width, int height)
{
    private const int LeastWidth = 40;
    private const int LeastHeight = 12;
    private const int LeastRows = 4;

    /// <summary>The lines, each as wide as the screen.</summary>
    public ImmutableArray<Line> Draw()
    {
        if (width < LeastWidth || height < LeastHeight)
        {
            string text = $" PartPick needs {LeastWidth} x {LeastHeight} at least; q quits.";
            return Filled([Line.Empty, new LineBuilder(glyphs).Words(text, width).Build()], height);
        }

        if (model is { Place: Place.Parts, ShowsKeys: false, Questions.IsOpen: false })
        {
            return model.Parts!.Draw(width, height);
        }

        ImmutableArray<Line> sentence =
            model.Wanted.Draw(width - 1, model.Place == Place.Sentence && !model.ShowsKeys, Math.Max(3, height / 4));
        ImmutableArray<Line> foot = new Foot(model, glyphs, width).Draw();
        int room = height - sentence.Length - foot.Length;
        ImmutableArray<Line> body = model.ShowsKeys ? KeysBody(room)
            : model.Questions.IsOpen ? model.Questions.Draw(width, room, glyphs)
            : model.Shortlists.IsOpen ? ShortlistDrawing.Draw(model.Shortlists.Page, width, room, glyphs)
            : model.Place == Place.Circuit && model.List.Chosen is { } candidate ? CircuitBody(candidate, room)
            : width >= ListShape.Full + 2 + Schematic.Width ? WideBody(room)
            : NarrowBody(room);
        return [.. Filled([.. sentence, .. body], height - foot.Length), .. foot.Select(line => line.Fit(width))];
    }

    private ImmutableArray<Line> NarrowBody(int room)
    {
        if (model.List.Chosen is not { } candidate)
        {
            return ListBody(width, room);
        }

        // Rule, heading and some rows of the list come before the pane, which then takes what it needs.
        ImmutableArray<Line> pane = CircuitPane.Below(candidate, model.List.Result!.Requirement, width, glyphs);
        int left = Math.Min(pane.Length, room - 3 - LeastRows);
        if (left < 2)
        {
            return ListBody(width, room);
        }

        return
        [
            .. Filled(ListBody(width, room - left - 1), room - left - 1),
            Rules.Draw(CircuitPane.Title(candidate), "", width, glyphs),
            .. pane.Take(left),
        ];
    }

    private ImmutableArray<Line> WideBody(int room)
    {
        const int left = ListShape.Full + 1;
        int right = width - left - 1;
        ImmutableArray<Line> list = ListBody(left, room);
        ImmutableArray<Line> pane = model.List.Chosen is { } candidate
            ?
            [
                Rules.Draw(CircuitPane.ShortTitle(candidate), "", right, glyphs),
                .. CircuitPane.Beside(candidate, model.List.Result!.Requirement, right, glyphs),
            ]
            : [Rules.Draw("", "", right, glyphs)];
        var bar = new Line([new Span(glyphs.Vertical.ToString(), Tone.Quiet)]);
        var lines = ImmutableArray.CreateBuilder<Line>();
        for (int i = 0; i < room; i++)
        {
            Line middle = i == 0 ? new Line([new Span(glyphs.TeeDown.ToString(), Tone.Quiet)]) : bar;
            lines.Add((i < list.Length ? list[i] : Line.Empty)
                .Beside(left, middle)
                .Beside(left + 1, i < pane.Length ? pane[i] : Line.Empty));
        }

        return lines.ToImmutable();
    }

    private ImmutableArray<Line> ListBody(int listWidth, int room)
    {
        CandidateList list = model.List;
        bool nothing = list.Result is { Candidates.IsEmpty: true, IsComplete: true } && !model.IsRanking;
        ImmutableArray<Line> why = nothing ? NothingFits.Draw(list.Result!, listWidth, glyphs) : [];
        if (list.Candidates.IsEmpty)
        {
            return [AnswerRule(listWidth), .. why];
        }

        ImmutableArray<Line> below = why.Length > 0 && room - 2 >= LeastRows + 1 + why.Length ? [Line.Empty, .. why] : [];
        ImmutableArray<Line> rows =
            list.Draw(room - 2 - below.Length, model.Place == Place.List, model.IsStale, glyphs, listWidth);
        return [AnswerRule(listWidth), list.Heading(glyphs, listWidth), .. rows, .. below];
    }

    private Line AnswerRule(int ruleWidth)
    {
        CandidateList list = model.List;
        string order = list.Candidates.IsEmpty ? ""
            : FormattableString.Invariant($"{list.At + 1} of {list.Candidates.Length}, {(list.ShowsMisses ? "nearest" : "best")} first");
        return Rules.Draw(
            AnswerWords.Of(list.Result, model.IsRanking, model.IsStale, model.ReadsParts), order, ruleWidth, glyphs,
            model.IsRanking ? Tone.Accent : Tone.Strong);
    }

    private ImmutableArray<Line> CircuitBody(Candidate candidate, int room)
    {
        ImmutableArray<Line> page = CircuitPage.Draw(candidate, model.List.Result!, width, glyphs);
        ImmutableArray<Line> shown = model.CircuitScroll.Cut(page, room - 1);
        string number = FormattableString.Invariant($"{model.List.At + 1} of {model.List.Candidates.Length}");
        string more = model.CircuitScroll.HasMore ? number + ", more below" : number;
        string age = model.IsStale ? "for the wanted before, " : model.IsRanking ? "computing, " : "";
        return [Rules.Draw(CircuitPane.ShortTitle(candidate), age + more, width, glyphs), .. shown];
    }

    private ImmutableArray<Line> KeysBody(int room)
    {
        ImmutableArray<Line> shown = model.KeysScroll.Cut(KeysPage.Draw(width, glyphs, model.Place == Place.Parts), room - 1);
        return [Rules.Draw("Keys", model.KeysScroll.HasMore ? "more below" : "", width, glyphs), .. shown];
    }

    private ImmutableArray<Line> Filled(ImmutableArray<Line> lines, int rows) =>
        [.. lines.Concat(Enumerable.Repeat(Line.Empty, Math.Max(0, rows))).Take(Math.Max(0, rows)).Select(line => line.Fit(width))];
}
