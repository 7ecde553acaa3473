using System.Text.Json;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Output;

/// <summary>The pictures of a circuit that a file gives by itself.</summary>
internal static class CircuitPicture
{
    /// <summary>Whether a text is a circuit rather than a requirement.</summary>
    /// <param name="text">The text; what is wrong with it is said by who reads it.</param>
    public static bool IsCircuit(string text)
    {
        try
        {
            using JsonDocument document = JsonDocument.Parse(text);
            return document.RootElement.ValueKind == JsonValueKind.Object
                && (document.RootElement.TryGetProperty("circuit", out _) || document.RootElement.TryGetProperty("crystal", out _));
        }
        catch (JsonException)
        {
            return false;
        }
    }

    /// <summary>The SVG file; a problem where the circuit has no such picture.</summary>
    /// <param name="kind">Growth or schematic.</param>
    /// <param name="description">The circuit.</param>
    /// <param name="name">The name of its file.</param>
    /// <param name="cancellation">Ends it.</param>
    public static Result<string> Of(PictureKind kind, CircuitDescription description, string name, CancellationToken cancellation) =>
        kind == PictureKind.Growth
            ? GrowthAfterSwitchOn.Of(description.Circuit, cancellation).Map(chart => ChartSvg.Of(chart, Subtitle(description, name)))
            : Result.Ok(PictureSvg.Circuit(DescribedSchematic.Draw(description), Subtitle(description, name)));

    private static string Subtitle(CircuitDescription description, string name) => $"{description.Kind.Word()}, from {name}";
}
