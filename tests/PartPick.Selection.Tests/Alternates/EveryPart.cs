using PartPick.Catalog;

namespace PartPick.Selection.Tests.Alternates;

/// <summary>The replacements of a line by the definition alone: the whole circuit analysed with every part of the kind.</summary>
internal static class EveryPart
{
    /// <summary>Ids of the parts that keep the circuit fit, by ordinal.</summary>
    public static string[] ThatFits(BoardParts board, BoardLine line, Requirement requirement, PartsCatalog catalog)
    {
        var market = new Market(catalog, requirement.Builds);
        var builder = new CandidateBuilder(requirement, market);
        return
        [
            .. catalog.All
                .Where(part => part.Kind == line.Part.Kind && part.Id != line.Part.Id && market.IsListed(part))
                .Where(part => line.Places.All(place => Serves(place, part, board, requirement)))
                .Where(part =>
                {
                    BoardParts with = line.Places.Aggregate(board, (changed, place) => changed.With(place, part));
                    return Specification.CoversTemperature(with.Choice.Crystal, with.Choice.Amplifier, requirement)
                        && Specification.CoversClock(with.Choice.Amplifier, with.Choice.Crystal.FrequencyHz, requirement)
                        && builder.Build(with.Choice, with.Support) is { IsFit: true };
                })
                .Select(part => part.Id),
        ];
    }

    private static bool Serves(PartPlace place, Part part, BoardParts board, Requirement requirement) => part switch
    {
        CrystalPart crystal => crystal.Overtone == 1,
        CounterPart counter => counter.Taps.Contains(board.Choice.Tap),
        CapacitorPart capacitor => !(capacitor.VoltageVolts < requirement.SupplyMaxVolts) && place switch
        {
            PartPlace.Decoupling => capacitor.ValueFarads is > 99.9e-9 and < 1.001e-6 && !IsLossy(capacitor),
            PartPlace.Coupling => capacitor.ValueFarads is > 9.99e-9 and < 100.1e-9 && !IsLossy(capacitor),
            _ => capacitor.TemperatureCoefficientPerKelvin is not null
                && capacitor.ValueFarads >= requirement.Board.Strays.InputFarads
                && capacitor.ValueFarads >= requirement.Board.Strays.OutputFarads,
        },
        ResistorPart resistor => place != PartPlace.Feedback
            || resistor.ValueOhms / SupportParts.UsualFeedbackOhms(board.Choice.Crystal.FrequencyHz) is > 0.1999 and < 5.001,
        _ => true,
    };

    private static bool IsLossy(CapacitorPart part) => part.Dielectric?[^1] is 'T' or 'U' or 'V';
}
