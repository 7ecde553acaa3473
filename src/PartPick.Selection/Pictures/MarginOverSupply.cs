using System.Collections.Immutable;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>
/// The start-up margin of a candidate over the required supply, at the device's limits and, where they count, at the ends of the
/// temperatures; each curve at the worse of the capacitances. The least of the corners is the candidate's own margin.
/// </summary>
public static class MarginOverSupply
{
    private const int Steps = 32;
    private const double Air = 1.12;
    private static readonly int[] Capacitances = [-1, 1];
    private static readonly DeviceStrength[] Limits = [DeviceStrength.Weakest, DeviceStrength.Strongest];

    private sealed record Line(char Letter, string Name, ImmutableArray<double> Celsius, ImmutableArray<DeviceStrength> Devices);

    /// <summary>The picture; a problem where the amplifier is not specified.</summary>
    /// <param name="candidate">The candidate.</param>
    /// <param name="requirement">What is needed.</param>
    /// <param name="cancellation">Ends it.</param>
    public static Result<Chart> Of(Candidate candidate, Requirement requirement, CancellationToken cancellation)
    {
        ArgumentNullException.ThrowIfNull(candidate);
        ArgumentNullException.ThrowIfNull(requirement);
        if (CornerAnalysis.Of(candidate, requirement) is not { } corners)
        {
            return Result.Fail<Chart>("supply", "the amplifier is not specified over it", "a supply range that the amplifier states");
        }

        double[] volts = [.. Supplies(requirement)];
        double air = volts.Length == 1 ? 0.05 * volts[0] : 0;
        bool follower = candidate.Choice.Circuit == CircuitKind.Follower;
        ImmutableArray<ChartCurve> curves =
        [
            .. (follower ? OfFollower(requirement) : OfInverter()).Select(line => new ChartCurve(
                line.Letter, line.Name, [.. volts.Select(at => new ChartPoint(at, Least(corners, line, at, cancellation)))])),
        ];
        ChartPoint least = curves.SelectMany(curve => curve.Points).MinBy(point => point.Y);
        double most = curves.SelectMany(curve => curve.Points).Max(point => point.Y);
        string wanted = ValueText.Format(requirement.Margin, Dimension.Number);
        return Result.Ok(new Chart(
            "Start-up margin over supply",
            new ChartAxis("supply", "V", volts[0] - air, volts[^1] + air),
            new ChartAxis("margin", "", Math.Min(0, Air * least.Y), Air * Math.Max(most, requirement.Margin)))
        {
            Curves = curves,
            Limits = [new ChartLimit("wanted " + wanted, requirement.Margin)],
            Marks = [new ChartMark('A', Words(least, candidate.Margin), least)],
            Notes = ["Each curve is at the worse of the capacitances, all low or all high."],
        });
    }

    // The corners lie at the ends of the supply; between them the margin is seldom less.
    private static string Words(ChartPoint least, AtCorner corner) => $"least {ValueText.Format(least.Y, Dimension.Number)} at "
        + (least.Y < corner.Value * (1 - 1e-9) ? ValueText.Format(least.X, Dimension.Voltage) : corner.Corner);

    private static Line[] OfInverter() =>
    [
        new Line('w', "weakest device", [25], [DeviceStrength.Weakest]),
        new Line('t', "typical", [25], [DeviceStrength.Typical]),
        new Line('s', "strongest", [25], [DeviceStrength.Strongest]),
    ];

    private static Line[] OfFollower(Requirement requirement) =>
    [
        new Line('c', Celsius(requirement.TemperatureMinCelsius), [requirement.TemperatureMinCelsius], [.. Limits]),
        new Line('h', Celsius(requirement.TemperatureMaxCelsius), [requirement.TemperatureMaxCelsius], [.. Limits]),
        new Line('t', "typical device at 25 °C", [25], [DeviceStrength.Typical]),
    ];

    private static string Celsius(double celsius) => ValueText.Format(celsius, Dimension.Temperature) + ", worst device";

    private static double Least(CornerAnalysis corners, Line line, double volts, CancellationToken cancellation)
    {
        double least = double.PositiveInfinity;
        foreach (double celsius in line.Celsius)
        {
            foreach (DeviceStrength device in line.Devices)
            {
                foreach (int capacitances in Capacitances)
                {
                    cancellation.ThrowIfCancellationRequested();
                    least = Math.Min(least, corners.MarginAt(new OperatingPoint(volts, celsius, device, capacitances)).Margin);
                }
            }
        }

        return least;
    }

    private static IEnumerable<double> Supplies(Requirement requirement)
    {
        (double low, double high) = (requirement.SupplyMinVolts, requirement.SupplyMaxVolts);
        return low == high
            ? [low]
            : Enumerable.Range(0, Steps + 1).Select(k => k == Steps ? high : low + (high - low) * k / Steps);
    }
}
