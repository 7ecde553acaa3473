using System.Collections.Immutable;
using PartPick.Catalog.Browsing;

namespace PartPick.Screens;

/// <summary>Which columns of a list of parts are in sight, and how wide they are.</summary>
internal sealed class PartListShape
{
    private const int Front = 3;
    private const int LeastText = 10;

    private PartListShape(ImmutableArray<(int Column, int Width)> shown) => Shown = shown;

    /// <summary>The columns in sight, each with its width and a gap behind it.</summary>
    public ImmutableArray<(int Column, int Width)> Shown { get; }

    /// <summary>Chooses the columns: the first one always, and of the others as many as fit round the marked one.</summary>
    public static PartListShape Of(ImmutableArray<ListColumn> columns, int marked, int width)
    {
        int[] widths = [.. columns.Select(column => WidthOf(column, width))];
        int first = 1;
        while (first < marked && Front + widths[0] + widths[first..(marked + 1)].Sum() > width)
        {
            first++;
        }

        var shown = ImmutableArray.CreateBuilder<(int Column, int Width)>();
        shown.Add((0, widths[0]));
        int left = width - Front - widths[0];
        for (int i = first; i < columns.Length && left > 0; i++)
        {
            // A text may be cut at the right end; a number may not.
            if (widths[i] > left && (columns[i].IsNumber || left < LeastText))
            {
                break;
            }

            int taken = Math.Min(left, widths[i]);
            shown.Add((i, taken));
            left -= taken;
        }

        // What is left over goes to the last text.
        if (shown.Count > 1 && !columns[shown[^1].Column].IsNumber)
        {
            shown[^1] = (shown[^1].Column, shown[^1].Width + left);
        }

        return new PartListShape(shown.ToImmutable());
    }

    private static int WidthOf(ListColumn column, int width) => column.Key switch
    {
        "id" => Math.Clamp(width / 4, 10, 26),
        "frequency" => 12,
        "stock" => 9,
        "description" => 40,
        "note" => 30,
        "supplierPart" => 20,
        "supplier" => 14,
        "package" => 12,
        _ => Math.Max(8, Math.Max(column.Name.Length, column.UnitName.Length) + 1),
    };
}
