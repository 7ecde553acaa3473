using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Physics;

namespace PartPick.Selection;

/// <summary>Builds the frequency error of a candidate from its parts and the figures of its values.</summary>
public static class BudgetBuilder
{
    /// <summary>The error budget; null where there is no steady state.</summary>
    /// <param name="choice">The parts.</param>
    /// <param name="requirement">What is needed.</param>
    /// <param name="crystal">The crystal's model.</param>
    /// <param name="crystalTerms">The spreads of the crystal alone.</param>
    /// <param name="analysis">The figures of the nominal values.</param>
    public static ErrorBudget? Build(
        CandidateParts choice,
        Requirement requirement,
        CrystalModel crystal,
        ImmutableArray<BudgetTerm> crystalTerms,
        ValueAnalysis analysis)
    {
        ArgumentNullException.ThrowIfNull(choice);
        ArgumentNullException.ThrowIfNull(requirement);
        ArgumentNullException.ThrowIfNull(crystal);
        ArgumentNullException.ThrowIfNull(analysis);
        return analysis.Steady is { } steady ? Build(choice, requirement, crystal, crystalTerms, analysis, steady) : null;
    }

    /// <summary>The error budget about a steady state that is known, which need not be the converged one.</summary>
    internal static ErrorBudget Build(
        CandidateParts choice,
        Requirement requirement,
        CrystalModel crystal,
        ImmutableArray<BudgetTerm> crystalTerms,
        ValueAnalysis analysis,
        RunningFigures steady)
    {
        (double byC1, double byC2, double byAcross) = analysis.SlopesPerFarad;
        double reach = TemperatureReach(requirement);
        var law = TemperatureLaw.Linear(reach);
        double strays = requirement.Board.UncertaintyRatio * (
            InputShare(choice) * Math.Abs(byC1) * requirement.Board.Strays.InputFarads
            + Math.Abs(byC2) * requirement.Board.Strays.OutputFarads
            + Math.Abs(byAcross) * requirement.Board.Strays.AcrossFarads);
        var terms = crystalTerms.ToBuilder();
        terms.Add(new BudgetTerm("C1 tolerance", Math.Abs(byC1) * choice.C1.ValueFarads * Tolerance(choice.C1)));
        terms.Add(new BudgetTerm("C2 tolerance", Math.Abs(byC2) * choice.C2.ValueFarads * Tolerance(choice.C2)));
        terms.Add(new BudgetTerm("C1 over temperature", Math.Abs(byC1) * choice.C1.ValueFarads * Coefficient(choice.C1) * reach)
        {
            Law = law,
        });
        terms.Add(new BudgetTerm("C2 over temperature", Math.Abs(byC2) * choice.C2.ValueFarads * Coefficient(choice.C2) * reach)
        {
            Law = law,
        });
        terms.Add(new BudgetTerm("strays", strays, "assumed"));
        if (crystal.MotionalAssumed)
        {
            double shift = ShiftOf(crystal.Crystal, steady, 1 + CrystalModel.MotionalUncertainty, 1);
            terms.Add(new BudgetTerm("motional capacitance", shift, "assumed"));
        }

        if (crystal.ShuntUncertain)
        {
            double shift = ShiftOf(crystal.Crystal, steady, 1, 1 - CrystalModel.ShuntUncertainty);
            terms.Add(new BudgetTerm("shunt capacitance", shift, "assumed"));
        }

        terms.Add(new BudgetTerm("amplifier and supply", analysis.AmplifierRatio, AmplifierRestsOn(choice.Amplifier)));
        double centre = steady.FrequencyHz / (Math.Pow(2, choice.Tap) * requirement.OutputHz) - 1;
        return new ErrorBudget(centre, terms.ToImmutable());
    }

    /// <summary>Tolerance of a capacitor as a ratio; 20 % where it states none.</summary>
    public static double Tolerance(CapacitorPart part)
    {
        ArgumentNullException.ThrowIfNull(part);
        return part.ToleranceRatio ?? part.ToleranceFarads / part.ValueFarads ?? 0.2;
    }

    /// <summary>Largest distance of the required temperatures from 25 °C, in kelvins.</summary>
    public static double TemperatureReach(Requirement requirement)
    {
        ArgumentNullException.ThrowIfNull(requirement);
        return Math.Max(Math.Abs(requirement.TemperatureMinCelsius - 25), Math.Abs(requirement.TemperatureMaxCelsius - 25));
    }

    /// <summary>Temperature coefficient of a capacitor in 1/K, as a magnitude; zero where it states none.</summary>
    public static double Coefficient(CapacitorPart part)
    {
        ArgumentNullException.ThrowIfNull(part);
        return Math.Abs(part.TemperatureCoefficientPerKelvin ?? 0);
    }

    /// <summary>
    /// Largest relative change of f when Cm or C0 is off by a factor either way: the crystal stays on its nominal frequency at
    /// its rated load, so only the shift from there changes.
    /// </summary>
    public static double ShiftOf(Crystal crystal, RunningFigures steady, double motionalFactor, double shuntFactor)
    {
        ArgumentNullException.ThrowIfNull(crystal);
        ArgumentNullException.ThrowIfNull(steady);
        double high = Moved(motionalFactor, shuntFactor);
        double low = Moved(2 - motionalFactor, 2 - shuntFactor);
        return Math.Max(Math.Abs(high), Math.Abs(low));

        double Moved(double motional, double shunt) => (crystal with
        {
            MotionalFarads = crystal.MotionalFarads * motional,
            ShuntFarads = crystal.ShuntFarads * shunt,
        }).FrequencyAtLoadHz(steady.LoadFarads) / steady.FrequencyHz - 1;
    }

    // In a follower no stray stands beside C1 alone.
    private static double InputShare(CandidateParts choice) => choice.Circuit == CircuitKind.Follower ? 0 : 1;

    private static string? AmplifierRestsOn(Part amplifier)
    {
        string[] keys = amplifier is TransistorPart ? ["betaMin", "beta", "betaMax", "vbe"] : ["gmMin", "gm", "gmMax", "ro", "vt"];
        bool assumed = keys.Any(key => amplifier.BasisOf(key) == Basis.Assumed);
        return assumed ? "assumed" : "typical";
    }
}
