using System.Collections.Immutable;
using System.Globalization;

namespace PartPick.Selection;

/// <summary>A corner: where supply, ambient, device and capacitances lie within their ranges.</summary>
/// <param name="SupplyVolts">Supply in volts.</param>
/// <param name="TemperatureCelsius">Ambient in °C.</param>
/// <param name="Strength">The device.</param>
/// <param name="Capacitances">Load capacitors and strays: −1 all low, 0 nominal, +1 all high.</param>
public sealed record OperatingPoint(double SupplyVolts, double TemperatureCelsius, DeviceStrength Strength, int Capacitances)
{
    /// <summary>Middle of the supply, 25 °C, typical device, nominal capacitances.</summary>
    public static OperatingPoint Nominal(Requirement requirement)
    {
        ArgumentNullException.ThrowIfNull(requirement);
        return new OperatingPoint(requirement.NominalSupplyVolts, 25, DeviceStrength.Typical, 0);
    }

    /// <summary>All corners. An inverter's figures do not depend on the ambient, so only a follower's corners vary it.</summary>
    public static ImmutableArray<OperatingPoint> Corners(Requirement requirement, CircuitKind kind)
    {
        ArgumentNullException.ThrowIfNull(requirement);
        return
        [
            .. from point in AtNominalCapacitances(requirement, kind)
               from capacitances in new[] { -1, 1 }
               select point with { Capacitances = capacitances },
        ];
    }

    /// <summary>The corners of amplifier, supply and ambient at nominal capacitances.</summary>
    public static ImmutableArray<OperatingPoint> AtNominalCapacitances(Requirement requirement, CircuitKind kind)
    {
        ArgumentNullException.ThrowIfNull(requirement);
        double[] temperatures = kind == CircuitKind.Follower
            ? [requirement.TemperatureMinCelsius, requirement.TemperatureMaxCelsius]
            : [25];
        return
        [
            .. from supply in new[] { requirement.SupplyMinVolts, requirement.SupplyMaxVolts }
               from temperature in temperatures
               from strength in new[] { DeviceStrength.Weakest, DeviceStrength.Strongest }
               select new OperatingPoint(supply, temperature, strength, 0),
        ];
    }

    /// <summary>The corner in words.</summary>
    public string Describe(CircuitKind kind)
    {
        string device = Strength switch
        {
            DeviceStrength.Weakest => "weakest device",
            DeviceStrength.Strongest => "strongest device",
            _ => "typical device",
        };
        string capacitances = Capacitances switch
        {
            < 0 => ", capacitances low",
            > 0 => ", capacitances high",
            _ => "",
        };
        string ambient = kind == CircuitKind.Follower
            ? string.Create(CultureInfo.InvariantCulture, $", {TemperatureCelsius:0.##} °C")
            : "";
        return string.Create(CultureInfo.InvariantCulture, $"{SupplyVolts:0.###} V{ambient}, {device}{capacitances}");
    }
}
