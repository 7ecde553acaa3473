using System.Numerics;
using System.Runtime.Intrinsics;

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
    private const double LargestExponent = 700;
    private static readonly int Lanes = Vector256<double>.Count;
    private readonly double _steepness;
    private readonly Complex[] _moments;
    private readonly Complex[] _harmonics;
    private double[] _values = [];
    private double[] _real = [];
    private double[] _imaginary = [];
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
        double scale = 2.0 / count;
        SumEdge(scale);
        for (int k = 0; k < _harmonics.Length; k++)
        {
            _harmonics[k] += scale * Flat(2 * k + 1);
        }
    }

    // The sums over the edge, four steps at a time; those beyond it count nothing.
    private void SumEdge(double scale)
    {
        int padded = (_edge + Lanes - 1) / Lanes * Lanes;
        if (_values.Length < padded)
        {
            _values = new double[padded];
            _real = new double[padded];
            _imaginary = new double[padded];
        }

        UnitRoots.Copy(_roots, _first, _real.AsSpan(0, padded), _imaginary.AsSpan(0, padded));
        Span<Vector256<double>> moments = stackalloc Vector256<double>[2 * _moments.Length];
        Span<Vector256<double>> harmonics = stackalloc Vector256<double>[2 * _harmonics.Length];
        moments.Clear();
        harmonics.Clear();
        var within = Vector256.Create(scale);
        for (int j = 0; j < padded; j += Lanes)
        {
            if (j + Lanes > _edge)
            {
                within = Vector256.ConditionalSelect(
                    Vector256.LessThan(Vector256.Create(0.0, 1, 2, 3), Vector256.Create((double)(_edge - j))), within, default);
            }

            AddSteps(Vector256.Create(_real, j), Vector256.Create(_imaginary, j), within, j, moments, harmonics);
        }

        for (int k = 0; k < _moments.Length; k++)
        {
            _moments[k] = new Complex(Vector256.Sum(moments[2 * k]), Vector256.Sum(moments[2 * k + 1]));
        }

        for (int k = 0; k < _harmonics.Length; k++)
        {
            _harmonics[k] = new Complex(Vector256.Sum(harmonics[2 * k]), Vector256.Sum(harmonics[2 * k + 1]));
        }
    }

    private void AddSteps(
        Vector256<double> real,
        Vector256<double> imaginary,
        Vector256<double> weight,
        int place,
        Span<Vector256<double>> moments,
        Span<Vector256<double>> harmonics)
    {
        Vector256<double> turnReal = real * real - imaginary * imaginary;
        Vector256<double> turnImaginary = 2 * real * imaginary;

        // The input is that at the conjugate root.
        Vector256<double> powerReal = real;
        Vector256<double> powerImaginary = imaginary;
        Vector256<double> volts = Vector256<double>.Zero;
        foreach (Complex harmonic in Input)
        {
            volts += harmonic.Real * powerReal + harmonic.Imaginary * powerImaginary;
            (powerReal, powerImaginary) = (
                powerReal * turnReal - powerImaginary * turnImaginary, powerReal * turnImaginary + powerImaginary * turnReal);
        }

        // tanh x = 1 − 2/(1 + e^2x), to an absolute rounding of one.
        Vector256<double> twice = Vector256.Min(Vector256.Create(LargestExponent), 2 * _steepness * volts);
        Vector256<double> value = Vector256<double>.One - Vector256.Create(2.0) / (Vector256<double>.One + Vector256.Exp(twice));
        value.CopyTo(_values, place);
        Vector256<double> slope = _steepness * (Vector256<double>.One - value * value) * weight;
        Vector256<double> height = value * weight;
        powerReal = Vector256<double>.One;
        powerImaginary = Vector256<double>.Zero;
        for (int k = 0; k < _moments.Length; k++)
        {
            moments[2 * k] += slope * powerReal;
            moments[2 * k + 1] += slope * powerImaginary;
            if (k < _harmonics.Length)
            {
                harmonics[2 * k] += height * (powerReal * real - powerImaginary * imaginary);
                harmonics[2 * k + 1] += height * (powerReal * imaginary + powerImaginary * real);
            }

            (powerReal, powerImaginary) = (
                powerReal * turnReal - powerImaginary * turnImaginary, powerReal * turnImaginary + powerImaginary * turnReal);
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
