using System.Collections.Immutable;

namespace PartPick.Screens;

/// <summary>Some fields that are asked for in one line at the foot: Tab goes on, Enter takes them all, Esc none.</summary>
internal sealed class AskedFields
{
    private int _at;

    /// <summary>Asks for fields.</summary>
    /// <param name="fields">Name, text to begin with and the most letters of each.</param>
    public AskedFields(params (string Name, string Text, int Longest)[] fields)
    {
        Fields = [.. fields.Select(field => new AskedField(field.Name, field.Text, field.Longest))];
    }

    /// <summary>The fields.</summary>
    public ImmutableArray<AskedField> Fields { get; }

    /// <summary>What is wrong, or to be confirmed; null for nothing.</summary>
    public string? Problem { get; set; }

    /// <summary>Takes a key; Enter and Esc are the owner's.</summary>
    public void Press(KeyPress key)
    {
        Problem = null;
        switch (key.Name)
        {
            case KeyName.Tab or KeyName.Down:
                _at = (_at + 1) % Fields.Length;
                break;
            case KeyName.BackTab or KeyName.Up:
                _at = (_at + Fields.Length - 1) % Fields.Length;
                break;
            default:
                Fields[_at].Press(key);
                break;
        }
    }

    /// <summary>The fields in a line, and below them what is wrong or the keys.</summary>
    public ImmutableArray<Line> Draw(string enter, int width, Glyphs glyphs)
    {
        LineBuilder line = new LineBuilder(glyphs).Add(" ");
        int room = Math.Max(8, (width - 2) / Fields.Length - Fields.Max(field => field.Name.Length) - 4);
        for (int i = 0; i < Fields.Length; i++)
        {
            line.Add(Fields[i].Name + " ", Tone.Quiet);
            Draw(line, Fields[i], i == _at, i == Fields.Length - 1 ? Math.Max(room, width - line.Width - 2) : room);
            line.Add("   ");
        }

        Line below = Problem is { } problem
            ? new LineBuilder(glyphs).Add(" ! ", Tone.Warning).Words(problem, width - 4, Tone.Warning).Build()
            : new LineBuilder(glyphs).Add(" ").Add("Enter", Tone.Strong).Add($" {enter}   ")
                .Add(Fields.Length > 1 ? "Tab" : "", Tone.Strong).Add(Fields.Length > 1 ? " next   " : "")
                .Add("Esc", Tone.Strong).Add(" leave it").Build();
        return [line.Build(), below];
    }

    // Of a text that is too long, the part round the caret.
    private static void Draw(LineBuilder line, AskedField field, bool here, int room)
    {
        string text = field.Text + " ";
        int first = Math.Max(0, Math.Min(field.Caret - room + 1, text.Length - room));
        int last = Math.Min(text.Length, first + room);
        if (!here)
        {
            line.Add(text[first..last].TrimEnd() is { Length: > 0 } shown ? shown : "-");
            return;
        }

        line.Add(text[first..field.Caret], Tone.Accent)
            .Add(text[field.Caret].ToString(), Tone.Caret)
            .Add(text[(field.Caret + 1)..last], Tone.Accent);
    }
}
