using PartPick.Values;

namespace PartPick.Catalog.Fields;

internal sealed class CapacitorShape() : PartShape(
    PartKind.Capacitor,
    Picofarads("value"), Ratio("tolerance", "%"), Picofarads("toleranceAbsolute"), Text("dielectric"),
    new PartField("temperatureCoefficient", Dimension.RelativePerKelvin, "ppm/K", -6), Volts("voltage"))
{
    protected override Part BuildOwn(DraftReader reader, string id, string description, Offer offer)
    {
        if (reader.Number("tolerance").HasValue == reader.Number("toleranceAbsolute").HasValue)
        {
            string what = reader.Number("tolerance").HasValue ? "is given twice" : "is missing";
            reader.Report("tolerance", what, "either tolerance or toleranceAbsolute");
        }

        return new CapacitorPart
        {
            Id = id,
            Description = description,
            Offer = offer,
            ValueFarads = reader.Required("value"),
            ToleranceRatio = reader.Number("tolerance"),
            ToleranceFarads = reader.Number("toleranceAbsolute"),
            Dielectric = reader.Text("dielectric"),
            TemperatureCoefficientPerKelvin = reader.Number("temperatureCoefficient"),
            VoltageVolts = reader.Number("voltage"),
        };
    }

    protected override void FillOwn(Part part, PartDraft draft)
    {
        var capacitor = (CapacitorPart)part;
        draft.Set("value", capacitor.ValueFarads);
        draft.Set("tolerance", capacitor.ToleranceRatio);
        draft.Set("toleranceAbsolute", capacitor.ToleranceFarads);
        draft.Set("dielectric", capacitor.Dielectric);
        draft.Set("temperatureCoefficient", capacitor.TemperatureCoefficientPerKelvin);
        draft.Set("voltage", capacitor.VoltageVolts);
    }
}
