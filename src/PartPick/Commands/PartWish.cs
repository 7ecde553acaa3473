using System.Collections.Immutable;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Commands;

/// <summary>Finds the parts of a circuit that options name: by designator, by what they are, or by id.</summary>
internal static class PartWish
{
    private static readonly (PartPlace Place, string Word)[] Words =
    [
        (PartPlace.Crystal, "crystal"), (PartPlace.Amplifier, "amplifier"), (PartPlace.Series, "rs"), (PartPlace.Feedback, "rf"),
        (PartPlace.BaseTop, "rbTop"), (PartPlace.BaseBottom, "rbBottom"), (PartPlace.Emitter, "re"), (PartPlace.Decoupling, "decoupling"),
        (PartPlace.Coupling, "coupling"),
    ];

    /// <summary>The lines that are named, in the order of the circuit; all where none is.</summary>
    /// <param name="lines">The lines of the circuit.</param>
    /// <param name="named">What was typed.</param>
    /// <param name="option">The option, for the problem.</param>
    public static ImmutableArray<BoardLine> Find(ImmutableArray<BoardLine> lines, IReadOnlyList<string> named, string option)
    {
        foreach (string name in named)
        {
            if (!lines.Any(line => Is(line, name)))
            {
                IEnumerable<string> words = Words
                    .Where(word => lines.Any(line => line.Places.Contains(word.Place)))
                    .Select(word => word.Word);
                throw new CommandFailure(
                    new Problem(
                        option,
                        $"{Problem.Quote(name)} is no part of the circuit",
                        string.Join(", ", lines.SelectMany(line => line.Designators).Concat(words)) + " or an id"),
                    ExitStatus.WrongInput);
            }
        }

        return named.Count == 0 ? lines : [.. lines.Where(line => named.Any(name => Is(line, name)))];
    }

    private static bool Is(BoardLine line, string name) =>
        line.Designators.Contains(name, StringComparer.OrdinalIgnoreCase)
        || line.Part.Id == name
        || Words.Any(word => word.Word.Equals(name, StringComparison.OrdinalIgnoreCase) && line.Places.Contains(word.Place));
}
