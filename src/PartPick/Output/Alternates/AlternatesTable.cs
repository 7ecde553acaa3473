using System.Globalization;
using PartPick.Catalog;
using PartPick.Selection;

namespace PartPick.Output;

/// <summary>Replacements for people.</summary>
internal static class AlternatesTable
{
    /// <summary>Prints the candidate, and for each of its parts what was looked at and what may replace it.</summary>
    public static void Write(TextWriter output, AlternatesView view)
    {
        ChosenSentence.Write(output, view.List, view.Review, view.Chosen);
        foreach (LineAlternates line in view.Lines)
        {
            output.WriteLine();
            WriteLine(output, line, view);
        }
    }

    /// <summary>What the columns mean.</summary>
    public static void WriteLegend(TextWriter output)
    {
        output.WriteLine();
        output.WriteLine(
            "Each figure is the change from the circuit as it stands, with the whole circuit analysed again. change is the largest share");
        output.WriteLine(
            "that a figure takes, or gives back, of what its limit had left; at 1 one figure has moved by all of it. Least change first.");
        output.WriteLine();
        output.WriteLine(Commands.HelpFooter.Cautions);
    }

    private static void WriteLine(TextWriter output, LineAlternates found, AlternatesView view)
    {
        Part part = found.Line.Part;
        output.WriteLine(
            $"{string.Join(", ", found.Line.Designators)}, {string.Join(" and ", found.Line.Roles)}, {part.Id}: "
            + $"{Figures.Whole(found.Replacements.Length)} of {Figures.Whole(found.Considered)} others keep the circuit fit; "
            + $"{Figures.Whole(found.Analysed)} analysed.");
        foreach (string words in LeftOutWords.Lines(found))
        {
            output.WriteLine("  " + words);
        }

        if (found.Replacements.IsEmpty)
        {
            return;
        }

        output.WriteLine();
        TextColumn[] columns =
        [
            new("part"), .. ChangeFigures.Columns(view.Chosen.Candidate.Currency), new("stock", true), new("package"),
        ];
        TextTable.Write(output, columns, [.. found.Replacements.Take(view.Top).Select(Row)]);
        if (found.Replacements.Length > view.Top)
        {
            output.WriteLine($"… and {Figures.Whole(found.Replacements.Length - view.Top)} more (--top N).");
        }
    }

    private static string[] Row(Replacement one) =>
    [
        one.Part.Id,
        .. ChangeFigures.Cells(one.Change),
        one.Part.Stock?.ToString(CultureInfo.InvariantCulture) ?? Figures.None,
        (one.Part.Package ?? "") + (one.SamePackage ? "" : " (another)"),
    ];
}
