using PartPick.Physics;
using PartPick.Physics.Circuits;

namespace PartPick.Selection.Search;

/// <summary>
/// Estimates of a family at every third value of C1, C2 and Rs, made when first asked for, and what they say of the values between:
/// the load seen by the crystal, over that of the capacitors in series, is smooth along the logarithms of all three. A bias network
/// has no such order, so a follower has a grid of its own for each.
/// </summary>
internal sealed class EstimateGrid
{
    private const int Step = 3;

    // What is left between the nodes after interpolation: a share of the load, and a share of the range over the nodes round it.
    private const double LoadSlack = 0.015;
    private const double RangeSlack = 0.25;
    private const double AmplifierShare = 0.8;

    // By how much a load outside the window must lie outside for its neighbours to be taken for outside.
    private const double SideReserve = 1.06;
    private readonly CircuitFamily _family;
    private readonly CircuitTemplate _template;
    private readonly OperatingPoint _nominal;
    private readonly SearchSpace _space;
    private readonly LoadRange _window;
    private readonly Dictionary<(int Option, int C1, int C2), int> _sides = [];
    private readonly double[] _values;
    private readonly double[] _options;
    private readonly Dictionary<(int Option, int C1, int C2), Node> _nodes = [];
    private RunningState? _last;

    /// <param name="space">What is searched.</param>
    /// <param name="family">The family.</param>
    /// <param name="window">Loads at which some crystal of the family may be within the budget.</param>
    public EstimateGrid(SearchSpace space, CircuitFamily family, LoadRange window)
    {
        _window = window;
        _space = space;
        _family = family;
        _template = family.Members[0].Template;
        _nominal = OperatingPoint.Nominal(space.Requirement);
        _values = [.. space.Capacitors.Select(value => Math.Log(value.Farads))];
        _options = family.IsGate ? Logarithms(family) : [];
    }

    /// <summary>The places of the nodes along the capacitors.</summary>
    public IEnumerable<int> Values() => Places(_values.Length, Step);

    /// <summary>The places of the nodes along the options.</summary>
    public IEnumerable<int> Options() => Places(_family.Options.Length, _family.IsGate ? Step : 1);

    /// <summary>
    /// Whether the load of a node is known to be outside the window, from its neighbours: the load grows with C1 and with C2. Nodes
    /// and combinations are asked for with C1 rising and C2 falling.
    /// </summary>
    public bool IsOutside(int option, int c1, int c2) => KnownSide(option, c1, c2) != 0;

    /// <summary>Whether the load of any combination is outside the window, from the nodes round it.</summary>
    public bool LiesOutside(int option, int c1, int c2)
    {
        (int lowC1, int highC1, _) = Bracket(_values, c1, Step);
        (int lowC2, int highC2, _) = Bracket(_values, c2, Step);
        (int low, int high, _) = _family.IsGate ? Bracket(_options, option, Step) : (option, option, 0);
        return (KnownSide(low, lowC1, lowC2) > 0 && KnownSide(high, lowC1, lowC2) > 0)
            || (KnownSide(low, highC1, highC2) < 0 && KnownSide(high, highC1, highC2) < 0);
    }

    // Which side of the window a node lies on, where it or its neighbours tell: above is 1, below is −1.
    private int KnownSide(int option, int c1, int c2)
    {
        int side = Side(option, c1, c2);
        if (side == 0)
        {
            side = Side(option, Before(c1), c2) > 0 ? 1
                : Side(option, c1, After(c2)) < 0 ? -1
                : 0;
            if (side != 0)
            {
                _sides[(option, c1, c2)] = side;
            }
        }

        return side;
    }

    /// <summary>The estimate of one combination of values; null where there is no steady state.</summary>
    public Estimate? At(int option, int c1, int c2) => Find(option, c1, c2).Estimate;

    /// <summary>The bounds between which the load of a combination lies, from the nodes round it.</summary>
    public LoadRange Range(int option, int c1, int c2)
    {
        double share = 0;
        double least = double.PositiveInfinity;
        double most = 0;
        double harmonics = 0;
        foreach ((Node? node, double weight) in Around(option, c1, c2))
        {
            if (node is null)
            {
                return LoadRange.Any;
            }

            share += weight * node.Share;
            least = Math.Min(least, node.Share);
            most = Math.Max(most, node.Share);
            harmonics = Math.Max(harmonics, node.Estimate!.HarmonicShare);
        }

        double load = StaticLoad(c1, c2);
        double slack = LoadSlack * share + RangeSlack * (most - least);
        return new LoadRange(load * Math.Max(0, share - slack), load * (share + slack), harmonics);
    }

    /// <summary>The least shift of the frequency over amplifier and supply, as a ratio, from the nodes round a combination.</summary>
    public double LeastAmplifierRatio(int option, int c1, int c2)
    {
        double least = double.PositiveInfinity;
        foreach ((Node? node, _) in Around(option, c1, c2))
        {
            if (node is null)
            {
                return 0;
            }

            least = Math.Min(least, node.AmplifierRatio ??= FindAmplifierRatio(node));
        }

        return AmplifierShare * least;
    }

