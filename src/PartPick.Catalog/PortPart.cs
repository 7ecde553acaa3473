namespace PartPick.Catalog;

/// <summary>The oscillator port of a microcontroller, stated by its transconductance or by the largest critical one.</summary>
public sealed record PortPart : AmplifierPart
{
    /// <inheritdoc/>
    public override PartKind Kind => PartKind.Port;

    /// <summary>The largest critical transconductance of the crystal and its load that the maker allows, S.</summary>
    public double? CriticalTransconductanceMaxSiemens { get; init; }

    /// <summary>The swing that an amplitude control keeps, V peak to peak; null where the supply limits it.</summary>
    public double? SwingVolts { get; init; }

    /// <summary>The lowest frequency, Hz.</summary>
    public double? FrequencyMinHz { get; init; }

    /// <summary>The highest frequency, Hz.</summary>
    public double? FrequencyMaxHz { get; init; }
}
