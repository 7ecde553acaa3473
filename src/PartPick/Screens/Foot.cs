using System.Collections.Immutable;

namespace PartPick.Screens;

/// <summary>The foot of the screen: what is wrong, what there is to say, or the keys that work here.</summary>
/// <param name="model">The screen.</param>
/// <param name="glyphs">The signs.</param>
/// <param name="width">Width in cells.</param>
internal sealed class Foot(MainModel model, Glyphs glyphs, int width)
{
    private const int MostRows = 2;

    /// <summary>One line, or two where a problem needs them.</summary>
    public ImmutableArray<Line> Draw()
    {
        if (model is { Place: Place.Sentence, ShowsKeys: false, Wanted.Problem: { } problem })
        {
            return [.. Paragraph.Of(problem.ToString(), width - 1, glyphs, " ! ", 3, Tone.Warning).Take(MostRows)];
        }

        if (model is { ShowsKeys: false, Shortlists.Asking: { } asking })
        {
            return asking.Draw(model.Shortlists.Enter, width, glyphs);
        }

        if (model is { ShowsKeys: false, Kept.Asking: { } naming })
        {
            return naming.Draw(model.Kept.Enter, width, glyphs);
        }

        if (model is { ShowsKeys: false, Pictures.Asking: { } file })
        {
            return file.Draw("write", width, glyphs);
        }

        return model switch
        {
            { Notice: { } notice } => [new LineBuilder(glyphs).Add(" ").Column(notice, width - 1, Tone.Accent).Build()],
            { ShowsKeys: true } => [Keys((UpDown, "scroll"), ("Esc", "back"))],
            { Questions.IsOpen: true } => [Keys(model.Questions.Keys(glyphs))],
            { Shortlists.Page.Replacements: not null } => [Keys(
                (UpDown, "choose"), (glyphs.Left + " " + glyphs.Right, "other parts"), ("Esc", "the list"), ("?", "keys"))],
            { Shortlists.Page.Quantity: not null } => [Keys((UpDown, "scroll"), ("Esc", "the list"), ("?", "keys"))],
            { Shortlists.IsOpen: true } => [Keys(
                (glyphs.Left + " " + glyphs.Right, "lists"), ("Del", "take off"), ("x", "to a file"), ("r", "replacements"),
                ("b", "cost over boards"), ("Esc", "back"))],
            { Differences.Pair: not null } => [Keys((UpDown, "scroll"), ("Esc", "back"), ("?", "keys"))],
            { Kept: { IsOpen: true, Comparison.IsOpen: true } } => [Keys(
                (glyphs.Left + " " + glyphs.Right, "others"), (UpDown, "scroll"), ("Esc", "what is kept"), ("?", "keys"))],
            { Kept.IsOpen: true } => [Keys(KeptKeys)],
            { Pictures.IsOpen: true } => [Keys(
                (glyphs.Left + " " + glyphs.Right, "other pictures"), ("x", "to an SVG file"), ("Esc", "back"), ("?", "keys"))],
            { Place: Place.Sentence, Wanted.Typed: not null } => [Value(("Enter", "keep"), ("Esc", "as it was"))],
            { Place: Place.Sentence } => [Value(("Tab", "next"), ("Esc", model.IsReading ? "circuit" : "list"))],
            { Place: Place.Circuit } => [Keys([
                .. new[] { ("n", "next"), ("d", "differences"), ("h", "how"), (UpDown, "part"), (glyphs.Left + " " + glyphs.Right, "value") },
                .. model.Swaps.IsChanged ? new[] { ("Backspace", "as ranked") } : [],
                ("p", "pictures"), ("s", "to a list"), ("Esc", "list"), ("?", "keys")])],
            { List.Chosen: null } =>
                [Keys([("y", "why not a part"), ("e", "edit the wanted"), .. Catalogue, ("?", "keys"), ("q", "quit")])],
            _ => [Keys([
                (UpDown, "choose"), ("d", "differences"), ("h", "how"), .. Kept, .. Catalogue, ("y", "why not"), ("p", "pictures"),
                ("s", "to a list"), ("Enter", "open"), ("e", "edit"), ("?", "keys"), ("q", "quit")])],
        };
    }

    private (string, string)[] Catalogue => model.Parts is null ? [] : [("c", "catalogue")];

    private (string, string)[] Kept => model.Kept.CanKeep ? [("w", "kept")] : [];

    private (string, string)[] KeptKeys => model.Kept.Chosen.Kept is null
        ? [("n", "keep it"), ("Space", "mark"), ("d", "compare"), (UpDown, "choose"), ("?", "keys"), ("Esc", "back")]
        :
        [
            ("n", "rename"), ("c", "copy"), ("Del", "away"), ("Space", "mark"), ("d", "compare"), ("Enter", "take"),
            ("Esc", "back"),
        ];

    private string UpDown => glyphs.Up + " " + glyphs.Down;

    // What the value is stands at the left, the keys at the right.
    private Line Value(params (string Key, string Does)[] keys)
    {
        int tail = keys.Sum(pair => pair.Key.Length + pair.Does.Length + 4);
        SentenceModel wanted = model.Wanted;
        string name = wanted.Field.Name + (wanted.IsFit ? ": " : ", not yet: ");
        LineBuilder line = new LineBuilder(glyphs).Add(" ")
            .Column(name + wanted.Field.Help(wanted.Accepted), Math.Max(10, width - tail - 1));
        foreach ((string key, string does) in keys)
        {
            line.Add("   ").Add(key, Tone.Strong).Add(" " + does);
        }

        return line.Build();
    }

    private Line Keys(params (string Key, string Does)[] keys) => KeyLine.Draw(width, glyphs, keys);
}
