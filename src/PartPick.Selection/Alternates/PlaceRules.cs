using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>What a part must be to stand in a place of a circuit, whatever the figures of the whole circuit are.</summary>
/// <param name="requirement">What is needed.</param>
/// <param name="market">What can be bought.</param>
/// <param name="board">The circuit.</param>
internal sealed class PlaceRules(Requirement requirement, Market market, BoardParts board)
{
    /// <summary>Why a part of the right kind cannot stand there; null where it may.</summary>
    public LeftOut? Reason(PartPlace place, Part part)
    {
        if (part.Excluded)
        {
            return LeftOut.Excluded;
        }

        if (!market.IsListed(part))
        {
            return LeftOut.Price;
        }

        return part switch
        {
            CrystalPart crystal => OfCrystal(crystal),
            CapacitorPart capacitor => OfCapacitor(place, capacitor),
            ResistorPart resistor => OfResistor(place, resistor),
            _ => OfAmplifier(part),
        };
    }

    private LeftOut? OfCrystal(CrystalPart crystal)
    {
        if (crystal.Overtone != 1)
        {
            return LeftOut.Overtone;
        }

        double target = requirement.OutputHz * Math.Pow(2, board.Choice.Tap);
        if (!Specification.ReachesFrequency(CrystalModel.From(crystal), target, requirement.BudgetRatio))
        {
            return LeftOut.Frequency;
        }

        return OfSpecification(crystal, board.Choice.Amplifier)
            ?? (CrystalSpread.Of(crystal, requirement).Sum(term => term.Ratio) > requirement.BudgetRatio ? LeftOut.CrystalError : null);
    }

    private LeftOut? OfAmplifier(Part amplifier) => amplifier is CounterPart counter && !counter.Taps.Contains(board.Choice.Tap)
        ? LeftOut.Stage
        : OfSpecification(board.Choice.Crystal, amplifier);

    private LeftOut? OfSpecification(CrystalPart crystal, Part amplifier)
    {
        if (!Specification.CoversTemperature(crystal, amplifier, requirement))
        {
            return LeftOut.Temperature;
        }

        return Specification.CoversClock(amplifier, crystal.FrequencyHz, requirement) ? null : LeftOut.Clock;
    }

    private LeftOut? OfCapacitor(PartPlace place, CapacitorPart part)
    {
        if (part.VoltageVolts < requirement.SupplyMaxVolts)
        {
            return LeftOut.Voltage;
        }

        return place switch
        {
            PartPlace.Decoupling => SupportParts.IsDecoupling(part) ? null : LeftOut.Value,
            PartPlace.Coupling => SupportParts.IsCoupling(part) ? null : LeftOut.Value,
            _ when part.TemperatureCoefficientPerKelvin is null => LeftOut.Dielectric,
            // A smaller one would leave the frequency to the stray beside it, as in a ranking.
            _ => part.ValueFarads < Math.Max(requirement.Board.Strays.InputFarads, requirement.Board.Strays.OutputFarads)
                ? LeftOut.Value
                : null,
        };
    }

    private LeftOut? OfResistor(PartPlace place, ResistorPart part) =>
        place == PartPlace.Feedback && !SupportParts.IsFeedback(part, board.Choice.Crystal.FrequencyHz) ? LeftOut.Value : null;
}
