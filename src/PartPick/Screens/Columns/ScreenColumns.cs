using System.Collections.Immutable;

namespace PartPick.Screens;

/// <summary>
/// Which columns stand side by side. One below 120 columns; two from there on, the list and what is asked for; three from 160 on, the
/// list, the circuit and the circuits that are kept. A page that is read needs more room than the circuit at a glance: the list
/// gives up columns for it, and stays.
/// </summary>
internal sealed class ScreenColumns
{
    private const int Two = ListShape.Full + 2 + Schematic.Width;
    private const int Three = Two + 1 + ListAsideDrawing.Width;
    private const int NarrowList = 43;
    private const int UsualPage = 80;
    private const int WidePage = Schematic.Width + 64;

    private ScreenColumns(int list, int page, int kept)
    {
        (List, Page, Kept) = (list, page, kept);
    }

    /// <summary>Width of the list in cells; zero where it has to give way to a page.</summary>
    public int List { get; }

    /// <summary>Width of the circuit or the page in cells; zero where there is none beside the list.</summary>
    public int Page { get; }

    /// <summary>Width of the circuits that are kept, in cells; zero where there is no room for them.</summary>
    public int Kept { get; }

    /// <summary>The columns beside the list with the circuit at a glance.</summary>
    /// <param name="width">Width of the screen in cells.</param>
    public static ScreenColumns AtAGlance(int width) => width < Two ? new ScreenColumns(width, 0, 0)
        : width < Three ? Beside(ListShape.Full + 1, width, 0)
        : Beside(ListShape.Full + 1, width, ListAsideDrawing.Width);

    /// <summary>The columns beside a circuit that is read.</summary>
    /// <param name="width">Width of the screen in cells.</param>
    public static ScreenColumns WithCircuit(int width)
    {
        int kept = width < Three ? 0 : ListAsideDrawing.Width;
        return width < Two ? new ScreenColumns(0, width, 0) : Beside(ListFor(width - (kept > 0 ? kept + 1 : 0), WidePage), width, kept);
    }

    /// <summary>A page without the list.</summary>
    /// <param name="width">Width of the screen in cells.</param>
    public static ScreenColumns Alone(int width) => new(0, width, 0);

    /// <summary>The columns beside any other page.</summary>
    /// <param name="width">Width of the screen in cells.</param>
    public static ScreenColumns WithPage(int width) =>
        width < Two ? new ScreenColumns(0, width, 0) : Beside(ListFor(width, UsualPage), width, 0);

    /// <summary>The columns beside a table that needs all its own columns.</summary>
    /// <param name="width">Width of the screen in cells.</param>
    public static ScreenColumns WithTable(int width) =>
        width < NarrowList + 1 + WidePage ? new ScreenColumns(0, width, 0) : Beside(ListFor(width, WidePage), width, 0);

    /// <summary>Puts the columns side by side, with bars between them that hang from their first lines.</summary>
    /// <param name="columns">The lines and the width of each.</param>
    /// <param name="height">Height in rows.</param>
    /// <param name="glyphs">The signs.</param>
    public static ImmutableArray<Line> Join((ImmutableArray<Line> Lines, int Width)[] columns, int height, Glyphs glyphs)
    {
        var lines = ImmutableArray.CreateBuilder<Line>();
        for (int i = 0; i < height; i++)
        {
            char bar = i == 0 ? glyphs.TeeDown : glyphs.Vertical;
            Line line = Line.Empty;
            int width = 0;
            foreach ((ImmutableArray<Line> each, int own) in columns.Where(column => column.Width > 0))
            {
                if (width > 0)
                {
                    line = line.Beside(width++, new Line([new Span(bar.ToString(), Tone.Quiet)]));
                }

                line = line.Beside(width, i < each.Length ? each[i] : Line.Empty).Fit(width += own);
            }

            lines.Add(line);
        }

        return lines.ToImmutable();
    }

    private static int ListFor(int width, int page) => Math.Clamp(width - 1 - page, NarrowList, ListShape.Full + 1);

    private static ScreenColumns Beside(int list, int width, int kept) =>
        new(list, width - list - 1 - (kept > 0 ? kept + 1 : 0), kept);
}
