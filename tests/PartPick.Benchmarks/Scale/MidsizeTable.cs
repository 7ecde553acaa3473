using System.Globalization;
using PartPick.Selection;
using PartPick.Selection.Tests.Ranking;

namespace PartPick.Benchmarks;

/// <summary>Compares rankings of some 100 000 combinations with trying every one of them: minutes each, so not among the tests.</summary>
internal static class MidsizeTable
{
    /// <summary>Compares and prints.</summary>
    /// <param name="arguments">Parts of the names of worlds (all).</param>
    /// <param name="output">Where the table goes.</param>
    /// <param name="error">Where mistakes go.</param>
    /// <returns>0 where all are equal; 1 where one differs; 2 for a wrong argument.</returns>
    public static int Print(string[] arguments, TextWriter output, TextWriter error)
    {
        if (arguments.FirstOrDefault(name => !MidWorld.Names.Any(world => world.Contains(name, StringComparison.Ordinal))) is { } unknown)
        {
            error.WriteLine($"{unknown} is none of {string.Join(", ", MidWorld.Names)}");
            return 2;
        }

        bool equal = true;
        foreach (string name in MidWorld.Names.Where(name => arguments.Length == 0 || arguments.Any(part => name.Contains(part, StringComparison.Ordinal))))
        {
            SmallWorld world = MidWorld.Named(name);
            RankingResult best = Ranker.Rank(world.Requirement, world.Catalog);
            var every = new EveryCombination(world.Requirement, world.Catalog);
            output.WriteLine(string.Create(
                CultureInfo.InvariantCulture,
                $"{name}: {best.Combinations:0} combinations, {every.Tried} tried, {every.Fit} fit, {best.Analysed} full analyses by the search"));
            equal &= Compare("front", every.Front(), [.. best.Front], output);
            equal &= Compare("first 50", [.. every.BestOfGroups().Take(50)], [.. best.Candidates.Select(one => one.Id)], output);
        }

        return equal ? 0 : 1;
    }

    private static bool Compare(string what, string[] every, string[] search, TextWriter output)
    {
        bool equal = every.SequenceEqual(search);
        output.WriteLine($"  {what}: {every.Length} of every combination, {search.Length} of the search, {(equal ? "equal" : "DIFFERENT")}");
        foreach (string id in equal ? [] : every.Except(search))
        {
            output.WriteLine($"    only of every combination: {id}");
        }

        foreach (string id in equal ? [] : search.Except(every))
        {
            output.WriteLine($"    only of the search: {id}");
        }

        output.Flush();
        return equal;
    }
}
