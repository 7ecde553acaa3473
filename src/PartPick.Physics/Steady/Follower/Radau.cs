namespace PartPick.Physics.Steady;

/// <summary>
/// The implicit Runge–Kutta rule of three stages after Radau (IIA): order five, its last stage the end of the step, stiff
/// parts damped out (Hairer, Wanner, Solving Ordinary Differential Equations II, 1991; coefficients from memory).
/// </summary>
internal static class Radau
{
    public const int Stages = 3;
    private static readonly double Root6 = Math.Sqrt(6);

    /// <summary>Where in a step of length one the stages stand.</summary>
    public static readonly double[] Nodes = [(4 - Root6) / 10, (4 + Root6) / 10, 1];

    /// <summary>Share of each stage in the integral over the step.</summary>
    public static readonly double[] Weights = [(16 - Root6) / 36, (16 + Root6) / 36, 1.0 / 9];

    /// <summary>Share of each stage (column) in the integral up to each stage (row).</summary>
    public static readonly double[] Matrix =
    [
        (88 - 7 * Root6) / 360, (296 - 169 * Root6) / 1800, (-2 + 3 * Root6) / 225,
        (296 + 169 * Root6) / 1800, (88 + 7 * Root6) / 360, (-2 - 3 * Root6) / 225,
        (16 - Root6) / 36, (16 + Root6) / 36, 1.0 / 9,
    ];

    /// <summary>Third divided difference over the beginning of a step and its stages, the step of length one.</summary>
    public static readonly double[] ThirdDifference = Differences();

    /// <summary>The cubic through the beginning of a step and its stages.</summary>
    public static double Cubic(double t, double start, double first, double second, double third)
    {
        double a = Nodes[0], b = Nodes[1];
        return start * (t - a) * (t - b) * (t - 1) / (-a * b)
            + first * t * (t - b) * (t - 1) / (a * (a - b) * (a - 1))
            + second * t * (t - a) * (t - 1) / (b * (b - a) * (b - 1))
            + third * t * (t - a) * (t - b) / ((1 - a) * (1 - b));
    }

    private static double[] Differences()
    {
        double a = Nodes[0], b = Nodes[1];
        return [1 / (-a * b), 1 / (a * (a - b) * (a - 1)), 1 / (b * (b - a) * (b - 1)), 1 / ((1 - a) * (1 - b))];
    }
}
