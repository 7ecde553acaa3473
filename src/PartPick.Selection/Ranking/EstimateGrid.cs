using PartPick.Physics;
using PartPick.Physics.Circuits;

namespace PartPick.Selection.Search;

/// <summary>
/// Estimates of a family at every third value of C1, C2 and Rs, made when first asked for, and what they say of the values between:
/// limiting brings the device down to about the critical transconductance, so the capacitance seen by the crystal over that at the
/// critical transconductance is near one, and smooth along the logarithms of all three. A follower, whose estimates cost most, has
/// every sixth value of the capacitors, and every third of its base resistor.
/// </summary>
internal sealed partial class EstimateGrid
{
    private const double AmplifierShare = 0.8;

    // Shift over amplifier and supply in full over that of estimates: a small one may be off by half, a large one hardly at all.
    private const double RoughShare = 0.85;
    private const double RoughRatio = 1e-6;
    private const double FairShare = 0.95;
    private const double FairRatio = 2.2e-6;
    private const double CornerDriveShare = 0.97;

    // By how much a load outside the window must lie outside for its neighbours to be taken for outside.
    private const double SideReserve = 1.06;
    private readonly CircuitFamily _family;
    private readonly CircuitTemplate _template;
    private readonly OperatingPoint _nominal;
    private readonly SearchSpace _space;
    private readonly GridFineness _fineness;
    private readonly CriticalLoad _critical;
    private readonly double _shunt;
    private readonly LoadRange _window;
    private readonly Dictionary<(int Option, int C1, int C2), int> _sides = [];
    private readonly NodeBracket[] _values;
    private readonly NodeBracket[] _options;
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
        _fineness = GridFineness.Of(family.Amplifier);
        _shunt = _template.Crystal.Crystal.ShuntFarads;
        _nominal = OperatingPoint.Nominal(space.Requirement);
        _critical = new CriticalLoad(_template, _nominal, family.Members[0].Crystal.FrequencyHz);
        _values = NodeBracket.Along([.. space.Capacitors.Select(value => Math.Log(value.Farads))], _fineness.Step);
        _options = OptionBracket.Of(family);
    }

    /// <summary>The places of the nodes along the capacitors.</summary>
    public IEnumerable<int> Values() => Nodes(_values);

    /// <summary>The places of the nodes along the options.</summary>
    public IEnumerable<int> Options() => Nodes(_options);

    /// <summary>
    /// Whether the load of a node is known to be outside the window, from its neighbours: the load grows with C1 and with C2. Nodes
    /// and combinations are asked for with C1 rising and C2 falling.
    /// </summary>
    public bool IsOutside(int option, int c1, int c2) => KnownSide(option, c1, c2) != 0;

    /// <summary>Whether the load of any combination is outside the window, from the nodes round it.</summary>
    public bool LiesOutside(int option, int c1, int c2)
    {
        NodeBracket first = _values[c1];
        NodeBracket second = _values[c2];
        NodeBracket at = _options[option];
        return (KnownSide(at.Low, first.Low, second.Low) > 0 && KnownSide(at.High, first.Low, second.Low) > 0)
            || (KnownSide(at.Low, first.High, second.High) < 0 && KnownSide(at.High, first.High, second.High) < 0);
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

    /// <summary>
    /// ∂f/f by C1, C2 and what stands across, per farad, to the first order at a combination's estimate; not a number where not found.
    /// </summary>
    public (double C1, double C2, double Across) FirstOrder(int option, int c1, int c2)
    {
        Node node = Find(option, c1, c2);
        return node.Slopes ??= node.Estimate is { } estimate
            ? FirstOrderSlopes.PerFarad(_template.At(node.Values, _nominal), estimate.State, estimate.FrequencyHz)
            : (double.NaN, double.NaN, double.NaN);
    }

    /// <summary>Wide bounds of the load of a combination, without any estimate.</summary>
    public LoadRange WideRange(int option, int c1, int c2) => _critical.Farads(Values(option, c1, c2)) is { } critical
        ? Load(critical * _fineness.Least, critical * _fineness.Most, _fineness.MostHarmonics)
        : LoadRange.Any;

    /// <summary>The bounds between which the load of a combination lies, from the nodes round it.</summary>
    public LoadRange Range(int option, int c1, int c2)
    {
        if (_critical.Farads(Values(option, c1, c2)) is not { } critical)
        {
            return LoadRange.Any;
        }

        // At the far ends of a resistor a circuit may not run at all: then it is left alone.
        return Range(option, c1, c2, true, critical)
            ?? (_options[option].IsNode ? null : Range(option, c1, c2, false, critical))
            ?? Load(critical * _fineness.Least, critical * _fineness.Most, _fineness.MostHarmonics);
    }

    private LoadRange? Range(int option, int c1, int c2, bool between, double critical)
    {
        double share = 0;
        double least = double.PositiveInfinity;
        double most = 0;
        double harmonics = 0;
        foreach ((Node? node, double weight) in Around(option, c1, c2, between))
        {
            if (node is null)
            {
                return null;
            }

            share += weight * node.Share;
            least = Math.Min(least, node.Share);
            most = Math.Max(most, node.Share);
            harmonics = Math.Max(harmonics, node.Estimate!.HarmonicShare);
        }

        double slack = _fineness.LoadSlack + _fineness.RangeSlack * (most - least);
        return Load(critical * (share - slack), critical * (share + slack), harmonics);
    }

    private LoadRange Load(double lowest, double highest, double harmonics) =>
        new(Math.Max(0, lowest - _shunt), Math.Max(0, highest - _shunt), harmonics);

    /// <summary>How much the load of a combination at least grows with its capacitances.</summary>
    public LoadSlopes Slopes(int option, int c1, int c2, in LoadRange load)
    {
        CircuitValues values = Values(option, c1, c2);
        return _critical.Slopes(values, load.Lowest + _shunt, _fineness)
            ?? LoadSlopes.OfCapacitors(_space.Requirement.Board, _family.IsGate, values);
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

            least = Math.Min(least, (node.Amplifier ??= FindOverAmplifier(node)).Ratio);
        }

        return AmplifierShare * least;
    }

    /// <summary>
    /// What the full analysis at least finds at the corners of amplifier and supply, from estimates at those furthest apart: the
    /// shift of the frequency as a ratio, and the drive level in watts.
    /// </summary>
    public (double Ratio, double Watts) LeastOverAmplifier(int option, int c1, int c2)
    {
        Node node = Find(option, c1, c2);
        (double ratio, double watts) = node.Amplifier ??= FindOverAmplifier(node);
        double least = Math.Max(RoughShare * ratio - RoughRatio, FairShare * ratio - FairRatio);
        return (Math.Max(0, least), CornerDriveShare * ProspectAnalysis.LeastCornerDrive * watts);
    }

    // The nodes round a combination with their weights; null for one of which nothing is known.
    private IEnumerable<(Node? Node, double Weight)> Around(int option, int c1, int c2, bool between = true)
    {
        foreach ((int i, double byC1) in Ends(_values[c1]))
        {
            foreach ((int j, double byC2) in Ends(_values[c2]))
            {
                foreach ((int o, double byOption) in between ? Ends(_options[option]) : [(option, 1.0)])
                {
                    Node node = Find(o, i, j);
                    yield return (node.Share == 0 ? null : node, byC1 * byC2 * byOption);
                }
            }
        }
    }

    private int Step => _fineness.Step;

    private int Side(int option, int c1, int c2) => _sides.GetValueOrDefault((option, c1, c2));

    private int Before(int place) => (place - 1) / Step * Step - (place == 0 ? Step : 0);

    private int After(int place) => Math.Min(place + Step, _values.Length - 1) is var next && next > place ? next : int.MaxValue;

    private static IEnumerable<int> Nodes(NodeBracket[] places) =>
        Enumerable.Range(0, places.Length).Where(place => places[place].IsNode);

    private static IEnumerable<(int Place, double Weight)> Ends(NodeBracket bracket)
    {
        yield return (bracket.Low, 1 - bracket.Weight);
        if (!bracket.IsNode)
        {
            yield return (bracket.High, bracket.Weight);
        }
    }

    private Node Find(int option, int c1, int c2)
    {
        if (!_nodes.TryGetValue((option, c1, c2), out Node? node))
        {
            CircuitValues values = Values(option, c1, c2);
            node = new Node(values);
            (RunningState? near, RunningState? other) = Near(option, c1, c2);
            OscillatorCircuit circuit = _template.At(values, _nominal);
            RunningState? state = null;
            if (MayBuildUp(circuit)
                && OscillatorAnalysis.EstimateSteadyState(circuit, near, other, out state) is { } estimate
                && state is not null)
            {
                _last = state;
                double load = _template.Crystal.Crystal.LoadAtFrequencyFarads(estimate.FrequencyHz);
                node.Share = EstimateQuality.Trusts(estimate.HarmonicShare) ? (load + _shunt) / _critical.Farads(values) ?? 0 : 0;
                node.Estimate = new Estimate(estimate.FrequencyHz, load, estimate.DriveWatts, estimate.HarmonicShare, state.Slim());
            }

            _nodes.Add((option, c1, c2), node);
            if (node is { Share: > 0, Estimate.LoadFarads: var farads })
            {
                _sides[(option, c1, c2)] = farads > _window.Highest * SideReserve ? 1 : farads < _window.Lowest / SideReserve ? -1 : 0;
            }
        }

        return node;
    }

    // To find that there is no state costs as much as many estimates; where none is known, a combination is only looked at for longer.
    private bool MayBuildUp(OscillatorCircuit circuit) =>
        _space.Requirement.AllowDisturbance || OscillatorAnalysis.FindMarginAt(circuit, _family.Members[0].Crystal.FrequencyHz) > 1;

    // The states of the two nearest combinations that are known.
    private (RunningState? Near, RunningState? Other) Near(int option, int c1, int c2)
    {
        int o = _options[option].Low;
        int i = c1 / Step * Step;
        int j = c2 / Step * Step;
        RunningState? near = null;
        foreach ((int atOption, int atC1, int atC2) in (ReadOnlySpan<(int, int, int)>)
        [
            (option, c1, c2 + 1), (option, c1, c2 - 1), (option, c1 - 1, c2), (option, c1 + 1, c2), (option, c1 - 1, c2 + 1),
            (option, c1 + 1, c2 - 1), (o, i, j), (o, i, j - Step), (o, i - Step, j), (_options[option].High, i, j),
            (option > 0 ? _options[option - 1].Low : option, i, j),
        ])
        {
            if (_nodes.TryGetValue((atOption, atC1, atC2), out Node? node) && node.Estimate is { State: var state } && state != near)
            {
                if (near is not null)
                {
                    return (near, state);
                }

                near = state;
            }
        }

        return (near ?? _last, _last);
    }

    // The shift over the corners furthest apart, and the higher drive level there.
    private (double Ratio, double Watts) FindOverAmplifier(Node node)
    {
        Estimate estimate = node.Estimate!;
        double hertz = _template.Crystal.Crystal.FrequencyAtLoadHz(estimate.LoadFarads);
        double most = 0;
        double watts = 0;
        foreach (OperatingPoint point in new[] { _template.AmplifierCorners[0], _template.AmplifierCorners[^1] })
        {
            if (OscillatorAnalysis.EstimateSteadyState(_template.At(node.Values, point), estimate.State, out _) is { } there)
            {
                most = Math.Max(most, Math.Abs(there.FrequencyHz / hertz - 1));
                watts = Math.Max(watts, there.DriveWatts);
            }
        }

        return (most, watts);
    }

    private CircuitValues Values(int option, int c1, int c2) =>
        _family.Options[option].With(_space.Capacitors[c1].Farads, _space.Capacitors[c2].Farads);

    private sealed class Node(CircuitValues values)
    {
        public CircuitValues Values => values;

        public Estimate? Estimate { get; set; }

        /// <summary>Capacitance seen by the crystal over that at the critical transconductance; zero where not known.</summary>
        public double Share { get; set; }

        public (double C1, double C2, double Across)? Slopes { get; set; }

        public (double Ratio, double Watts)? Amplifier { get; set; }
    }
}
