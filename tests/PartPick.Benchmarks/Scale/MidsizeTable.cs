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
        foreach (string name in MidWorld.Names.Where(name => arguments.Length == 0 || arguments.Any(name.Contains)))
        {
            SmallWorld world = MidWorld.Named(name);
            RankingResult best = Ranker.Rank(world.Requirement, world.Catalog);
            var every = new EveryCombination(world.Requirement, world.Catalog);
            output.WriteLine(string.Create(
                CultureInfo.InvariantCulture,
                $"{name}: {best.Combinations:0} combinations, {every.Tried} tried, {every.Fit} fit, {best.Analysed} full analyses by search"));
            equal &= Compare("front", every, every.Front(), [.. best.Front], output);
            equal &= Compare(
                "first 50", every, [.. every.BestOfGroups().Take(50)], [.. best.Candidates.Select(one => one.Id)], output);
        }

        return equal ? 0 : 1;
    }

    private static bool Compare(string what, EveryCombination every, string[] tried, string[] search, TextWriter output)
    {
        bool equal = tried.SequenceEqual(search);
        string verdict = equal ? "equal" : "DIFFERENT";
        output.WriteLine($"  {what}: {tried.Length} of every combination, {search.Length} of the search, {verdict}");
        foreach (string id in tried.Except(search))
        {
            output.WriteLine($"    only of every combination: {Figures(every, id)}");
        }

        foreach (string id in search.Except(tried))
        {
            output.WriteLine($"    only of the search: {Figures(every, id)}");
        }

        output.Flush();
        return equal;
    }

    // With the one that comes nearest to beating it: no less margin, no dearer, and the least error.
    private static string Figures(EveryCombination every, string id)
    {
        if (every.FitOnes.FirstOrDefault(one => one.Id == id) is not { } choice)
        {
            return $"{id} (not fit)";
        }

        TriedChoice? rival = every.FitOnes
            .Where(one => one.Id != id && one.Margin >= choice.Margin && one.Cost <= choice.Cost).MinBy(one => one.ErrorRatio);
        return string.Create(
            CultureInfo.InvariantCulture,
            $"{id} (error {choice.ErrorRatio * 1e6:0.000} ppm, margin {choice.Margin:0.000}, cost {choice.Cost:0.0000}; ")
            + (rival is null ? "none has as much margin for no more)" : string.Create(
                CultureInfo.InvariantCulture, $"{(rival.ErrorRatio - choice.ErrorRatio) * 1e6:+0.000;-0.000} ppm: {rival.Id})"));
    }
}
