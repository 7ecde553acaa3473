using System.Globalization;
using System.Text.Json.Nodes;
using PartPick.Catalog;

namespace PartPick.Output;

/// <summary>A part as JSON: plain SI numbers, absent figures left out.</summary>
internal static class PartJson
{
    /// <summary>A part with the origin of its figures.</summary>
    public static JsonObject Of(CatalogEntry entry)
    {
        Part part = entry.Part;
        var json = new JsonObject { ["id"] = part.Id, ["kind"] = part.Kind.Word() };
        var points = new List<JsonObject>();
        foreach (PartFigure figure in PartFigures.Of(part))
        {
            string[] key = figure.Key.Split(' ');
            if (key.Length == 2)
            {
                int point = int.Parse(key[1], CultureInfo.InvariantCulture);
                while (points.Count < point)
                {
                    points.Add([]);
                }

                points[point - 1][key[0]] = Value(figure);
            }
            else if (figure.Key is not ("id" or "basis" or "prices" or "taps" or "excluded"))
            {
                json[figure.Key] = Value(figure);
            }
        }

        if (part is AmplifierPart)
        {
            json["points"] = new JsonArray([.. points]);
        }

        if (part is CounterPart counter)
        {
            json["taps"] = new JsonArray([.. counter.Taps.Select(tap => (JsonNode)tap)]);
        }

        if (part.Offer.HasPrices)
        {
            json["prices"] = new JsonArray([.. part.Offer.Prices.Select(
                price => (JsonNode)new JsonObject { ["quantity"] = price.Quantity, ["price"] = price.UnitPrice })]);
        }

        json["excluded"] = part.Excluded;
        json["assumed"] = new JsonArray([.. PartFigures.AssumedOf(part).Select(key => (JsonNode)key)]);
        json["origin"] = new JsonObject(entry.Origin.Select(pair => KeyValuePair.Create(pair.Key, (JsonNode?)pair.Value)));
        return json;
    }

    private static JsonNode? Value(PartFigure figure) => figure switch
    {
        { Dimension: Values.Dimension.Count, Number: { } whole } => (int)whole,
        { Number: { } number } => number,
        _ => figure.Text,
    };
}
