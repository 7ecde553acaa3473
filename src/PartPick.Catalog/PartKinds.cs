using PartPick.Values;

namespace PartPick.Catalog;

/// <summary>The words for the kinds of parts, as in file names and commands.</summary>
public static class PartKinds
{
    /// <summary>All kinds, in the order of <see cref="PartKind"/>.</summary>
    public static IReadOnlyList<PartKind> All { get; } = Array.AsReadOnly(Enum.GetValues<PartKind>());

    /// <summary>The plural word: crystals, capacitors, resistors, inverters, counters, ports, transistors.</summary>
    /// <param name="kind">The kind.</param>
    /// <returns>The word.</returns>
    public static string Word(this PartKind kind) => kind switch
    {
        PartKind.Crystal => "crystals",
        PartKind.Capacitor => "capacitors",
        PartKind.Resistor => "resistors",
        PartKind.Inverter => "inverters",
        PartKind.Counter => "counters",
        PartKind.Port => "ports",
        PartKind.Transistor => "transistors",
        _ => throw new ArgumentOutOfRangeException(nameof(kind), kind, "Not a kind of part."),
    };

    /// <summary>Finds a kind by its plural word.</summary>
    /// <param name="word">The word.</param>
    /// <param name="where">The field or option, for the problem.</param>
    /// <returns>The kind, or the problem.</returns>
    public static Result<PartKind> Named(string? word, string where = "kind")
    {
        foreach (PartKind kind in All)
        {
            if (kind.Word() == word)
            {
                return Result.Ok(kind);
            }
        }

        return Result.Fail<PartKind>(
            where, $"{Problem.Quote(word)} is no kind of part", "one of " + string.Join(", ", All.Select(kind => kind.Word())));
    }
}
