using System.Numerics;

namespace PartPick.Physics.Steady;

/// <summary>
/// Fourier coefficients of tanh(α u(θ)) for an input u of odd harmonics that crosses zero twice a period, and of its
/// derivative. However steep the tanh, the integrals are exact to about 1e-11.
/// </summary>
internal sealed class SaturatedSine
{
    private const double Reach = 18;
    private const int FewestUniform = 64;
    private const int MostUniform = 512;
    private static readonly double[] Panels = [0, 2, 5, 10, Reach];
    private static readonly (double Node, double Weight)[] Gauss = GaussNodes();
    private readonly double _steepness;
    private readonly double[] _angles;
    private readonly double[] _values;
    private readonly double[] _slopes;
    private readonly Complex[] _moments;
    private int _count;
    private double _flatFrom;
    private double _flatTo;
    private double _flatValue;

    /// <param name="harmonics">Number of odd harmonics of the input.</param>
    /// <param name="steepness">α in 1/V.</param>
    public SaturatedSine(int harmonics, double steepness)
    {
        _steepness = steepness;
        Input = new Complex[harmonics];
        _angles = new double[MostUniform];
        _values = new double[MostUniform];
        _slopes = new double[MostUniform];
        _moments = new Complex[2 * harmonics + 1];
    }

    /// <summary>Complex amplitudes of the input's odd harmonics 1, 3, …, in volts.</summary>
    public Complex[] Input { get; }

    /// <summary>Takes the input as it stands and evaluates the tanh and its derivative where they change.</summary>
    public void Prepare()
    {
        Complex[] input = Input;
        double crossing = ZeroCrossing(input);
        Evaluate(input, crossing, out double slope);
        double width = 1 / (_steepness * Math.Abs(slope));
        // The tanh's nearest pole is (π/2)·width off the real axis: 8/width equal steps in half a period leave an error of 1e-11.
        double wanted = Math.Max(8 / width, Math.Max(FewestUniform, 4 * input.Length));
        if (wanted > MostUniform)
        {
            PlaceRound(crossing, width);
            _flatFrom = crossing + Reach * width;
            _flatTo = crossing + Math.PI - Reach * width;
            _flatValue = Math.Sign(slope);
        }
        else
        {
            // In steps of 64, so that a small change of the input does not change the rule.
            _count = (int)Math.Ceiling(wanted / FewestUniform) * FewestUniform;
            for (int j = 0; j < _count; j++)
            {
                _angles[j] = Math.PI * j / _count;
                _slopes[j] = Math.PI / _count;
            }

            _flatFrom = _flatTo = _flatValue = 0;
        }

        Array.Clear(_moments);
        for (int j = 0; j < _count; j++)
        {
            double weight = _slopes[j];
            double value = Math.Tanh(_steepness * Evaluate(input, _angles[j], out _));
            _values[j] = value * weight;
            _slopes[j] = _steepness * (1 - value * value) * weight;
            Complex turn = Complex.FromPolarCoordinates(1, -2 * _angles[j]);
            Complex term = _slopes[j] * 2 / Math.PI;
            for (int k = 0; k < _moments.Length; k++)
            {
                _moments[k] += term;
                term *= turn;
            }
        }
    }

    /// <summary>Complex amplitude of the odd harmonic n of the tanh.</summary>
    public Complex Harmonic(int n)
    {
        Complex sum = Complex.Zero;
        for (int j = 0; j < _count; j++)
        {
            sum += _values[j] * Complex.FromPolarCoordinates(1, -n * _angles[j]);
        }

        if (_flatValue != 0)
        {
            Complex ends = Complex.FromPolarCoordinates(1, -n * _flatTo) - Complex.FromPolarCoordinates(1, -n * _flatFrom);
            sum += _flatValue * ends / new Complex(0, -n);
        }

        return sum * (2 / Math.PI);
    }

    /// <summary>Derivative of harmonic n of the tanh by the real and the imaginary part of harmonic m of the input.</summary>
    public void Derivative(int n, int m, out Complex byReal, out Complex byImaginary)
    {
        Complex difference = n >= m ? _moments[(n - m) / 2] : Complex.Conjugate(_moments[(m - n) / 2]);
        Complex sum = _moments[(n + m) / 2];
        byReal = (difference + sum) / 2;
        byImaginary = -(difference - sum) / new Complex(0, 2);
    }

    private static double ZeroCrossing(Complex[] input)
    {
        double angle = Math.PI / 2 - input[0].Phase;
        for (int step = 0; step < 20; step++)
        {
            double value = Evaluate(input, angle, out double slope);
            double change = value / slope;
            if (!double.IsFinite(change))
            {
                break;
            }

            angle -= Math.Clamp(change, -0.3, 0.3);
            if (Math.Abs(change) < 1e-15)
            {
                break;
            }
        }

        return angle;
    }

    private static double Evaluate(Complex[] input, double angle, out double slope)
    {
        Complex turn = Complex.FromPolarCoordinates(1, 2 * angle);
        Complex root = Complex.FromPolarCoordinates(1, angle);
        double value = 0;
        slope = 0;
        for (int h = 0; h < input.Length; h++)
        {
            Complex term = input[h] * root;
            value += term.Real;
            slope -= (2 * h + 1) * term.Imaginary;
            root *= turn;
        }

        return value;
    }

    private static (double Node, double Weight)[] GaussNodes()
    {
        const int Order = 10;
        var rule = new MathNet.Numerics.Integration.GaussLegendreRule(-1, 1, Order);
        return [.. Enumerable.Range(0, Order).Select(i => (rule.GetAbscissa(i), rule.GetWeight(i)))];
    }

    private void PlaceRound(double crossing, double width)
    {
        _count = 0;
        for (int panel = 0; panel + 1 < Panels.Length; panel++)
        {
            double half = (Panels[panel + 1] - Panels[panel]) / 2 * width;
            double middle = (Panels[panel + 1] + Panels[panel]) / 2 * width;
            foreach ((double node, double weight) in Gauss)
            {
                double distance = middle + half * node;
                _angles[_count] = crossing + distance;
                _slopes[_count++] = weight * half;
                _angles[_count] = crossing - distance;
                _slopes[_count++] = weight * half;
            }
        }
    }
}
