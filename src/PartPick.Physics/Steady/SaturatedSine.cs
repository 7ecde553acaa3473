using System.Numerics;

namespace PartPick.Physics.Steady;

/// <summary>
/// Fourier coefficients of tanh(α u(θ)) for an input u of odd harmonics that crosses zero twice a period, and of its
/// derivative. A steep tanh is a square wave whose edges are those of tanh along a straight line, in closed form; a shallow
/// one is summed at equal steps.
/// </summary>
internal sealed class SaturatedSine
{
    // Below this width of an edge, in radians, the input is straight across it: what is left is of the order of width⁴.
    private const double StraightWidth = 0.02;
    private const double StepsPerWidth = 8;
    private const int StepQuantum = 64;
    private const int MostSteps = 448;
    private readonly double _steepness;
    private readonly double[] _values = new double[MostSteps];
    private readonly double[] _slopes = new double[MostSteps];
    private readonly Complex[] _moments;
    private readonly Complex[] _harmonics;
    private int _count;
    private double _crossing;
    private double _width;
    private double _sign;

    /// <param name="harmonics">Number of odd harmonics of the input.</param>
    /// <param name="steepness">α in 1/V.</param>
    public SaturatedSine(int harmonics, double steepness)
    {
        _steepness = steepness;
        Input = new Complex[harmonics];
        _moments = new Complex[2 * harmonics + 1];
        _harmonics = new Complex[harmonics];
    }

    /// <summary>Complex amplitudes of the input's odd harmonics 1, 3, …, in volts.</summary>
    public Complex[] Input { get; }

    /// <summary>Takes the input as it stands and computes the coefficients of the tanh and of its derivative.</summary>
    public void Prepare()
    {
        _crossing = ZeroCrossing(Input);
        Evaluate(Input, _crossing, out double slope);
        _width = 1 / (_steepness * Math.Abs(slope));
        _sign = Math.Sign(slope);
        if (_width < StraightWidth)
        {
            PrepareEdges(slope);
        }
        else
        {
            PrepareSteps();
        }
    }

    /// <summary>Complex amplitude of the odd harmonic n of the tanh.</summary>
    public Complex Harmonic(int n)
    {
        if (n / 2 < _harmonics.Length)
        {
            return _harmonics[n / 2];
        }

        return _count == 0 ? Edge(n) : Sum(n);
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
        Complex root = Complex.FromPolarCoordinates(1, angle);
        Complex turn = root * root;
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

    private void PrepareEdges(double slope)
    {
        _count = 0;
        for (int h = 0; h < _harmonics.Length; h++)
        {
            _harmonics[h] = Edge(2 * h + 1);
        }

        for (int k = 0; k < _moments.Length; k++)
        {
            double size = 4 / (Math.PI * Math.Abs(slope)) * Rounding(2 * k);
            _moments[k] = Complex.FromPolarCoordinates(size, -2 * k * _crossing);
        }
    }

    // A square wave's harmonic times the spectrum of its edge.
    private Complex Edge(int n) =>
        _sign * 4 / (Math.PI * n) * Rounding(n) * new Complex(0, -1) * Complex.FromPolarCoordinates(1, -n * _crossing);

    // The spectrum of sech²(θ/w)/(2w): (πnw/2)/sinh(πnw/2).
    private double Rounding(int n)
    {
        double x = Math.PI * n * _width / 2;
        return x < 1e-4 ? 1 - x * x / 6 : x / Math.Sinh(x);
    }

    // The tanh's nearest pole is (π/2)·width off the real axis: 8/width equal steps in half a period leave an error of 1e-11.
    private void PrepareSteps()
    {
        double wanted = Math.Max(StepsPerWidth / _width, 4 * Input.Length);
        _count = Math.Min(MostSteps, (int)Math.Ceiling(wanted / StepQuantum) * StepQuantum);
        Array.Clear(_moments);
        Array.Clear(_harmonics);
        double step = Math.PI / _count;
        for (int j = 0; j < _count; j++)
        {
            double value = Math.Tanh(_steepness * Evaluate(Input, j * step, out _));
            _values[j] = value;
            _slopes[j] = _steepness * (1 - value * value);
            Complex root = Complex.FromPolarCoordinates(1, -j * step);
            Complex turn = root * root;
            Complex power = 2.0 / _count;
            for (int k = 0; k < _moments.Length; k++)
            {
                _moments[k] += _slopes[j] * power;
                if (k < _harmonics.Length)
                {
                    _harmonics[k] += value * (power * root);
                }

                power *= turn;
            }
        }
    }

    private Complex Sum(int n)
    {
        // Beyond half the steps the sum would fold back; what lies there is as good as nothing.
        if (n >= _count)
        {
            return Complex.Zero;
        }

        Complex sum = Complex.Zero;
        for (int j = 0; j < _count; j++)
        {
            sum += _values[j] * Complex.FromPolarCoordinates(1, -n * j * Math.PI / _count);
        }

        return sum * (2.0 / _count);
    }
}
