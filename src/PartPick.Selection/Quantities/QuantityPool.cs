using System.Collections.Concurrent;
using PartPick.Catalog;

namespace PartPick.Selection.Search;

/// <summary>
/// Candidates whose figures are known once, compared for any number of boards. What depends on that number is bought anew: which of
/// the resistors of a value, and which support parts, are cheapest and in stock; the figures stay as long as the values do.
/// </summary>
internal sealed class QuantityPool
{
    private readonly Requirement _requirement;
    private readonly PartsCatalog _catalog;
    private readonly string _currency;
    private readonly Dictionary<string, CandidateParts> _members = new(StringComparer.Ordinal);
    private readonly ConcurrentDictionary<(string Id, double FeedbackOhms), PoolFigures?> _figures = new();
    private PartsCatalog _used = PartsCatalog.Empty;

    public QuantityPool(Requirement requirement, PartsCatalog catalog)
    {
        _requirement = requirement;
        _catalog = catalog;
        _currency = new Market(catalog, 1).Currency;
    }

    /// <summary>Number of candidates.</summary>
    public int Count => _members.Count;

    /// <summary>Adds candidates that are new; true where one was.</summary>
    public bool Add(IEnumerable<Candidate> candidates)
    {
        int before = Count;
        foreach (Candidate candidate in candidates)
        {
            _members.TryAdd(candidate.Id, candidate.Choice);
            _figures.TryAdd((candidate.Id, FeedbackOf(candidate)), FiguresOf(candidate));
        }

        if (Count > before)
        {
            _used = new PartsCatalog(_catalog.All.Where(part => part.Offer.Currency == _currency && MayBeUsed(part)));
        }

        return Count > before;
    }

    /// <summary>The best of the candidates for a number of boards; null where none fits.</summary>
    public PoolPoint? Best(int builds)
    {
        var market = new Market(_used, builds);
        Dictionary<double, ResistorPart> resistors = [];
        foreach (ResistorPart part in market.Resistors)
        {
            if (!resistors.TryGetValue(part.ValueOhms, out ResistorPart? other) || market.UnitCost(part, 1) < market.UnitCost(other, 1))
            {
                resistors[part.ValueOhms] = part;
            }
        }

        var fit = new List<PoolPoint>();
        var supports = new Dictionary<(CircuitKind, double), SupportParts>();
        foreach ((string id, CandidateParts member) in _members)
        {
            if (Buy(id, member, market, resistors, supports) is { } point)
            {
                fit.Add(point);
            }
        }

        decimal cheapest = fit.Count == 0 ? 0 : fit.Min(point => point.Cost);
        return fit
            .OrderBy(point => Score.Of(_requirement, point.Figures.ErrorRatio, point.Figures.Margin, point.Cost, cheapest))
            .ThenBy(point => point.Figures.ErrorRatio)
            .ThenBy(point => point.Cost)
            .ThenBy(point => point.Id, StringComparer.Ordinal)
            .FirstOrDefault();
    }

    private PoolPoint? Buy(
        string id,
        CandidateParts member,
        Market market,
        Dictionary<double, ResistorPart> resistors,
        Dictionary<(CircuitKind, double), SupportParts> supports)
    {
        (CircuitKind, double) place = (member.Circuit, member.Crystal.FrequencyHz);
        if (!supports.TryGetValue(place, out SupportParts? support))
        {
            supports.Add(place, support = SupportParts.For(member.Circuit, member.Crystal.FrequencyHz, market));
        }

        if ((member.Circuit != CircuitKind.Follower && support.Feedback is null)
            || !Take(member.Series, out ResistorPart? series)
            || !Take(member.BaseTop, out ResistorPart? top)
            || !Take(member.BaseBottom, out ResistorPart? bottom)
            || !Take(member.Emitter, out ResistorPart? emitter))
        {
            return null;
        }

        CandidateParts choice = member with { Series = series, BaseTop = top, BaseBottom = bottom, Emitter = emitter };
        if (BillOfParts.FirstShortage(choice, support, market) is not null)
        {
            return null;
        }

        decimal cost = BillOfParts.UnitCost(choice, support, market);
        double feedback = support.Feedback?.ValueOhms ?? double.PositiveInfinity;
        PoolFigures? figures = cost > _requirement.CostLimit
            ? null
            : _figures.GetOrAdd((id, feedback), _ => Analyse(choice, support));
        return figures is { } known ? new PoolPoint(CandidateId.Of(choice), choice, cost, known) : null;

        bool Take(ResistorPart? wanted, out ResistorPart? found)
        {
            found = null;
            return wanted is null || resistors.TryGetValue(wanted.ValueOhms, out found);
        }
    }

    private PoolFigures? Analyse(CandidateParts choice, SupportParts support) =>
        new CandidateBuilder(_requirement, new Market(_catalog, 1)).Build(choice, support) is { } candidate ? FiguresOf(candidate) : null;

    // Stock and cost are judged for each number of boards; the other limits once.
    private static PoolFigures? FiguresOf(Candidate candidate) =>
        candidate.Budget is { } budget && candidate.Misses.All(miss => miss.Limit is Limit.Stock or Limit.Cost)
            ? new PoolFigures(budget.WorstRatio, candidate.Margin.Value)
            : null;

    private static double FeedbackOf(Candidate candidate) =>
        candidate.Nominal is Physics.Circuits.GateCircuit gate ? gate.FeedbackOhms : double.PositiveInfinity;

    private bool MayBeUsed(Part part) => part switch
    {
        ResistorPart resistor => _members.Values.Any(member =>
            SupportParts.IsFeedback(resistor, member.Crystal.FrequencyHz)
            || new[] { member.Series, member.BaseTop, member.BaseBottom, member.Emitter }.Any(one => one?.ValueOhms == resistor.ValueOhms)),
        CapacitorPart capacitor => SupportParts.IsDecoupling(capacitor) || SupportParts.IsCoupling(capacitor),
        _ => false,
    };
}
