using PartPick.Catalog;
using PartPick.Physics;
using PartPick.Physics.Circuits;

namespace PartPick.Selection;

/// <summary>What a circuit file gives for every kind of circuit.</summary>
internal sealed record CircuitCommon
{
    public required CircuitKind Kind { get; init; }

    public required Crystal Crystal { get; init; }

    public required CrystalRatings Ratings { get; init; }

    public required CrystalPart? CrystalPart { get; init; }

    public required double C1Farads { get; init; }

    public required CapacitorPart? C1Part { get; init; }

    public required double C2Farads { get; init; }

    public required CapacitorPart? C2Part { get; init; }

    public required Strays Strays { get; init; }

    public required double SupplyVolts { get; init; }

    public required double TemperatureCelsius { get; init; }
}
