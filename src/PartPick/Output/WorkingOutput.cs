using System.Collections.Immutable;
using System.Text.Json.Nodes;
using PartPick.Selection;

namespace PartPick.Output;

/// <summary>Prints the working of a check: every formula with its numbers and its source.</summary>
internal static class WorkingOutput
{
    /// <summary>Prints the steps under their headings.</summary>
    public static void Write(TextWriter output, ImmutableArray<WorkingStep> steps)
    {
        string section = "";
        foreach (WorkingStep step in steps)
        {
            if (step.Section != section)
            {
                section = step.Section;
                output.WriteLine();
                output.WriteLine(section);
            }

            output.WriteLine($"  {step.Quantity}: {step.Formula}");
            if (step.Numbers.Length > 0)
            {
                bool equation = step.Numbers.Contains('=', StringComparison.Ordinal);
                output.WriteLine($"    {(equation ? "with" : "=")} {step.Numbers}");
            }

            output.WriteLine($"    = {step.Value}" + (step.Source.Length == 0 ? "" : $"   [{step.Source}]"));
        }
    }

    /// <summary>Prints the steps as rows.</summary>
    public static void WriteCsv(TextWriter output, ImmutableArray<WorkingStep> steps) => CsvOutput.Write(
        output,
        ["section", "quantity", "formula", "numbers", "value (with unit)", "source"],
        steps.Select(step => new[] { step.Section, step.Quantity, step.Formula, step.Numbers, step.Value, step.Source }));

    /// <summary>A step as an object.</summary>
    public static JsonNode ToJson(WorkingStep step) => new JsonObject
    {
        ["section"] = step.Section,
        ["quantity"] = step.Quantity,
        ["formula"] = step.Formula,
        ["numbers"] = step.Numbers,
        ["value"] = step.Value,
        ["source"] = step.Source,
    };
}
