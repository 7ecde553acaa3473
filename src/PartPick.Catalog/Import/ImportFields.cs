using PartPick.Catalog.Fields;
using PartPick.Values;

namespace PartPick.Catalog.Import;

/// <summary>The fields that columns can be: the figures of the parts, and what an import makes figures of.</summary>
internal static class ImportFields
{
    /// <summary>
    /// Those that are no figure themselves: a price from one quantity on; a list of prices; from which quantity on, and for how many
    /// together, the price of a row holds; a temperature range; a capacitor's tolerance, relative or not.
    /// </summary>
    private static readonly string[] Further = ["price", "prices", "priceQuantity", "priceFor", "temperature", "toleranceAny"];

    /// <summary>All that a column of a list of a kind can be.</summary>
    public static IEnumerable<string> Names(PartKind kind)
    {
        string[] own = [.. PartShape.Of(kind).Fields.Select(field => field.Key)];
        return own.Concat(Further.Where(field => field switch
        {
            "temperature" => own.Contains("temperatureMin"),
            "toleranceAny" => own.Contains("toleranceAbsolute"),
            _ => true,
        }));
    }

    /// <summary>What a field measures; null for a text, and for what is read in its own way.</summary>
    public static Dimension? DimensionOf(PartKind kind, string field) => field switch
    {
        "overtone" or "stages" => null,
        "priceQuantity" or "priceFor" => Dimension.Count,
        _ => PartShape.Of(kind).Fields.FirstOrDefault(each => each.Key == field)?.Dimension,
    };

    /// <summary>Whether its cells are numbers.</summary>
    public static bool IsNumeric(PartKind kind, string field) =>
        field is "price" or "prices" or "toleranceAny" || DimensionOf(kind, field) is not null;

    /// <summary>Whether a field may come from several columns.</summary>
    public static bool IsRepeated(string field) => field is "price" or "priceQuantity";

    /// <summary>Whether parts of a kind differ in their inverting stages.</summary>
    public static bool HasStages(PartKind kind) => PartShape.Of(kind).Fields.Any(field => field.Key == "stages");

    /// <summary>The number of inverting stages that a cell states, as a number or in words; null where it states none.</summary>
    public static int? Stages(string cell) => Trade.Words(cell) switch
    {
        "1" or "one" or "unbuffered" or "u" or "no" or "single stage" or "ungepuffert" or "non" or "nein" or "not buffered" => 1,
        "3" or "three" or "buffered" or "b" or "yes" or "gepuffert" or "oui" or "ja" => 3,
        _ => null,
    };
}
