using System.Collections.Immutable;
using System.Globalization;
using PartPick.Catalog.Browsing;

namespace PartPick.Screens;

/// <summary>Draws rows of parts: the headings, the units below them, and the parts with numbers lined up on their points.</summary>
internal static class PartListDrawing
{
    private const int Digits = 7;

    /// <summary>The names of the columns, and their units.</summary>
    public static ImmutableArray<Line> Headings(
        ImmutableArray<ListColumn> columns, PartListShape shape, int marked, int ordered, Glyphs glyphs)
    {
        LineBuilder names = new LineBuilder(glyphs).Add("   ");
        LineBuilder units = new LineBuilder(glyphs).Add("   ");
        foreach ((int at, int width) in shape.Shown)
        {
            Tone tone = at == marked ? Tone.Chosen : at == ordered ? Tone.Strong : Tone.Quiet;
            bool right = columns[at].IsNumber;
            string name = columns[at].Name;
            int inner = Math.Max(1, width - 1);
            string shown = glyphs.Show(name.Length > inner ? name[..inner] : name);
            int before = right ? inner - shown.Length : 0;
            names.Add(new string(' ', before)).Add(shown, tone).Add(new string(' ', inner - before - shown.Length + 1));
            units.Column(columns[at].UnitName, inner, Tone.Quiet, right).Add(" ");
        }

        return [names.Build(), units.Build()];
    }

    /// <summary>The rows.</summary>
    /// <param name="rows">The parts.</param>
    /// <param name="columns">The columns of their kind.</param>
    /// <param name="shape">Which of them are in sight.</param>
    /// <param name="chosen">Which row is chosen, -1 for none.</param>
    /// <param name="glyphs">The signs.</param>
    public static ImmutableArray<Line> Rows(
        IReadOnlyList<PartRow> rows, ImmutableArray<ListColumn> columns, PartListShape shape, int chosen, Glyphs glyphs)
    {
        string[][] cells = [.. shape.Shown.Select(pair => Cells(rows, columns, pair.Column))];
        var lines = ImmutableArray.CreateBuilder<Line>();
        for (int i = 0; i < rows.Count; i++)
        {
            bool excluded = rows[i].Marks.HasFlag(RowMarks.Excluded);
            string mark = excluded ? "x" : rows[i].Marks.HasFlag(RowMarks.SetByHand) ? "*" : "";
            LineBuilder line = new LineBuilder(glyphs).Column(i == chosen ? glyphs.Chosen : "", 1).Column(mark, 2, Tone.Accent);
            for (int k = 0; k < shape.Shown.Length; k++)
            {
                (int at, int width) = shape.Shown[k];
                line.Column(cells[k][i], Math.Max(1, width - 1), excluded ? Tone.Quiet : Tone.Normal, columns[at].IsNumber).Add(" ");
            }

            lines.Add(i == chosen ? line.Build().Chosen() : line.Build());
        }

        return lines.ToImmutable();
    }

    /// <summary>A number without an exponent, to seven digits; a dash where there is none.</summary>
    public static string Number(double value, double unit)
    {
        if (!double.IsFinite(value))
        {
            return "-";
        }

        double scaled = value / unit;
        int whole = scaled == 0 ? 1 : (int)Math.Floor(Math.Log10(Math.Abs(scaled))) + 1;
        string text = Figures.Fixed(scaled, Math.Clamp(Digits - whole, 0, 9));
        return text.Contains('.', StringComparison.Ordinal) ? text.TrimEnd('0').TrimEnd('.') : text;
    }

    /// <summary>A count with its thousands apart.</summary>
    public static string Count(long count) => count.ToString("#,##0", CultureInfo.InvariantCulture).Replace(',', ' ');

    private static string[] Cells(IReadOnlyList<PartRow> rows, ImmutableArray<ListColumn> columns, int column)
    {
        int place = columns.Take(column).Count(each => each.IsNumber == columns[column].IsNumber);
        return columns[column].IsNumber
            ? Figures.LineUp([.. rows.Select(row => Number(row.Numbers[place], columns[column].Unit))])
            : [.. rows.Select(row => row.Cells[place])];
    }
}
