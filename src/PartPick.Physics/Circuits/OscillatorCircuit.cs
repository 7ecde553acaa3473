namespace PartPick.Physics.Circuits;

/// <summary>An oscillator: a crystal, two load capacitors, strays and a supply; the amplifier is the derived circuit's.</summary>
public abstract record OscillatorCircuit
{
    /// <summary>The crystal.</summary>
    public required Crystal Crystal { get; init; }

    /// <summary>Load capacitor C1 in farads.</summary>
    public required double C1Farads { get; init; }

    /// <summary>Load capacitor C2 in farads.</summary>
    public required double C2Farads { get; init; }

    /// <summary>Stray capacitances.</summary>
    public Strays Strays { get; init; } = Strays.None;

    /// <summary>Supply voltage in volts, above zero.</summary>
    public required double SupplyVolts { get; init; }

    /// <summary>Ambient temperature in °C.</summary>
    public double TemperatureCelsius { get; init; } = 25;
}
