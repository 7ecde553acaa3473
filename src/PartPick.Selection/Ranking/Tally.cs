using System.Collections.Immutable;

namespace PartPick.Selection.Search;

/// <summary>Counts of combinations, shared by the search's threads.</summary>
internal sealed class Tally
{
    private readonly Lock _gate = new();
    private readonly Dictionary<Limit, double> _rejections = [];
    private double _covered;
    private long _fit;
    private long _analysed;

    /// <summary>Combinations covered so far.</summary>
    public double Covered
    {
        get
        {
            lock (_gate)
            {
                return _covered;
            }
        }
    }

    /// <summary>Fit combinations found so far.</summary>
    public long Fit
    {
        get
        {
            lock (_gate)
            {
                return _fit;
            }
        }
    }

    /// <summary>Combinations of values whose steady state was solved so far.</summary>
    public long Analysed => Interlocked.Read(ref _analysed);

    /// <summary>Adds combinations that a limit removed.</summary>
    public void Reject(Limit limit, double combinations)
    {
        lock (_gate)
        {
            _rejections[limit] = _rejections.GetValueOrDefault(limit) + combinations;
        }
    }

    /// <summary>Adds combinations that are dealt with.</summary>
    public void Cover(double combinations)
    {
        lock (_gate)
        {
            _covered += combinations;
        }
    }

    /// <summary>Adds one fit combination.</summary>
    public void CountFit()
    {
        lock (_gate)
        {
            _fit++;
        }
    }

    /// <summary>Adds one combination of values whose steady state is solved.</summary>
    public void CountAnalysed() => Interlocked.Increment(ref _analysed);

    /// <summary>A copy of the rejections.</summary>
    public ImmutableDictionary<Limit, double> Rejections()
    {
        lock (_gate)
        {
            return _rejections.ToImmutableDictionary();
        }
    }
}
