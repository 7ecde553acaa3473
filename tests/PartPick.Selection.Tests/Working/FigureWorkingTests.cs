using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Physics;

namespace PartPick.Selection.Tests.Working;

public class FigureWorkingTests
{
    private static readonly Requirement Wanted = new() { OutputHz = 4e6, BudgetRatio = 200e-6, Builds = 200, Years = 5 };

    private static readonly PartsCatalog Parts = PartsCatalog.BuiltIn();

    private static readonly string[] Expected =
    [
        "frequency error, worst case", "frequency error, RSS", "centre error e0", "crystal tolerance", "crystal over temperature",
        "crystal ageing", "C1 tolerance", "C2 tolerance", "C1 over temperature", "C2 over temperature", "strays", "amplifier and supply",
        "start-up margin, least", "drive level, highest", "start-up time, longest", "start-up margin, nominal", "critical transconductance",
        "gain margin", "running margin", "load capacitance", "frequency at the crystal", "output frequency", "drive level, nominal",
        "output swing", "cost", "score",
    ];

    public static TheoryData<string> Circuits => ["one stage", "buffered", "counter", "port", "follower"];

    [Theory]
    [MemberData(nameof(Circuits))]
    public void Every_figure_is_there_with_its_definition_formula_and_source(string circuit)
    {
        (Candidate candidate, Requirement requirement) = Make(circuit);

        ImmutableArray<FigureWorking> figures = FigureWorkings.Of(candidate, requirement, 0.2m);

        Assert.Empty(Expected.Except(figures.Select(figure => figure.Name)));
        Assert.All(candidate.Budget!.Terms, term => Assert.Contains(figures, figure => figure.Name == term.Term));
        Assert.All(figures, figure =>
        {
            Assert.EndsWith(".", figure.Definition, StringComparison.Ordinal);
            Assert.All(figure.Steps, step => Assert.All([step.Formula, step.Value, step.Source], text => Assert.NotEqual("", text)));
            Assert.Contains(figure.Steps, step => step.Numbers.Length > 0);
        });
    }

    [Theory]
    [MemberData(nameof(Circuits))]
    public void The_numbers_in_each_formula_evaluate_to_the_value_beside_it(string circuit)
    {
        (Candidate candidate, Requirement requirement) = Make(circuit);

        foreach (FigureWorking figure in FigureWorkings.Of(candidate, requirement, 0.2m))
        {
            foreach (WorkingStep step in figure.Steps.Where(step => step.Numbers.Length > 0))
            {
                double shown = Arithmetic.Of(step.Value);

                // Six digits each; a difference of two frequencies of thirteen digits is good to 1e-11 of them.
                double slack = 2e-4 * Math.Abs(shown) + (figure.Name.StartsWith("centre", StringComparison.Ordinal) ? 1e-11 : 0);
                Assert.True(
                    Math.Abs(Arithmetic.Of(step.Numbers) - shown) <= slack,
                    $"{circuit}, {figure.Name}: {step.Numbers} is {Arithmetic.Of(step.Numbers)}, not {step.Value}");
            }
        }
    }

