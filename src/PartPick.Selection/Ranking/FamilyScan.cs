using PartPick.Physics;
using PartPick.Physics.Circuits;

namespace PartPick.Selection.Search;

/// <summary>
/// The first look at a family: which combinations of values have the margin, and could bring a crystal near its target. Uses
/// start-up figures and quick estimates; what it drops is off by more than an estimate can be.
/// </summary>
internal sealed class FamilyScan
{
    /// <summary>Share of the pull from series resonance by which an estimate may be off.</summary>
    private const double EstimateShare = 0.02;

    /// <summary>What else an estimate may be off, as a ratio.</summary>
    private const double EstimateFloor = 0.5e-6;

    // Load seen over load of the capacitors in series: never outside these bounds in the model, and steady between neighbours.
    private const double LowestLoadShare = 0.5;
    private const double HighestLoadShare = 1.5;
    private const double NeighbourShare = 0.07;
    private const double MarginSlack = 0.98;
    private readonly SearchSpace _space;
    private readonly CircuitFamily _family;
    private readonly CancellationToken _cancellation;
    private readonly CircuitTemplate _template;
    private readonly double _lowestLoad;
    private readonly double _highestLoad;
    private readonly double[] _loadShares;
    private readonly OperatingPoint _nominal;

    public FamilyScan(SearchSpace space, CircuitFamily family, CancellationToken cancellation)
    {
        _space = space;
        _family = family;
        _cancellation = cancellation;
        _template = family.Members[0].Template;
        _nominal = OperatingPoint.Nominal(space.Requirement);
        _loadShares = new double[family.Options.Length];
        _lowestLoad = double.PositiveInfinity;
        _highestLoad = 0;
        foreach (FamilyMember member in family.Members)
        {
            (double low, double high) = LoadWindow(member);
            _lowestLoad = Math.Min(_lowestLoad, low);
            _highestLoad = Math.Max(_highestLoad, high);
        }
    }

    /// <summary>What may be fit for some crystal of the family.</summary>
    public List<Estimate> Estimates { get; } = [];

    /// <summary>Combinations (of parts, for one crystal) that the margin removed.</summary>
    public double MarginRejections { get; private set; }

    /// <summary>Combinations (of parts, for one crystal) that the frequency error removed for every crystal.</summary>
    public double ErrorRejections { get; private set; }

    /// <summary>The combination of values with the largest margin among those that miss it, and that margin.</summary>
    public (int Option, int C1, int C2, double Margin)? BestMarginMiss { get; private set; }

    /// <summary>Largest relative error of an estimated frequency.</summary>
    public static double EstimateError(Crystal crystal, double frequencyHz) =>
        EstimateShare * Math.Abs(frequencyHz / crystal.SeriesHz - 1) + EstimateFloor;

    /// <summary>Runs the scan.</summary>
    public void Run()
    {
        for (int i = 0; i < _space.Capacitors.Length; i++)
        {
            Array.Clear(_loadShares);
            for (int j = 0; j < _space.Capacitors.Length; j++)
            {
                _cancellation.ThrowIfCancellationRequested();
                double weight = (double)_space.Capacitors[i].Parts.Length * _space.Capacitors[j].Parts.Length;
                double load = StaticLoad(_space.Capacitors[i].Farads, _space.Capacitors[j].Farads);
                if (load * HighestLoadShare < _lowestLoad || load * LowestLoadShare > _highestLoad)
                {
                    ErrorRejections += weight * _family.Options.Length;
                    continue;
                }

                ScanPair(i, j, load, weight);
            }
        }
    }

    private void ScanPair(int i, int j, double staticLoad, double weight)
    {
        double c1 = _space.Capacitors[i].Farads;
        double c2 = _space.Capacitors[j].Farads;
        double wanted = _space.Requirement.AllowDisturbance ? double.NegativeInfinity : _space.Requirement.Margin * MarginSlack;
        double before = double.NegativeInfinity;
        double share = 0;
        RunningState? near = null;
        for (int option = 0; option < _family.Options.Length; option++)
        {
            double known = share != 0 ? share : _loadShares[option];
            double expected = staticLoad * known;
            if (known != 0 && (expected * (1 + NeighbourShare) < _lowestLoad || expected * (1 - NeighbourShare) > _highestLoad))
            {
                ErrorRejections += weight;
                continue;
            }

            CircuitValues values = _family.Options[option].With(c1, c2);
            double margin = WorstMargin(values, wanted, out double first);
            if (margin < wanted)
            {
                NoteMarginMiss(option, i, j, margin);
                if (_family.Kind != CircuitKind.Follower && first < wanted && first < before)
                {
                    // At one corner the margin rises, if at all, and then falls along Rs: nothing beyond has it.
                    MarginRejections += weight * (_family.Options.Length - option);
                    return;
                }

                before = first;
                MarginRejections += weight;
                continue;
            }

            before = first;
            OscillatorCircuit circuit = _template.At(values, _nominal);
            if (OscillatorAnalysis.EstimateSteadyState(circuit, near, out RunningState? state) is not { } estimate || state is null)
            {
                ErrorRejections += weight;
                continue;
            }

            near = state;
            double load = _template.Crystal.Crystal.LoadAtFrequencyFarads(estimate.FrequencyHz);
            share = load / staticLoad;
            _loadShares[option] = share;
            Estimates.Add(new Estimate(option, i, j, margin, load, estimate, state.Slim()));
        }
    }

    // The first corner is the weakest device at the lowest supply.
    private double WorstMargin(in CircuitValues values, double wanted, out double first)
    {
        first = OscillatorAnalysis.FindStartFigures(_template.At(values, _template.AmplifierCorners[0])).Margin;
        double least = first;
        for (int corner = 1; corner < _template.AmplifierCorners.Length && least >= wanted; corner++)
        {
            least = Math.Min(least, OscillatorAnalysis.FindStartFigures(_template.At(values, _template.AmplifierCorners[corner])).Margin);
        }

        return least;
    }

    private void NoteMarginMiss(int option, int i, int j, double margin)
    {
        if (BestMarginMiss is not { } best || margin > best.Margin)
        {
            BestMarginMiss = (option, i, j, margin);
        }
    }

    private double StaticLoad(double c1, double c2)
    {
        Strays strays = _space.Requirement.Board.Strays;
        if (_template.At(new CircuitValues(c1, c2), _nominal) is GateCircuit gate)
        {
            double a = c1 + strays.InputFarads + gate.Inverter.InputFarads;
            double b = c2 + strays.OutputFarads + gate.Inverter.OutputFarads / 2;
            return a * b / (a + b) + strays.AcrossFarads + gate.Inverter.FeedbackFarads;
        }

        double emitter = c2 + strays.OutputFarads;
        return c1 * emitter / (c1 + emitter) + strays.AcrossFarads;
    }

    private (double Low, double High) LoadWindow(FamilyMember member)
    {
        Crystal crystal = member.Model.Crystal;
        double room = _space.Requirement.BudgetRatio - member.TermsRatio;
        double high = Bound(member.TargetHz * (1 - room));
        double low = Bound(member.TargetHz * (1 + room));
        return (low, high);

        double Bound(double frequencyHz)
        {
            if (frequencyHz <= crystal.SeriesHz)
            {
                return double.PositiveInfinity;
            }

            return Math.Max(0, crystal.LoadAtFrequencyFarads(frequencyHz));
        }
    }
}
