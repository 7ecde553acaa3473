namespace PartPick.Physics.Devices;

/// <summary>An NPN transistor for the follower, in the terms of Ebers and Moll.</summary>
public sealed record Transistor
{
    /// <summary>Current gain β (hFE), above zero.</summary>
    public required double Beta { get; init; }

    /// <summary>Base–emitter junction capacitance Cje in farads.</summary>
    public double JunctionFarads { get; init; }

    /// <summary>Forward transit time τF in seconds.</summary>
    public double TransitSeconds { get; init; }

    /// <summary>Base–collector capacitance Cµ in farads.</summary>
    public double CollectorFarads { get; init; }

    /// <summary>Base spreading resistance rbb in ohms.</summary>
    public double BaseSpreadingOhms { get; init; }

    /// <summary>Base–emitter voltage at 1 mA and 25 °C, in volts.</summary>
    public double BaseEmitterVolts { get; init; } = 0.65;
}
