using PartPick.Catalog;

namespace PartPick.Selection.Search;

/// <summary>Costs and spreads of load capacitors, looked up once for the whole search.</summary>
internal sealed class Prices
{
    private readonly decimal[,] _cheapestPair;
    private readonly double[] _leastSpread;
    private readonly CapacitorPart[] _tightest;

    public Prices(SearchSpace space)
    {
        int count = space.Capacitors.Length;
        double reach = BudgetBuilder.TemperatureReach(space.Requirement);
        _leastSpread = [.. space.Capacitors.Select(value => value.Contenders.Min(one => one.Spread(reach)))];
        _tightest = [.. space.Capacitors.Select(value => value.Contenders.MinBy(one => one.Tolerance)!.Part)];
        _cheapestPair = new decimal[count, count];
        for (int i = 0; i < count; i++)
        {
            for (int j = 0; j < count; j++)
            {
                CapacitorValue others = space.Capacitors[j];
                _cheapestPair[i, j] = space.Capacitors[i].Contenders.Min(first => others.Contenders.Min(second => Pair(first, second)));
            }
        }
    }

    /// <summary>Cost of two load capacitors.</summary>
    public static decimal Pair(Contender c1, Contender c2) => ReferenceEquals(c1, c2) ? c1.Two : c1.One + c2.One;

    /// <summary>Least cost of two load capacitors of two values.</summary>
    public decimal CheapestPair(int c1, int c2) => _cheapestPair[c1, c2];

    /// <summary>Least cost of any two load capacitors.</summary>
    public decimal CheapestOfAllPairs() => _cheapestPair.Length == 0 ? 0 : _cheapestPair.Cast<decimal>().Min();

    /// <summary>Least sum of tolerance and change over temperature of the capacitors of a value, as a ratio.</summary>
    public double LeastSpread(int value) => _leastSpread[value];

    /// <summary>The capacitor of a value with the tightest tolerance.</summary>
    public CapacitorPart Tightest(int value) => _tightest[value];
}
