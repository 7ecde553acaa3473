using System.Collections.Immutable;

namespace PartPick.Selection;

/// <summary>
/// Finds the pairs of preferred values nearest to a load: CL = (C1 + Cp)(C2 + Cp)/(C1 + C2 + 2 Cp) + Cs,
/// with the stray Cs as one figure and Cp at each pin, where the pins are counted apart.
/// </summary>
public static class LoadCapacitorPairs
{
    private const double SmallestFarads = 1e-12;

    /// <summary>The nearest pairs, best first; the nearest equal pair is always among them.</summary>
    /// <param name="request">What is wanted.</param>
    /// <returns>The pairs; none where the strays alone make the load, or no value of the series fits.</returns>
    public static ImmutableArray<LoadPair> Find(LoadPairRequest request)
    {
        ArgumentNullException.ThrowIfNull(request);
        double needed = request.LoadFarads - request.StrayFarads;
        if (!(needed > 0) || !double.IsFinite(needed))
        {
            return [];
        }

        LoadSide[] sides = Sides(request, needed * 2 * (1 + request.LargestRatio));
        var found = new List<LoadPair>();
        for (int i = 0; i < sides.Length; i++)
        {
            AddPartners(request, sides, i, found);
        }

        LoadPair[] ordered = [.. found.Order(Comparer<LoadPair>.Create(Compare))];
        ImmutableArray<LoadPair> best = [.. ordered.Take(request.Top)];
        return ordered.FirstOrDefault(pair => pair.IsEqual) is { } equal && !best.Contains(equal)
            ? [.. best.Take(Math.Max(0, request.Top - 1)), equal]
            : best;
    }

    // Every sum once, with the fewest capacitors that make it.
    private static LoadSide[] Sides(LoadPairRequest request, double largest)
    {
        IReadOnlyList<double> values = request.Series.ValuesBetween(SmallestFarads, Math.Max(largest, SmallestFarads));
        IEnumerable<LoadSide> all = values.Select(value => new LoadSide([value]));
        if (request.Parallel)
        {
            all = all.Concat(values.SelectMany((first, i) => values.Skip(i).Select(second => new LoadSide([first, second]))));
        }

        var sides = new List<LoadSide>();
        foreach (LoadSide side in all.OrderBy(side => side.Farads).ThenBy(side => side.Parts.Length))
        {
            if (sides.Count == 0 || side.Farads > sides[^1].Farads * (1 + 1e-9))
            {
                sides.Add(side);
            }
            else if (side.Parts.Length < sides[^1].Parts.Length)
            {
                sides[^1] = side;
            }
        }

        return [.. sides];
    }

    // For one side, the partners next to its exact partner; and its equal.
    private static void AddPartners(LoadPairRequest request, LoadSide[] sides, int index, List<LoadPair> found)
    {
        LoadSide own = sides[index];
        double needed = request.LoadFarads - request.StrayFarads;
        double mine = own.Farads + request.PinStrayFarads;
        double exact = mine > needed ? mine * needed / (mine - needed) - request.PinStrayFarads : double.PositiveInfinity;
        int middle = FirstAtLeast(sides, exact);
        int from = Math.Max(index, middle - request.Top);
        int to = Math.Min(sides.Length - 1, middle + request.Top);
        found.Add(Pair(request, own, own));
        for (int i = from; i <= to; i++)
        {
            if (i != index && sides[i].Farads <= own.Farads * request.LargestRatio * (1 + 1e-9))
            {
                found.Add(Pair(request, own, sides[i]));
            }
        }
    }

    private static int FirstAtLeast(LoadSide[] sides, double farads)
    {
        int low = 0;
        int high = sides.Length;
        while (low < high)
        {
            int middle = (low + high) / 2;
            if (sides[middle].Farads < farads)
            {
                low = middle + 1;
            }
            else
            {
                high = middle;
            }
        }

        return low;
    }

    private static LoadPair Pair(LoadPairRequest request, LoadSide c1, LoadSide c2)
    {
        double first = c1.Farads + request.PinStrayFarads;
        double second = c2.Farads + request.PinStrayFarads;
        double load = first * second / (first + second) + request.StrayFarads;
        double? shift = request.Crystal is { } crystal
            ? (crystal.FrequencyAtLoadHz(load) - crystal.NominalHz) / crystal.NominalHz
            : null;
        return new LoadPair(c1, c2, load, (load - request.LoadFarads) / request.LoadFarads, shift);
    }

    // Deviations of one part in a billion are the same: then fewer capacitors, then the more equal pair, then the smaller.
    private static int Compare(LoadPair a, LoadPair b)
    {
        double first = Math.Round(Math.Abs(a.DeviationRatio), 9);
        double second = Math.Round(Math.Abs(b.DeviationRatio), 9);
        int order = first.CompareTo(second);
        order = order != 0 ? order : a.Count.CompareTo(b.Count);
        order = order != 0 ? order : (a.C2.Farads / a.C1.Farads).CompareTo(b.C2.Farads / b.C1.Farads);
        return order != 0 ? order : a.C1.Farads.CompareTo(b.C1.Farads);
    }
}
