using PartPick.Values;

namespace PartPick.Catalog.Fields;

internal sealed class TransistorShape() : PartShape(
    PartKind.Transistor,
    new PartField("betaMin", Dimension.Number), new PartField("beta", Dimension.Number), new PartField("betaMax", Dimension.Number),
    new PartField("transitionFrequency", Dimension.Frequency, "MHz", 6), Picofarads("cje"),
    new PartField("tf", Dimension.Time, "ns", -9), Picofarads("cmu"), Ohms("rbb"), Volts("vbe"),
    new PartField("currentMax", Dimension.Current, "mA", -3), Volts("voltageMax"),
    Celsius("temperatureMin"), Celsius("temperatureMax"))
{
    protected override Part BuildOwn(DraftReader reader, string id, string description, Offer offer)
    {
        reader.Ascending("betaMin", "beta", "betaMax");
        reader.Ascending("temperatureMin", "temperatureMax");
        return new TransistorPart
        {
            Id = id,
            Description = description,
            Offer = offer,
            BetaMin = reader.Number("betaMin"),
            Beta = reader.Required("beta"),
            BetaMax = reader.Number("betaMax"),
            TransitionFrequencyHz = reader.Number("transitionFrequency"),
            CjeFarads = reader.Number("cje"),
            TfSeconds = reader.Number("tf"),
            CmuFarads = reader.Number("cmu"),
            RbbOhms = reader.Number("rbb"),
            VbeVolts = reader.Number("vbe"),
            CurrentMaxAmperes = reader.Number("currentMax"),
            VoltageMaxVolts = reader.Number("voltageMax"),
            TemperatureMinCelsius = reader.Number("temperatureMin"),
            TemperatureMaxCelsius = reader.Number("temperatureMax"),
        };
    }

    protected override void FillOwn(Part part, PartDraft draft)
    {
        var transistor = (TransistorPart)part;
        draft.Set("betaMin", transistor.BetaMin);
        draft.Set("beta", transistor.Beta);
        draft.Set("betaMax", transistor.BetaMax);
        draft.Set("transitionFrequency", transistor.TransitionFrequencyHz);
        draft.Set("cje", transistor.CjeFarads);
        draft.Set("tf", transistor.TfSeconds);
        draft.Set("cmu", transistor.CmuFarads);
        draft.Set("rbb", transistor.RbbOhms);
        draft.Set("vbe", transistor.VbeVolts);
        draft.Set("currentMax", transistor.CurrentMaxAmperes);
        draft.Set("voltageMax", transistor.VoltageMaxVolts);
        draft.Set("temperatureMin", transistor.TemperatureMinCelsius);
        draft.Set("temperatureMax", transistor.TemperatureMaxCelsius);
    }
}
