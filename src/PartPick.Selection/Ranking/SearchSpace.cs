using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection.Search;

/// <summary>Everything that a search may combine, and what its limits removed before any circuit was looked at.</summary>
internal sealed class SearchSpace
{
    private readonly Dictionary<Limit, double> _rejections = [];
    private readonly AmplifierOptions _options;
    private readonly SearchScope _scope;
    private readonly CrystalDesk _crystals;
    private readonly CancellationToken _cancellation;

    /// <param name="requirement">What is needed.</param>
    /// <param name="catalog">All parts.</param>
    /// <param name="every">Whether every load capacitor is tried, also those that another one beats whatever the circuit.</param>
    public SearchSpace(Requirement requirement, PartsCatalog catalog, bool every)
        : this(requirement, new WholeCatalog(catalog), every, CancellationToken.None)
    {
    }

    /// <param name="requirement">What is needed.</param>
    /// <param name="source">Where the parts come from.</param>
    /// <param name="every">Whether every load capacitor is tried, also those that another one beats whatever the circuit.</param>
    /// <param name="cancellation">Ends it.</param>
    public SearchSpace(Requirement requirement, IPartsSource source, bool every, CancellationToken cancellation)
    {
        PartsCatalog catalog = source.PartsFor(requirement, cancellation);
        Requirement = requirement;
        Source = source;
        _cancellation = cancellation;
        Market = new Market(catalog, requirement.Builds);
        _scope = new SearchScope(requirement, catalog);
        _crystals = new CrystalDesk(requirement, catalog, Market);
        Capacitors = CapacitorChoice.Of(requirement, Market, every);
        _options = new AmplifierOptions(requirement, Market);
        Families = [.. _scope.Kinds.SelectMany(FamiliesOf)];
    }

    /// <summary>What is needed.</summary>
    public Requirement Requirement { get; }

    /// <summary>Where the parts come from.</summary>
    public IPartsSource Source { get; }

    /// <summary>What can be bought.</summary>
    public Market Market { get; }

    /// <summary>Load capacitors by value.</summary>
    public ImmutableArray<CapacitorValue> Capacitors { get; }

    /// <summary>What is left to look into.</summary>
    public ImmutableArray<CircuitFamily> Families { get; }

    /// <summary>Number of combinations of the whole space.</summary>
    public double Combinations { get; private set; }

    /// <summary>Combinations removed before any circuit was looked at, by limit.</summary>
    public IReadOnlyDictionary<Limit, double> Rejections => _rejections;

    /// <summary>Number of combinations of C1 and C2 parts.</summary>
    public double CapacitorPairs
    {
        get
        {
            double parts = Capacitors.Sum(value => value.Parts);
            return parts * parts;
        }
    }

    /// <summary>
    /// Least sum of the spreads of a crystal alone, as a ratio, among those that the other limits leave; null where none is left.
    /// </summary>
    public double? LeastCrystalRatio { get; private set; }

    private IEnumerable<CircuitFamily> FamiliesOf(CircuitKind kind)
    {
        foreach (Part amplifier in _scope.Amplifiers(kind).Where(Market.IsListed))
        {
            ImmutableArray<AmplifierOption> options =
                amplifier is TransistorPart transistor ? _options.BiasFor(transistor) : _options.Series;
            double size = CapacitorPairs * options.Length;
            var members = new List<(FamilyMember Member, SupportParts Support)>();
            foreach ((CrystalDesk.Entry crystal, int tap, double target) in Reaching(amplifier))
            {
                _cancellation.ThrowIfCancellationRequested();
                Combinations += size;
                SupportParts support = _crystals.Support(kind, crystal.Part);
                (FamilyMember? member, Limit limit) = Admit(kind, amplifier, crystal, tap, target, support);
                if (member is not null)
                {
                    members.Add((member, support));
                }
                else
                {
                    _rejections[limit] = _rejections.GetValueOrDefault(limit) + size;
                }
            }

            foreach (var family in members.GroupBy(pair => (
                pair.Member.Crystal.FrequencyHz,
                pair.Member.Model.Crystal.ShuntFarads,
                pair.Member.Model.Crystal.ResistanceOhms,
                pair.Member.Model.Crystal.MotionalFarads,
                pair.Support)))
            {
                yield return new CircuitFamily
                {
                    Kind = kind,
                    Amplifier = amplifier,
                    Support = family.Key.Support,
                    Options = options,
                    OptionCosts = [.. options.Select(option => option.Cost(family.Key.Support.Feedback, Market))],
                    Members = [.. family.Select(pair => pair.Member)],
                };
            }
        }
    }

    // Crystals by id, each with the stages that it serves.
    private IEnumerable<(CrystalDesk.Entry Crystal, int Tap, double TargetHz)> Reaching(Part amplifier) =>
        from tap in SearchScope.Taps(amplifier)
        let target = _scope.TargetHz(tap)
        from crystal in _crystals.Reaching(target)
        orderby crystal.Place
        select (crystal, tap, target);

    private (FamilyMember? Member, Limit Limit) Admit(
        CircuitKind kind, Part amplifier, CrystalDesk.Entry entry, int tap, double targetHz, SupportParts support)
    {
        (CrystalPart crystal, CrystalModel model) = (entry.Part, entry.Model);
        double feedback = support.Feedback?.ValueOhms ?? double.PositiveInfinity;
        CircuitTemplate? template = CircuitTemplate.Create(Requirement, kind, model, amplifier, feedback);
        if (template is null)
        {
            return (null, Limit.Supply);
        }

        if (!Specification.CoversTemperature(crystal, amplifier, Requirement))
        {
            return (null, Limit.Temperature);
        }

        if (!Specification.CoversClock(amplifier, crystal.FrequencyHz, Requirement))
        {
            return (null, Limit.Clock);
        }

        bool complete = kind == CircuitKind.Follower || support.Feedback is not null;
        if (!Market.Covers(crystal, 1) || !Market.Covers(amplifier, 1) || !complete)
        {
            return (null, Limit.Stock);
        }

        ImmutableArray<BudgetTerm> terms = entry.Terms;
        double ratio = terms.Sum(term => term.Ratio);
        decimal cost = Market.UnitCost(crystal, 1) + Market.UnitCost(amplifier, 1)
            + Cost(support.Feedback) + Cost(support.Decoupling) + Cost(support.Coupling);
        LeastCrystalRatio = Math.Min(ratio, LeastCrystalRatio ?? ratio);
        if (cost > Requirement.CostLimit)
        {
            return (null, Limit.Cost);
        }

        if (ratio > Requirement.BudgetRatio)
        {
            return (null, Limit.Error);
        }

        return (new FamilyMember
        {
            Crystal = crystal,
            Model = model,
            Template = template,
            Quality = EstimateQuality.Of(amplifier),
            Tap = tap,
            Terms = terms,
            TermsRatio = ratio,
            BaseCost = cost,
            TargetHz = targetHz,
        }, default);
    }

    private decimal Cost(Part? part) => part is null ? 0 : Market.UnitCost(part, 1);
}
