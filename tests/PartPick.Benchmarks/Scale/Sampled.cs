using System.Diagnostics;
using PartPick.Catalog;
using PartPick.Selection;
using PartPick.Selection.Search;

namespace PartPick.Benchmarks;

/// <summary>Trying every combination, timed on combinations drawn evenly from a space and scaled by their count.</summary>
/// <param name="Drawn">Number of combinations timed.</param>
/// <param name="Admitted">Combinations that the limits leave before any circuit is looked at; the others count as free of cost.</param>
/// <param name="FullSeconds">Seconds to analyse every admitted one in full from nothing, on all cores.</param>
/// <param name="MarginFirstSeconds">Seconds where those without the wanted margin are given up before their steady state.</param>
internal sealed record Sampled(int Drawn, double Admitted, double FullSeconds, double MarginFirstSeconds)
{
    private const int Seed = 5;

    /// <summary>Draws and times.</summary>
    /// <param name="requirement">What is needed.</param>
    /// <param name="catalog">The parts.</param>
    /// <param name="count">Number of combinations to draw.</param>
    public static Sampled Of(Requirement requirement, PartsCatalog catalog, int count)
    {
        var space = new SearchSpace(requirement, catalog, every: true);
        var builder = new CandidateBuilder(requirement, space.Market);
        var sizes = space.Families.Select(family => (double)family.Options.Length * family.Members.Length).ToArray();
        double groups = sizes.Sum();
        if (groups == 0)
        {
            return new Sampled(0, 0, 0, 0);
        }

        CapacitorPart[] capacitors = [.. space.Capacitors.SelectMany(value => value.Contenders).Select(one => one.Part)];
        var random = new Random(Seed);
        (CandidateParts Choice, SupportParts Support)[] drawn =
            [.. Enumerable.Range(0, count).Select(_ => Draw(space, sizes, groups, capacitors, random))];

        // Once before, so that nothing is compiled while it is timed.
        drawn.Take(count / 10 + 1).AsParallel().ForAll(one => builder.Build(one.Choice, one.Support));
        double full = Seconds(() => drawn.AsParallel().ForAll(one => builder.Build(one.Choice, one.Support)));
        double first = Seconds(() => drawn.AsParallel().ForAll(one =>
        {
            if (builder.StartsWithMargin(one.Choice, one.Support) == true)
            {
                builder.Build(one.Choice, one.Support);
            }
        }));
        double admitted = groups * space.CapacitorPairs;
        return new Sampled(count, admitted, full / count * admitted, first / count * admitted);
    }

    private static (CandidateParts Choice, SupportParts Support) Draw(
        SearchSpace space, double[] sizes, double groups, CapacitorPart[] capacitors, Random random)
    {
        double place = random.NextDouble() * groups;
        int at = 0;
        while (at < sizes.Length - 1 && place >= sizes[at])
        {
            place -= sizes[at++];
        }

        CircuitFamily family = space.Families[at];
        CandidateParts choice = SearchRun.Choice(
            family,
            family.Members[random.Next(family.Members.Length)],
            random.Next(family.Options.Length),
            capacitors[random.Next(capacitors.Length)],
            capacitors[random.Next(capacitors.Length)]);
        return (choice, family.Support);
    }

    private static double Seconds(Action work)
    {
        long start = Stopwatch.GetTimestamp();
        work();
        return Stopwatch.GetElapsedTime(start).TotalSeconds;
    }
}
