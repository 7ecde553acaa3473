using System.Buffers;
using System.Numerics;
using System.Runtime.InteropServices;
using System.Runtime.Intrinsics;

namespace PartPick.Physics.Steady;

/// <summary>
/// What a follower's junctions do in the steps of a period: voltages at each stage, the currents of the last pass and the
/// derivatives by the unknowns. Voltages are logarithms of currents, as in <see cref="JunctionStep"/>.
/// </summary>
internal sealed class FollowerOrbit
{
    private const int Stages = Radau.Stages;
    private const int Voltages = JunctionStep.Voltages;
    private const int Width = JunctionStep.Width;
    private double[] _volts = [];
    private double[] _currents = [];
    private double[] _slopes = [];

    /// <param name="mesh">The steps.</param>
    public FollowerOrbit(PeriodMesh mesh) => Mesh = mesh;

    /// <summary>The steps.</summary>
    public PeriodMesh Mesh { get; private set; }

    /// <summary>Voltages, six to a step.</summary>
    public Span<double> Volts => Room(ref _volts, Mesh.Count * Voltages);

    /// <summary>Currents, six to a step.</summary>
    public Span<double> Currents => Room(ref _currents, Mesh.Count * Voltages);

    /// <summary>Derivatives of the voltages, in rows of <see cref="JunctionStep.Width"/>.</summary>
    public Span<double> Slopes => Room(ref _slopes, Mesh.Count * Voltages * Width);

    /// <summary>Takes other steps; what is known of the voltages is lost.</summary>
    public void Use(PeriodMesh mesh) => Mesh = mesh;

    /// <summary>Takes steps and voltages from another.</summary>
    public void Copy(FollowerOrbit from)
    {
        Use(from.Mesh);
        from.Volts.CopyTo(Volts);
    }

    /// <summary>Moves the voltages along derivatives taken at voltages nearby.</summary>
    /// <param name="at">Holds the derivatives, on the same steps.</param>
    /// <param name="change">Change of the unknowns.</param>
    public void Move(FollowerOrbit at, ReadOnlySpan<double> change)
    {
        ReadOnlySpan<Vector256<double>> rows = MemoryMarshal.Cast<double, Vector256<double>>(at.Slopes);
        var low = Vector256.Create(change[0], change[1], change[2], change[3]);
        var high = Vector256.Create(change[4], change[5], 0, 0);
        Span<double> volts = Volts;
        for (int k = 0; k < volts.Length; k++)
        {
            volts[k] = JunctionLimit.Change(volts[k], Vector256.Sum(rows[2 * k] * low + rows[2 * k + 1] * high));
        }
    }

    /// <summary>The largest change of a voltage by each unknown.</summary>
    public void Weigh(Span<double> weights)
    {
        ReadOnlySpan<Vector256<double>> rows = MemoryMarshal.Cast<double, Vector256<double>>(Slopes);
        Vector256<double> low = Vector256<double>.Zero;
        Vector256<double> high = Vector256<double>.Zero;
        for (int k = 0; k < rows.Length; k += 2)
        {
            low = Vector256.Max(low, Vector256.Abs(rows[k]));
            high = Vector256.Max(high, Vector256.Abs(rows[k + 1]));
        }

        low.CopyTo(weights);
        weights[4] = high[0];
        weights[5] = high[1];
    }

    /// <summary>Small signals: a mean and a sine at the base–emitter junction, the other junction still.</summary>
    public void Start(double forward, Complex sine, double reverse)
    {
        Span<double> volts = Volts;
        for (int step = 0; step < Mesh.Count; step++)
        {
            ReadOnlySpan<Complex> turns = Mesh.Turns(step);
            for (int k = 0; k < Stages; k++)
            {
                volts[step * Voltages + k] = forward + (sine * turns[k]).Real;
                volts[step * Voltages + Stages + k] = reverse;
            }
        }
    }

    /// <summary>Adds a sine to the voltage of each junction.</summary>
    public void Turn(double shift, Complex forward, Complex reverse)
    {
        Span<double> volts = Volts;
        for (int step = 0; step < Mesh.Count; step++)
        {
            ReadOnlySpan<Complex> turns = Mesh.Turns(step);
            for (int k = 0; k < Stages; k++)
            {
                volts[step * Voltages + k] += shift + (forward * turns[k]).Real;
                volts[step * Voltages + Stages + k] += (reverse * turns[k]).Real;
            }
        }
    }

    /// <summary>Means over the period of the voltages, and of the base current for a current gain.</summary>
    public (double Forward, double Reverse, double Base) Means(double beta)
    {
        double forward = 0;
        double reverse = 0;
        double current = 0;
        for (int step = 0; step < Mesh.Count; step++)
        {
            for (int k = 0; k < Stages; k++)
            {
                double weight = Radau.Weights[k] * Mesh.Length(step) / (2 * Math.PI);
                double u = _volts[step * Voltages + k];
                double w = _volts[step * Voltages + Stages + k];
                forward += weight * u;
                reverse += weight * w;
                current += weight * (Math.Exp(u) / beta + Math.Exp(w));
            }
        }

        return (forward, reverse, current);
    }

    /// <summary>Largest vBC, and the emitter's lowest and highest voltage against the supply, between the stages by cubics.</summary>
    public (double Reverse, double Low, double High) Extremes()
    {
        const int Parts = 8;
        double reverse = double.NegativeInfinity;
        double low = double.PositiveInfinity;
        double high = double.NegativeInfinity;
        Span<double> emitter = stackalloc double[4];
        for (int step = 0; step < Mesh.Count; step++)
        {
            ReadOnlySpan<double> at = _volts.AsSpan(step * Voltages, Voltages);
            ReadOnlySpan<double> last = _volts.AsSpan((step == 0 ? Mesh.Count - 1 : step - 1) * Voltages, Voltages);
            emitter[0] = last[5] - last[2];
            for (int k = 0; k < Stages; k++)
            {
                emitter[k + 1] = at[Stages + k] - at[k];
            }

            for (int part = 1; part <= Parts; part++)
            {
                double t = (double)part / Parts;
                double volts = Radau.Cubic(t, emitter[0], emitter[1], emitter[2], emitter[3]);
                low = Math.Min(low, volts);
                high = Math.Max(high, volts);
                reverse = Math.Max(reverse, Radau.Cubic(t, last[5], at[3], at[4], at[5]));
            }
        }

        return (reverse, low, high);
    }

    /// <summary>Gives the room for its numbers back; what it knew is lost.</summary>
    public void Release()
    {
        Give(ref _volts);
        Give(ref _currents);
        Give(ref _slopes);
    }

    private static void Give(ref double[] array)
    {
        if (array.Length > 0)
        {
            ArrayPool<double>.Shared.Return(array);
            array = [];
        }
    }

    private static Span<double> Room(ref double[] array, int count)
    {
        if (array.Length < count)
        {
            Give(ref array);
            array = ArrayPool<double>.Shared.Rent(count);
            Array.Clear(array);
        }

        return array.AsSpan(0, count);
    }
}
