using System.Collections.Immutable;
using System.Globalization;
using PartPick.Values;

namespace PartPick.Catalog.Fields;

/// <summary>The text of a prices column: <c>1:0.42;10:0.31</c>, quantity and unit price.</summary>
internal static class PricesText
{
    private const decimal Highest = 1_000_000_000;

    public static ImmutableArray<PriceBreak> Read(string? text, DraftReader reader)
    {
        var prices = ImmutableArray.CreateBuilder<PriceBreak>();
        foreach (string entry in (text ?? "").Split(';', StringSplitOptions.TrimEntries | StringSplitOptions.RemoveEmptyEntries))
        {
            string[] halves = entry.Split(':');
            if (halves.Length != 2
                || !int.TryParse(halves[0], NumberStyles.None, CultureInfo.InvariantCulture, out int quantity)
                || quantity < 1
                || !decimal.TryParse(halves[1], NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture, out decimal price)
                || price > Highest)
            {
                reader.Report("prices", $"{Problem.Quote(entry)} is no price", "quantity:price such as 1:0.42;10:0.31");
                return [];
            }

            if (prices.Count > 0 && quantity <= prices[^1].Quantity)
            {
                reader.Report("prices", $"the quantity {quantity} does not ascend", "ascending quantities such as 1:0.42;10:0.31");
                return [];
            }

            prices.Add(new PriceBreak(quantity, price));
        }

        return prices.ToImmutable();
    }

    public static string Write(Offer offer) => offer.HasPrices
        ? string.Join(';', offer.Prices.Select(price =>
            string.Create(CultureInfo.InvariantCulture, $"{price.Quantity}:{price.UnitPrice}")))
        : "";
}
