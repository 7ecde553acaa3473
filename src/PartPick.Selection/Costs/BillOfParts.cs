using System.Collections.Immutable;
using System.Globalization;
using PartPick.Catalog;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>Every part of a candidate with its designator, and what they cost together.</summary>
public static class BillOfParts
{
    /// <summary>The parts in the order of their designators.</summary>
    public static ImmutableArray<PartUse> List(CandidateParts choice, SupportParts support)
    {
        ArgumentNullException.ThrowIfNull(choice);
        ArgumentNullException.ThrowIfNull(support);
        var uses = new List<PartUse>
        {
            Capacitor("C1", PartRoles.Load, choice.C1),
            Capacitor("C2", PartRoles.Load, choice.C2),
        };
        int capacitor = 2;
        if (support.Decoupling is { } decoupling)
        {
            uses.Add(Capacitor($"C{++capacitor}", PartRoles.Decoupling, decoupling));
        }

        if (support.Coupling is { } coupling)
        {
            uses.Add(Capacitor($"C{++capacitor}", PartRoles.Coupling, coupling));
        }

        int resistor = 0;
        Add(choice.Series, PartRoles.Damping);
        Add(support.Feedback, PartRoles.Feedback);
        Add(choice.BaseTop, choice.BaseBottom is null ? PartRoles.Base : PartRoles.BaseTop);
        Add(choice.BaseBottom, PartRoles.BaseBottom);
        Add(choice.Emitter, PartRoles.Emitter);
        uses.Add(choice.Amplifier is TransistorPart
            ? new PartUse("Q1", PartRoles.Amplifier, choice.Amplifier, "")
            : new PartUse("U1", PartRoles.Amplifier, choice.Amplifier, choice.Tap > 0 ? Stage(choice.Tap) : ""));
        string frequency = ValueText.FormatExact(choice.Crystal.FrequencyHz, Dimension.Frequency);
        uses.Add(new PartUse("Y1", PartRoles.Crystal, choice.Crystal, frequency));
        return [.. uses];

        void Add(ResistorPart? part, string role)
        {
            if (part is not null)
            {
                string designator = string.Create(CultureInfo.InvariantCulture, $"R{++resistor}");
                uses.Add(new PartUse(designator, role, part, ValueText.FormatExact(part.ValueOhms, Dimension.Resistance)));
            }
        }
    }

    /// <summary>Cost per unit; equal parts are bought together.</summary>
    public static decimal UnitCost(CandidateParts choice, SupportParts support, Market market)
    {
        ArgumentNullException.ThrowIfNull(market);
        decimal sum = 0;
        foreach ((Part part, int count) in Counts(choice, support))
        {
            sum += market.UnitCost(part, count);
        }

        return sum;
    }

    /// <summary>The first part whose stock does not cover the build; null where all do.</summary>
    public static Part? FirstShortage(CandidateParts choice, SupportParts support, Market market)
    {
        ArgumentNullException.ThrowIfNull(market);
        foreach ((Part part, int count) in Counts(choice, support))
        {
            if (!market.Covers(part, count))
            {
                return part;
            }
        }

        return null;
    }

    /// <summary>Every part that is bought, with the number on one board.</summary>
    internal static List<(Part Part, int Count)> Counts(CandidateParts choice, SupportParts support)
    {
        var counts = new List<(Part Part, int Count)>(10);
        Count(choice.Crystal);
        Count(choice.Amplifier);
        Count(choice.C1);
        Count(choice.C2);
        Count(choice.Series);
        Count(choice.BaseTop);
        Count(choice.BaseBottom);
        Count(choice.Emitter);
        Count(support.Feedback);
        Count(support.Decoupling);
        Count(support.Coupling);
        return counts;

        void Count(Part? part)
        {
            if (part is null)
            {
                return;
            }

            int place = counts.FindIndex(entry => ReferenceEquals(entry.Part, part));
            if (place < 0)
            {
                counts.Add((part, 1));
            }
            else
            {
                counts[place] = (part, counts[place].Count + 1);
            }
        }
    }

    private static PartUse Capacitor(string designator, string role, CapacitorPart part) =>
        new(designator, role, part, ValueText.FormatExact(part.ValueFarads, Dimension.Capacitance));

    private static string Stage(int tap) => string.Create(CultureInfo.InvariantCulture, $"output at stage {tap}");
}
