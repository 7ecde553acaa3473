namespace PartPick.Catalog.Fields;

internal sealed class ResistorShape() : PartShape(PartKind.Resistor, Ohms("value"), Ratio("tolerance", "%"))
{
    protected override Part BuildOwn(DraftReader reader, string id, string description, Offer offer) => new ResistorPart
    {
        Id = id,
        Description = description,
        Offer = offer,
        ValueOhms = reader.Required("value"),
        ToleranceRatio = reader.Required("tolerance"),
    };

    protected override void FillOwn(Part part, PartDraft draft)
    {
        var resistor = (ResistorPart)part;
        draft.Set("value", resistor.ValueOhms);
        draft.Set("tolerance", resistor.ToleranceRatio);
    }
}
