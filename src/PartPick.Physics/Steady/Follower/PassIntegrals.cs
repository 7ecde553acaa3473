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

    /// <param name="beta">Current gain.</param>
    public PassIntegrals(double beta) => _emitterPerForward = 1 + 1 / beta;

    /// <summary>Mean emitter current.</summary>
    public double MeanEmitter { get; private set; }

    /// <summary>Mean of the collector junction's voltage.</summary>
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
        ReadOnlySpan<Vector256<double>> lines = MemoryMarshal.Cast<double, Vector256<double>>(slopes);
        for (int k = 0; k < Stages; k++)
        {
            double weight = Radau.Weights[k] * share;
            double forward = weight * currents[k];
            double backward = weight * currents[Stages + k];
            Complex turn = Complex.Conjugate(turns[k]) * (2 / amps);
            Complex perForward = ports.OwnPerForward * turn * forward;
            Complex perReverse = ports.OwnPerReverse * turn * backward;
            MeanEmitter += _emitterPerForward * forward - backward;
            MeanReverse += weight * volts[Stages + k];
            Impedance += perForward + perReverse;
            for (int half = 0; half < 2; half++)
            {
                Vector256<double> u = lines[2 * k + half];
                Vector256<double> w = lines[2 * (Stages + k) + half];
                Accumulate(_emitter, half, u, _emitterPerForward * forward, w, -backward);
                Accumulate(_reverse, half, u, 0, w, weight);
                Accumulate(_resistance, half, u, perForward.Real, w, perReverse.Real);
                Accumulate(_reactance, half, u, perForward.Imaginary, w, perReverse.Imaginary);
            }
        }
    }

    /// <summary>Ends a pass: what the crystal's current itself makes at its terminals.</summary>
    public void Close(Complex own)
    {
        _resistance[FollowerPass.LogAmps] -= Impedance.Real;
        _reactance[FollowerPass.LogAmps] -= Impedance.Imaginary;
        Impedance += own;
    }

    private static void Accumulate(double[] sums, int half, Vector256<double> u, double perU, Vector256<double> w, double perW)
    {
        ref Vector256<double> sum = ref MemoryMarshal.Cast<double, Vector256<double>>(sums.AsSpan())[half];
        sum += u * perU + w * perW;
    }
}
