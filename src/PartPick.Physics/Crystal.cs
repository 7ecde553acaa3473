namespace PartPick.Physics;

/// <summary>
/// A quartz crystal as its Butterworth–Van Dyke equivalent: a motional branch L–C–R in series, shunted by C0.
/// All values in SI units.
/// </summary>
public sealed record Crystal
{
    /// <summary>Nominal frequency in hertz, stated at <see cref="LoadFarads"/>; above zero.</summary>
    public required double NominalHz { get; init; }

    /// <summary>Load capacitance in farads at which the nominal frequency is stated; null for series resonance.</summary>
    public double? LoadFarads { get; init; }

    /// <summary>Shunt (holder) capacitance C0 in farads; zero or more.</summary>
    public double ShuntFarads { get; init; }

    /// <summary>Motional capacitance Cm in farads; above zero.</summary>
    public required double MotionalFarads { get; init; }

    /// <summary>Motional (series-resonance) resistance Rm in ohms; above zero. The stated maximum where it is a part's.</summary>
    public required double ResistanceOhms { get; init; }

    /// <summary>Series-resonant frequency in hertz: fN / √(1 + Cm/(C0 + CL)), or fN for a series part.</summary>
    public double SeriesHz => LoadFarads is { } load
        ? NominalHz / Math.Sqrt(1 + MotionalFarads / (ShuntFarads + load))
        : NominalHz;

    /// <summary>Motional inductance in henries: 1/((2π fs)² Cm).</summary>
    public double InductanceHenries
    {
        get
        {
            double omega = 2 * Math.PI * SeriesHz;
            return 1 / (omega * omega * MotionalFarads);
        }
    }

    /// <summary>Quality factor: 1/(2π fs Rm Cm).</summary>
    public double QualityFactor => 1 / (2 * Math.PI * SeriesHz * ResistanceOhms * MotionalFarads);

    /// <summary>Frequency in hertz at a load capacitance: fs √(1 + Cm/(C0 + C)).</summary>
    /// <param name="loadFarads">Load capacitance outside C0, in farads.</param>
    public double FrequencyAtLoadHz(double loadFarads) =>
        SeriesHz * Math.Sqrt(1 + MotionalFarads / (ShuntFarads + loadFarads));

    /// <summary>
    /// Load capacitance in farads at which this crystal runs at a frequency: the inverse of <see cref="FrequencyAtLoadHz"/>.
    /// Positive infinity at the series-resonant frequency itself, negative below it (an inductive load).
    /// </summary>
    /// <param name="frequencyHz">Frequency in hertz.</param>
    public double LoadAtFrequencyFarads(double frequencyHz)
    {
        double series = SeriesHz;
        double shift = (frequencyHz - series) / series;
        return MotionalFarads / (shift * (2 + shift)) - ShuntFarads;
    }

    /// <summary>Trim sensitivity at a load, −Cm / (2 (C0 + C)²): relative frequency per farad.</summary>
    /// <param name="loadFarads">Load capacitance in farads.</param>
    public double TrimSensitivityPerFarad(double loadFarads)
    {
        double total = ShuntFarads + loadFarads;
        return -MotionalFarads / (2 * total * total);
    }

    /// <summary>Resistance at a load in ohms: Rm (1 + C0/CL)².</summary>
    /// <param name="loadFarads">Load capacitance in farads, above zero.</param>
    public double ResistanceAtLoadOhms(double loadFarads)
    {
        double ratio = 1 + ShuntFarads / loadFarads;
        return ResistanceOhms * ratio * ratio;
    }
}
