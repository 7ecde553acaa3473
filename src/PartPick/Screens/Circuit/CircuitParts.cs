using PartPick.Catalog;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>Finds the parts of a candidate in their places, with the designators of its list of parts.</summary>
public sealed class CircuitParts
{
    private readonly List<PartUse> _left;

    /// <summary>Looks the parts up.</summary>
    /// <param name="candidate">The candidate.</param>
    public CircuitParts(Candidate candidate)
    {
        ArgumentNullException.ThrowIfNull(candidate);
        CandidateParts choice = candidate.Choice;
        _left = [.. candidate.Parts];
        Crystal = Take(choice.Crystal)!;
        Amplifier = Take(choice.Amplifier)!;
        C1 = Take(choice.C1)!;
        C2 = Take(choice.C2)!;
        Series = Take(choice.Series);
        BaseTop = Take(choice.BaseTop);
        BaseBottom = Take(choice.BaseBottom);
        Emitter = Take(choice.Emitter);
        Feedback = _left.Find(use => use.Part is ResistorPart && use.Role.Contains("feedback", StringComparison.OrdinalIgnoreCase));
        Coupling = _left.Find(use => use.Part is CapacitorPart && use.Role.Contains("coupling", StringComparison.OrdinalIgnoreCase)
            && !use.Role.Contains("decoupling", StringComparison.OrdinalIgnoreCase));
    }

    /// <summary>The crystal.</summary>
    public PartUse Crystal { get; }

    /// <summary>Inverter, counter, port or transistor.</summary>
    public PartUse Amplifier { get; }

    /// <summary>Load capacitor C1.</summary>
    public PartUse C1 { get; }

    /// <summary>Load capacitor C2.</summary>
    public PartUse C2 { get; }

    /// <summary>Damping resistor; null where there is none.</summary>
    public PartUse? Series { get; }

    /// <summary>Feedback resistor; null where there is none on the board.</summary>
    public PartUse? Feedback { get; }

    /// <summary>Upper bias resistor; null where there is none.</summary>
    public PartUse? BaseTop { get; }

    /// <summary>Lower bias resistor; null where there is none.</summary>
    public PartUse? BaseBottom { get; }

    /// <summary>Emitter resistor; null where there is none.</summary>
    public PartUse? Emitter { get; }

    /// <summary>Output coupling capacitor; null where there is none.</summary>
    public PartUse? Coupling { get; }

    /// <summary>Designator and value: "C1 27 pF".</summary>
    /// <param name="use">The part in its place.</param>
    public static string Label(PartUse use)
    {
        ArgumentNullException.ThrowIfNull(use);
        return use.Value.Length == 0 ? use.Designator : use.Designator + " " + use.Value;
    }

    // Parts of one id can stand in two places: each place is taken once, in the order of the designators.
    private PartUse? Take(Part? part)
    {
        if (part is null)
        {
            return null;
        }

        int at = _left.FindIndex(use => use.Part.Id == part.Id);
        if (at < 0)
        {
            return new PartUse("", "", part, "");
        }

        PartUse found = _left[at];
        _left.RemoveAt(at);
        return found;
    }
}
