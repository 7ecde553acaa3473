using System.Text.Json.Nodes;
using PartPick.Selection;

namespace PartPick.Output;

/// <summary>A purchase list as JSON.</summary>
internal static class PurchaseJson
{
    /// <summary>The document.</summary>
    public static JsonObject Of(PurchaseList list) => new()
    {
        ["name"] = list.Name,
        ["currency"] = list.Currency,
        ["total"] = list.Total,
        ["circuits"] = new JsonArray([.. list.Circuits.Select(circuit => (JsonNode)new JsonObject
        {
            ["label"] = circuit.Label,
            ["name"] = circuit.Name,
            ["builds"] = circuit.Builds,
        })]),
        ["lines"] = new JsonArray([.. list.Lines.Select(line => (JsonNode)Of(line))]),
        ["notes"] = new JsonArray([.. new PurchaseCells(list).Notes().Select(note => (JsonNode)note)]),
    };

    private static JsonObject Of(PurchaseLine line) => new()
    {
        ["line"] = line.Number,
        ["parts"] = new JsonArray([.. line.Parts.Select(part => (JsonNode)part.Id)]),
        ["description"] = line.Description,
        ["uses"] = new JsonArray([.. line.Uses.Select(use => (JsonNode)new JsonObject
        {
            ["circuit"] = use.Circuit,
            ["builds"] = use.Builds,
            ["designators"] = new JsonArray([.. use.Designators.Select(each => (JsonNode)each)]),
        })]),
        ["needed"] = line.Needed,
        ["attrition"] = line.Attrition,
        ["required"] = line.Required,
        ["orders"] = new JsonArray([.. line.Orders.Select(order => (JsonNode)new JsonObject
        {
            ["part"] = order.Part.Id,
            ["supplier"] = order.Part.Supplier,
            ["supplierPart"] = order.Part.SupplierPart,
            ["quantity"] = order.Quantity,
            ["unitPrice"] = order.UnitPrice,
            ["total"] = order.Total,
            ["stock"] = order.Part.Stock,
            ["covers"] = PurchaseCells.Covers(order),
        })]),
        ["total"] = line.Total,
        ["singleTotal"] = line.SingleTotal,
        ["saving"] = line.Saving,
        ["alternates"] = new JsonArray([.. line.Alternates.Select(id => (JsonNode)id)]),
        ["gone"] = line.IsGone,
    };
}
