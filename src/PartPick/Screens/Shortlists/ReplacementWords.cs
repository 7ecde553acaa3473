using System.Collections.Immutable;
using System.Globalization;
using PartPick.Output;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>What there is to say about the replacements of a part: the chosen one, the circuit with it, and what was left out.</summary>
internal static class ReplacementWords
{
    /// <summary>The lines.</summary>
    /// <param name="page">The page.</param>
    /// <param name="found">What was found for its part.</param>
    /// <param name="width">Width in cells.</param>
    /// <param name="glyphs">The signs.</param>
    public static ImmutableArray<Line> Of(ReplacementsPage page, LineAlternates found, int width, Glyphs glyphs)
    {
        var lines = ImmutableArray.CreateBuilder<Line>();
        if (page.Chosen is { } chosen)
        {
            Say(Part(chosen, found.Line.Part.Package));
            Say(Circuit(page.Circuit!, chosen.Candidate));
        }

        foreach (string line in LeftOutWords.Lines(found))
        {
            Say(line, Tone.Quiet);
        }

        Say("ppm is the change of the worst error; change, the largest share of what a limit had left; * another package.", Tone.Quiet);
        return lines.ToImmutable();

        void Say(string text, Tone tone = Tone.Normal) => lines.AddRange(Paragraph.Of(text, width - 1, glyphs, " ", 1, tone));
    }

    private static string Part(Replacement one, string? before)
    {
        string stock = one.Part.Stock is { } count ? FormattableString.Invariant($"{count} in stock") : "stock not known";
        string package = one.SamePackage ? "" : $"; another package than {before ?? "not stated"}";
        return $"{BuyerText.Of(one.Part)}; {stock}{package}.";
    }

    private static string Circuit(ListCircuit circuit, Candidate with)
    {
        Requirement wanted = circuit.Review.Requirement;
        string drive = with.Drive is { } most
            ? $", drive {ValueText.Format(most.Value, Dimension.Power)}"
                + (with.RatedDriveWatts is { } rated ? $" of {ValueText.Format(rated, Dimension.Power)}" : "")
            : "";
        string limit = wanted.CostLimit is { } cost ? " of " + cost.ToString("0.###", CultureInfo.InvariantCulture) : "";
        return $"Error {(with.Budget is { } budget ? Figures.Ppm(budget.WorstRatio) : "-")} of {Figures.Ppm(wanted.BudgetRatio)} ppm, "
            + $"margin {Figures.Three(with.Margin.Value)} ({Figures.Three(wanted.Margin)} wanted){drive}, "
            + $"{with.Cost.ToString("0.000", CultureInfo.InvariantCulture)}{limit} {with.Currency} each for "
            + FormattableString.Invariant($"{wanted.Builds} boards.");
    }
}
