using System.Globalization;
using System.Text.Json.Nodes;
using PartPick.Selection;

namespace PartPick.Output;

/// <summary>Cost and choice over the number of boards, as JSON and as comma-separated values.</summary>
internal static class QuantityJson
{
    /// <summary>The document.</summary>
    public static JsonObject Of(QuantityView view)
    {
        JsonObject json = AlternatesJson.Chosen(view.List, view.Review, view.Chosen);
        json["most"] = view.Curve.Most;
        json["coveredTo"] = view.Curve.CoveredTo;
        json["rows"] = new JsonArray([.. view.Rows.Select(builds => (JsonNode)Row(view, builds))]);
        json["breaks"] = new JsonArray([.. view.Curve.Breaks.Select(turn => (JsonNode)Break(turn))]);
        if (view.Choice is { } choice)
        {
            json["choices"] = new JsonArray([.. choice.Spans.Select(span => (JsonNode)Span(span))]);
            json["rankedAt"] = new JsonArray([.. choice.RankedAt.Select(builds => (JsonNode)builds)]);
            json["exact"] = choice.IsExact;
            json["compared"] = choice.Compared;
        }

        return json;
    }

    /// <summary>Prints the rows of the table.</summary>
    public static void WriteCsv(TextWriter output, QuantityView view) => CsvOutput.Write(
        output,
        ["builds", "cost", "total", "currency", "breaks", "bestId", "bestCost"],
        view.Rows.Select(builds => (IEnumerable<string>)
        [
            Figures.Whole(builds),
            Text(view.Curve.UnitCost(builds)),
            Text(Total(view, builds)),
            view.Chosen.Candidate.Currency,
            view.Breaks(builds),
            view.Choice?.At(builds).Candidate?.Id ?? "",
            view.Choice?.Costs[builds - 1] is { } cost ? Text(cost) : "",
        ]));

    private static JsonObject Row(QuantityView view, int builds)
    {
        var json = new JsonObject
        {
            ["builds"] = builds,
            ["cost"] = view.Curve.UnitCost(builds),
            ["total"] = Total(view, builds),
            ["breaks"] = view.Breaks(builds) is { Length: > 0 } why ? why : null,
        };
        if (view.Choice is { } choice)
        {
            json["best"] = choice.At(builds).Candidate?.Id;
            json["bestCost"] = choice.Costs[builds - 1];
        }

        return json;
    }

    private static JsonObject Break(CostBreak turn) => new()
    {
        ["builds"] = turn.Builds,
        ["part"] = turn.Part.Id,
        ["kind"] = turn.Kind switch
        {
            CostBreakKind.Price => "price",
            CostBreakKind.Multiple => "multiple",
            CostBreakKind.UsedUp => "used-up",
            _ => "stock",
        },
        ["ordered"] = turn.Ordered,
        ["unitPrice"] = Plain(turn.UnitPrice),
        ["costBefore"] = turn.Before,
        ["cost"] = turn.After,
    };

    private static JsonObject Span(ChoiceSpan span) => new()
    {
        ["from"] = span.From,
        ["to"] = span.To,
        ["id"] = span.Candidate?.Id,
        ["errorWorst"] = span.Candidate?.Budget?.WorstRatio * 1e6,
        ["startUpMargin"] = span.Candidate?.Margin.Value,
        ["costAtFirst"] = span.Candidate?.Cost,
        ["costAtLast"] = span.CostAtEnd,
        ["ranked"] = span.Ranked,
    };

    // What is bought is paid in full: the sum of whole purchases, without the remainder of the division by the boards.
    private static decimal Total(QuantityView view, int builds) => Plain(decimal.Round(view.Curve.UnitCost(builds) * builds, 6));

    // Without the zeros at the end that a division or a product leaves.
    private static decimal Plain(decimal value) => value / 1.0000000000000000000000000000m;

    private static string Text(decimal value) => value.ToString(CultureInfo.InvariantCulture);
}
