using CsCheck;
using PartPick.Selection.Search;

namespace PartPick.Selection.Tests.Ranking;

/// <summary>The front and the score by their definitions (arithmetic).</summary>
public class FrontAndScoreTests
{
    private static readonly Gen<(double Error, double Margin, int Cost)[]> Points =
        Gen.Select(Gen.Int[1, 6], Gen.Int[1, 6], Gen.Int[1, 6])
            .Select(point => ((double)point.Item1, (double)point.Item2, point.Item3)).Array[1, 40];

    [Fact]
    public void The_front_holds_exactly_what_no_other_beats_whatever_the_order() => Points.Sample(points =>
    {
        var front = new Front();
        foreach ((double error, double margin, int cost) in points)
        {
            front.Add(Point(error, margin, cost));
        }

        var expected = points.Where(one => !points.Any(other => Beats(other, one))).Order();
        return front.Points.Select(point => (point.ErrorRatio, point.Margin, (int)point.Cost)).Order().SequenceEqual(expected)
            && points.All(one => front.Beats(one.Error, one.Margin, one.Cost) == points.Any(other => Beats(other, one)));
    });

    [Theory]
    [InlineData(1, 1, 1, 50e-6, 10, 3, 2, 0.5 + 0.5 + 1.5)]
    [InlineData(2, 0, 0, 50e-6, 10, 3, 2, 1)]
    [InlineData(0, 3, 0, 50e-6, 10, 3, 2, 1.5)]
    [InlineData(0, 0, 2, 50e-6, 10, 3, 2, 3)]
    [InlineData(1, 1, 1, 100e-6, 5, 2, 2, 3)]
    [InlineData(0, 0, 1, 1e-6, 5, 0, 0, 1)]
    public void The_score_is_the_weighted_sum_of_used_shares(
        double error, double margin, double cost, double ratio, double factor, double price, double cheapest, double expected) =>
        Assert.Equal(
            expected,
            Score.Of(
                Sample.Requirement with { Weights = new Weights(error, margin, cost), Margin = 5 },
                ratio,
                factor,
                (decimal)price,
                (decimal)cheapest),
            1e-12);

    private static bool Beats((double Error, double Margin, int Cost) one, (double Error, double Margin, int Cost) other) =>
        one.Error <= other.Error && one.Margin >= other.Margin && one.Cost <= other.Cost && one != other;

    private static FitPoint Point(double error, double margin, int cost) => new(error, margin, cost, new CandidateParts
    {
        Circuit = CircuitKind.Gate,
        Crystal = Sample.Crystal,
        Amplifier = Sample.Inverter,
        C1 = Sample.Capacitor(22e-12, "C"),
        C2 = Sample.Capacitor(22e-12, "C"),
    });
}
