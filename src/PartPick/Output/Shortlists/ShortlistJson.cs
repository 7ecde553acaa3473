using System.Text.Json.Nodes;
using PartPick.Selection;

namespace PartPick.Output;

/// <summary>A list as JSON.</summary>
internal static class ShortlistJson
{
    /// <summary>The document.</summary>
    public static JsonObject Of(ShortlistView list) => new()
    {
        ["name"] = list.Name,
        ["candidates"] = new JsonArray([.. list.Candidates.Select(each => (JsonNode)Of(each))]),
        ["changed"] = new JsonArray([.. list.Candidates.Where(each => each.IsChanged).Select(each => (JsonNode)each.Entry.Number)]),
    };

    private static JsonObject Of(ShortlistReview review) => new()
    {
        ["number"] = review.Entry.Number,
        ["added"] = review.Entry.Added,
        ["builds"] = review.Entry.Builds,
        ["note"] = review.Entry.Note,
        ["circuit"] = review.Chosen.Circuit.Word(),
        ["crystal"] = review.Chosen.Ids["crystal"],
        ["amplifier"] = review.Chosen.Ids["amplifier"],
        ["tap"] = review.Chosen.Tap,
        ["parts"] = new JsonArray([.. review.Parts.Select(use => (JsonNode)new JsonObject
        {
            ["designator"] = use.Designator,
            ["part"] = use.Part.Id,
            ["value"] = use.Value,
            ["role"] = use.Role,
        })]),
        ["state"] = ReviewWords.State(review),
        ["isChanged"] = review.IsChanged,
        ["fit"] = review.IsFit,
        ["misses"] = new JsonArray([.. review.Misses.Select(miss => (JsonNode)new JsonObject
        {
            ["limit"] = LimitWords.Key(miss.Limit),
            ["sentence"] = miss.Sentence,
        })]),
        ["changes"] = new JsonArray([.. review.Changes.Select(change => (JsonNode)new JsonObject
        {
            ["designators"] = change.Designators,
            ["part"] = change.Part,
            ["kind"] = change.Kind.ToString().ToLowerInvariant(),
            ["key"] = change.Key,
            ["old"] = change.Old,
            ["new"] = change.New,
        })]),
        ["then"] = review.Then.ToJson(),
        ["now"] = review.HasGoneParts ? null : review.Now.ToJson(),
        ["requirement"] = RequirementFile.Write(review.Requirement),
        ["circuitFile"] = review.Candidate is { } candidate
            ? CircuitFile.Write(candidate.Describe(review.Requirement.OutputHz))
            : JsonNode.Parse(review.Entry.Circuit),
    };
}
