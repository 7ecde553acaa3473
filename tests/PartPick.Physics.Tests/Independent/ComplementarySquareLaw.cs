using PartPick.Physics.Devices;

namespace PartPick.Physics.Tests.Independent;

/// <summary>Two equal complementary square-law transistors (Shichman, Hodges 1968) and a linear resistor at the output.</summary>
internal sealed class ComplementarySquareLaw
{
    private readonly double _supply;
    private readonly double _threshold;
    private readonly double _k;
    private readonly double _lambda;
    private readonly double _leftover;

    public ComplementarySquareLaw(OneStageInverter inverter, double supplyVolts)
    {
        _supply = supplyVolts;
        _threshold = inverter.ThresholdVolts;
        double overdrive = supplyVolts / 2 - inverter.ThresholdVolts;
        double q = 2 / (inverter.Gm * inverter.Ro * overdrive);
        double lambda = q / (1 - q * supplyVolts / 2);
        _lambda = lambda is < 0 or > 0.2 ? 0.2 : lambda;
        _k = inverter.Gm / (2 * overdrive * (1 + _lambda * supplyVolts / 2));
        _leftover = Math.Max(0, 1 / inverter.Ro - _k * overdrive * overdrive * _lambda);
    }

    /// <summary>Current from the output node into the inverter, and its derivatives by the input's and output's voltage.</summary>
    public (double Amps, double ByInput, double ByOutput) OutputCurrent(double input, double output)
    {
        (double sink, double sinkGate, double sinkDrain) = Transistor(input, output);
        (double source, double sourceGate, double sourceDrain) = Transistor(_supply - input, _supply - output);
        return (sink - source + (output - _supply / 2) * _leftover, sinkGate + sourceGate, sinkDrain + sourceDrain + _leftover);
    }

    private (double Amps, double ByGate, double ByDrain) Transistor(double gate, double drain)
    {
        if (drain < 0)
        {
            // Source and drain change places: the gate is now counted from the old drain.
            (double amps, double byGate, double byDrain) = Transistor(gate - drain, -drain);
            return (-amps, -byGate, byGate + byDrain);
        }

        double over = gate - _threshold;
        if (over <= 0)
        {
            return (0, 0, 0);
        }

        double channel = 1 + _lambda * drain;
        if (drain >= over)
        {
            return (_k / 2 * over * over * channel, _k * over * channel, _k / 2 * over * over * _lambda);
        }

        double shape = (over - drain / 2) * drain;
        return (_k * shape * channel, _k * drain * channel, _k * ((over - drain) * channel + shape * _lambda));
    }
}
