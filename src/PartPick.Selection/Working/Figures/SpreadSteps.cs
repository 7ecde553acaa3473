using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Physics;
using PartPick.Physics.Circuits;

namespace PartPick.Selection;

/// <summary>The formulas of the spreads of a frequency, with their numbers.</summary>
internal sealed class SpreadSteps(Candidate candidate, Requirement requirement, CandidateStudy study, RunningFigures steady)
{
    private const string Section = "Frequency error";
    private const string Part = "the part's stated figure";
    private const string Usual = "usual for the class where the part states none: common practice";
    private const string Slope = "slope of f by central difference of two steady states";

    private readonly CandidateParts _choice = candidate.Choice;
    private readonly Crystal _crystal = study.Model.Crystal;

    /// <summary>What a spread is, and how it comes about.</summary>
    public (string Definition, ImmutableArray<WorkingStep> Steps) Of(BudgetTerm term) => term.Term switch
    {
        "crystal tolerance" => (
            "How far the crystal's frequency may be off at 25 °C and its rated load, as it is delivered.",
            [Stated(term, "tolerance of the crystal")]),
        "crystal over temperature" => (
            "How far the crystal's frequency moves over the wanted temperatures.",
            [_choice.Crystal.StabilityRatio is null ? Parabola(term) : Stated(term, "stated band over temperature")]),
        "crystal ageing" => (
            "How far the crystal's frequency drifts over the wanted years: the first year's figure, then the yearly one.",
            [Ageing(term)]),
        "C1 tolerance" => (
            "What the tolerance of C1 moves the frequency by, through the slope of the frequency by C1 in this circuit.",
            [OfTolerance(term, "C1", study.Analysis.SlopesPerFarad.C1, _choice.C1)]),
        "C2 tolerance" => (
            "What the tolerance of C2 moves the frequency by, through the slope of the frequency by C2 in this circuit.",
            [OfTolerance(term, "C2", study.Analysis.SlopesPerFarad.C2, _choice.C2)]),
        "C1 over temperature" => (
            "What the temperature coefficient of C1 moves the frequency by, at the wanted temperature farthest from 25 °C.",
            [OverTemperature(term, "C1", study.Analysis.SlopesPerFarad.C1, _choice.C1)]),
        "C2 over temperature" => (
            "What the temperature coefficient of C2 moves the frequency by, at the wanted temperature farthest from 25 °C.",
            [OverTemperature(term, "C2", study.Analysis.SlopesPerFarad.C2, _choice.C2)]),
        "strays" => (
            "What the uncertainty of the board's stray capacitances moves the frequency by, all of them off together.", [Strays(term)]),
        "motional capacitance" => (
            "What an assumed motional capacitance may put the frequency off by: the crystal is right at its rated load, and only the "
                + "shift from there depends on Cm.",
            [Moved(term, "Cm", CrystalModel.MotionalUncertainty, (part, share) =>
                part with { MotionalFarads = part.MotionalFarads * share })]),
        "shunt capacitance" => (
            "What a shunt capacitance that is assumed, or stated as a maximum only, may put the frequency off by.",
            [Moved(term, "C0", CrystalModel.ShuntUncertainty, (part, share) => part with { ShuntFarads = part.ShuntFarads * share })]),
        _ => (
            "The largest shift of the frequency over supply, amplifier and ambient: from a weak device at the lowest supply to a strong "
                + "one at the highest.",
            [Amplifier(term)]),
    };

    private static WorkingStep Stated(BudgetTerm term, string formula) => new(
        Section, term.Term, formula, Numbers.Ppm(term.Ratio), Numbers.Ppm(term.Ratio), term.RestsOn == "assumed" ? Usual : Part);

    private WorkingStep Parabola(BudgetTerm term)
    {
        if (_choice.Crystal.ParabolaPerSquareKelvin is null && _choice.Crystal.Cut != CrystalCut.Fork)
        {
            return Stated(term, "usual band over temperature");
        }

        double turnover = _choice.Crystal.TurnoverCelsius ?? CrystalSpread.ForkTurnoverCelsius;
        double curvature = Math.Abs(_choice.Crystal.ParabolaPerSquareKelvin ?? CrystalSpread.ForkParabolaPerSquareKelvin);
        double reach = Math.Max(
            Math.Abs(requirement.TemperatureMinCelsius - turnover), Math.Abs(requirement.TemperatureMaxCelsius - turnover));
        return new WorkingStep(
            Section, term.Term, "|b| (farthest wanted temperature - turnover)^2",
            $"{Numbers.Of(curvature * 1e6)} ppm/K^2 ({Numbers.Of(reach)} K)^2", Numbers.Ppm(term.Ratio),
            "parabola of a tuning fork" + (term.RestsOn == "assumed" ? ", " + Usual : ""));
    }

