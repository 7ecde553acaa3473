using System.Text.Json;
using PartPick.Values;

namespace PartPick.Selection.Files;

/// <summary>
/// Reads the keys of an object. Wrong values give a harmless stand-in and a problem in the box; null counts as absent.
/// </summary>
internal sealed class FieldReader
{
    private readonly Dictionary<string, Field> _fields;
    private readonly string _name;
    private readonly ProblemBox _box;

    private FieldReader(Dictionary<string, Field> fields, string name, ProblemBox box)
    {
        _fields = fields;
        _name = name;
        _box = box;
    }

    /// <summary>Reads from fields gathered elsewhere.</summary>
    /// <param name="fields">The fields.</param>
    /// <param name="name">File and path of the object, in front of a missing key's name.</param>
    /// <param name="box">Where problems go.</param>
    public static FieldReader Of(IEnumerable<KeyValuePair<string, Field>> fields, string name, ProblemBox box) => new(
        fields.Where(field => field.Value.Value.ValueKind != JsonValueKind.Null).ToDictionary(StringComparer.Ordinal), name, box);

    /// <summary>Reads from an object.</summary>
    /// <param name="element">The object.</param>
    /// <param name="name">What stands in front of a key: "file.json: " or "file.json: crystal.".</param>
    /// <param name="box">Where problems go.</param>
    public static FieldReader Of(JsonElement element, string name, ProblemBox box)
    {
        var fields = new Dictionary<string, Field>(StringComparer.Ordinal);
        foreach (JsonProperty property in element.EnumerateObject())
        {
            if (!fields.TryAdd(property.Name, new Field(property.Value, name + property.Name)))
            {
                box.Add(name + Printable(property.Name), "is given twice", "each key once");
            }
        }

        return Of(fields, name, box);
    }

    /// <summary>Whether a key is given.</summary>
    public bool Has(string key) => _fields.ContainsKey(key);

    /// <summary>Where a key is, for a problem.</summary>
    public string Where(string key) => _fields.TryGetValue(key, out Field field) ? field.Where : _name + key;

    /// <summary>Notes a problem with a key.</summary>
    public void Reject(string key, string what, string fits) => _box.Add(Where(key), what, fits);

    /// <summary>Notes the first key that is none of those known here.</summary>
    /// <param name="owner">What the keys belong to, for the problem: "a gate circuit".</param>
    /// <param name="known">The known keys.</param>
    public void Allow(string owner, IReadOnlyCollection<string> known)
    {
        foreach (string key in _fields.Keys.Where(key => !known.Contains(key)))
        {
            string fits = NearWord.Of(key, known) is { } near ? $"'{near}'" : "one of " + string.Join(", ", known);
            _box.Add(_name + Printable(key), $"is no key of {owner}", fits);
        }
    }

    /// <summary>A value that may be absent.</summary>
    /// <param name="key">The key.</param>
    /// <param name="dimension">What it measures.</param>
    /// <param name="positive">Whether zero is wrong.</param>
    public double? Optional(string key, Dimension dimension, bool positive = false)
    {
        if (!_fields.TryGetValue(key, out Field field))
        {
            return null;
        }

        Result<double> read = FieldValue.Read(field, dimension);
        if (!read.IsOk)
        {
            _box.Add(read.Problem);
            return null;
        }

        if (positive && read.Value == 0)
        {
            _box.Add(field.Where, "is zero", "a value above zero");
        }

        return read.Value;
    }

    /// <summary>A value above zero that the file has to give.</summary>
    /// <param name="key">The key.</param>
    /// <param name="dimension">What it measures.</param>
    public double Needed(string key, Dimension dimension)
    {
        if (!Has(key))
        {
            _box.Add(_name + key, "is missing", FieldValue.Fits(dimension));
        }

        return Optional(key, dimension, positive: true) ?? 1;
    }

    /// <summary>A text that may be absent.</summary>
    public string? Text(string key, string fits)
    {
        if (!_fields.TryGetValue(key, out Field field))
        {
            return null;
        }

        if (field.Value.ValueKind == JsonValueKind.String)
        {
            return field.Value.GetString();
        }

        _box.Add(field.Where, $"is {JsonText.Kind(field.Value)}", fits);
        return null;
    }

