using PartPick.Catalog;
using PartPick.Selection.Search;

namespace PartPick.Selection.Tests.Ranking;

/// <summary>The answer of a ranking by trying every combination, each analysed in full from nothing, by the definitions alone.</summary>
internal sealed class EveryCombination
{
    private readonly Requirement _requirement;
    private readonly List<Candidate> _fit;

    public EveryCombination(Requirement requirement, PartsCatalog catalog)
    {
        _requirement = requirement;
        var space = new SearchSpace(requirement, catalog, every: true);
        var builder = new CandidateBuilder(requirement, space.Market);
        CandidateParts[] choices =
        [
            .. from family in space.Families
               from member in family.Members
               from choice in Choices(space, family, member)
               select choice,
        ];
        Tried = choices.Length;
        _fit = [.. choices.AsParallel().AsOrdered().Select(builder.Build).OfType<Candidate>().Where(candidate => candidate.IsFit)];
    }

    /// <summary>Number of combinations analysed.</summary>
    public int Tried { get; }

    /// <summary>Number of fit ones.</summary>
    public int Fit => _fit.Count;

    /// <summary>Ids of the front, in order.</summary>
    public string[] Front() =>
        [.. Order(_fit.Where(one => !_fit.Any(other => Dominates(other, one)))).Select(candidate => candidate.Id)];

    /// <summary>Ids of the best of each circuit–crystal–amplifier group, in order.</summary>
    public string[] BestOfGroups() =>
        [.. Order(_fit.GroupBy(one => (one.Choice.Circuit, one.Choice.Crystal.Id, one.Choice.Amplifier.Id, one.Choice.Tap))
            .Select(group => Order(group).First())).Select(candidate => candidate.Id)];

    /// <summary>Ids of every fit candidate, in order.</summary>
    public string[] All() => [.. Order(_fit).Select(candidate => candidate.Id)];

    private static IEnumerable<CandidateParts> Choices(SearchSpace space, CircuitFamily family, FamilyMember member) =>
        from option in Enumerable.Range(0, family.Options.Length)
        from c1 in space.Capacitors.SelectMany(value => value.Contenders)
        from c2 in space.Capacitors.SelectMany(value => value.Contenders)
        select SearchRun.Choice(family, member, option, c1.Part, c2.Part);

    private static bool Dominates(Candidate one, Candidate other)
    {
        double error = one.Budget!.WorstRatio;
        double otherError = other.Budget!.WorstRatio;
        return error <= otherError && one.Margin.Value >= other.Margin.Value && one.Cost <= other.Cost
            && (error < otherError || one.Margin.Value > other.Margin.Value || one.Cost < other.Cost);
    }

    private IOrderedEnumerable<Candidate> Order(IEnumerable<Candidate> candidates)
    {
        decimal cheapest = _fit.Select(candidate => candidate.Cost).DefaultIfEmpty(1).Min();
        return candidates
            .OrderBy(one => Score.Of(_requirement, one.Budget!.WorstRatio, one.Margin.Value, one.Cost, cheapest))
            .ThenBy(one => one.Budget!.WorstRatio)
            .ThenBy(one => one.Cost)
            .ThenBy(one => one.Id, StringComparer.Ordinal);
    }
}
