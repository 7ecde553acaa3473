using System.Numerics;

namespace PartPick.Physics.Steady;

/// <summary>The largest value of the cubic through two values and slopes.</summary>
/// <param name="Height">That value; negative infinity where the cubic does not rise to one between its ends.</param>
/// <param name="Place">Where it is, from the first end.</param>
internal readonly record struct CubicCrest(double Height, double Place)
{
    /// <summary>The crest between two ends.</summary>
    /// <param name="y0">Value at the first end.</param>
    /// <param name="m0">Slope there.</param>
    /// <param name="y1">Value at the second end.</param>
    /// <param name="m1">Slope there.</param>
    /// <param name="width">Distance of the ends.</param>
    public static CubicCrest Between(double y0, double m0, double y1, double m1, double width)
    {
        if (!(m0 > 0 && m1 < 0))
        {
            return new CubicCrest(double.NegativeInfinity, 0);
        }

        // Derivative of the cubic through both ends on t in 0 … 1: a t² + b t + c = 0.
        double c = m0 * width;
        double b = 6 * (y1 - y0) - 4 * m0 * width - 2 * m1 * width;
        double a = 3 * (m0 + m1) * width - 6 * (y1 - y0);
        Complex root = Math.Abs(a) < 1e-12 * Math.Abs(b) ? -c / b : (-b - Complex.Sqrt(b * b - 4 * a * c)) / (2 * a);
        double t = root.Real;
        if (!(t > 0 && t < 1))
        {
            t = m0 / (m0 - m1);
        }

        double t2 = t * t;
        double t3 = t2 * t;
        double height = (2 * t3 - 3 * t2 + 1) * y0 + (t3 - 2 * t2 + t) * width * m0 + (3 * t2 - 2 * t3) * y1 + (t3 - t2) * width * m1;
        return new CubicCrest(height, t * width);
    }
}
