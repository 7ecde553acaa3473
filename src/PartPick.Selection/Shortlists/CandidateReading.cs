using System.Text.Json;
using PartPick.Catalog;
using PartPick.Selection.Files;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>Reads the parts of one candidate as a ranking prints it.</summary>
internal static class CandidateReading
{
    /// <summary>The parts by their roles, or the first problem.</summary>
    public static Result<(CandidateParts Choice, SupportParts Support)> Read(JsonElement candidate, string where, PartsCatalog catalog)
    {
        if (candidate.ValueKind != JsonValueKind.Object)
        {
            return Wrong(where + "candidates", $"holds {JsonText.Kind(candidate)}", "candidates of partpick rank --format json");
        }

        if (TextOf(candidate, "circuit") is not { } word || !CircuitWords.ByWord.TryGetValue(word, out CircuitKind kind))
        {
            return Wrong(where + "circuit", "is missing or unknown", "one of " + string.Join(", ", CircuitWords.ByWord.Keys));
        }

        int tap = 0;
        if (candidate.TryGetProperty("tap", out JsonElement stage)
            && (stage.ValueKind != JsonValueKind.Number || !stage.TryGetInt32(out tap) || tap is < 0 or > 30))
        {
            return Wrong(where + "tap", "is no stage", "a stage from 0 to 30");
        }

        if (!candidate.TryGetProperty("parts", out JsonElement parts) || parts.ValueKind != JsonValueKind.Array)
        {
            return Wrong(where + "parts", "is missing", "the list of parts with their roles, as partpick rank prints it");
        }

        var byPlace = new SortedDictionary<string, string>(StringComparer.Ordinal);
        foreach (JsonElement use in parts.EnumerateArray())
        {
            if (use.ValueKind != JsonValueKind.Object || TextOf(use, "part") is not { } id || TextOf(use, "role") is not { } role
                || PlaceOf(role, TextOf(use, "designator") ?? "") is not { } place || !byPlace.TryAdd(place, id))
            {
                return Wrong(where + "parts", $"holds {Problem.Quote(use.GetRawText())}", "parts as partpick rank prints them");
            }

            if (catalog.Find(id) is null)
            {
                return Wrong(where + "parts", $"{Problem.Quote(id)} is not in the catalogue", "a part of the catalogue it was ranked with");
            }
        }

        foreach (string needed in new[] { "crystal", "amplifier", "c1", "c2" })
        {
            if (!byPlace.ContainsKey(needed))
            {
                return Wrong(where + "parts", $"the place {needed} is missing", "parts as partpick rank prints them");
            }
        }

        var chosen = new ChosenParts(
            kind, tap, System.Collections.Immutable.ImmutableSortedDictionary.CreateRange(StringComparer.Ordinal, byPlace));
        return chosen.In(catalog) is { } found
            ? Result.Ok(found)
            : Wrong(where + "parts", "a part is of another kind than its place asks for", "parts as partpick rank prints them");
    }

    private static string? PlaceOf(string role, string designator) => role switch
    {
        PartRoles.Load when designator is "C1" or "C2" => designator.ToLowerInvariant(),
        PartRoles.Decoupling => "decoupling",
        PartRoles.Coupling => "coupling",
        PartRoles.Damping => "rs",
        PartRoles.Feedback => "rf",
        PartRoles.Base or PartRoles.BaseTop => "rbTop",
        PartRoles.BaseBottom => "rbBottom",
        PartRoles.Emitter => "re",
        PartRoles.Amplifier => "amplifier",
        PartRoles.Crystal => "crystal",
        _ => null,
    };

    private static string? TextOf(JsonElement element, string key) =>
        element.TryGetProperty(key, out JsonElement value) && value.ValueKind == JsonValueKind.String ? value.GetString() : null;

    private static Result<(CandidateParts Choice, SupportParts Support)> Wrong(string where, string what, string fits) =>
        Result.Fail<(CandidateParts, SupportParts)>(where, what, fits);
}
