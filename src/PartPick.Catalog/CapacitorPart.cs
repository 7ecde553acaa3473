namespace PartPick.Catalog;

/// <summary>A fixed capacitor.</summary>
public sealed record CapacitorPart : Part
{
    /// <inheritdoc/>
    public override PartKind Kind => PartKind.Capacitor;

    /// <summary>The nominal capacitance, F.</summary>
    public required double ValueFarads { get; init; }

    /// <summary>The tolerance, a ratio to both sides; null where it is given in farads.</summary>
    public double? ToleranceRatio { get; init; }

    /// <summary>The tolerance, F to both sides; null where it is given as a ratio.</summary>
    public double? ToleranceFarads { get; init; }

    /// <summary>The dielectric, such as C0G or X7R.</summary>
    public string? Dielectric { get; init; }

    /// <summary>The temperature coefficient, 1/K to both sides; null for class 2.</summary>
    public double? TemperatureCoefficientPerKelvin { get; init; }

    /// <summary>The rated voltage, V.</summary>
    public double? VoltageVolts { get; init; }
}
