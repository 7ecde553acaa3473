using System.Text.Json.Nodes;
using PartPick.Selection;

namespace PartPick.Output;

/// <summary>Replacements as JSON.</summary>
internal static class AlternatesJson
{
    /// <summary>One candidate of a list with the replacements of its parts.</summary>
    public static JsonObject Of(AlternatesView view)
    {
        JsonObject json = Chosen(view.List, view.Review, view.Chosen);
        json["parts"] = new JsonArray([.. view.Lines.Select(line => (JsonNode)Line(line, view.Top))]);
        return json;
    }

    /// <summary>A candidate of a list with its figures of today.</summary>
    public static JsonObject Chosen(string list, ShortlistReview review, ChosenCircuit chosen) => new()
    {
        ["list"] = list,
        ["candidate"] = review.Entry.Number,
        ["builds"] = review.Requirement.Builds,
        ["id"] = chosen.Candidate.Id,
        ["fit"] = review.IsFit,
        ["misses"] = new JsonArray([.. review.Misses.Select(miss => (JsonNode)miss.Sentence)]),
        ["figures"] = Numbers(chosen.Candidate),
    };

    private static JsonObject Line(LineAlternates line, int top) => new()
    {
        ["designators"] = new JsonArray([.. line.Line.Designators.Select(designator => (JsonNode)designator)]),
        ["role"] = string.Join(" and ", line.Line.Roles),
        ["part"] = line.Line.Part.Id,
        ["considered"] = line.Considered,
        ["analysed"] = line.Analysed,
        ["leftOut"] = new JsonObject(line.LeftOut.Select(pair => KeyValuePair.Create(LeftOutWords.Key(pair.Key), (JsonNode?)pair.Value))),
        ["unfit"] = new JsonObject(line.Unfit.Select(pair => KeyValuePair.Create(LimitWords.Key(pair.Key), (JsonNode?)pair.Value))),
        ["fit"] = line.Replacements.Length,
        ["replacements"] = new JsonArray([.. line.Replacements.Take(top).Select(one => (JsonNode)Replacement(one))]),
    };

    private static JsonObject Replacement(Replacement one)
    {
        var json = new JsonObject
        {
            ["part"] = one.Part.Id,
            ["description"] = one.Part.Description,
            ["supplier"] = one.Part.Supplier,
            ["supplierPart"] = one.Part.SupplierPart,
            ["package"] = one.Part.Package,
            ["samePackage"] = one.SamePackage,
            ["stock"] = one.Part.Stock,
            ["id"] = one.Candidate.Id,
        };
        json["figures"] = Numbers(one.Candidate);
        json["change"] = ChangeFigures.Json(one.Change);
        return json;
    }

    private static JsonObject Numbers(Candidate candidate) => new()
    {
        ["errorWorst"] = candidate.Budget?.WorstRatio * 1e6,
        ["error"] = candidate.Budget?.CentreRatio * 1e6,
        ["startUpMargin"] = double.IsFinite(candidate.Margin.Value) ? candidate.Margin.Value : null,
        ["driveLevel"] = candidate.Drive?.Value,
        ["startUpTime"] = candidate.StartUpTime?.Value,
        ["cost"] = candidate.IsInOneCurrency ? candidate.Cost : null,
        ["currency"] = candidate.Currency,
    };
}
