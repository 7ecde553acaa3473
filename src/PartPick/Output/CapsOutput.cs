using System.Collections.Immutable;
using System.Text.Json.Nodes;
using PartPick.Commands;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Output;

/// <summary>Prints load capacitor pairs.</summary>
internal static class CapsOutput
{
    /// <summary>Prints them in the chosen format.</summary>
    public static void Write(TextWriter output, OutputFormat format, LoadPairRequest request, ImmutableArray<LoadPair> pairs)
    {
        switch (format)
        {
            case OutputFormat.Json:
                JsonOutput.Write(output, ToJson(request, pairs));
                break;
            case OutputFormat.Csv:
                CsvOutput.Write(output, ["c1 (F)", "c2 (F)", "load (F)", "deviation (%)", "error (ppm)"], pairs.Select(pair => new[]
                {
                    string.Join('+', pair.C1.Parts.Select(part => Figures.Exact(part))),
                    string.Join('+', pair.C2.Parts.Select(part => Figures.Exact(part))),
                    Figures.Exact(pair.LoadFarads),
                    Figures.Exact(pair.DeviationRatio * 100),
                    Figures.Exact(pair.ShiftRatio * 1e6),
                }));
                break;
            default:
                WriteTable(output, request, pairs);
                break;
        }
    }

    private static JsonObject ToJson(LoadPairRequest request, ImmutableArray<LoadPair> pairs) => new()
    {
        ["load"] = request.LoadFarads,
        ["stray"] = request.StrayFarads,
        ["pinStray"] = request.PinStrayFarads,
        ["series"] = request.Series.Name,
        ["exact"] = request.ExactFarads,
        ["pairs"] = new JsonArray([.. pairs.Select(pair => (JsonNode)new JsonObject
        {
            ["c1"] = pair.C1.Farads,
            ["c2"] = pair.C2.Farads,
            ["c1Parts"] = new JsonArray([.. pair.C1.Parts.Select(part => (JsonNode)part)]),
            ["c2Parts"] = new JsonArray([.. pair.C2.Parts.Select(part => (JsonNode)part)]),
            ["load"] = pair.LoadFarads,
            ["deviation"] = pair.DeviationRatio,
            ["error"] = pair.ShiftRatio * 1e6,
        })]),
    };

    private static void WriteTable(TextWriter output, LoadPairRequest request, ImmutableArray<LoadPair> pairs)
    {
        string pins = request.PinStrayFarads > 0 ? $" and {Farads(request.PinStrayFarads)} at each pin" : "";
        output.WriteLine($"A load of {Farads(request.LoadFarads)} with a stray of {Farads(request.StrayFarads)}{pins} "
            + $"asks for two capacitors of {Farads(request.ExactFarads)}. "
            + $"Nearest of {request.Series.Name}, either way round:");
        output.WriteLine();
        bool shift = request.Crystal is not null;
        TextColumn[] columns =
        [
            new("C1 (pF)", true), new("C2 (pF)", true), new("load (pF)", true), new("deviation (%)", true),
            .. shift ? [new TextColumn("frequency (ppm)", true)] : Array.Empty<TextColumn>(),
        ];
        TextTable.Write(output, columns, [.. pairs.Select(pair => (string[])
        [
            Side(pair.C1), Side(pair.C2), Figures.Fixed(pair.LoadFarads, 1e-12, 3), Figures.Fixed(pair.DeviationRatio, 0.01, 2),
            .. shift ? [Figures.Fixed(pair.ShiftRatio, 1e-6, 2)] : Array.Empty<string>(),
        ])]);
    }

    private static string Side(LoadSide side) => string.Join(" + ", side.Parts.Select(part => Figures.Short(part, 1e-12)));

    private static string Farads(double value) => ValueText.Format(value, Dimension.Capacitance, 4);
}
