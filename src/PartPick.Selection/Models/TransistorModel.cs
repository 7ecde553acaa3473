using PartPick.Catalog;
using PartPick.Physics.Devices;

namespace PartPick.Selection;

/// <summary>A transistor part as the physics sees it.</summary>
public static class TransistorModel
{
    // Where a part states no spread of the current gain: common practice, half to twice the typical figure.
    private const double WeakestShare = 0.5;
    private const double StrongestShare = 2;

    /// <summary>The device at a place in its spread of current gain.</summary>
    public static Transistor At(TransistorPart part, DeviceStrength strength)
    {
        ArgumentNullException.ThrowIfNull(part);
        var transistor = new Transistor
        {
            Beta = strength switch
            {
                DeviceStrength.Weakest => part.BetaMin ?? part.Beta * WeakestShare,
                DeviceStrength.Typical => part.Beta,
                _ => part.BetaMax ?? part.Beta * StrongestShare,
            },
            JunctionFarads = part.CjeFarads ?? 0,
            TransitSeconds = part.TfSeconds ?? (part.TransitionFrequencyHz is { } transition ? 1 / (2 * Math.PI * transition) : 0),
            CollectorFarads = part.CmuFarads ?? 0,
            BaseSpreadingOhms = part.RbbOhms ?? 0,
        };
        return part.VbeVolts is { } volts ? transistor with { BaseEmitterVolts = volts } : transistor;
    }
}
