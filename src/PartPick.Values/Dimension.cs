namespace PartPick.Values;

/// <summary>What a value measures. Every value is a <see cref="double"/> in the unit named here.</summary>
public enum Dimension
{
    /// <summary>Hertz.</summary>
    Frequency,

    /// <summary>Farad.</summary>
    Capacitance,

    /// <summary>Ohm.</summary>
    Resistance,

    /// <summary>Siemens.</summary>
    Transconductance,

    /// <summary>Volt.</summary>
    Voltage,

    /// <summary>Ampere.</summary>
    Current,

    /// <summary>Watt.</summary>
    Power,

    /// <summary>Second.</summary>
    Time,

    /// <summary>Degree Celsius, not below absolute zero; negative values always make sense.</summary>
    Temperature,

    /// <summary>A ratio: 30 ppm is 3e-5.</summary>
    Relative,

    /// <summary>A ratio for each kelvin: 30 ppm/K is 3e-5.</summary>
    RelativePerKelvin,

    /// <summary>A ratio for each squared kelvin: the parabola of a tuning fork.</summary>
    RelativePerSquareKelvin,

    /// <summary>A number without a unit.</summary>
    Number,

    /// <summary>A whole number from 0 to 2147483647.</summary>
    Count,
}
