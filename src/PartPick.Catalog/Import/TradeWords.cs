using System.Collections.Frozen;
using PartPick.Catalog.Fields;

namespace PartPick.Catalog.Import;

/// <summary>The phrases by which lists of parts name a field, and the words with which a header means something else.</summary>
/// <param name="Field">The field.</param>
/// <param name="Phrases">The phrases, each with its place in its language's list: the surest are first.</param>
/// <param name="Against">Words, or several together, that make a header another one.</param>
internal sealed record TradeWords(string Field, IReadOnlyList<(TradePhrase Phrase, int Place)> Phrases, IReadOnlyList<string[]> Against)
{
    private static readonly HashSet<string> Texts = new(StringComparer.Ordinal)
    {
        "supplierPart", "description", "supplier", "package", "currency", "note", "holder", "dielectric", "excluded",
    };

    private static readonly Dictionary<PartKind, TradeWords[]> Kinds =
        PartKinds.All.ToDictionary(kind => kind, kind => Gather(kind, Lines()).ToArray());

    private static readonly Dictionary<PartKind, FrozenSet<string>> AllWords = Kinds.ToDictionary(
        kind => kind.Key, kind => kind.Value.SelectMany(words => words.Phrases).SelectMany(each => each.Phrase.Words).ToFrozenSet());

    /// <summary>Whether the cells are texts, which fit whatever the header means.</summary>
    public bool IsText => IsTextual(Field);

    /// <summary>Whether the cells of a field are texts.</summary>
    public static bool IsTextual(string field) => Texts.Contains(field);

    /// <summary>The name under which kinds that have the same figures are listed together.</summary>
    public static string Family(PartKind kind) =>
        kind is PartKind.Inverter or PartKind.Counter or PartKind.Port ? "amplifiers" : kind.Word();

    /// <summary>Whether a header has a word with which it means something else.</summary>
    public bool IsOther(HeaderCell header) => Against.Any(words => words.All(header.Plain.Split(' ').Contains));

    /// <summary>The words of the fields of a kind.</summary>
    public static IReadOnlyList<TradeWords> Of(PartKind kind) => Kinds[kind];

    /// <summary>All words of the phrases of a kind.</summary>
    public static IReadOnlySet<string> Known(PartKind kind) => AllWords[kind];

    private static IEnumerable<TradeWords> Gather(PartKind kind, List<(string Section, string Field, string[] Phrases)> lines)
    {
        string family = Family(kind);
        HashSet<string> fields =
        [
            .. PartShape.Of(kind).Fields.Select(field => field.Key), "price", "prices", "priceQuantity", "priceFor", "toleranceAny",
        ];
        if (fields.Contains("temperatureMin"))
        {
            fields.Add("temperature");
        }

        foreach (var field in lines
            .Where(line => line.Section == "all" || line.Section == kind.Word() || line.Section == family)
            .GroupBy(line => line.Field.TrimEnd('!')).Where(field => fields.Contains(field.Key)))
        {
            yield return new TradeWords(
                field.Key,
                [
                    .. field.Where(line => !line.Field.EndsWith('!'))
                        .SelectMany(line => line.Phrases.Select((phrase, place) => (TradePhrase.Of(phrase), place))),
                ],
                [
                    .. field.Where(line => line.Field.EndsWith('!')).SelectMany(line => line.Phrases)
                        .Select(words => TradePhrase.Of(words).Text.Split(' ')),
                ]);
        }
    }

    /// <summary>The lines of all lists of words.</summary>
    internal static List<(string Section, string Field, string[] Phrases)> Lines()
    {
        var lines = new List<(string, string, string[])>();
        foreach (string name in typeof(TradeWords).Assembly.GetManifestResourceNames().Order(StringComparer.Ordinal)
            .Where(name => name.StartsWith("words/", StringComparison.Ordinal)))
        {
            string section = "";
            using var reader = new StreamReader(typeof(TradeWords).Assembly.GetManifestResourceStream(name)!);
            while (reader.ReadLine() is { } line)
            {
                int colon = line.IndexOf(':', StringComparison.Ordinal);
                if (line.StartsWith('['))
                {
                    section = line.Trim('[', ']');
                }
                else if (!line.StartsWith('#') && colon > 0)
                {
                    lines.Add((section, line[..colon], line[(colon + 1)..].Split(';', StringSplitOptions.TrimEntries)));
                }
            }
        }

        return lines;
    }
}
