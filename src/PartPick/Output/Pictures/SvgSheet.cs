namespace PartPick.Output;

/// <summary>An SVG file complete in itself: heading, picture, and dark on light or light on dark as the reader's screen is.</summary>
internal static class SvgSheet
{
    /// <summary>Height of the heading in pixels: the picture begins below it.</summary>
    public const int Head = 50;

    private const string Style =
        """
        svg { color: #1c1c1c; }
        .paper { fill: #ffffff; }
        text { font: 13px sans-serif; fill: currentColor; stroke: none; }
        .head { font-size: 16px; font-weight: bold; }
        .schematic text, .bars text { font: 13px monospace; }
        .axis { stroke: currentColor; fill: none; stroke-width: 1.2; }
        .grid { stroke: currentColor; stroke-opacity: 0.15; fill: none; }
        .limit { stroke: currentColor; fill: none; stroke-width: 1; stroke-dasharray: 22 7; }
        .curve { stroke: currentColor; fill: none; stroke-width: 2; stroke-linejoin: round; }
        .band { stroke: currentColor; stroke-width: 0.8; fill: currentColor; fill-opacity: 0.12; }
        .open { stroke: currentColor; fill: none; stroke-width: 1.6; }
        .full { stroke: none; fill: currentColor; }
        .letter { font-weight: bold; paint-order: stroke; stroke: #ffffff; stroke-width: 3px; }
        @media (prefers-color-scheme: dark) {
          svg { color: #e4e4e4; } .paper { fill: #161616; } .letter { stroke: #161616; }
        }
        """;

    /// <summary>The file.</summary>
    /// <param name="title">What it shows.</param>
    /// <param name="subtitle">Of which circuit.</param>
    /// <param name="width">Width in pixels.</param>
    /// <param name="height">Height in pixels, with the heading.</param>
    /// <param name="body">The elements of the picture, encoded.</param>
    public static string Of(string title, string subtitle, double width, double height, string body)
    {
        var heading = new SvgText();
        heading.Text(16, 22, title, "head").Text(16, 40, subtitle);
        return FormattableString.Invariant(
            $"""
            <?xml version="1.0" encoding="UTF-8"?>
            <svg xmlns="http://www.w3.org/2000/svg" role="img" width="{width:0}" height="{height:0}" viewBox="0 0 {width:0} {height:0}">
            <title>{SvgText.Encode(title)}: {SvgText.Encode(subtitle)}</title>
            <style>
            {Style}
            </style>
            <rect class="paper" x="0" y="0" width="{width:0}" height="{height:0}"/>
            {heading}{body}</svg>

            """).ReplaceLineEndings("\n");
    }
}