    /// <summary>One of some words; null where it is absent.</summary>
    public T? Word<T>(string key, IReadOnlyDictionary<string, T> words, string? fits = null)
        where T : struct
    {
        fits ??= "one of " + string.Join(", ", words.Keys);
        return Text(key, fits) is { } text ? FieldValue.Word(text, Where(key), words, fits, _box) : null;
    }

    /// <summary>True or false; null where it is absent.</summary>
    public bool? Flag(string key)
    {
        if (!_fields.TryGetValue(key, out Field field))
        {
            return null;
        }

        if (field.Value.ValueKind is JsonValueKind.True or JsonValueKind.False)
        {
            return field.Value.GetBoolean();
        }

        _box.Add(field.Where, $"is {JsonText.Kind(field.Value)}", "true or false");
        return null;
    }

    /// <summary>The items of a list, or a single value as its only item; null where it is absent.</summary>
    public IReadOnlyList<Field>? Items(string key, string fits)
    {
        if (!_fields.TryGetValue(key, out Field field))
        {
            return null;
        }

        if (field.Value.ValueKind == JsonValueKind.Object)
        {
            _box.Add(field.Where, $"is {JsonText.Kind(field.Value)}", fits);
            return null;
        }

        return field.Value.ValueKind == JsonValueKind.Array
            ? [.. field.Value.EnumerateArray().Select(item => field with { Value = item })]
            : [field];
    }

    /// <summary>The value of an item.</summary>
    public double ValueOf(Field item, Dimension dimension)
    {
        Result<double> read = FieldValue.Read(item, dimension);
        if (!read.IsOk)
        {
            _box.Add(read.Problem);
        }

        return read.ValueOr(1);
    }

    /// <summary>The word of an item; null where it is none of those known.</summary>
    public T? WordOf<T>(Field item, IReadOnlyDictionary<string, T> words, string fits)
        where T : struct
    {
        if (item.Value.ValueKind == JsonValueKind.String)
        {
            return FieldValue.Word(item.Value.GetString()!, item.Where, words, fits, _box);
        }

        _box.Add(item.Where, $"holds {JsonText.Kind(item.Value)}", fits);
        return null;
    }

    /// <summary>Two values, the first not above the second; a single value stands for both.</summary>
    public (double Min, double Max) Range(string key, Dimension dimension, (double Min, double Max) usual, bool positive)
    {
        string fits = "two values, the lower first, each " + FieldValue.Fits(dimension);
        if (Items(key, fits) is not { } items)
        {
            return usual;
        }

        if (items.Count is not (1 or 2))
        {
            Reject(key, $"has {items.Count} values", fits);
            return usual;
        }

        double[] values = [.. items.SelectMany(Ends).Select(item => ValueOf(item, dimension))];
        if (values[0] > values[^1])
        {
            Reject(key, $"runs from {ValueText.Format(values[0], dimension)} down to {ValueText.Format(values[^1], dimension)}", fits);
        }

        if (positive && values[0] <= 0)
        {
            Reject(key, "is zero", "values above zero");
        }

        return (values[0], values[^1]);
    }

    // "4.5 V..5.5 V" holds both ends.
    private static IEnumerable<Field> Ends(Field item) =>
        item.Value.ValueKind == JsonValueKind.String && item.Value.GetString()!.Split("..", 2) is { Length: 2 } ends
            ? ends.Select(end => item with { Value = JsonSerializer.SerializeToElement(end) })
            : [item];

    /// <summary>Copies the fields.</summary>
    public void CopyTo(Dictionary<string, Field> fields)
    {
        foreach ((string key, Field field) in _fields)
        {
            fields[key] = field;
        }
    }

    /// <summary>The raw field; null where it is absent.</summary>
    public Field? Raw(string key) => _fields.TryGetValue(key, out Field field) ? field : null;

    /// <summary>An object; null where it is absent or something else.</summary>
    public FieldReader? Object(string key, string fits)
    {
        if (!_fields.TryGetValue(key, out Field field))
        {
            return null;
        }

        if (field.Value.ValueKind == JsonValueKind.Object)
        {
            return Of(field.Value, field.Where + ".", _box);
        }

        _box.Add(field.Where, $"is {JsonText.Kind(field.Value)}", fits);
        return null;
    }

    private static string Printable(string key)
    {
        string quoted = Problem.Quote(key);
        return quoted[1..^1];
    }
}
