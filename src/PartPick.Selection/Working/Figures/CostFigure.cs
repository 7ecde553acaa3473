using System.Collections.Immutable;
using System.Globalization;
using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>The cost of a board, part by part.</summary>
internal static class CostFigure
{
    private const string Section = "Cost";

    public static FigureWorking Of(Candidate candidate, SupportParts support, int builds)
    {
        (Part Part, int Count)[] counts = [.. BillOfParts.Counts(candidate.Choice, support)];
        string currency = candidate.Currency;
        var steps = ImmutableArray.CreateBuilder<WorkingStep>();
        foreach ((Part part, int count) in counts)
        {
            int needed = (int)Math.Min((long)count * builds, int.MaxValue);
            if (part.Offer.CheapestPurchase(needed) is { } bought)
            {
                steps.Add(new WorkingStep(
                    Section, $"{Designators(candidate, part)} {part.Id}",
                    string.Create(CultureInfo.InvariantCulture, $"paid for {bought.Quantity} of them ({needed} needed) / boards"),
                    string.Create(CultureInfo.InvariantCulture, $"{bought.Total} {currency} / {builds}"),
                    $"{Exact(Market.UnitCost(part, count, builds))} {currency}",
                        "cheapest purchase under price breaks, minimum order and multiple"));
            }
        }

        steps.Add(new WorkingStep(
            Section, "cost of a board", "sum of the parts",
            string.Join(" + ", counts.Select(one => $"{Exact(Market.UnitCost(one.Part, one.Count, builds))} {currency}")),
            $"{Exact(candidate.Cost)} {currency}", "definition"));
        return new FigureWorking(
            "cost", $"{Say.Money(candidate.Cost)} {currency}",
            string.Create(CultureInfo.InvariantCulture,
                $"What the parts of one board cost when {builds} boards are bought for at once; equal parts are bought together."),
            steps.ToImmutable());
    }

    private static string Designators(Candidate candidate, Part part) =>
        string.Join(", ", candidate.Parts.Where(use => use.Part.Id == part.Id).Select(use => use.Designator));

    private static string Exact(decimal amount) => Math.Round(amount, 8).ToString("0.########", CultureInfo.InvariantCulture);
}
