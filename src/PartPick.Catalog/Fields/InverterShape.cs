namespace PartPick.Catalog.Fields;

internal sealed class InverterShape() : AmplifierShape(PartKind.Inverter)
{
    protected override AmplifierPart BuildAmplifier(DraftReader reader, string id, string description, Offer offer) =>
        new InverterPart { Id = id, Description = description, Offer = offer, Stages = 1, Points = [] };
}
