using System.Globalization;
using System.Text;
using System.Xml;

namespace PartPick.Output;

/// <summary>Puts the elements of an SVG picture together; every text is encoded, and numbers have a point whatever the culture.</summary>
internal sealed class SvgText
{
    private readonly StringBuilder _text = new();

    /// <summary>A text.</summary>
    /// <param name="x">Across, in pixels.</param>
    /// <param name="y">Down to its base line, in pixels.</param>
    /// <param name="text">The text.</param>
    /// <param name="kind">Its class; empty for none.</param>
    /// <param name="anchor">Which end of it stands there: start, middle or end.</param>
    public SvgText Text(double x, double y, string text, string kind = "", string anchor = "start") => Raw(
        FormattableString.Invariant($"<text x=\"{x:0.#}\" y=\"{y:0.#}\"{Class(kind)}{Anchor(anchor)}>{Encode(text)}</text>"));

    /// <summary>A straight line.</summary>
    public SvgText Line(double x1, double y1, double x2, double y2, string kind) => Raw(
        FormattableString.Invariant($"<line x1=\"{x1:0.#}\" y1=\"{y1:0.#}\" x2=\"{x2:0.#}\" y2=\"{y2:0.#}\"{Class(kind)}/>"));

    /// <summary>A broken line through points, or an area between them where its class says so.</summary>
    /// <param name="points">The points in pixels.</param>
    /// <param name="kind">Its class.</param>
    /// <param name="dashes">Lengths of strokes and gaps; empty for none.</param>
    /// <param name="isClosed">Whether it is an area.</param>
    public SvgText Points(IEnumerable<(double X, double Y)> points, string kind, string dashes = "", bool isClosed = false)
    {
        string list = string.Join(' ', points.Select(point => FormattableString.Invariant($"{point.X:0.##},{point.Y:0.##}")));
        string strokes = dashes.Length == 0 ? "" : $" stroke-dasharray=\"{dashes}\"";
        return Raw($"<{(isClosed ? "polygon" : "polyline")} points=\"{list}\"{Class(kind)}{strokes}/>");
    }

    /// <summary>A circle.</summary>
    public SvgText Circle(double x, double y, double radius, string kind) => Raw(
        FormattableString.Invariant($"<circle cx=\"{x:0.#}\" cy=\"{y:0.#}\" r=\"{radius:0.#}\"{Class(kind)}/>"));

    /// <summary>A rectangle.</summary>
    public SvgText Box(double x, double y, double width, double height, string kind) => Raw(FormattableString.Invariant(
        $"<rect x=\"{x:0.#}\" y=\"{y:0.#}\" width=\"{width:0.#}\" height=\"{height:0.#}\"{Class(kind)}/>"));

    /// <summary>Markup that is there already.</summary>
    public SvgText Raw(string markup)
    {
        _text.Append(CultureInfo.InvariantCulture, $"{markup}\n");
        return this;
    }

    /// <summary>A text as XML, also within quotes; signs that XML does not have become spaces.</summary>
    public static string Encode(string text)
    {
        var shown = new StringBuilder(text.Length);
        for (int i = 0; i < text.Length; i++)
        {
            if (i + 1 < text.Length && XmlConvert.IsXmlSurrogatePair(text[i + 1], text[i]))
            {
                shown.Append(text, i++, 2);
            }
            else
            {
                shown.Append(XmlConvert.IsXmlChar(text[i]) && !char.IsControl(text[i]) ? text[i] : ' ');
            }
        }

        return Html.Encode(shown.ToString());
    }

    /// <inheritdoc/>
    public override string ToString() => _text.ToString();

    private static string Class(string kind) => kind.Length == 0 ? "" : $" class=\"{kind}\"";

    private static string Anchor(string anchor) => anchor == "start" ? "" : $" text-anchor=\"{anchor}\"";
}
