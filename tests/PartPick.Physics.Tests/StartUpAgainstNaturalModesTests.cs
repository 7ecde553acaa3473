using System.Text;
using PartPick.Physics.Circuits;
using PartPick.Physics.Tests.Independent;
using Complex = System.Numerics.Complex;

namespace PartPick.Physics.Tests;

/// <summary>
/// The small-signal figures of circuits drawn at random against the eigenvalues of the complete circuit (arithmetic on the
/// model's definitions).
/// </summary>
public sealed class StartUpAgainstNaturalModesTests
{
    private const int CircuitsPerKind = 60;
    private const double Relative = 1e-4;

    public static TheoryData<string> Kinds => ["one stage", "clock", "buffered", "follower"];

    [Theory]
    [MemberData(nameof(Kinds))]
    public void Bias_gives_the_transconductance(string kind) => ForEach(kind, 11, (circuit, found) =>
        Compare("gm", RandomCircuits.Transconductance(circuit), found.TransconductanceSiemens, 1e-6));

    [Theory]
    [MemberData(nameof(Kinds))]
    public void Natural_frequency_is_the_eigenvalue_within_a_billionth(string kind) => ForEach(kind, 11, (circuit, found) =>
        Compare("f", NaturalModes.Mode(circuit, found.TransconductanceSiemens).Imaginary / (2 * Math.PI), found.NaturalHz, 1e-9));

    [Theory]
    [MemberData(nameof(Kinds))]
    public void Growth_rate_is_the_eigenvalue(string kind) => ForEach(kind, 11, (circuit, found) =>
    {
        Complex mode = NaturalModes.Mode(circuit, found.TransconductanceSiemens);
        double decay = circuit.Crystal.ResistanceOhms / (2 * circuit.Crystal.InductanceHenries);
        return Math.Abs(mode.Real - found.GrowthRatePerSecond) <= Relative * Math.Max(Math.Abs(mode.Real), decay)
            ? null
            : Difference("growth", mode.Real, found.GrowthRatePerSecond);
    });

    [Theory]
    [MemberData(nameof(Kinds))]
    public void Negative_resistance_and_margin_are_those_of_the_full_matrix(string kind) => ForEach(kind, 11, (circuit, found) =>
    {
        double expected = NaturalModes.NegativeResistance(circuit, found.TransconductanceSiemens);
        double rm = circuit.Crystal.ResistanceOhms;
        double allowed = Relative * Math.Max(Math.Abs(expected), rm);
        return Math.Abs(expected - found.NegativeResistanceOhms) > allowed
            ? Difference("Rn", expected, found.NegativeResistanceOhms)
            : Compare("margin", found.NegativeResistanceOhms / rm, found.Margin, 1e-12);
    });

    [Theory]
    [MemberData(nameof(Kinds))]
    public void Critical_and_upper_transconductance_are_where_growth_changes_its_sign(string kind) => ForEach(kind, 12, (circuit, found) =>
    {
        GainWindow window = GainWindow.Of(circuit);
        return CompareLimit(circuit, "critical", window.Critical, found.CriticalSiemens)
            ?? CompareLimit(circuit, "upper", window.Upper, found.UpperSiemens);
    });

    private static string? CompareLimit(OscillatorCircuit circuit, string name, double? expected, double? found) => (expected, found) switch
    {
        (null, null) => null,
        ({ } e, { } f) => Compare(name, e, f, Relative),
        ({ } e, null) => Difference(name, e, double.NaN),
        // Outside the scan, or between two of its points: then the figure itself is tried.
        (null, { } f) => GainWindow.SignChangesAt(circuit, f, Relative) ? null : Difference(name, double.NaN, f),
    };

    private static string? Compare(string name, double expected, double found, double relative) =>
        Math.Abs(found - expected) <= relative * Math.Abs(expected) ? null : Difference(name, expected, found);

    private static string Difference(string name, double expected, double found) =>
        FormattableString.Invariant($"{name}: expected {expected:G12}, found {found:G12}, ratio − 1 = {found / expected - 1:E2}");

    private static void ForEach(string kind, int seed, Func<OscillatorCircuit, StartUp, string?> compare)
    {
        var random = new Random(seed);
        var failures = new StringBuilder();
        int failed = 0;
        for (int k = 0; k < CircuitsPerKind; k++)
        {
            OscillatorCircuit circuit = RandomCircuits.Next(random, kind);
            if (compare(circuit, OscillatorAnalysis.AnalyseStartUp(circuit)) is { } failure)
            {
                failed++;
                failures.AppendLine(failure).Append("    ").Append(circuit).AppendLine();
            }
        }

        Assert.True(failed == 0, $"{failed} of {CircuitsPerKind}:\n{failures}");
    }
}
