namespace PartPick.Catalog.Tests.BuiltIn;

/// <summary>
/// Three complementary square-law stages (Shichman, Hodges 1968) in a row, integrated in time: how much later the output turns
/// round than the input. The capacitance between the stages is set so that the chain meets a propagation delay as makers
/// measure it, with edges of 6 ns and 50 pF.
/// </summary>
internal sealed class SlowEdgeChain
{
    private const double EdgeSeconds = 6e-9;
    private const double MakersLoadFarads = 55e-12;
    private const double OscillatorLoadFarads = 15e-12;
    private const double Modulation = 0.05;
    private readonly double _supply;
    private readonly double _threshold;
    private readonly double _outputStrength;
    private readonly double _ron;
    private readonly double _between;

    public SlowEdgeChain(double supply, double threshold, double ron, double propagationDelay)
    {
        (_supply, _threshold, _ron) = (supply, threshold, ron);
        _outputStrength = 1 / (ron * (supply - threshold));
        (double low, double high) = (1e-11, 1e-6);
        for (int step = 0; step < 22; step++)
        {
            _between = Math.Sqrt(low * high);
            (low, high) = StepDelay() < propagationDelay ? (_between, high) : (low, _between);
        }
    }

    /// <summary>Delay of a sine of a third of the supply, less what the output's resistance and 15 pF make of it.</summary>
    public double ExcessDelay(double hertz)
    {
        double period = 1 / hertz;
        double fall = Falls(2.8 * period, 1.9 * period, OscillatorLoadFarads, Sine);
        return fall - (2 * period) - (Math.Log(2) * _ron * OscillatorLoadFarads);

        double Sine(double t) => (_supply / 2) + (_supply / 3 * Math.Sin(2 * Math.PI * hertz * t));
    }

    private double StepDelay()
    {
        const double Start = 5e-9;
        double fall = Falls(300e-9, 0, MakersLoadFarads, t => _supply * Math.Clamp((t - Start) / EdgeSeconds, 0, 1));
        return fall - Start - (EdgeSeconds / 2);
    }

    // When the output falls through half the supply after a time; infinite where it does not. Midpoint rule, 20 ps.
    private double Falls(double until, double after, double load, Func<double, double> input)
    {
        const double Step = 20e-12;
        (double a, double b, double c) = (_supply, 0, _supply);
        for (double t = 0; t < until; t += Step)
        {
            double drive = input(t);
            (double da, double db, double dc) = Slopes(drive, a, b, c, load);
            (da, db, dc) = Slopes(drive, a + (Step / 2 * da), b + (Step / 2 * db), c + (Step / 2 * dc), load);
            double before = c;
            (a, b, c) = (a + (Step * da), b + (Step * db), c + (Step * dc));
            if (t > after && before > _supply / 2 && c <= _supply / 2)
            {
                return t + (Step * (before - (_supply / 2)) / (before - c));
            }
        }

        return double.PositiveInfinity;
    }

    private (double A, double B, double C) Slopes(double drive, double a, double b, double c, double load) =>
        (Stage(drive, a) / _between, Stage(a, b) / _between, _outputStrength * Stage(b, c) / load);

    // Current into the output of a stage of k = 1 A/V².
    private double Stage(double input, double output) => Current(_supply - input, _supply - output) - Current(input, output);

    private double Current(double gate, double drain)
    {
        if (drain < 0)
        {
            return -Current(gate - drain, -drain);
        }

        double over = gate - _threshold;
        double current = over <= 0 ? 0 : drain < over ? (over - (drain / 2)) * drain : over * over / 2;
        return current * (1 + (Modulation * drain));
    }
}
