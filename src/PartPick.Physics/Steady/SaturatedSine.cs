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

    // The tanh's nearest pole is (π/2)·width off the real axis, so N equal steps in half a period leave an error of e^(−π N width):
    // 1e-11 at 8/width, and 3e-10 at 7/width, enough for the few harmonics of an estimate.
    private const double StepsPerWidth = 8;
    private const double CoarseStepsPerWidth = 7;
    private const int CoarseHarmonics = 4;

    // Where 1 − tanh x is as small as what the steps leave, and by how much the way there may be longer than along a sine.
    private const double Saturation = 13;
    private const double CoarseSaturation = 11;
    private const double EdgeReserve = 1.3;
    private readonly double _steepness;
    private readonly Complex[] _moments;
    private readonly Complex[] _harmonics;
    private double[] _values = [];
    private Complex[] _roots = [];
    private int _first;
    private int _edge;
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
        Evaluate(Input, Complex.FromPolarCoordinates(1, _crossing), out double slope);
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

        return _roots.Length == 0 ? Edge(n) : Sum(n);
    }

    /// <summary>Derivative of harmonic n of the tanh by the real and the imaginary part of harmonic m of the input.</summary>
    public void Derivative(int n, int m, out Complex byReal, out Complex byImaginary)
    {
        Complex difference = n >= m ? _moments[(n - m) / 2] : Complex.Conjugate(_moments[(m - n) / 2]);
        Complex sum = _moments[(n + m) / 2];
        byReal = (difference + sum) / 2;
        byImaginary = new Complex(-(difference - sum).Imaginary / 2, (difference - sum).Real / 2);
    }

    private static double ZeroCrossing(Complex[] input)
    {
        double angle = Math.PI / 2 - input[0].Phase;
        for (int step = 0; step < 20; step++)
        {
            double value = Evaluate(input, Complex.FromPolarCoordinates(1, angle), out double slope);
            double change = value / slope;
            if (!double.IsFinite(change))
            {
                break;
            }

            angle -= Math.Clamp(change, -0.3, 0.3);

            // The next step would change it by about the square of this one.
            if (Math.Abs(change) < 1e-8)
            {
                break;
            }
        }

        return angle;
    }

    private static double Evaluate(Complex[] input, Complex root, out double slope)
    {
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

    // Edge and moments of all harmonics by powers of one root and one exponential.
    private void PrepareEdges(double slope)
    {
        _roots = [];
        Complex root = Complex.FromPolarCoordinates(1, -_crossing);
        Complex turn = root * root;
        Complex power = Complex.One;
        double x = Math.PI * _width / 2;
        double growth = Math.Exp(x);
        double grown = 1;
        double size = 4 / (Math.PI * Math.Abs(slope));
        double square = _sign * 4 / Math.PI;
        for (int k = 0; k < _moments.Length; k++)
        {
            _moments[k] = size * Rounding(2 * k * x, grown) * power;
            if (k < _harmonics.Length)
            {
                int n = 2 * k + 1;
                Complex odd = power * root;
                double edge = square / n * Rounding(n * x, grown * growth);
                _harmonics[k] = new Complex(edge * odd.Imaginary, -edge * odd.Real);
            }

            power *= turn;
            grown *= growth * growth;
        }
    }

    // A square wave's harmonic times the spectrum of its edge.
    private Complex Edge(int n)
    {
        double x = Math.PI * n * _width / 2;
        return _sign * 4 / (Math.PI * n) * Rounding(x, Math.Exp(x)) * new Complex(0, -1) * Complex.FromPolarCoordinates(1, -n * _crossing);
    }

    // x/sinh x, the spectrum of sech²(θ/w)/(2w) at x = πnw/2, from e^x.
    private static double Rounding(double x, double exponential) =>
        x < 1e-3 ? 1 - x * x / 6 : 2 * x / (exponential - 1 / exponential);

    // Equal steps over the half period that begins where the edge does: only the edge itself is summed, the flat rest is a
    // geometric series.
    private void PrepareSteps()
    {
        bool coarse = Input.Length <= CoarseHarmonics;
        double wanted = Math.Max((coarse ? CoarseStepsPerWidth : StepsPerWidth) / _width, 4 * Input.Length);
        _roots = UnitRoots.Of(wanted);
        int count = _roots.Length;
        int half = Math.Min(count / 2, EdgeSteps(coarse ? CoarseSaturation : Saturation, count));
        _first = (int)Math.Round(_crossing * count / Math.PI) - half;
        _edge = 2 * half;
        if (_values.Length < _edge)
        {
            _values = new double[_edge];
        }

        Array.Clear(_moments);
        Array.Clear(_harmonics);
        double scale = 2.0 / count;
        for (int j = 0; j < _edge; j++)
        {
            Complex root = UnitRoots.Power(_roots, _first + j);
            double value = Math.Tanh(_steepness * Evaluate(Input, Complex.Conjugate(root), out _));
            _values[j] = value;
            double slope = _steepness * (1 - value * value);
            Complex turn = root * root;
            Complex power = scale;
            for (int k = 0; k < _moments.Length; k++)
            {
                _moments[k] += slope * power;
                if (k < _harmonics.Length)
                {
                    _harmonics[k] += value * (power * root);
                }

                power *= turn;
            }
        }

        for (int k = 0; k < _harmonics.Length; k++)
        {
            _harmonics[k] += scale * Flat(2 * k + 1);
        }
    }

    // Steps from the crossing to where the tanh is flat: along a sine of this width, and everywhere where the input is none.
    private int EdgeSteps(double saturation, int count)
    {
        double others = 0;
        for (int h = 1; h < Input.Length; h++)
        {
            others += Complex.Abs(Input[h]);
        }

        double height = saturation * _width;
        return height > 0.9 || others > 0.2 * Complex.Abs(Input[0])
            ? count
            : (int)Math.Ceiling(EdgeReserve * Math.Asin(height) * count / Math.PI) + 1;
    }

    // The sum of the flat part, ±Σ e^(−jπ n j/N) from the end of the edge to the beginning of the next.
    private Complex Flat(int n)
    {
        int count = _roots.Length;
        if (_edge == count)
        {
            return Complex.Zero;
        }

        Complex from = UnitRoots.Power(_roots, (long)n * (_first + _edge));
        Complex to = UnitRoots.Power(_roots, (long)n * (_first + count));
        return _sign * (from - to) / (1 - UnitRoots.Power(_roots, n));
    }

    private Complex Sum(int n)
    {
        int count = _roots.Length;

        // Beyond half the steps the sum would fold back; what lies there is as good as nothing.
        if (n >= count)
        {
            return Complex.Zero;
        }

        Complex sum = Flat(n);
        for (int j = 0; j < _edge; j++)
        {
            sum += _values[j] * UnitRoots.Power(_roots, (long)n * (_first + j));
        }

        return sum * (2.0 / count);
    }
}
