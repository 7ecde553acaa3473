using System.Collections.Immutable;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>The foot of the catalogue's screens: what is wrong, what there is to say, or the keys that work here.</summary>
/// <param name="model">The screens.</param>
/// <param name="glyphs">The signs.</param>
/// <param name="width">Width in cells.</param>
internal sealed class PartsFoot(PartsModel model, Glyphs glyphs, int width)
{
    private const int MostRows = 2;

    /// <summary>One line, or two where a problem needs them.</summary>
    public ImmutableArray<Line> Draw()
    {
        if (ProblemHere() is { } problem)
        {
            return [.. Paragraph.Of(problem.ToString(), width - 1, glyphs, " ! ", 3, Tone.Warning).Take(MostRows)];
        }

        return (model.Undo.Words ?? (model.Place == PartsPlace.Import ? model.Import.Notice : null)) is { } words
            ? [.. Paragraph.Of(words, width - 1, glyphs, " ", 1, Tone.Accent).Take(MostRows)]
            : [model.Place switch { PartsPlace.Part => PartKeys(), PartsPlace.Import => ImportKeys(), _ => ListKeys() }];
    }

    private Problem? ProblemHere() => model.Place switch
    {
        PartsPlace.Part => model.Page.Problem,
        PartsPlace.Import => model.Import.Problem,
        _ => model.List.Problem ?? model.ReadingProblem,
    };

    private Line ListKeys() => model.List.Typed is not null
        ? Keys(("words", "or"), ("load<=18p", "and such"), ("Enter", "to the list"), ("Esc", "as it was"))
        : Keys(
            ("y", "why not"), ("Enter", "open"), ("f", "filter"), (glyphs.Left + " " + glyphs.Right + " o", "order"), ("k", "kind"),
                ("i", "import"),
            ("Esc", model.List.FilterText.Length > 0 ? "all" : "circuits"), ("?", "keys"));

    private Line PartKeys() => model.Page.Typed is not null
        ? Keys(("Enter", "keep"), ("Esc", "as it was"))
        : Keys(
            ("y", "why not"), ("Enter", "change"), ("b", "as supplied"), ("n", "note"), ("x", "exclude"), ("Esc", "list"), ("?", "keys"));

    private Line ImportKeys()
    {
        ImportPage page = model.Import;
        if (page.Typed is { } typed)
        {
            return page.IsNaming ? Naming(typed)
                : page.Choices.ColumnOf(page) is not null ? Names(typed)
                : page.Choices.At == ImportChoices.File
                    ? Keys(("Tab", "complete"), ("Enter", "look at it"), ("Esc", "as it was"))
                    : Keys(("Enter", "keep"), ("Esc", "as it was"));
        }

        return page.Step switch
        {
            ImportStep.Running => Keys(("Esc", "stop; the catalogue stays as it is")),
            ImportStep.Rows => Keys(("d", "try without writing"), ("i", "import"), ("Esc", "columns"), ("?", "keys")),
            ImportStep.Done when page.Run.Report is { DryRun: true } => Keys(("i", "import"), ("Esc", "columns"), ("?", "keys")),
            ImportStep.Done => Keys(("u", "take it back"), ("Esc", "parts"), ("?", "keys")),
            _ when page.Look is null => Keys(("Enter", "change"), ("Esc", "parts"), ("?", "keys")),
            _ => Keys(
                ("Enter", "change"), ("r", "rows"), ("k", "keep as"), ("d", "try"), ("i", "import"), ("Esc", "parts"), ("?", "keys")),
        };
    }

    private Line Naming(TypedText typed)
    {
        LineBuilder line = new LineBuilder(glyphs).Add(" Keep the columns under the name ");
        return line.Typed(typed, Math.Max(8, width - line.Width - 1), glyphs).Build();
    }

    private Line Names(TypedText typed)
    {
        string begun = typed.Text.Split(':')[0].Trim();
        string names = string.Join(", ", model.Import.Wishes.NamesLike(begun));
        string text = begun.Length == 0 ? "nothing to leave it out, or " + names
            : names.Length == 0 ? "no figure begins so"
            : names + "; a unit behind a colon";
        return new LineBuilder(glyphs).Add(" ").Words(text, width - 2).Build();
    }

    private Line Keys(params (string Key, string Does)[] keys) => KeyLine.Draw(width, glyphs, keys);
}
