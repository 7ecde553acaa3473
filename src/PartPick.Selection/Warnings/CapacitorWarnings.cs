using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>Warnings about the load capacitors' dielectric.</summary>
internal static class CapacitorWarnings
{
    public static IEnumerable<string> Of(CircuitDescription description)
    {
        foreach ((string name, CapacitorPart? part) in new[] { ("C1", description.C1), ("C2", description.C2) })
        {
            if (part?.Dielectric is { } dielectric && Class2Change(dielectric) is { } change)
            {
                yield return $"{name} ({part.Id}) is of the class 2 dielectric {dielectric}, whose capacitance changes by {change} "
                    + "over temperature, and with age and voltage too: a load capacitor should be C0G.";
            }
        }
    }

    // EIA-198: the first letter of class 2 is X, Y or Z, the last the change of capacitance.
    private static string? Class2Change(string dielectric)
    {
        if (dielectric.Length != 3 || !"XYZ".Contains(char.ToUpperInvariant(dielectric[0]), StringComparison.Ordinal))
        {
            return null;
        }

        return char.ToUpperInvariant(dielectric[2]) switch
        {
            'P' => "±10 %",
            'R' => "±15 %",
            'S' => "±22 %",
            'T' => "+22/-33 %",
            'U' => "+22/-56 %",
            'V' => "+22/-82 %",
            _ => "10 % or more",
        };
    }
}