    [Theory]
    [MemberData(nameof(Circuits))]
    public void What_the_last_step_gives_is_the_candidates_own_figure(string circuit)
    {
        (Candidate candidate, Requirement requirement) = Make(circuit);
        ImmutableArray<FigureWorking> figures = FigureWorkings.Of(candidate, requirement, 0.2m);

        Equal(candidate.Budget!.WorstRatio, "frequency error, worst case");
        Equal(candidate.Budget.RssRatio, "frequency error, RSS");
        Equal(candidate.Budget.CentreRatio, "centre error e0");
        Assert.All(candidate.Budget.Terms, term => Equal(term.Ratio, term.Term));
        Equal(candidate.Margin.Value, "start-up margin, least");
        Equal(candidate.Drive!.Value, "drive level, highest");
        Equal(candidate.StartUpTime!.Value, "start-up time, longest");
        Equal(candidate.Result.StartUp.Margin, "start-up margin, nominal");
        Equal(candidate.Result.StartUp.GainMargin!.Value, "gain margin");
        Equal(candidate.Result.RunningMargin, "running margin");
        SteadyState steady = candidate.Result.Steady!;
        Equal(steady.LoadFarads, "load capacitance");
        Equal(steady.FrequencyHz, "frequency at the crystal");
        Equal(candidate.OutputHz!.Value, "output frequency");
        Equal(steady.DriveWatts, "drive level, nominal");
        Equal(steady.OutputSwingVolts, "output swing");
        Equal((double)candidate.Cost, "cost");
        Equal(candidate.Score, "score");

        // The condition that defines it: with just that transconductance the margin is 1.
        FigureWorking critical = figures.Single(figure => figure.Name == "critical transconductance");
        Assert.Equal(candidate.Result.StartUp.CriticalSiemens!.Value, Arithmetic.Of(critical.Steps[0].Value),
            candidate.Result.StartUp.CriticalSiemens.Value * 1e-5);
        Assert.Equal(1, Arithmetic.Of(critical.Steps[^1].Numbers), 1e-4);

        void Equal(double expected, string name) => Assert.Equal(
            expected, Arithmetic.Of(figures.Single(figure => figure.Name == name).Steps[^1].Value), Math.Abs(expected) * 1e-5
                + 1e-12 * (name[0] == 'c' && name.Contains("e0", StringComparison.Ordinal) ? 1 : 0));
    }

    [Fact]
    public void An_assumed_motional_and_shunt_capacitance_have_their_own_terms()
    {
        (Candidate candidate, Requirement requirement) = Make("one stage", crystal =>
            crystal with { MotionalFarads = null, ShuntFarads = null });

        ImmutableArray<FigureWorking> figures = FigureWorkings.Of(candidate, requirement, null);

        foreach (string name in new[] { "motional capacitance", "shunt capacitance" })
        {
            WorkingStep step = figures.Single(figure => figure.Name == name).Steps[^1];
            Assert.Equal(candidate.Budget!.Terms.Single(term => term.Term == name).Ratio, Arithmetic.Of(step.Numbers), 1e-10);
        }
    }

    [Fact]
    public void A_corner_without_a_steady_state_leaves_figures_out_and_says_so()
    {
        (Candidate candidate, Requirement requirement) = Make("buffered");
        CandidateParts undamped = candidate.Choice with { Series = Resistor(2200) };
        Candidate stuck = new CandidateBuilder(requirement, new Market(Parts, requirement.Builds)).Build(undamped)!;
        Assert.Null(stuck.Drive);

        ImmutableArray<FigureWorking> figures = FigureWorkings.Of(stuck, requirement, 0.2m);

        Assert.DoesNotContain(figures.SelectMany(figure => figure.Steps), step =>
            step.Numbers.Contains("Infinity", StringComparison.Ordinal));
        Assert.Equal("none", figures[0].Value);
        Assert.Contains("a corner does not run", figures[0].Definition, StringComparison.Ordinal);
        Assert.Equal("none", figures.Single(figure => figure.Name == "drive level, highest").Value);
    }

    [Fact]
    public void The_emitters_voltage_swings_about_where_it_rests_and_an_inverters_about_half_the_supply()
    {
        SteadyState emitter = Make("follower").Item1.Result.Steady!;
        double rest = Make("follower").Item1.Result.EmitterCurrentAmps!.Value * 2200;
        SteadyState gate = Make("one stage").Item1.Result.Steady!;

        Assert.InRange(rest, emitter.OutputLowVolts, emitter.OutputHighVolts);
        Assert.InRange(emitter.OutputLowVolts, 0, 5);
        Assert.InRange(emitter.OutputHighVolts, 0, 5);
        Assert.Equal(0, gate.OutputLowVolts + gate.OutputHighVolts, 1e-12);
    }

