using System.Net;
using System.Text;

namespace PartPick.Output;

/// <summary>Puts an HTML page together; every text is encoded.</summary>
internal sealed class Html
{
    private readonly StringBuilder _text = new();

    /// <summary>A text between tags of a name.</summary>
    public Html Element(string name, string text)
    {
        _text.Append(Tag(name, Encode(text))).Append('\n');
        return this;
    }

    /// <summary>Markup that is there already.</summary>
    public Html Raw(string markup)
    {
        _text.Append(markup).Append('\n');
        return this;
    }

    /// <summary>A table; columns of numbers stand at the right.</summary>
    public Html Table(IReadOnlyList<TextColumn> columns, IEnumerable<string[]> rows)
    {
        _text.Append("<table>\n<thead><tr>");
        foreach (TextColumn column in columns)
        {
            _text.Append(Cell("th", column, column.Heading));
        }

        _text.Append("</tr></thead>\n<tbody>\n");
        foreach (string[] row in rows)
        {
            _text.Append("<tr>").AppendJoin("", row.Select((cell, i) => Cell("td", columns[i], cell))).Append("</tr>\n");
        }

        _text.Append("</tbody>\n</table>\n");
        return this;
    }

    /// <summary>A list of sentences; nothing where there are none.</summary>
    public Html List(IEnumerable<string> sentences)
    {
        string[] all = [.. sentences];
        if (all.Length > 0)
        {
            _text.Append("<ul>\n").AppendJoin("", all.Select(sentence => Tag("li", Encode(sentence)) + "\n")).Append("</ul>\n");
        }

        return this;
    }

    /// <summary>A text as HTML, also within quotes.</summary>
    public static string Encode(string text) => WebUtility.HtmlEncode(
        new string([.. text.Select(sign => char.IsControl(sign) && sign != '\n' ? ' ' : sign)]));

    /// <inheritdoc/>
    public override string ToString() => _text.ToString();

    private static string Cell(string name, TextColumn column, string text) =>
        column.Right ? $"<{name} class=\"n\">{Encode(text)}</{name}>" : Tag(name, Encode(text));

    private static string Tag(string name, string inner) => $"<{name}>{inner}</{name}>";
}
