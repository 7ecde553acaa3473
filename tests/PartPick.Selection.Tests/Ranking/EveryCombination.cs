using PartPick.Catalog;
using PartPick.Selection.Search;

namespace PartPick.Selection.Tests.Ranking;

/// <summary>
/// The answer of a ranking by trying every combination, each analysed in full from nothing, by the definitions alone. Parts of one
/// value share the analysis of their values; what lacks the wanted margin, is too dear or short of stock is not analysed further.
/// </summary>
internal sealed class EveryCombination
{
    private readonly Requirement _requirement;
    private readonly List<TriedChoice> _fit;

    public EveryCombination(Requirement requirement, PartsCatalog catalog)
    {
        _requirement = requirement;
        var space = new SearchSpace(requirement, catalog, every: true);
        SameValues[] values =
        [
            .. from family in space.Families
               from members in family.Members.GroupBy(member => member.Model.Crystal)
               from option in Enumerable.Range(0, family.Options.Length)
               from c1 in space.Capacitors
               from c2 in space.Capacitors
               select new SameValues(requirement, space.Market, family, [.. members], option, c1, c2),
        ];
        Tried = values.Sum(one => one.Count);
        _fit = [.. values.AsParallel().AsOrdered().SelectMany(one => one.Fit())];
    }

    /// <summary>Number of combinations tried.</summary>
    public int Tried { get; }

    /// <summary>Number of fit ones.</summary>
    public int Fit => _fit.Count;

    /// <summary>Every fit combination, in no order.</summary>
    public IReadOnlyList<TriedChoice> FitOnes => _fit;

    /// <summary>Ids of the front, in order.</summary>
    public string[] Front() => [.. Order(_fit.Where(one => !_fit.Any(other => Dominates(other, one)))).Select(choice => choice.Id)];

    /// <summary>Ids of the best of each circuit–crystal–amplifier group, in order.</summary>
    public string[] BestOfGroups() =>
        [.. Order(_fit.GroupBy(one => one.Group).Select(group => Order(group).First())).Select(choice => choice.Id)];

    /// <summary>Ids of every fit candidate, in order.</summary>
    public string[] All() => [.. Order(_fit).Select(choice => choice.Id)];

    private static bool Dominates(TriedChoice one, TriedChoice other) =>
        one.ErrorRatio <= other.ErrorRatio && one.Margin >= other.Margin && one.Cost <= other.Cost
        && (one.ErrorRatio < other.ErrorRatio || one.Margin > other.Margin || one.Cost < other.Cost);

    private IOrderedEnumerable<TriedChoice> Order(IEnumerable<TriedChoice> choices)
    {
        decimal cheapest = _fit.Select(choice => choice.Cost).DefaultIfEmpty(1).Min();
        return choices
            .OrderBy(one => Score.Of(_requirement, one.ErrorRatio, one.Margin, one.Cost, cheapest))
            .ThenBy(one => one.ErrorRatio)
            .ThenBy(one => one.Cost)
            .ThenBy(one => one.Id, StringComparer.Ordinal);
    }
}
