using System.Text.Json.Nodes;

namespace PartPick.Selection;

/// <summary>Writes a requirement with every key; what does not matter is null.</summary>
internal static class RequirementWriter
{
    public static JsonObject Write(Requirement requirement)
    {
        ArgumentNullException.ThrowIfNull(requirement);
        return new JsonObject
        {
            ["name"] = requirement.Name,
            ["output"] = requirement.OutputHz,
            ["waveform"] = RequirementWords.Of(requirement.Waveform),
            ["budget"] = requirement.BudgetRatio,
            ["supply"] = new JsonArray(requirement.SupplyMinVolts, requirement.SupplyMaxVolts),
            ["temperature"] = new JsonArray(requirement.TemperatureMinCelsius, requirement.TemperatureMaxCelsius),
            ["years"] = requirement.Years,
            ["margin"] = requirement.Margin,
            ["allowDisturbance"] = requirement.AllowDisturbance,
            ["startUpTime"] = requirement.StartUpTimeSeconds,
            ["builds"] = requirement.Builds,
            ["costLimit"] = requirement.CostLimit,
            ["board"] = BoardFields.Write(requirement.Board),
            ["capacitorSeries"] = requirement.CapacitorSeries,
            ["resistorSeries"] = requirement.ResistorSeries,
            ["biasSeries"] = requirement.BiasSeries,
            ["circuits"] = new JsonArray([.. requirement.Circuits.Select(circuit => (JsonNode)circuit.Word())]),
            ["weights"] = WeightFields.Write(requirement.Weights),
        };
    }
}
