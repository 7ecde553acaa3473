using PartPick.Catalog;
using PartPick.Physics.Devices;

namespace PartPick.Selection;

/// <summary>
/// An inverter, counter or port as the physics sees it at one supply. Data are given at stated supply points and interpolated
/// linearly between them; outside them the part is not specified.
/// </summary>
public static class InverterModel
{
    /// <summary>A stated maximum critical transconductance is understood to leave a factor of five to the weakest gm.</summary>
    public const double CriticalFactor = 5;

    // Where a part states no spread: common practice, half to one and a half times the typical figure.
    private const double WeakestShare = 0.5;
    private const double StrongestShare = 1.5;

    /// <summary>The device at a supply; null where the part is not specified there.</summary>
    /// <param name="part">The part.</param>
    /// <param name="supplyVolts">Supply in volts.</param>
    /// <param name="strength">Where in its spread the device lies.</param>
    public static Inverter? At(AmplifierPart part, double supplyVolts, DeviceStrength strength)
    {
        ArgumentNullException.ThrowIfNull(part);
        if (!Covers(part, supplyVolts) || Transconductance(part, supplyVolts, strength) is not { } gm)
        {
            return null;
        }

        double delay = Interpolate(part, supplyVolts, point => point.DelaySeconds) ?? 0;
        if (part.IsBuffered)
        {
            if (Interpolate(part, supplyVolts, point => point.RonOhms) is not { } ron)
            {
                return null;
            }

            return new BufferedInverter(gm * ron, ron)
            {
                InputFarads = part.InputFarads ?? 0,
                OutputFarads = part.OutputFarads ?? 0,
                FeedbackFarads = part.FeedbackFarads ?? 0,
                DelaySeconds = delay,
            };
        }

        // The output resistance follows the same current as gm, so their product, the stage's gain, stays.
        double typical = Transconductance(part, supplyVolts, DeviceStrength.Typical)!.Value;
        double ro = Interpolate(part, supplyVolts, point => point.RoOhms) is { } stated ? stated * typical / gm : double.PositiveInfinity;
        var inverter = new OneStageInverter(gm, ro)
        {
            InputFarads = part.InputFarads ?? 0,
            OutputFarads = part.OutputFarads ?? 0,
            FeedbackFarads = part.FeedbackFarads ?? 0,
            DelaySeconds = delay,
            SwingVolts = (part as PortPart)?.SwingVolts,
        };
        return part.ThresholdVolts is { } threshold ? inverter with { ThresholdVolts = threshold } : inverter;
    }

    /// <summary>Whether the supply lies within the part's stated points.</summary>
    public static bool Covers(AmplifierPart part, double supplyVolts)
    {
        ArgumentNullException.ThrowIfNull(part);
        return !part.Points.IsEmpty && supplyVolts >= part.Points[0].SupplyVolts && supplyVolts <= part.Points[^1].SupplyVolts;
    }

    /// <summary>Guaranteed highest clock in hertz at a supply; null where none is stated.</summary>
    public static double? GuaranteedClockHz(AmplifierPart part, double supplyVolts) =>
        Interpolate(part, supplyVolts, point => point.ClockMinHz);

    /// <summary>Typical highest clock in hertz at a supply; null where none is stated.</summary>
    public static double? TypicalClockHz(AmplifierPart part, double supplyVolts) =>
        Interpolate(part, supplyVolts, point => point.ClockHz);

    private static double? Transconductance(AmplifierPart part, double supplyVolts, DeviceStrength strength)
    {
        double? weakest = Interpolate(part, supplyVolts, point => point.GmMinSiemens);
        double? typical = Interpolate(part, supplyVolts, point => point.GmSiemens)
            ?? Interpolate(part, supplyVolts, point => point.Gain / point.RonOhms);
        double? strongest = Interpolate(part, supplyVolts, point => point.GmMaxSiemens);
        if (typical is null && weakest is null && (part as PortPart)?.CriticalTransconductanceMaxSiemens is { } critical)
        {
            weakest = CriticalFactor * critical;
        }

        typical ??= weakest / WeakestShare;
        return strength switch
        {
            DeviceStrength.Weakest => weakest ?? typical * WeakestShare,
            DeviceStrength.Typical => typical,
            _ => strongest ?? typical * StrongestShare,
        };
    }

    private static double? Interpolate(AmplifierPart part, double supplyVolts, Func<SupplyPoint, double?> figure)
    {
        SupplyPoint? below = null;
        foreach (SupplyPoint point in part.Points)
        {
            if (figure(point) is not { } value)
            {
                continue;
            }

            if (point.SupplyVolts == supplyVolts)
            {
                return value;
            }

            if (point.SupplyVolts > supplyVolts)
            {
                if (below is null)
                {
                    return null;
                }

                double share = (supplyVolts - below.SupplyVolts) / (point.SupplyVolts - below.SupplyVolts);
                double start = figure(below)!.Value;
                return start + share * (value - start);
            }

            below = point;
        }

        return null;
    }
}
