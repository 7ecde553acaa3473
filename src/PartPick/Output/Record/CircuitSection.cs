using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Screens;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Output;

/// <summary>One circuit of a design record.</summary>
internal static class CircuitSection
{
    /// <summary>Writes it.</summary>
    public static void Write(Html page, ShortlistReview review)
    {
        page.Raw("<section class=\"circuit\">")
            .Element("h2", $"{Figures.Whole(review.Entry.Number)}: {ReviewWords.Name(review)}")
            .Element("p", "Wanted: " + RequirementSentence.Of(review.Requirement))
            .Element("p", $"Put on the list on {review.Entry.Added}"
                + (review.Entry.Note is { } note ? $" with the note: {note}" : ""));
        WriteChanges(page, review);
        if (review.Candidate is { } candidate)
        {
            Write(page, candidate, review.Requirement);
        }
        else
        {
            page.Element("p", "The circuit cannot be computed from the parts of this day; see what changed.");
        }

        WriteParts(page, review);
        WriteCosts(page, review);
        page.Raw("</section>");
    }

    private static void WriteChanges(Html page, ShortlistReview review)
    {
        string[] lines = [.. ReviewWords.Lines(review)];
        if (lines.Length > 0)
        {
            page.Raw("<div class=\"changed\">").Element("h3", $"State: {ReviewWords.State(review)}").List(lines).Raw("</div>");
        }
    }

    private static void Write(Html page, Candidate candidate, Requirement requirement)
    {
        page.Element("h3", "Schematic").Raw(DrawingSvg.Of(Schematic.Draw(candidate, Glyphs.Drawn), "Schematic of the circuit"));
        page.Element("h3", "Limits: the line is the limit")
            .Raw(new BarsSvg(
                [
                    .. LimitUses.Of(candidate, requirement).Select(use => new PictureBar(
                        use.Word, use.Used, $"{use.Figure} {use.Against} {use.Unlimited} ({use.Because})")),
                ],
                "Share of each limit that is used").ToString());
        WriteBudget(page, candidate, requirement);
        page.Element("h3", "Figures of the nominal circuit")
            .Table(
                [new("figure"), new("value")],
                CircuitFigures.Of(candidate.Describe(requirement.OutputHz), candidate.Result)
                    .Select(figure => new[] { figure.Label, figure.Text }));
        page.Element("h3", "Assumptions and warnings").List(Assumptions(candidate, requirement));
        page.Element("h3", "Before it is built").List(Cautions.Of(requirement));
    }

    private static void WriteBudget(Html page, Candidate candidate, Requirement requirement)
    {
        if (candidate.Budget is not { } budget)
        {
            page.Element("h3", "Frequency error").Element("p", "None: there is no steady state.");
            return;
        }

        (string Name, double Ratio, string Basis)[] rows =
        [
            ("centre: nominal values at 25 °C", budget.CentreRatio, ""),
            .. budget.Terms.Select(term => (term.Term, term.Ratio, term.RestsOn ?? "stated")),
            ("worst case, all together", budget.WorstRatio, ""), ("root of the sum of squares", budget.RssRatio, ""),
        ];
        page.Element("h3", $"Frequency error; the line is the budget of {ValueText.Format(requirement.BudgetRatio, Dimension.Relative)}")
            .Raw(new BarsSvg(
                [
                    .. rows.Select(row => new PictureBar(
                        row.Name, Math.Abs(row.Ratio) / requirement.BudgetRatio,
                        $"{Figures.Fixed(row.Ratio, 1e-6, 2)} ppm{(row.Basis.Length > 0 ? ", " + row.Basis : "")}")),
                ],
                "Terms of the frequency error").ToString());
    }

    private static ImmutableArray<string> Assumptions(Candidate candidate, Requirement requirement)
    {
        Board board = requirement.Board;
        return
        [
            $"Strays of the board ({board.Name}): {Farads(board.Strays.InputFarads)} at the input, {Farads(board.Strays.OutputFarads)} at "
                + $"the output, {Farads(board.Strays.AcrossFarads)} across, within {Figures.Fixed(board.UncertaintyRatio, 0.01, 0)} %.",
            $"Least start-up margin at {candidate.Margin.Corner}.",
            .. candidate.Drive is { } drive ? [$"Highest drive level at {drive.Corner}."] : Array.Empty<string>(),
            .. candidate.Parts.Select(use => use.Part).DistinctBy(part => part.Id)
                .Select(part => (part.Id, Keys: PartFigures.AssumedOf(part)))
                .Where(pair => pair.Keys.Length > 0)
                .Select(pair => $"Assumed for {pair.Id}, as its class default: {string.Join(", ", pair.Keys)}."),
            .. candidate.Warnings,
        ];
    }

    private static void WriteParts(Html page, ShortlistReview review) => page
        .Element("h3", "Parts")
        .Table(
            [new("reference"), new("value"), new("role"), new("part"), new("description"), new("supplier"), new("supplier's number")],
            review.Parts.Select(use => new[]
            {
                use.Designator, use.Value, use.Role, use.Part.Id, BuyerText.Of(use.Part), use.Part.Supplier ?? "",
                use.Part.SupplierPart ?? "",
            }));

    private static void WriteCosts(Html page, ShortlistReview review)
    {
        const int most = 10_000;
        var parts = new PartsCatalog(review.Parts.Select(use => use.Part).DistinctBy(part => part.Id));
        if (review.Candidate is not null && review.Chosen.In(parts) is { } found
            && CostCurve.Of(new BoardParts(found.Choice, found.Support), most) is { } curve)
        {
            page.Element("h3", $"Cost of one board ({review.Candidate.Currency}) over the number of boards, both logarithmic")
                .Raw(CostSvg.Of(curve, Math.Min(review.Requirement.Builds, most), "Cost of one board over the number of boards"));
        }
    }

    private static string Farads(double farads) => ValueText.Format(farads, Dimension.Capacitance);
}
