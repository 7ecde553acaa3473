using System.Globalization;
using System.Security.Cryptography;
using System.Text;
using PartPick.Catalog.Fields;
using PartPick.Values;

namespace PartPick.Catalog.Import;

/// <summary>
/// Fills in what a part cannot be without and a list does not state, and marks it assumed (common practice, from memory): the cut,
/// overtone and series resonance of a crystal, the tolerance of a capacitor or resistor, the one stage of the oscillator of a
/// counter or controller, the
/// gain of a transistor between its limits, a description.
/// </summary>
internal static class RowCompletion
{
    private const double HighestFundamental = 60e6;
    private const int LongestId = 64;

    public static void Complete(PartKind kind, PartDraft draft)
    {
        switch (kind)
        {
            case PartKind.Crystal when draft.Number("frequency") is { } hertz:
                Assume(draft, "cut", hertz < 200e3 ? "fork" : "AT");
                if (hertz <= HighestFundamental)
                {
                    Assume(draft, "overtone", 1);
                }

                // A list that does not state the load may leave it out of a crystal that has one: taken as series, and said.
                if (!draft.Has("load") && !draft.IsSeries)
                {
                    Mark(draft, "load");
                }

                break;
            case PartKind.Capacitor when !draft.Has("tolerance") && !draft.Has("toleranceAbsolute"):
                Assume(draft, "tolerance", draft.Text("dielectric")?.ToUpperInvariant() is "C0G" or "NP0" or "NPO" or "COG" ? 0.05 : 0.2);
                break;
            // The oscillator of a counter or a controller is one stage; one of several is stated with its gain.
            case PartKind.Counter or PartKind.Port when !draft.Has("gain 1") && !draft.Has("ron 1"):
                Assume(draft, "stages", 1);
                break;
            case PartKind.Resistor:
                Assume(draft, "tolerance", 0.05);
                break;
            case PartKind.Transistor when draft.Number("betaMin") is { } least && draft.Number("betaMax") is { } most:
                Assume(draft, "beta", Math.Round(Math.Sqrt(least * most)));
                break;
            case PartKind.Transistor when draft.Number("betaMin") is { } least:
                Assume(draft, "beta", least * 2);
                break;
        }

        if (!draft.Has("description"))
        {
            draft.Set("description", Describe(kind, draft));
        }
    }

    /// <summary>An id from the supplier's number: without spaces, and short.</summary>
    public static string IdOf(string supplierPart)
    {
        string id = !supplierPart.Any(char.IsWhiteSpace)
            ? supplierPart
            : string.Join('-', supplierPart.Split(default(char[]), StringSplitOptions.RemoveEmptyEntries));
        if (id.Length <= LongestId)
        {
            return id;
        }

        return id[..(LongestId - 9)] + "-" + Convert.ToHexString(SHA256.HashData(Encoding.UTF8.GetBytes(id)))[..8];
    }

    private static void Assume(PartDraft draft, string key, string text)
    {
        if (!draft.Has(key))
        {
            draft.Set(key, text);
            Mark(draft, key);
        }
    }

    private static void Assume(PartDraft draft, string key, double number)
    {
        if (!draft.Has(key))
        {
            draft.Set(key, number);
            Mark(draft, key);
        }
    }

    private static void Mark(PartDraft draft, string key)
    {
        string marks = draft.Text("basis") ?? "";
        if (marks.Split(';').Any(mark => mark.StartsWith(key + "=", StringComparison.Ordinal)))
        {
            return;
        }

        draft.Set("basis", $"{marks}{(marks.Length > 0 ? ";" : "")}{key}=assumed");
    }

    private static string Describe(PartKind kind, PartDraft draft)
    {
        string[] pieces =
        [
            .. new[]
            {
                Figure(draft, "frequency", Dimension.Frequency), Figure(draft, "load", Dimension.Capacitance),
                Figure(draft, "value", kind == PartKind.Capacitor ? Dimension.Capacitance : Dimension.Resistance),
                draft.Text("dielectric"), draft.Text("holder") ?? draft.Text("package"),
            }.OfType<string>(),
        ];
        string word = kind.Word()[..^1];
        return pieces.Length > 0 ? $"{word} {string.Join(' ', pieces)}" : word + " " + (draft.Text("supplierPart") ?? draft.Text("id"));
    }

    private static string? Figure(PartDraft draft, string key, Dimension dimension) =>
        draft.Number(key) is { } number ? ValueText.Format(number, dimension, 7).ToString(CultureInfo.InvariantCulture) : null;
}
