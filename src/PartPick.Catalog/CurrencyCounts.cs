namespace PartPick.Catalog;

/// <summary>Counts in which currencies parts are priced.</summary>
internal sealed class CurrencyCounts
{
    private readonly Dictionary<string, int> _counts = new(StringComparer.Ordinal);

    /// <summary>The currency of most parts, the first by ordinal of equally many; empty where none is priced.</summary>
    public string Most => _counts
        .OrderByDescending(pair => pair.Value)
        .ThenBy(pair => pair.Key, StringComparer.Ordinal)
        .Select(pair => pair.Key)
        .FirstOrDefault("");

    /// <summary>Counts a part by its offer; one without prices does not count.</summary>
    public void Add(Offer offer)
    {
        if (offer.HasPrices)
        {
            _counts[offer.Currency] = _counts.GetValueOrDefault(offer.Currency) + 1;
        }
    }
}
