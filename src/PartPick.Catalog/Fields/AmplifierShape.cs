namespace PartPick.Catalog.Fields;

/// <summary>What inverters, counters and ports have in common in files.</summary>
internal abstract class AmplifierShape(PartKind kind, params PartField[] further) : PartShape(
    kind,
    [
        Count("stages"), Volts("vt"), Picofarads("cin"), Picofarads("cout"), Picofarads("cf"), .. further,
        Celsius("temperatureMin"), Celsius("temperatureMax"), .. PointFields.All,
    ])
{
    protected override Part BuildOwn(DraftReader reader, string id, string description, Offer offer)
    {
        reader.Ascending("temperatureMin", "temperatureMax");
        int stages = reader.OneOf("stages", 1, 3);
        AmplifierPart own = BuildAmplifier(reader, id, description, offer);
        return own with
        {
            Stages = stages,
            Points = PointFields.Read(reader, stages > 1, NeedsTransconductance(reader)),
            ThresholdVolts = reader.Number("vt"),
            InputFarads = reader.Number("cin"),
            OutputFarads = reader.Number("cout"),
            FeedbackFarads = reader.Number("cf"),
            TemperatureMinCelsius = reader.Number("temperatureMin"),
            TemperatureMaxCelsius = reader.Number("temperatureMax"),
        };
    }

    /// <summary>Makes the part with its own figures; points and stages follow.</summary>
    protected abstract AmplifierPart BuildAmplifier(DraftReader reader, string id, string description, Offer offer);

    protected virtual bool NeedsTransconductance(DraftReader reader) => true;

    protected override void FillOwn(Part part, PartDraft draft)
    {
        var amplifier = (AmplifierPart)part;
        draft.Set("stages", amplifier.Stages);
        draft.Set("vt", amplifier.ThresholdVolts);
        draft.Set("cin", amplifier.InputFarads);
        draft.Set("cout", amplifier.OutputFarads);
        draft.Set("cf", amplifier.FeedbackFarads);
        draft.Set("temperatureMin", amplifier.TemperatureMinCelsius);
        draft.Set("temperatureMax", amplifier.TemperatureMaxCelsius);
        PointFields.Fill(amplifier.Points, draft);
    }
}
