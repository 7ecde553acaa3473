using PartPick.Catalog;

namespace PartPick.Selection.Search;

/// <summary>Costs of load capacitors and amplifier options, looked up once for the whole search.</summary>
internal sealed class Prices
{
    private readonly SearchSpace _space;
    private readonly Dictionary<CapacitorPart, (decimal One, decimal Two)> _capacitors = new(ReferenceEqualityComparer.Instance);
    private readonly decimal[,] _cheapestPair;
    private readonly double[] _leastSpread;
    private readonly CapacitorPart[] _tightest;

    public Prices(SearchSpace space)
    {
        _space = space;
        int count = space.Capacitors.Length;
        _leastSpread = new double[count];
        _tightest = new CapacitorPart[count];
        double reach = BudgetBuilder.TemperatureReach(space.Requirement);
        for (int i = 0; i < count; i++)
        {
            foreach (CapacitorPart part in space.Capacitors[i].Parts)
            {
                _capacitors[part] = (space.Market.UnitCost(part, 1), space.Market.UnitCost(part, 2));
            }

            _leastSpread[i] = space.Capacitors[i].Parts.Min(part => BudgetBuilder.Tolerance(part) + BudgetBuilder.Coefficient(part) * reach);
            _tightest[i] = space.Capacitors[i].Parts.MinBy(BudgetBuilder.Tolerance)!;
        }

        _cheapestPair = new decimal[count, count];
        for (int i = 0; i < count; i++)
        {
            for (int j = 0; j < count; j++)
            {
                _cheapestPair[i, j] = space.Capacitors[i].Parts.Min(first => space.Capacitors[j].Parts.Min(second => Pair(first, second)));
            }
        }
    }

    /// <summary>Cost of two load capacitors.</summary>
    public decimal Pair(CapacitorPart c1, CapacitorPart c2) =>
        ReferenceEquals(c1, c2) ? _capacitors[c1].Two : _capacitors[c1].One + _capacitors[c2].One;

    /// <summary>Least cost of two load capacitors of two values.</summary>
    public decimal CheapestPair(int c1, int c2) => _cheapestPair[c1, c2];

    /// <summary>Least cost of any two load capacitors.</summary>
    public decimal CheapestOfAllPairs() => _cheapestPair.Length == 0 ? 0 : _cheapestPair.Cast<decimal>().Min();

    /// <summary>Least sum of tolerance and change over temperature of the capacitors of a value, as a ratio.</summary>
    public double LeastSpread(int value) => _leastSpread[value];

    /// <summary>The capacitor of a value with the tightest tolerance.</summary>
    public CapacitorPart Tightest(int value) => _tightest[value];

    /// <summary>What an amplifier option adds to the cost of the family's support parts; equal parts are bought together.</summary>
    public decimal Option(CircuitFamily family, AmplifierOption option)
    {
        ResistorPart? feedback = family.Support.Feedback;
        if (option.Series is { } series)
        {
            return ReferenceEquals(series, feedback)
                ? _space.Market.UnitCost(series, 2) - _space.Market.UnitCost(series, 1)
                : _space.Market.UnitCost(series, 1);
        }

        if (option is not { BaseTop: { } top, Emitter: { } emitter })
        {
            return 0;
        }

        int tops = option.BaseBottom is null ? 1 : 2;
        return ReferenceEquals(top, emitter)
            ? _space.Market.UnitCost(top, tops + 1)
            : _space.Market.UnitCost(top, tops) + _space.Market.UnitCost(emitter, 1);
    }
}
