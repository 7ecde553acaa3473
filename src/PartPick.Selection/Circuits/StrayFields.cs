using System.Text.Json.Nodes;
using PartPick.Physics.Circuits;
using PartPick.Selection.Files;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>The keys of the stray capacitances in a file.</summary>
internal static class StrayFields
{
    /// <summary>What fits, for a problem.</summary>
    public const string Fits = "an object with input, output and across";

    private static readonly string[] Keys = ["input", "output", "across"];

    /// <summary>Reads the strays; none where the object is absent.</summary>
    public static Strays Read(FieldReader? fields)
    {
        fields?.Allow("the strays", Keys);
        return fields is null ? Strays.None : ReadValues(fields);
    }

    /// <summary>Reads the three values without a look at other keys.</summary>
    public static Strays ReadValues(FieldReader fields) => new(
        fields.Optional("input", Dimension.Capacitance) ?? 0,
        fields.Optional("output", Dimension.Capacitance) ?? 0,
        fields.Optional("across", Dimension.Capacitance) ?? 0);

    /// <summary>Writes plain SI values.</summary>
    public static JsonObject Write(Strays strays) => new JsonObjectOf()
        .Add("input", strays.InputFarads)
        .Add("output", strays.OutputFarads)
        .Add("across", strays.AcrossFarads)
        .Done;
}
