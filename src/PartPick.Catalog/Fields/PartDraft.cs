namespace PartPick.Catalog.Fields;

/// <summary>The figures of one part by their keys, in SI units: the form between parts and files.</summary>
internal sealed class PartDraft
{
    private readonly Dictionary<string, double> _numbers = new(StringComparer.Ordinal);
    private readonly Dictionary<string, string> _texts = new(StringComparer.Ordinal);

    public double? Number(string key) => _numbers.TryGetValue(key, out double value) ? value : null;

    public string? Text(string key) => _texts.GetValueOrDefault(key);

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
}
