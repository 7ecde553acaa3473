namespace PartPick.Selection;

/// <summary>How a spread of the frequency goes over temperature: a power of the distance from the temperature where it is zero.</summary>
/// <param name="OriginCelsius">Where it is zero, in °C.</param>
/// <param name="ReachKelvins">The distance in kelvins at which it has its whole size.</param>
/// <param name="Power">1 for a coefficient, 2 for a parabola.</param>
/// <param name="Sign">+1 or −1 where it is known which way the frequency goes; 0 where it may go either way.</param>
public sealed record TemperatureLaw(double OriginCelsius, double ReachKelvins, int Power, int Sign)
{
    /// <summary>A coefficient of unknown sign, counted from 25 °C.</summary>
    /// <param name="reachKelvins">The distance in kelvins at which it has its whole size.</param>
    public static TemperatureLaw Linear(double reachKelvins) => new(25, reachKelvins, 1, 0);

    /// <summary>A parabola.</summary>
    /// <param name="turnoverCelsius">Its top or bottom, in °C.</param>
    /// <param name="reachKelvins">The distance in kelvins at which it has its whole size.</param>
    /// <param name="sign">−1 where it opens downwards.</param>
    public static TemperatureLaw Parabola(double turnoverCelsius, double reachKelvins, int sign) =>
        new(turnoverCelsius, reachKelvins, 2, sign);

    /// <summary>The part of the whole size at a temperature: 0 at the origin, 1 at the reach.</summary>
    /// <param name="celsius">The temperature in °C.</param>
    public double ShareAt(double celsius) =>
        ReachKelvins > 0 ? Math.Pow(Math.Abs(celsius - OriginCelsius) / ReachKelvins, Power) : 0;
}
