using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>What may be bought in the place of the parts of several circuits: a replacement has to keep every one of them fit.</summary>
public static class ListAlternates
{
    /// <summary>The replacements of each part, by its id; the one that changes least, in the circuit that it changes most, first.</summary>
    /// <param name="circuits">The circuits with what is needed of each.</param>
    /// <param name="catalog">The parts.</param>
    /// <param name="most">Most replacements of a part, one or more.</param>
    /// <param name="options">Which replacements are wanted; null for all.</param>
    /// <param name="cancellation">Ends the search at once with <see cref="OperationCanceledException"/>.</param>
    public static ImmutableDictionary<string, ImmutableArray<string>> Of(
        IReadOnlyList<(ChosenCircuit Chosen, Requirement Requirement)> circuits,
        PartsCatalog catalog,
        int most = 3,
        AlternatesOptions? options = null,
        CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(circuits);
        LineAlternates[] lines =
        [
            .. from circuit in circuits
               let alternates = new Alternates(circuit.Chosen, circuit.Requirement, catalog, options)
               from line in BoardLine.Of(circuit.Chosen.Board)
               select alternates.Find(line, cancellation),
        ];
        return lines.GroupBy(line => line.Line.Part.Id, StringComparer.Ordinal).ToImmutableDictionary(
            group => group.Key,
            group => Common([.. group], most),
            StringComparer.Ordinal);
    }

    private static ImmutableArray<string> Common(LineAlternates[] lines, int most) =>
    [
        .. lines.SelectMany(line => line.Replacements)
            .GroupBy(one => one.Part.Id, StringComparer.Ordinal)
            .Where(part => part.Count() == lines.Length)
            .OrderBy(part => part.Max(one => one.Change.Size))
            .ThenBy(part => part.Max(one => one.Change.Cost))
            .ThenBy(part => part.Key, StringComparer.Ordinal)
            .Select(part => part.Key)
            .Take(most),
    ];
}
