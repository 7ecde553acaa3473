namespace PartPick.Catalog;

/// <summary>The figures of an amplifier at one supply voltage. Figures that are not known are null.</summary>
public sealed record SupplyPoint
{
    /// <summary>The supply voltage, V.</summary>
    public required double SupplyVolts { get; init; }

    /// <summary>The smallest transconductance, S.</summary>
    public double? GmMinSiemens { get; init; }

    /// <summary>The transconductance, S.</summary>
    public double? GmSiemens { get; init; }

    /// <summary>The largest transconductance, S.</summary>
    public double? GmMaxSiemens { get; init; }

    /// <summary>The small-signal output resistance of one stage, Ω; null is infinite.</summary>
    public double? RoOhms { get; init; }

    /// <summary>The on-resistance of the last stage of a buffered inverter, Ω.</summary>
    public double? RonOhms { get; init; }

    /// <summary>The voltage gain of the whole chain of a buffered inverter.</summary>
    public double? Gain { get; init; }

    /// <summary>The excess delay of a buffered inverter, s.</summary>
    public double? DelaySeconds { get; init; }

    /// <summary>The guaranteed highest clock frequency, Hz.</summary>
    public double? ClockMinHz { get; init; }

    /// <summary>The typical highest clock frequency, Hz.</summary>
    public double? ClockHz { get; init; }
}
