using System.Collections.Immutable;
using System.Text.Json.Nodes;
using PartPick.Commands;
using PartPick.Physics;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Output;

/// <summary>Prints the check of one circuit.</summary>
internal static class CheckOutput
{
    /// <summary>Prints it in the chosen format.</summary>
    public static void Write(
        TextWriter output, OutputFormat format, CircuitDescription description, OscillatorResult result, bool working)
    {
        ImmutableArray<string> warnings = CircuitWarnings.Of(description, result);
        JsonObject json = CircuitResults.ToJson(description, result, warnings);
        ImmutableArray<WorkingStep> steps = working ? CircuitWorking.Of(description, result) : [];
        switch (format)
        {
            case OutputFormat.Json:
                if (working)
                {
                    json["working"] = new JsonArray([.. steps.Select(WorkingOutput.ToJson)]);
                }

                JsonOutput.Write(output, json);
                break;
            case OutputFormat.Csv when working:
                WorkingOutput.WriteCsv(output, steps);
                break;
            case OutputFormat.Csv:
                WriteCsv(output, CircuitFigures.Of(description, result), json);
                break;
            default:
                WriteTable(output, description, result, warnings);
                WorkingOutput.Write(output, steps);
                break;
        }
    }

    private static void WriteTable(
        TextWriter output, CircuitDescription description, OscillatorResult result, ImmutableArray<string> warnings)
    {
        output.WriteLine($"A {description.Kind.Word()} circuit with a crystal of "
            + $"{ValueText.Format(description.Circuit.Crystal.NominalHz, Dimension.Frequency, 9)} at "
            + $"{ValueText.Format(description.Circuit.SupplyVolts, Dimension.Voltage)} and "
            + $"{ValueText.Format(description.Circuit.TemperatureCelsius, Dimension.Temperature)}: "
            + $"it {CircuitFigures.Start(result.Start)}.");
        output.WriteLine();
        TextTable.Write(
            output,
            [new("Figure"), new("Value")],
            [.. CircuitFigures.Of(description, result).Select(figure => new[] { figure.Label, figure.Text })]);
        WriteWarnings(output, warnings);
    }

    private static void WriteWarnings(TextWriter output, ImmutableArray<string> warnings)
    {
        if (warnings.IsEmpty)
        {
            return;
        }

        output.WriteLine();
        output.WriteLine("Warnings:");
        foreach (string warning in warnings)
        {
            output.WriteLine("- " + warning);
        }
    }

    private static void WriteCsv(TextWriter output, IReadOnlyList<CircuitFigure> figures, JsonObject json) => CsvOutput.Write(
        output,
        [.. figures.Select(figure => figure.Unit.Length == 0 ? figure.Key : $"{figure.Key} ({figure.Unit})"), "warnings"],
        [[.. figures.Select(figure => json[figure.Key]?.ToString() ?? ""), string.Join(" | ", json["warnings"]!.AsArray())]]);
}
