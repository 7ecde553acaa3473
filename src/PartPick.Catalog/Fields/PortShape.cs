using PartPick.Values;

namespace PartPick.Catalog.Fields;

internal sealed class PortShape() : AmplifierShape(
    PartKind.Port,
    new PartField("criticalTransconductanceMax", Dimension.Transconductance, "mS", -3), Volts("swing"),
    new PartField("frequencyMin", Dimension.Frequency, "Hz"), new PartField("frequencyMax", Dimension.Frequency, "Hz"))
{
    protected override AmplifierPart BuildAmplifier(DraftReader reader, string id, string description, Offer offer)
    {
        reader.Ascending("frequencyMin", "frequencyMax");
        return new PortPart
        {
            Id = id,
            Description = description,
            Offer = offer,
            Stages = 1,
            Points = [],
            CriticalTransconductanceMaxSiemens = reader.Number("criticalTransconductanceMax"),
            SwingVolts = reader.Number("swing"),
            FrequencyMinHz = reader.Number("frequencyMin"),
            FrequencyMaxHz = reader.Number("frequencyMax"),
        };
    }

    protected override bool NeedsTransconductance(DraftReader reader) => reader.Number("criticalTransconductanceMax") is null;

    protected override void FillOwn(Part part, PartDraft draft)
    {
        base.FillOwn(part, draft);
        var port = (PortPart)part;
        draft.Set("criticalTransconductanceMax", port.CriticalTransconductanceMaxSiemens);
        draft.Set("swing", port.SwingVolts);
        draft.Set("frequencyMin", port.FrequencyMinHz);
        draft.Set("frequencyMax", port.FrequencyMaxHz);
    }
}
