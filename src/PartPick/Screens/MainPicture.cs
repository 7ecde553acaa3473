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
        return [.. Filled([.. sentence, .. Body(room)], height - foot.Length), .. foot.Select(line => line.Fit(width))];
    }

    // What is asked for stands beside the list where there is room, and in its place where there is none.
    private ImmutableArray<Line> Body(int room)
    {
        if (model.ShowsKeys)
        {
            return model.Place == Place.Parts
                ? KeysBody(width, room)
                : Beside(ScreenColumns.WithPage(width), page => KeysBody(page, room), room);
        }

        if (model.Questions.IsOpen)
        {
            ScreenColumns asked = model.Place == Place.Parts ? ScreenColumns.Alone(width)
                : model.Questions.IsTable ? ScreenColumns.WithTable(width)
                : ScreenColumns.WithPage(width);
            return Beside(asked, page => model.Questions.Draw(page, room, glyphs), room);
        }

        if (model.Shortlists.IsOpen)
        {
            ShortlistPage list = model.Shortlists.Page;
            bool isTable = list.Replacements is not null || list.Quantity is not null;
            return Beside(
                isTable ? ScreenColumns.WithTable(width) : ScreenColumns.WithPage(width),
                page => ShortlistDrawing.Draw(list, page, room, glyphs), room);
        }

        if (model.Pictures.IsOpen)
        {
            return PicturesDrawing.Draw(model.Pictures, width, room, glyphs);
        }

        if (model.Kept.IsOpen)
        {
            return Beside(
                ScreenColumns.WithPage(width), page => KeptDrawing.Draw(model.Kept, model.Wanted.Currency, page, room, glyphs), room);
        }

        if (model.Differences.Pair is not null)
        {
            return Beside(ScreenColumns.WithTable(width), page => DifferencesDrawing.Draw(model.Differences, page, room, glyphs), room);
        }

        ScreenColumns reading = ScreenColumns.WithCircuit(width);
        bool reads = model.Place == Place.Circuit || (reading.List > 0 && model.KeepsReading);
        return reads && model.List.Chosen is { } candidate
            ? Columns(reading, CircuitBody(model.Swaps.Shown ?? candidate, reading.Page, room), room)
            : ScreenColumns.AtAGlance(width) is { Page: > 0 } glance ? Columns(glance, Glance(glance.Page), room)
            : NarrowBody(room);
    }

    private ImmutableArray<Line> Beside(ScreenColumns columns, Func<int, ImmutableArray<Line>> page, int room) =>
        Columns(columns, page(columns.Page), room);

    private ImmutableArray<Line> Columns(ScreenColumns columns, ImmutableArray<Line> page, int room) => ScreenColumns.Join(
    [
        (columns.List > 0 ? ListBody(columns.List, room) : [], columns.List),
        (page, columns.Page),
        (columns.Kept > 0 ? ListAsideDrawing.Draw(model.Shortlists.Aside, columns.Kept, room, glyphs) : [], columns.Kept),
    ], room, glyphs);

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

    private ImmutableArray<Line> Glance(int page) => model.List.Chosen is { } candidate
        ?
        [
            Rules.Draw(CircuitPane.ShortTitle(candidate), "", page, glyphs),
            .. CircuitPane.Beside(candidate, model.List.Result!.Requirement, page, glyphs),
        ]
        : [Rules.Draw("", "", page, glyphs)];

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
            list.Draw(room - 2 - below.Length, model.IsInList, model.IsStale, glyphs, listWidth);
        return [AnswerRule(listWidth), list.Heading(glyphs, listWidth), .. rows, .. below];
    }

    private Line AnswerRule(int ruleWidth)
    {
        CandidateList list = model.List;
        string order = list.Candidates.IsEmpty ? ""
            : FormattableString.Invariant($"{list.At + 1} of {list.Candidates.Length}, {(list.ShowsMisses ? "nearest" : "best")} first");
        string words = AnswerWords.Of(list.Result, model.IsRanking, model.IsStale, model.ReadsParts);
        if (words.Length + 4 > ruleWidth)
        {
            words = words.Split(',', ';')[0];
        }

        return Rules.Draw(words, order, ruleWidth, glyphs, model.IsRanking ? Tone.Accent : Tone.Strong);
    }

    private ImmutableArray<Line> CircuitBody(Candidate candidate, int page, int room)
    {
        ImmutableArray<Line> shown =
            model.CircuitScroll.Cut(CircuitPage.Draw(candidate, model.List.Result!, page, glyphs, model.Swaps), room - 1);
        string number = FormattableString.Invariant($"{model.List.At + 1} of {model.List.Candidates.Length}");
        string more = model.CircuitScroll.HasMore ? number + ", more below" : number;
        string age = model.IsStale ? "for the wanted before, " : model.IsRanking || model.Swaps.IsComputing ? "computing, " : "";
        string title = CircuitPane.ShortTitle(candidate) + (model.Swaps.IsChanged ? ", changed" : "");
        return [Rules.Draw(title, age + more, page, glyphs), .. shown];
    }

    private ImmutableArray<Line> KeysBody(int page, int room)
    {
        ImmutableArray<Line> shown = model.KeysScroll.Cut(KeysPage.Draw(page, glyphs, model.Place == Place.Parts), room - 1);
        return [Rules.Draw("Keys", model.KeysScroll.HasMore ? "more below" : "", page, glyphs), .. shown];
    }

    private ImmutableArray<Line> Filled(ImmutableArray<Line> lines, int rows) =>
        [.. lines.Concat(Enumerable.Repeat(Line.Empty, Math.Max(0, rows))).Take(Math.Max(0, rows)).Select(line => line.Fit(width))];
}
