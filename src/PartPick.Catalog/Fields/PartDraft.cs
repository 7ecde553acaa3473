namespace PartPick.Catalog.Fields;

/// <summary>The figures of one part by their keys, in SI units: the form between parts and files.</summary>
internal sealed class PartDraft
{
    // Room for the figures of most parts, so that reading a list does not make the tables grow row by row.
    private readonly Dictionary<string, double> _numbers = new(17, StringComparer.Ordinal);
    private readonly Dictionary<string, string> _texts = new(11, StringComparer.Ordinal);

    /// <summary>The keys of the figures and texts that are there.</summary>
    public IEnumerable<string> Keys => _numbers.Keys.Concat(_texts.Keys);

    /// <summary>Whether a crystal without a load is stated to be one for series resonance, not only left without a load.</summary>
    public bool IsSeries { get; set; }

    public double? Number(string key) => _numbers.TryGetValue(key, out double value) ? value : null;

    public string? Text(string key) => _texts.GetValueOrDefault(key);

    public bool Has(string key) => _numbers.ContainsKey(key) || _texts.ContainsKey(key);

    public void Set(string key, double? value)
    {
        if (value is { } number)
        {
            _numbers[key] = number;
        }
    }

    public void Set(string key, string? value)
    {
        if (!string.IsNullOrEmpty(value))
        {
            _texts[key] = value;
        }
    }

    public void Remove(string key)
    {
        _numbers.Remove(key);
        _texts.Remove(key);
    }

    /// <summary>Takes one figure from another draft: its value, or its absence.</summary>
    public void Take(string key, PartDraft other)
    {
        Remove(key);
        Set(key, other.Number(key));
        Set(key, other.Text(key));
    }

    public PartDraft Copy()
    {
        var copy = new PartDraft { IsSeries = IsSeries };
        foreach (string key in Keys)
        {
            copy.Take(key, this);
        }

        return copy;
    }

    /// <summary>Whether another draft holds the same figure or also holds none.</summary>
    public bool Agrees(string key, PartDraft other) =>
        Number(key).Equals(other.Number(key)) && string.Equals(Text(key), other.Text(key), StringComparison.Ordinal);
}
