using System.Text.Json.Nodes;
using PartPick.Selection;

namespace PartPick.Output;

/// <summary>A ranking as JSON under its fixed keys.</summary>
internal static class RankJson
{
    /// <summary>The document.</summary>
    public static JsonObject Of(RankView view)
    {
        RankingResult result = view.Result;
        double target = result.Requirement.OutputHz;
        var json = new JsonObject
        {
            ["requirement"] = RequirementFile.Write(result.Requirement),
            ["combinations"] = result.Combinations,
            ["fit"] = result.Fit,
            ["candidates"] = new JsonArray([.. view.Result.Candidates.Select(candidate => (JsonNode)Candidate(candidate, target))]),
            ["front"] = new JsonArray([.. result.Front.Select(id => (JsonNode)id)]),
            ["rejections"] = new JsonObject(
                result.Rejections.OrderBy(limit => limit.Key)
                    .Select(limit => KeyValuePair.Create(LimitWords.Key(limit.Key), (JsonNode?)limit.Value))),
            ["elapsed"] = result.ElapsedSeconds,
        };
        if (view.NothingFits)
        {
            json["nearestMisses"] = new JsonArray([.. result.NearestMisses.Select(miss => (JsonNode)Candidate(miss, target))]);
        }

        return json;
    }

    /// <summary>One candidate.</summary>
    internal static JsonObject Candidate(Candidate candidate, double targetHz)
    {
        CandidateParts choice = candidate.Choice;
        CircuitDescription circuit = candidate.Describe(targetHz);
        var json = new JsonObject
        {
            ["id"] = candidate.Id,
            ["circuit"] = choice.Circuit.Word(),
            ["crystal"] = choice.Crystal.Id,
            ["amplifier"] = choice.Amplifier.Id,
            ["tap"] = choice.Tap,
            ["parts"] = new JsonArray([.. candidate.Parts.Select(use => (JsonNode)new JsonObject
            {
                ["designator"] = use.Designator,
                ["part"] = use.Part.Id,
                ["value"] = use.Value,
                ["role"] = use.Role,
            })]),
            ["errorWorst"] = candidate.Budget?.WorstRatio * 1e6,
            ["errorRss"] = candidate.Budget?.RssRatio * 1e6,
            ["startUpMargin"] = Finite(candidate.Margin.Value),
            ["startUpMarginNominal"] = Finite(candidate.Result.StartUp.Margin),
            ["cost"] = candidate.Cost,
            ["currency"] = candidate.Currency,
            ["score"] = Finite(candidate.Score),
            ["onFront"] = candidate.OnFront,
            ["budget"] = candidate.Budget is null ? null : new JsonArray([.. candidate.Budget.Terms.Select(term => (JsonNode)new JsonObject
            {
                ["term"] = term.Term,
                ["ppm"] = term.Ratio * 1e6,
                ["restsOn"] = term.RestsOn,
            })]),
        };
        foreach ((string key, JsonNode? value) in CircuitResults.ToJson(circuit, candidate.Result, candidate.Warnings))
        {
            // The margin of a candidate is that of its worst corner.
            if (!json.ContainsKey(key))
            {
                json[key] = value?.DeepClone();
            }
        }

        json["circuitFile"] = CircuitFile.Write(circuit);
        if (!candidate.IsFit)
        {
            json["misses"] = new JsonArray([.. candidate.Misses.Select(miss => (JsonNode)miss.Sentence)]);
        }

        return json;
    }

    private static JsonValue? Finite(double value) => double.IsFinite(value) ? JsonValue.Create(value) : null;
}
