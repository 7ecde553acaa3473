using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>The spreads of the frequency that belong to the crystal alone, whatever the circuit.</summary>
public static class CrystalSpread
{
    // Class defaults where a part states nothing (common practice, from memory).
    internal const double AssumedAgeing = 5e-6;
    internal const double ForkParabolaPerSquareKelvin = -0.034e-6;
    internal const double ForkTurnoverCelsius = 25;
    private const double AssumedTolerance = 50e-6;
    private const double AssumedStability = 50e-6;

    /// <summary>Tolerance, temperature and ageing over a requirement.</summary>
    public static ImmutableArray<BudgetTerm> Of(CrystalPart part, Requirement requirement)
    {
        ArgumentNullException.ThrowIfNull(part);
        ArgumentNullException.ThrowIfNull(requirement);
        return [Tolerance(part), Temperature(part, requirement), Ageing(part, requirement.Years)];
    }

    private static BudgetTerm Tolerance(CrystalPart part) =>
        new("crystal tolerance", part.ToleranceRatio ?? AssumedTolerance, RestsOn(part, "tolerance", part.ToleranceRatio));

    private static BudgetTerm Temperature(CrystalPart part, Requirement requirement)
    {
        const string Term = "crystal over temperature";
        if (part.StabilityRatio is { } band)
        {
            return new BudgetTerm(Term, band, RestsOn(part, "stability", part.StabilityRatio));
        }

        if (part.ParabolaPerSquareKelvin is not null || part.Cut == CrystalCut.Fork)
        {
            double turnover = part.TurnoverCelsius ?? ForkTurnoverCelsius;
            double reach = Math.Max(
                Math.Abs(requirement.TemperatureMinCelsius - turnover),
                Math.Abs(requirement.TemperatureMaxCelsius - turnover));
            double parabola = part.ParabolaPerSquareKelvin ?? ForkParabolaPerSquareKelvin;
            double curvature = Math.Abs(parabola);
            return new BudgetTerm(Term, curvature * reach * reach, RestsOn(part, "parabola", part.ParabolaPerSquareKelvin))
            {
                Law = TemperatureLaw.Parabola(turnover, reach, Math.Sign(parabola)),
            };
        }

        return new BudgetTerm(Term, AssumedStability, "assumed");
    }

    private static BudgetTerm Ageing(CrystalPart part, double years)
    {
        double first = part.AgeingRatio ?? AssumedAgeing;
        double yearly = part.AgeingYearlyRatio ?? first;
        double sum = years <= 1 ? first * years : first + (years - 1) * yearly;
        return new BudgetTerm("crystal ageing", sum, RestsOn(part, "ageing", part.AgeingRatio));
    }

    private static string? RestsOn(CrystalPart part, string key, double? stated) =>
        stated is null ? "assumed" : part.BasisOf(key) switch
        {
            Basis.Assumed => "assumed",
            Basis.Typical => "typical",
            _ => null,
        };
}
