namespace PartPick.Physics.Steady;

/// <summary>
/// Bounds on how far Newton's method may take a junction's voltage at once (as circuit simulators have them; Nagel, SPICE2,
/// 1975, from memory).
/// </summary>
internal static class JunctionLimit
{
    private const double Knee = 2;
    private const double LargestFall = 4;
    private const double Off = -5;

    /// <summary>
    /// The voltage after a change, in thermal voltages. A rise of a conducting junction overshoots: its current's logarithm
    /// takes its place. A junction that stops to conduct does so gently.
    /// </summary>
    public static double Change(double volts, double change)
    {
        double next = volts + change;
        if (volts > 0 && change < -LargestFall)
        {
            return Math.Max(next, Math.Min(volts - LargestFall, Off));
        }

        if (change <= Knee || next <= Knee)
        {
            return next;
        }

        double from = Math.Max(volts, Knee);
        return from + Math.Log(1 + next - from);
    }
}