    // The nodes round a combination with their weights; null for one without a steady state.
    private IEnumerable<(Node? Node, double Weight)> Around(int option, int c1, int c2)
    {
        (int, int, double) third = _family.IsGate ? Bracket(_options, option, Step) : (option, option, 0);
        foreach ((int i, double byC1) in Ends(Bracket(_values, c1, Step)))
        {
            foreach ((int j, double byC2) in Ends(Bracket(_values, c2, Step)))
            {
                foreach ((int o, double byOption) in Ends(third))
                {
                    Node node = Find(o, i, j);
                    yield return (node.Estimate is null ? null : node, byC1 * byC2 * byOption);
                }
            }
        }
    }

    private int Side(int option, int c1, int c2) => _sides.GetValueOrDefault((option, c1, c2));

    private static int Before(int place) => (place - 1) / Step * Step - (place == 0 ? Step : 0);

    private int After(int place) => Math.Min(place + Step, _values.Length - 1) is var next && next > place ? next : int.MaxValue;

    private static IEnumerable<int> Places(int count, int step)
    {
        for (int i = 0; i < count; i += step)
        {
            yield return i;
        }

        if (count > 0 && (count - 1) % step != 0)
        {
            yield return count - 1;
        }
    }

    private static (int Low, int High, double Weight) Bracket(double[] along, int place, int step)
    {
        int low = place / step * step;
        int high = low == place ? place : Math.Min(low + step, along.Length - 1);
        return (low, high, high == low ? 0 : (along[place] - along[low]) / (along[high] - along[low]));
    }

    private static IEnumerable<(int Place, double Weight)> Ends((int Low, int High, double Weight) bracket)
    {
        yield return (bracket.Low, 1 - bracket.Weight);
        if (bracket.High != bracket.Low)
        {
            yield return (bracket.High, bracket.Weight);
        }
    }

    // A direct connection stands one step below the smallest resistor.
    private static double[] Logarithms(CircuitFamily family)
    {
        double[] along = [.. family.Options.Select(option => Math.Log(option.Series?.ValueOhms ?? 1))];
        if (along.Length > 2)
        {
            along[0] = 2 * along[1] - along[2];
        }

        return along;
    }

    private Node Find(int option, int c1, int c2)
    {
        if (!_nodes.TryGetValue((option, c1, c2), out Node? node))
        {
            CircuitValues values = _family.Options[option].With(_space.Capacitors[c1].Farads, _space.Capacitors[c2].Farads);
            node = new Node(values);
            RunningState? near = Near(option, c1, c2) ?? _last;
            OscillatorCircuit circuit = _template.At(values, _nominal);
            if (OscillatorAnalysis.EstimateSteadyState(circuit, near, out RunningState? state) is { } estimate && state is not null)
            {
                _last = state;
                double load = _template.Crystal.Crystal.LoadAtFrequencyFarads(estimate.FrequencyHz);
                node.Share = load / StaticLoad(c1, c2);
                node.Estimate = new Estimate(load, estimate.DriveWatts, estimate.HarmonicShare, state.Slim());
            }

            _nodes.Add((option, c1, c2), node);
            if (node.Estimate is { LoadFarads: var farads })
            {
                _sides[(option, c1, c2)] = farads > _window.Highest * SideReserve ? 1 : farads < _window.Lowest / SideReserve ? -1 : 0;
            }
        }

        return node;
    }

    // The state of the nearest node that is known.
    private RunningState? Near(int option, int c1, int c2)
    {
        int o = _family.IsGate ? option / Step * Step : option;
        int i = c1 / Step * Step;
        int j = c2 / Step * Step;
        return Known(o, i, j) ?? Known(o, i, j - Step) ?? Known(o, i - Step, j) ?? Known(o - Step, i, j);

        RunningState? Known(int atOption, int atC1, int atC2) =>
            _nodes.TryGetValue((atOption, atC1, atC2), out Node? node) ? node.Estimate?.State : null;
    }

    private double FindAmplifierRatio(Node node)
    {
        Estimate estimate = node.Estimate!;
        double hertz = _template.Crystal.Crystal.FrequencyAtLoadHz(estimate.LoadFarads);
        double most = 0;
        foreach (OperatingPoint point in new[] { _template.AmplifierCorners[0], _template.AmplifierCorners[^1] })
        {
            if (OscillatorAnalysis.EstimateSteadyState(_template.At(node.Values, point), estimate.State, out _) is { } there)
            {
                most = Math.Max(most, Math.Abs(there.FrequencyHz / hertz - 1));
            }
        }

        return most;
    }

    // The capacitors with their strays in series, beside what stands across.
    private double StaticLoad(int c1, int c2)
    {
        Strays strays = _space.Requirement.Board.Strays;
        double a = _space.Capacitors[c1].Farads;
        double b = _space.Capacitors[c2].Farads + strays.OutputFarads;
        double across = strays.AcrossFarads;
        if (_template.At(new CircuitValues(a, b), _nominal) is GateCircuit { Inverter: { } inverter })
        {
            a += strays.InputFarads + inverter.InputFarads;
            b += inverter.OutputFarads / 2;
            across += inverter.FeedbackFarads;
        }

        return a * b / (a + b) + across;
    }

    private sealed class Node(CircuitValues values)
    {
        public CircuitValues Values => values;

        public Estimate? Estimate { get; set; }

        public double Share { get; set; }

        public double? AmplifierRatio { get; set; }
    }
}
