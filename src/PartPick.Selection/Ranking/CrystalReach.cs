using System.Runtime.CompilerServices;
using PartPick.Catalog;

namespace PartPick.Selection.Search;

/// <summary>
/// Finds the crystals that may run at a frequency without looking at all of them. Crystals are grouped by how far they can be pulled
/// (antiresonant over series frequency) and ordered by series frequency in each group: one stretch of each group can reach a frequency.
/// </summary>
internal sealed class CrystalReach
{
    // Rounding may move a crystal that lies on the edge; who asks looks at each crystal again.
    private const double Slack = 1e-9;

    private static readonly ConditionalWeakTable<PartsCatalog, CrystalReach> OfCatalogs = [];

    private readonly List<Group> _groups = [];

    /// <param name="count">Number of crystals.</param>
    /// <param name="outlineAt">The outline of each.</param>
    public CrystalReach(int count, Func<int, CrystalOutline> outlineAt)
    {
        var groups = new Dictionary<int, List<Entry>>();
        for (int place = 0; place < count; place++)
        {
            (double series, double highest) = CrystalModel.SpanHz(outlineAt(place));
            int pull = (int)Math.Ceiling(Math.Clamp(Math.Log2(highest / series - 1), -60, 60));
            if (!groups.TryGetValue(pull, out List<Entry>? entries))
            {
                entries = [];
                groups.Add(pull, entries);
            }

            entries.Add(new Entry(series, highest, place));
        }

        foreach (List<Entry> entries in groups.Values)
        {
            double[] series = [.. entries.Select(entry => entry.SeriesHz)];
            Entry[] ordered = [.. entries];
            Array.Sort(series, ordered);
            _groups.Add(new Group(series, ordered, ordered.Max(entry => entry.HighestHz / entry.SeriesHz)));
        }
    }

    /// <summary>Of the crystals of a catalogue; made once for each.</summary>
    public static CrystalReach Of(PartsCatalog catalog) => OfCatalogs.GetValue(
        catalog, parts => new CrystalReach(parts.Crystals.Length, place => CrystalOutline.Of(parts.Crystals[place])));

    /// <summary>The places of all crystals that may reach a frequency, ascending; hardly any other.</summary>
    /// <param name="targetHz">Wanted frequency at the crystal in hertz.</param>
    /// <param name="budgetRatio">Largest frequency error as a ratio.</param>
    public int[] Within(double targetHz, double budgetRatio)
    {
        double highest = targetHz * (1 + budgetRatio) * (1 + Slack);
        double lowest = targetHz * (1 - budgetRatio) * (1 - Math.Sign(1 - budgetRatio) * Slack);
        var places = new List<int>();
        foreach (Group group in _groups)
        {
            for (int i = First(group.SeriesHz, lowest / group.MostPull * (1 - Slack)); i < group.SeriesHz.Length; i++)
            {
                if (group.SeriesHz[i] > highest)
                {
                    break;
                }

                if (group.Entries[i].HighestHz >= lowest)
                {
                    places.Add(group.Entries[i].Place);
                }
            }
        }

        places.Sort();
        return [.. places];
    }

    // The first place whose figure is not below a bound.
    private static int First(double[] ascending, double bound)
    {
        (int low, int high) = (0, ascending.Length);
        while (low < high)
        {
            int middle = (low + high) / 2;
            (low, high) = ascending[middle] < bound ? (middle + 1, high) : (low, middle);
        }

        return low;
    }

    private readonly record struct Entry(double SeriesHz, double HighestHz, int Place);

    private sealed record Group(double[] SeriesHz, Entry[] Entries, double MostPull);
}
