using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection.Search;

/// <summary>What a search needs to know of crystals whatever the amplifier, worked out once for each.</summary>
internal sealed class CrystalDesk(Requirement requirement, PartsCatalog catalog, Market market)
{
    private readonly CrystalReach _reach = CrystalReach.Of(catalog);
    private readonly Dictionary<double, ImmutableArray<Entry>> _reaching = [];
    private readonly Dictionary<int, Entry?> _entries = [];
    private readonly Dictionary<(CircuitKind, double), SupportParts> _support = [];

    /// <summary>Crystals that are for sale and reach a frequency within the budget, by id.</summary>
    public ImmutableArray<Entry> Reaching(double targetHz)
    {
        if (!_reaching.TryGetValue(targetHz, out ImmutableArray<Entry> found))
        {
            found =
            [
                .. _reach.Within(targetHz, requirement.BudgetRatio).Select(EntryAt).OfType<Entry>()
                    .Where(entry => Specification.ReachesFrequency(entry.Model, targetHz, requirement.BudgetRatio)),
            ];
            _reaching.Add(targetHz, found);
        }

        return found;
    }

    /// <summary>The support parts of a circuit with a crystal.</summary>
    public SupportParts Support(CircuitKind kind, CrystalPart crystal)
    {
        (CircuitKind, double) key = (kind, SupportParts.UsualFeedbackOhms(crystal.FrequencyHz));
        if (!_support.TryGetValue(key, out SupportParts? support))
        {
            support = SupportParts.For(kind, crystal.FrequencyHz, market);
            _support.Add(key, support);
        }

        return support;
    }

    private Entry? EntryAt(int place)
    {
        if (!_entries.TryGetValue(place, out Entry? entry))
        {
            CrystalPart crystal = catalog.Crystals[place];
            entry = crystal.Overtone == 1 && market.IsListed(crystal) ? new Entry(place, crystal, requirement) : null;
            _entries.Add(place, entry);
        }

        return entry;
    }

    /// <summary>A crystal.</summary>
    internal sealed class Entry(int place, CrystalPart part, Requirement requirement)
    {
        private ImmutableArray<BudgetTerm> _terms;

        /// <summary>Its place in the catalogue.</summary>
        public int Place => place;

        /// <summary>The part.</summary>
        public CrystalPart Part => part;

        /// <summary>Its model.</summary>
        public CrystalModel Model { get; } = CrystalModel.From(part);

        /// <summary>Spreads of the crystal alone.</summary>
        public ImmutableArray<BudgetTerm> Terms
        {
            get
            {
                if (_terms.IsDefault)
                {
                    _terms = CrystalSpread.Of(part, requirement);
                }

                return _terms;
            }
        }
    }
}
