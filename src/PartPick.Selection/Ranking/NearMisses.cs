namespace PartPick.Selection.Search;

/// <summary>The choices that came nearest to being fit, one a group, for when nothing is.</summary>
internal sealed class NearMisses
{
    private readonly Lock _gate = new();
    private readonly Dictionary<FamilyMember, (double Penalty, CandidateParts Choice)> _best = [];

    /// <summary>Offers a choice; a smaller penalty is nearer.</summary>
    public void Offer(FamilyMember member, double penalty, Func<CandidateParts> choice)
    {
        lock (_gate)
        {
            if (!_best.TryGetValue(member, out var known) || penalty < known.Penalty)
            {
                _best[member] = (penalty, choice());
            }
        }
    }

    /// <summary>The nearest first.</summary>
    public IReadOnlyList<CandidateParts> Nearest(int count)
    {
        lock (_gate)
        {
            return
            [
                .. _best.Values
                    .OrderBy(entry => entry.Penalty)
                    .ThenBy(entry => CandidateId.Of(entry.Choice), StringComparer.Ordinal)
                    .Take(count)
                    .Select(entry => entry.Choice),
            ];
        }
    }
}