    [Fact]
    public void The_arithmetic_of_these_tests_is_right()
    {
        Assert.Equal(2.5, Arithmetic.Of("1 + 3 / 2"));
        Assert.Equal(60e-6, Arithmetic.Of("60 Ω (1 mA)^2"), 1e-18);
        Assert.Equal(3, Arithmetic.Of("|1 - sqrt(16)|"), 1e-12);
        Assert.Equal(27e-6 * 0.05, Arithmetic.Of("1 ppm/pF 27 pF 5 %"), 1e-15);
        Assert.Equal(-2e-6, Arithmetic.Of("3.999992 MHz / (4 MHz) - 1"), 1e-12);
        Assert.Equal(Math.Sqrt(1.380649e-23 * 300), Arithmetic.Of("sqrt(k 300 K / 1 H)"), 1e-18);
    }

    private static (Candidate, Requirement) Make(string circuit, Func<CrystalPart, CrystalPart>? change = null)
    {
        CircuitKind kind = circuit switch
        {
            "counter" => CircuitKind.Counter,
            "port" => CircuitKind.Port,
            "follower" => CircuitKind.Follower,
            _ => CircuitKind.Gate,
        };
        Part amplifier = circuit switch
        {
            "one stage" => Parts.Inverters.First(part => !part.IsBuffered && part.Points[0].SupplyVolts <= 4.5
                && part.Points[^1].SupplyVolts >= 5.5),
            "buffered" => Parts.Inverters.First(part => part.IsBuffered && part.Points[0].SupplyVolts <= 4.5
                && part.Points[^1].SupplyVolts >= 5.5),
            "counter" => Parts.Find("CNT-14-HC")!,
            "port" => Parts.Ports.First(part => part.FrequencyMinHz <= 8e6 && part.FrequencyMaxHz >= 8e6),
            _ => Parts.Transistors[0],
        };
        double hertz = circuit switch { "counter" => 4.096e6, "port" => 8e6, _ => 4e6 };
        Requirement requirement = circuit switch
        {
            "counter" => Wanted with { OutputHz = 1000 },
            "port" => Wanted with { OutputHz = 8e6, SupplyMinVolts = 3, SupplyMaxVolts = 3.6 },
            _ => Wanted,
        };
        CrystalPart crystal = Parts.Crystals.First(part => part.FrequencyHz == hertz && part.LoadFarads > 15e-12 && part.Overtone == 1);
        bool follower = kind == CircuitKind.Follower;
        var choice = new CandidateParts
        {
            Circuit = kind,
            Crystal = change is null ? crystal : change(crystal),
            Amplifier = amplifier,
            Tap = kind == CircuitKind.Counter ? 12 : 0,
            C1 = Capacitor(follower ? 100e-12 : 22e-12),
            C2 = Capacitor(follower ? 100e-12 : 27e-12),
            Series = follower ? null : Resistor(470),
            BaseTop = follower ? Resistor(100e3) : null,
            BaseBottom = follower ? Resistor(100e3) : null,
            Emitter = follower ? Resistor(2200) : null,
        };
        // A buffered inverter runs at every corner only with enough damping: the smallest resistor that does it.
        var builder = new CandidateBuilder(requirement, new Market(Parts, requirement.Builds));
        double[] damping = circuit == "buffered" ? [4700, 6800, 8200, 10e3, 12e3, 15e3, 22e3, 33e3, 47e3] : [choice.Series?.ValueOhms ?? 0];
        Candidate built = damping.Select(ohms => builder.Build(ohms > 0 ? choice with { Series = Resistor(ohms) } : choice)!)
            .First(one => one.Drive is not null && one.StartUpTime is not null);
        return (built with { Score = Score.Of(requirement, built.Budget!.WorstRatio, built.Margin.Value, built.Cost, 0.2m) }, requirement);
    }

    private static CapacitorPart Capacitor(double farads) =>
        Parts.Capacitors.First(part => Math.Abs(part.ValueFarads / farads - 1) < 1e-9 && part.Dielectric == "C0G");

    private static ResistorPart Resistor(double ohms) => Parts.Resistors.First(part => part.ValueOhms == ohms);
}
