using PartPick.Values;

namespace PartPick.Catalog.Fields;

internal sealed class CrystalShape() : PartShape(
    PartKind.Crystal,
    Text("cut"), Count("overtone"), Text("holder"), new PartField("frequency", Dimension.Frequency, "Hz"),
    Picofarads("load"), Picofarads("shunt"), new PartField("motional", Dimension.Capacitance, "fF", -15), Ohms("resistance"),
    new PartField("driveLevel", Dimension.Power, "uW", -6), Ratio("tolerance", "ppm"), Ratio("stability", "ppm"),
    Ratio("ageing", "ppm"), Ratio("ageingYearly", "ppm"), Celsius("temperatureMin"), Celsius("temperatureMax"),
    new PartField("parabola", Dimension.RelativePerSquareKelvin, "ppm/K2", -6, AllowNegative: true), Celsius("turnover"))
{
    protected override Part BuildOwn(DraftReader reader, string id, string description, Offer offer)
    {
        reader.Ascending("temperatureMin", "temperatureMax");
        if (reader.Number("load") == 0)
        {
            reader.Report("load", "is zero", "a load above zero, or nothing for series resonance");
        }

        return new CrystalPart
        {
            Id = id,
            Description = description,
            Offer = offer,
            Cut = ReadCut(reader),
            Overtone = reader.OneOf("overtone", 1, 3, 5),
            Holder = reader.Text("holder"),
            FrequencyHz = reader.Required("frequency"),
            LoadFarads = reader.Number("load"),
            ShuntFarads = reader.Number("shunt"),
            MotionalFarads = reader.Number("motional"),
            ResistanceOhms = reader.Number("resistance"),
            DriveLevelWatts = reader.Number("driveLevel"),
            ToleranceRatio = reader.Number("tolerance"),
            StabilityRatio = reader.Number("stability"),
            AgeingRatio = reader.Number("ageing"),
            AgeingYearlyRatio = reader.Number("ageingYearly"),
            TemperatureMinCelsius = reader.Number("temperatureMin"),
            TemperatureMaxCelsius = reader.Number("temperatureMax"),
            ParabolaPerSquareKelvin = reader.Number("parabola"),
            TurnoverCelsius = reader.Number("turnover"),
        };
    }

    protected override void FillOwn(Part part, PartDraft draft)
    {
        var crystal = (CrystalPart)part;
        draft.Set("cut", crystal.Cut == CrystalCut.Fork ? "fork" : crystal.Cut.ToString());
        draft.Set("overtone", crystal.Overtone);
        draft.Set("holder", crystal.Holder);
        draft.Set("frequency", crystal.FrequencyHz);
        draft.Set("load", crystal.LoadFarads);
        draft.Set("shunt", crystal.ShuntFarads);
        draft.Set("motional", crystal.MotionalFarads);
        draft.Set("resistance", crystal.ResistanceOhms);
        draft.Set("driveLevel", crystal.DriveLevelWatts);
        draft.Set("tolerance", crystal.ToleranceRatio);
        draft.Set("stability", crystal.StabilityRatio);
        draft.Set("ageing", crystal.AgeingRatio);
        draft.Set("ageingYearly", crystal.AgeingYearlyRatio);
        draft.Set("temperatureMin", crystal.TemperatureMinCelsius);
        draft.Set("temperatureMax", crystal.TemperatureMaxCelsius);
        draft.Set("parabola", crystal.ParabolaPerSquareKelvin);
        draft.Set("turnover", crystal.TurnoverCelsius);
    }

    private static CrystalCut ReadCut(DraftReader reader)
    {
        switch (reader.Text("cut"))
        {
            case "AT":
                return CrystalCut.AT;
            case "BT":
                return CrystalCut.BT;
            case "fork":
                return CrystalCut.Fork;
            default:
                reader.Report("cut", $"{Problem.Quote(reader.Text("cut"))} is no cut", "AT, BT or fork");
                return CrystalCut.AT;
        }
    }
}
