using System.Collections.Immutable;
using System.Globalization;
using System.Text.Json;
using PartPick.Catalog;
using PartPick.Selection.Files;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>
/// Reads what is put on a list: the answer of a ranking with the number or id of one of its candidates, one such candidate, or a
/// circuit file.
/// </summary>
public static class ShortlistFile
{
    private const string Fits = "the answer of partpick rank --format json, one of its candidates, or a circuit";

    /// <summary>Reads a file.</summary>
    /// <param name="json">The text of the file.</param>
    /// <param name="fileName">The name of the file, for problems.</param>
    /// <param name="catalog">Where the parts are looked up.</param>
    /// <param name="which">Number (from 1) or id of the candidate of an answer; null for the first.</param>
    /// <param name="wanted">What is wanted; null for what the file says.</param>
    /// <returns>The choice, or the first problem.</returns>
    public static Result<ShortlistSource> Read(
        string json, string fileName, PartsCatalog catalog, string? which = null, Requirement? wanted = null)
    {
        ArgumentNullException.ThrowIfNull(json);
        ArgumentNullException.ThrowIfNull(catalog);
        Result<JsonElement> opened = JsonText.Open(json, fileName, Fits);
        if (!opened.IsOk)
        {
            return Result.Fail<ShortlistSource>(opened.Problem);
        }

        JsonElement root = opened.Value;
        if (root.TryGetProperty("candidates", out JsonElement candidates))
        {
            return FromAnswer(root, candidates, fileName, catalog, which, wanted);
        }

        if (which is not null)
        {
            return Result.Fail<ShortlistSource>("--candidate", $"{fileName} holds one circuit, not a ranking", "no --candidate");
        }

        return root.TryGetProperty("circuitFile", out JsonElement circuit)
            ? Described(circuit, fileName + ": circuitFile", catalog).Then(description =>
            {
                Requirement requirement = wanted ?? RequirementOf(description);
                return CandidateReading.Read(root, fileName + ": ", catalog).Map(parts => new ShortlistSource(
                    parts.Choice, parts.Support, requirement, wanted is null ? [Derived(requirement)] : []));
            })
            : FromCircuit(json, fileName, catalog, wanted);
    }

    private static Result<ShortlistSource> FromAnswer(
        JsonElement root, JsonElement candidates, string fileName, PartsCatalog catalog, string? which, Requirement? wanted)
    {
        Result<Requirement> requirement = wanted is not null ? Result.Ok(wanted)
            : root.TryGetProperty("requirement", out JsonElement given)
                ? RequirementFile.Read(given.GetRawText(), fileName + ": requirement")
                : Result.Fail<Requirement>(fileName + ": requirement", "is missing", Fits);
        if (!requirement.IsOk)
        {
            return Result.Fail<ShortlistSource>(requirement.Problem);
        }

        JsonElement[] all = candidates.ValueKind == JsonValueKind.Array ? [.. candidates.EnumerateArray()] : [];
        bool misses = all.Length == 0;
        if (misses && root.TryGetProperty("nearestMisses", out JsonElement near) && near.ValueKind == JsonValueKind.Array)
        {
            all = [.. near.EnumerateArray()];
        }

        if (all.Length == 0)
        {
            return Result.Fail<ShortlistSource>(fileName + ": candidates", "holds none", "a ranking that found one");
        }

        JsonElement? found = Pick(all, which ?? "1");
        return found is not { } candidate
            ? Result.Fail<ShortlistSource>(
                "--candidate", $"{Problem.Quote(which)} is none of its candidates",
                string.Create(CultureInfo.InvariantCulture, $"a number from 1 to {all.Length}, or an id"))
            : CandidateReading.Read(candidate, fileName + ": ", catalog).Map(parts => new ShortlistSource(
                parts.Choice, parts.Support, requirement.Value, misses ? ["Nothing fits; this is one of the nearest misses."] : []));
    }

    private static JsonElement? Pick(JsonElement[] all, string which)
    {
        if (int.TryParse(which, NumberStyles.None, CultureInfo.InvariantCulture, out int number))
        {
            return number >= 1 && number <= all.Length ? all[number - 1] : null;
        }

        JsonElement[] named =
        [
            .. all.Where(one => one.ValueKind == JsonValueKind.Object && one.TryGetProperty("id", out JsonElement id)
                && id.ValueKind == JsonValueKind.String && id.GetString() == which),
        ];
        return named.Length > 0 ? named[0] : null;
    }

    private static Result<ShortlistSource> FromCircuit(string json, string fileName, PartsCatalog catalog, Requirement? wanted) =>
        CircuitFile.Read(json, fileName, catalog).Then(description =>
        {
            Requirement requirement = wanted ?? RequirementOf(description);
            var remarks = ImmutableArray.CreateBuilder<string>();
            if (wanted is null)
            {
                remarks.Add(Derived(requirement));
            }

            return PartsFinder.Find(description, fileName + ": ", catalog, new Market(catalog, requirement.Builds), remarks)
                .Map(parts => new ShortlistSource(parts.Choice, parts.Support, requirement, remarks.ToImmutable()));
        });

    private static Result<CircuitDescription> Described(JsonElement circuit, string where, PartsCatalog catalog) =>
        CircuitFile.Read(circuit.GetRawText(), where, catalog);

    // A circuit alone says what it gives and on which board and supply; the rest is as usual.
    private static Requirement RequirementOf(CircuitDescription description) => new()
    {
        OutputHz = description.TargetHz ?? description.Circuit.Crystal.NominalHz / Math.Pow(2, description.Tap),
        SupplyMinVolts = description.Circuit.SupplyVolts,
        SupplyMaxVolts = description.Circuit.SupplyVolts,
        Board = new Board("own", description.Circuit.Strays, Board.TwoLayer.UncertaintyRatio),
        Circuits = [description.Kind],
    };

    private static string Derived(Requirement requirement) =>
        $"No requirement is given: {Say.Hertz(requirement.OutputHz)} within {requirement.BudgetRatio * 1e6:0} ppm at "
        + $"{Say.Volts(requirement.SupplyMinVolts)} is taken; --requirement FILE says more.";
}
