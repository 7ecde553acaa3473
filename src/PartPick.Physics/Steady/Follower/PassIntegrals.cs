using System.Numerics;
using System.Runtime.InteropServices;
using System.Runtime.Intrinsics;
using PartPick.Physics.Network;

namespace PartPick.Physics.Steady;

/// <summary>What a pass through the period sums up: mean currents and the crystal's impedance, each with its derivatives.</summary>
internal sealed class PassIntegrals
{
    private const int Stages = Radau.Stages;
    private const int Width = JunctionStep.Width;
    private readonly double _emitterPerForward;
    private readonly double[] _emitter = new double[Width];
    private readonly double[] _reverse = new double[Width];
    private readonly double[] _resistance = new double[Width];
    private readonly double[] _reactance = new double[Width];

    private readonly bool _holdsBase;

    /// <param name="beta">Current gain.</param>
    /// <param name="holdsBase">Whether the mean of the collector junction's voltage is asked for.</param>
    public PassIntegrals(double beta, bool holdsBase)
    {
        _emitterPerForward = 1 + 1 / beta;
        _holdsBase = holdsBase;
    }

    /// <summary>Mean emitter current.</summary>
    public double MeanEmitter { get; private set; }

    /// <summary>Mean of the collector junction's voltage, where it is asked for.</summary>
    public double MeanReverse { get; private set; }

    /// <summary>Zc in ohms.</summary>
    public Complex Impedance { get; private set; }

    public ReadOnlySpan<double> MeanEmitterSlopes => _emitter.AsSpan(0, FollowerPass.Unknowns);

    public ReadOnlySpan<double> MeanReverseSlopes => _reverse.AsSpan(0, FollowerPass.Unknowns);

    public ReadOnlySpan<double> ResistanceSlopes => _resistance.AsSpan(0, FollowerPass.Unknowns);

    public ReadOnlySpan<double> ReactanceSlopes => _reactance.AsSpan(0, FollowerPass.Unknowns);

    /// <summary>Begins a pass.</summary>
    public void Clear()
    {
        MeanEmitter = 0;
        MeanReverse = 0;
        Impedance = Complex.Zero;
        Array.Clear(_emitter);
        Array.Clear(_reverse);
        Array.Clear(_resistance);
        Array.Clear(_reactance);
    }

    /// <summary>Adds a step.</summary>
    /// <param name="share">The step's share of the period.</param>
    /// <param name="turns">e^(jθ) at its stages.</param>
    /// <param name="ports">Transfer impedances at the crystal's frequency.</param>
    /// <param name="amps">Peak motional current in units of the emitter current at rest.</param>
    /// <param name="volts">Voltages of the junctions.</param>
    /// <param name="currents">Their currents.</param>
    /// <param name="slopes">Derivatives of the voltages.</param>
    public void Add(
        double share,
        ReadOnlySpan<Complex> turns,
        in FollowerPorts ports,
        double amps,
        ReadOnlySpan<double> volts,
        ReadOnlySpan<double> currents,
        ReadOnlySpan<double> slopes)
    {
        if (currents[0] + currents[1] + currents[2] == 0 && !_holdsBase)
        {
            return;
        }

        ReadOnlySpan<Vector256<double>> lines = MemoryMarshal.Cast<double, Vector256<double>>(slopes);
        Span<Vector256<double>> emitter = MemoryMarshal.Cast<double, Vector256<double>>(_emitter.AsSpan());
        Span<Vector256<double>> resistance = MemoryMarshal.Cast<double, Vector256<double>>(_resistance.AsSpan());
        Span<Vector256<double>> reactance = MemoryMarshal.Cast<double, Vector256<double>>(_reactance.AsSpan());
        double real = 0;
        double imaginary = 0;
        for (int k = 0; k < Stages; k++)
        {
            double weight = Radau.Weights[k] * share;
            double forward = weight * currents[k];
            Complex turn = Complex.Conjugate(turns[k]) * (2 / amps);
            Complex perForward = ports.OwnPerForward * turn * forward;
            MeanEmitter += _emitterPerForward * forward;
            real += perForward.Real;
            imaginary += perForward.Imaginary;
            Accumulate(emitter, lines, k, _emitterPerForward * forward);
            Accumulate(resistance, lines, k, perForward.Real);
            Accumulate(reactance, lines, k, perForward.Imaginary);
            if (currents[Stages + k] != 0)
            {
                double backward = weight * currents[Stages + k];
                Complex perReverse = ports.OwnPerReverse * turn * backward;
                MeanEmitter -= backward;
                real += perReverse.Real;
                imaginary += perReverse.Imaginary;
                Accumulate(emitter, lines, Stages + k, -backward);
                Accumulate(resistance, lines, Stages + k, perReverse.Real);
                Accumulate(reactance, lines, Stages + k, perReverse.Imaginary);
            }

            if (_holdsBase)
            {
                MeanReverse += weight * volts[Stages + k];
                Accumulate(MemoryMarshal.Cast<double, Vector256<double>>(_reverse.AsSpan()), lines, Stages + k, weight);
            }
        }

        Impedance += new Complex(real, imaginary);
    }

    /// <summary>Ends a pass: what the crystal's current itself makes at its terminals.</summary>
    public void Close(Complex own)
    {
        _resistance[FollowerPass.LogAmps] -= Impedance.Real;
        _reactance[FollowerPass.LogAmps] -= Impedance.Imaginary;
        Impedance += own;
    }

    private static void Accumulate(Span<Vector256<double>> sums, ReadOnlySpan<Vector256<double>> lines, int line, double weight)
    {
        sums[0] += lines[2 * line] * weight;
        sums[1] += lines[2 * line + 1] * weight;
    }
}
