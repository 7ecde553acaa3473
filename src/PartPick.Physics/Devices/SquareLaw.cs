namespace PartPick.Physics.Devices;

/// <summary>
/// The static characteristic of a one-stage inverter: two equal complementary square-law transistors about mid-supply
/// (Shichman and Hodges, 1968), fitted to gm and Ro at mid-supply. Odd about mid-supply.
/// </summary>
internal readonly struct SquareLaw
{
    private const double LargestLambda = 0.2;

    private SquareLaw(double half, double overdrive, double lambda, double factor, double leftover)
    {
        HalfVolts = half;
        OverdriveVolts = overdrive;
        Lambda = lambda;
        Factor = factor;
        LeftoverSiemens = leftover;
    }

    /// <summary>Half of the supply, or of the stated swing, in volts.</summary>
    public double HalfVolts { get; }

    /// <summary>v = VDD/2 − Vt in volts.</summary>
    public double OverdriveVolts { get; }

    /// <summary>Channel-length modulation λ in 1/V.</summary>
    public double Lambda { get; }

    /// <summary>Transconductance factor k in A/V².</summary>
    public double Factor { get; }

    /// <summary>What of 1/Ro the transistors leave: a linear conductance at the output, in siemens.</summary>
    public double LeftoverSiemens { get; }

    /// <summary>Fits the characteristic; null where the supply leaves no overdrive (no gain, not specified there).</summary>
    public static SquareLaw? Fit(OneStageInverter inverter, double supplyVolts)
    {
        double half = (inverter.SwingVolts ?? supplyVolts) / 2;
        double overdrive = half - inverter.ThresholdVolts;
        if (!(overdrive > 0))
        {
            return null;
        }

        double q = 2 / (inverter.Gm * inverter.Ro * overdrive);
        double lambda = q / (1 - q * half);
        if (!(lambda >= 0) || lambda > LargestLambda)
        {
            lambda = LargestLambda;
        }

        double factor = inverter.Gm / (2 * overdrive * (1 + lambda * half));
        double leftover = Math.Max(0, 1 / inverter.Ro - factor * overdrive * overdrive * lambda);
        return new SquareLaw(half, overdrive, lambda, factor, leftover);
    }

    /// <summary>Current into the output node in amperes, with its derivatives, for voltages from mid-supply.</summary>
    /// <param name="input">Input voltage less half the supply, in volts.</param>
    /// <param name="output">Output voltage less half the supply, in volts.</param>
    /// <param name="byInput">∂/∂input in siemens.</param>
    /// <param name="byOutput">∂/∂output in siemens.</param>
    public double Current(double input, double output, out double byInput, out double byOutput)
    {
        double upper = Channel(OverdriveVolts - input, HalfVolts - output, out double upperGate, out double upperDrain);
        double lower = Channel(OverdriveVolts + input, HalfVolts + output, out double lowerGate, out double lowerDrain);
        byInput = -upperGate - lowerGate;
        byOutput = -upperDrain - lowerDrain;
        return upper - lower;
    }

    private double Channel(double overdrive, double drain, out double byGate, out double byDrain)
    {
        if (drain >= 0)
        {
            return Forward(overdrive, drain, out byGate, out byDrain);
        }

        double current = Forward(overdrive - drain, -drain, out double gate, out double own);
        byGate = -gate;
        byDrain = gate + own;
        return -current;
    }

    private double Forward(double overdrive, double drain, out double byGate, out double byDrain)
    {
        if (overdrive <= 0)
        {
            byGate = byDrain = 0;
            return 0;
        }

        double modulation = 1 + Lambda * drain;
        if (drain >= overdrive)
        {
            double saturated = 0.5 * Factor * overdrive * overdrive;
            byGate = Factor * overdrive * modulation;
            byDrain = saturated * Lambda;
            return saturated * modulation;
        }

        double triode = Factor * (overdrive - drain / 2) * drain;
        byGate = Factor * drain * modulation;
        byDrain = Factor * (overdrive - drain) * modulation + triode * Lambda;
        return triode * modulation;
    }
}
