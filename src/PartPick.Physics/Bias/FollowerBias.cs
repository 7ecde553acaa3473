using PartPick.Physics.Circuits;

namespace PartPick.Physics.Bias;

/// <summary>The DC operating point of a follower.</summary>
/// <param name="EmitterAmps">Emitter current IE in amperes.</param>
/// <param name="TransconductanceSiemens">gm = IC/VT with IC = IE β/(β+1), in siemens.</param>
/// <param name="ThermalVolts">kT/q in volts.</param>
/// <param name="SaturationAmps">Transport saturation current Is in amperes.</param>
/// <param name="BaseVolts">Base voltage in volts; half the supply where the emitter current is given.</param>
public sealed record FollowerBias(
    double EmitterAmps, double TransconductanceSiemens, double ThermalVolts, double SaturationAmps, double BaseVolts)
{
    private const double ReferenceAmps = 1e-3;
    private const double VoltsPerKelvin = -2e-3;

    /// <summary>
    /// Solves the bias network with the transistor's exponential law: Is from VBE at 1 mA and 25 °C, VBE falling by 2 mV/K.
    /// </summary>
    public static FollowerBias Solve(FollowerCircuit circuit)
    {
        double thermal = PhysicalConstants.ThermalVolts(circuit.TemperatureCelsius);
        double junction = circuit.Transistor.BaseEmitterVolts + VoltsPerKelvin * (circuit.TemperatureCelsius - 25);
        double saturation = ReferenceAmps * Math.Exp(-junction / thermal);
        double beta = circuit.Transistor.Beta;
        if (circuit.EmitterCurrentAmps is { } given)
        {
            return new FollowerBias(given, given * beta / (beta + 1) / thermal, thermal, saturation, circuit.SupplyVolts / 2);
        }

        double top = 1 / circuit.BaseTopOhms;
        double bottom = 1 / circuit.BaseBottomOhms;
        double open = circuit.SupplyVolts * top / (top + bottom);
        double sourceOhms = 1 / (top + bottom);
        double perCollector = (sourceOhms + circuit.Transistor.BaseSpreadingOhms) / beta
            + (double.IsPositiveInfinity(circuit.EmitterOhms) ? 0 : circuit.EmitterOhms) * (1 + 1 / beta);
        double collector = double.IsPositiveInfinity(circuit.EmitterOhms) || !(open > 0)
            ? 0
            : CollectorAmps(open, perCollector, junction, thermal);
        double emitter = collector * (1 + 1 / beta);
        return new FollowerBias(emitter, collector / thermal, thermal, saturation, open - collector / beta * sourceOhms);
    }

    // open = ic·R + VBE + VT ln(ic/1 mA): increasing and concave in ln ic; Newton in y = ln(ic/1 mA) from above converges.
    private static double CollectorAmps(double open, double ohms, double junction, double thermal)
    {
        double y = Math.Max(0, Math.Log(Math.Max(open, 1e-3) / (ohms * ReferenceAmps)));
        y = Math.Min(y, (open - junction) / thermal);
        for (int i = 0; i < 200; i++)
        {
            double current = ReferenceAmps * Math.Exp(y);
            double residual = current * ohms + junction + thermal * y - open;
            double step = residual / (current * ohms + thermal);
            y -= step;
            if (Math.Abs(step) < 1e-15 * Math.Max(1, Math.Abs(y)))
            {
                break;
            }
        }

        return ReferenceAmps * Math.Exp(y);
    }
}