    private WorkingStep Ageing(BudgetTerm term)
    {
        double first = _choice.Crystal.AgeingRatio ?? CrystalSpread.AssumedAgeing;
        double yearly = _choice.Crystal.AgeingYearlyRatio ?? first;
        string source = term.RestsOn == "assumed" ? Usual : Part;
        return requirement.Years <= 1
            ? new WorkingStep(Section, term.Term, "first year x years", $"{Numbers.Ppm(first)} {Numbers.Of(requirement.Years)}",
                Numbers.Ppm(term.Ratio), source)
            : new WorkingStep(Section, term.Term, "first year + (years - 1) yearly",
                $"{Numbers.Ppm(first)} + ({Numbers.Of(requirement.Years)} - 1) {Numbers.Ppm(yearly)}", Numbers.Ppm(term.Ratio), source);
    }

    private static WorkingStep OfTolerance(BudgetTerm term, string name, double slope, CapacitorPart part) => new(
        Section, term.Term, $"|df/f by {name}| {name} tolerance",
        $"{Numbers.PerPicofarad(slope)} {Numbers.Farads(part.ValueFarads)} {Numbers.Of(BudgetBuilder.Tolerance(part) * 100)} %",
        Numbers.Ppm(term.Ratio), Slope);

    private WorkingStep OverTemperature(BudgetTerm term, string name, double slope, CapacitorPart part) => new(
        Section, term.Term, $"|df/f by {name}| {name} coefficient (farthest wanted temperature - 25 °C)",
        $"{Numbers.PerPicofarad(slope)} {Numbers.Farads(part.ValueFarads)} {Numbers.Of(BudgetBuilder.Coefficient(part) * 1e6)} ppm/K "
            + $"{Numbers.Of(BudgetBuilder.TemperatureReach(requirement))} K",
        Numbers.Ppm(term.Ratio), Slope);

    private WorkingStep Strays(BudgetTerm term)
    {
        (double byC1, double byC2, double across) = study.Analysis.SlopesPerFarad;
        Strays strays = requirement.Board.Strays;
        bool isFollower = _choice.Circuit == CircuitKind.Follower;
        string input = isFollower ? "" : $"{Numbers.PerPicofarad(byC1)} {Numbers.Farads(strays.InputFarads)} + ";
        return new WorkingStep(
            Section, term.Term,
            $"u ({(isFollower ? "" : "|df/f by C1| Cs,in + ")}|df/f by C2| Cs,out + |df/f by C3| Cs,across)",
            $"{Numbers.Of(requirement.Board.UncertaintyRatio)} ({input}"
                + $"{Numbers.PerPicofarad(byC2)} {Numbers.Farads(strays.OutputFarads)} + "
                + $"{Numbers.PerPicofarad(across)} {Numbers.Farads(strays.AcrossFarads)})",
            Numbers.Ppm(term.Ratio), $"strays of a {requirement.Board.Name} board and their uncertainty u: common practice");
    }

    // Of a figure that is off either way, the way that moves more.
    private WorkingStep Moved(BudgetTerm term, string symbol, double uncertainty, Func<Crystal, double, Crystal> change)
    {
        double[] moved = [.. new[] { 1 + uncertainty, 1 - uncertainty }
            .Select(share => change(_crystal, share).FrequencyAtLoadHz(steady.LoadFarads))
            .OrderByDescending(hertz => Math.Abs(hertz / steady.FrequencyHz - 1))];
        return new WorkingStep(
            Section, term.Term, $"|f({symbol} off by {Numbers.Of(uncertainty * 100)} %) / f - 1| at the load that the crystal sees",
            $"|{Numbers.Finely(moved[0])} / {Numbers.Finely(steady.FrequencyHz)} - 1|", Numbers.Ppm(term.Ratio),
            "loaded frequency fs sqrt(1 + Cm/(C0 + C)), fN held at the rated load");
    }

    private WorkingStep Amplifier(BudgetTerm term)
    {
        OperatingPoint? point = study.Analysis.AmplifierFarthest;
        RunningFigures? far = point is null ? null : study.Analysis.SteadyAt(point, 0, 0);
        return new WorkingStep(
            Section, term.Term, "largest |f(corner) / f - 1|" + (point is null ? "" : $", at {point.Describe(_choice.Circuit)}"),
            far is null || study.Analysis.Base is not { } middle
                ? Numbers.Ppm(term.Ratio)
                : $"|{Numbers.Finely(far.FrequencyHz)} / {Numbers.Finely(middle.FrequencyHz)} - 1|",
            Numbers.Ppm(term.Ratio), "steady states at the corners, and the nominal one to the same fineness");
    }
}
