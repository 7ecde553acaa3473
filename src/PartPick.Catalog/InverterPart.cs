namespace PartPick.Catalog;

/// <summary>A logic inverter.</summary>
public sealed record InverterPart : AmplifierPart
{
    /// <inheritdoc/>
    public override PartKind Kind => PartKind.Inverter;
}
