using MathNet.Numerics.LinearAlgebra;
using PartPick.Physics.Circuits;
using Complex = System.Numerics.Complex;

namespace PartPick.Physics.Tests.Independent;

/// <summary>
/// The natural mode near the crystal's series resonance, as an eigenvalue of the complete circuit: node voltages,
/// motional current and the charge of the motional capacitance together. With a delay the determinant of the same
/// matrix is zeroed by Muller's method.
/// </summary>
internal static class NaturalModes
{
    /// <summary>Complex natural frequency s in rad/s.</summary>
    public static Complex Mode(OscillatorCircuit circuit, double transconductance)
    {
        var pencil = new Pencil(circuit.Crystal, SmallSignalNetwork.Of(circuit, transconductance));
        return pencil.Mode();
    }

    public static double GrowthRate(OscillatorCircuit circuit, double transconductance) =>
        Mode(circuit, transconductance).Real;

    /// <summary>−Re Zc at the mode's real frequency, in ohms.</summary>
    public static double NegativeResistance(OscillatorCircuit circuit, double transconductance)
    {
        Complex s = Mode(circuit, transconductance);
        return -SmallSignalNetwork.Of(circuit, transconductance).Impedance(new Complex(0, s.Imaginary)).Real;
    }

    /// <summary>
    /// (A + pB) x = 0 with p = s/ω0. Unknowns: node voltages, the motional current times a reference impedance, and the
    /// motional capacitance's voltage in the same unit after division by the branch's reactance.
    /// </summary>
    private sealed class Pencil
    {
        private readonly Crystal _crystal;
        private readonly SmallSignalNetwork _network;
        private readonly double _omega;
        private readonly double _reference;
        private readonly Matrix<Complex> _dynamic;

        public Pencil(Crystal crystal, SmallSignalNetwork network)
        {
            _crystal = crystal;
            _network = network;
            _omega = 2 * Math.PI * crystal.SeriesHz;
            Matrix<double> capacitance = network.Capacitance();
            _reference = 1 / (_omega * capacitance.Diagonal().Maximum());
            int n = network.Nodes;
            _dynamic = Matrix<Complex>.Build.Dense(n + 2, n + 2);
            _dynamic.SetSubMatrix(0, 0, (capacitance * (_omega * _reference)).ToComplex());
            _dynamic[n, n] = 1;
            _dynamic[n + 1, n + 1] = 1;
        }

        public Complex Mode()
        {
            Complex p = new(0, 1);
            double offset = 1e-3;
            for (int pass = 0; pass < 4; pass++)
            {
                p = Nearest(p, p + new Complex(offset, offset));
                offset *= 1e-2;
            }

            return _omega * (_network.DelaySeconds > 0 ? Muller(p) : p);
        }

        /// <summary>The eigenvalue nearest to the shift, delays frozen at the point given.</summary>
        private Complex Nearest(Complex frozen, Complex shift)
        {
            Matrix<Complex> shifted = Static(frozen) + _dynamic * shift;
            Vector<Complex> inverse = shifted.Solve(_dynamic).Evd().EigenValues;
            Complex largest = inverse.MaxBy(value => value.Magnitude);
            return shift - 1 / largest;
        }

        private Complex Muller(Complex start)
        {
            Complex x0 = start * (1 + 1e-6), x1 = start * (1 - 1e-6), x2 = start;
            Complex f0 = Determinant(x0), f1 = Determinant(x1), f2 = Determinant(x2);
            for (int pass = 0; pass < 30; pass++)
            {
                Complex h1 = x1 - x0, h2 = x2 - x1;
                Complex d1 = (f1 - f0) / h1, d2 = (f2 - f1) / h2;
                Complex a = (d2 - d1) / (h2 + h1);
                Complex b = a * h2 + d2;
                Complex root = Complex.Sqrt(b * b - 4 * a * f2);
                Complex denominator = (b + root).Magnitude > (b - root).Magnitude ? b + root : b - root;
                Complex step = -2 * f2 / denominator;
                if (f2 == Complex.Zero || !double.IsFinite(step.Magnitude))
                {
                    return x2;
                }

                (x0, x1, x2) = (x1, x2, x2 + step);
                (f0, f1, f2) = (f1, f2, Determinant(x2));
                if (step.Magnitude < 1e-14)
                {
                    return x2;
                }
            }

            return x2;
        }

        private Complex Determinant(Complex p) => (Static(p) + _dynamic * p).Determinant();

        private Matrix<Complex> Static(Complex p)
        {
            int n = _network.Nodes;
            double reactance = 1 / (_omega * _crystal.MotionalFarads);
            var matrix = Matrix<Complex>.Build.Dense(n + 2, n + 2);
            matrix.SetSubMatrix(0, 0, _network.Conductance(p * _omega) * _reference);
            Terminal(_network.CrystalPlus, 1);
            Terminal(_network.CrystalMinus, -1);
            matrix[n, n] = _crystal.ResistanceOhms / reactance;
            matrix[n, n + 1] = 1;
            matrix[n + 1, n] = -1;
            return matrix;

            void Terminal(int node, double sign)
            {
                if (node >= 0)
                {
                    matrix[node, n] += sign;
                    matrix[n, node] -= sign * _reference / reactance;
                }
            }
        }
    }
}
