using System.Text.Json.Nodes;
using PartPick.Selection;

namespace PartPick.Output;

/// <summary>Why a part is not in a ranked list, as JSON.</summary>
internal static class WhyNotJson
{
    /// <summary>The document.</summary>
    public static JsonObject Of(WhyNotAnswer answer) => new()
    {
        ["requirement"] = RequirementFile.Write(answer.Requirement),
        ["part"] = answer.Part.Id,
        ["fits"] = answer.Fits,
        ["verdict"] = WhyNotWords.Verdict(answer),
        ["hurdles"] = new JsonArray([.. answer.Hurdles.Select(hurdle => (JsonNode)new JsonObject
        {
            ["what"] = WhyNotWords.Of(hurdle.Name),
            ["wanted"] = hurdle.Wanted,
            ["has"] = hurdle.Has,
            ["distance"] = hurdle.Distance,
            ["canBeLifted"] = hurdle.CanBeLifted,
        })]),
        ["limits"] = new JsonArray([.. answer.Limits.Select(limit => (JsonNode)new JsonObject
        {
            ["limit"] = LimitWords.Key(limit.Limit),
            ["wanted"] = limit.Wanted,
            ["reached"] = limit.Reached,
            ["distance"] = limit.Distance,
            ["at"] = limit.At,
            ["broken"] = limit.IsBroken,
        })]),
        ["candidate"] = answer.Candidate is { } candidate ? RankJson.Candidate(candidate, answer.Requirement.OutputHz) : null,
        ["changes"] = new JsonArray([.. answer.Changes.Select(set => (JsonNode)new JsonObject
        {
            ["ofRequirement"] = set.IsOfRequirement,
            ["changes"] = new JsonArray([.. set.Changes.Select(Change)]),
            ["candidate"] = set.Candidate.Id,
        })]),
        ["place"] = Place(answer.Place),
        ["placeThen"] = Place(answer.PlaceThen),
        ["rejections"] = new JsonObject(answer.Rejections.OrderBy(limit => limit.Key)
            .Select(limit => KeyValuePair.Create(LimitWords.Key(limit.Key), (JsonNode?)limit.Value))),
    };

    private static JsonNode Change(NeededChange change) => new JsonObject
    {
        ["key"] = change.Key?.Name,
        ["what"] = change.What,
        ["was"] = change.Was,
        ["becomes"] = change.Becomes,
    };

    private static JsonObject? Place(ListPlace? place) => place is null ? null : new JsonObject
    {
        ["number"] = place.Number,
        ["listed"] = place.Listed,
        ["first"] = place.First.Id,
        ["above"] = place.Above?.Id,
    };
}
