using System.Collections.Immutable;
using System.Globalization;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>An axis of a picture. Its values are in SI units; its ticks are round numbers in the unit of its heading.</summary>
/// <param name="Name">What it measures.</param>
/// <param name="Unit">The unit of its ticks; empty where there is none.</param>
/// <param name="From">The value at its beginning, SI.</param>
/// <param name="To">The value at its end, SI; larger than <paramref name="From"/>.</param>
public sealed record ChartAxis(string Name, string Unit, double From, double To)
{
    private static readonly double[] Steps = [1, 2, 5, 10];

    /// <summary>One unit of the ticks in SI: 1e-6 for ppm.</summary>
    public double UnitSize { get; init; } = 1;

    /// <summary>What the ticks of a logarithmic axis are printed as, each with its prefix and unit; null for a linear axis.</summary>
    public Dimension? Logarithmic { get; init; }

    /// <summary>Name and unit.</summary>
    public string Heading => Unit.Length == 0 ? Name : $"{Name} ({Unit})";

    /// <summary>An axis with the unit of time that suits its end.</summary>
    /// <param name="name">What it measures.</param>
    /// <param name="seconds">Its end in seconds, above zero.</param>
    public static ChartAxis Time(string name, double seconds)
    {
        (string unit, double size) = seconds switch
        {
            >= 1 => ("s", 1),
            >= 1e-3 => ("ms", 1e-3),
            _ => ("µs", 1e-6),
        };
        return new ChartAxis(name, unit, 0, seconds) { UnitSize = size };
    }

    /// <summary>Where a value lies: 0 at the beginning, 1 at the end, beyond them outside.</summary>
    /// <param name="value">The value, SI.</param>
    public double Place(double value) => Logarithmic is null
        ? (value - From) / (To - From)
        : Math.Log(Math.Max(value, double.Epsilon) / From) / Math.Log(To / From);

    /// <summary>Ticks at round numbers.</summary>
    /// <param name="most">The most ticks, one or more.</param>
    public ImmutableArray<AxisTick> Ticks(int most) => Logarithmic is { } dimension ? Decades(dimension, most) : Round(most);

    private ImmutableArray<AxisTick> Round(int most)
    {
        double span = (To - From) / UnitSize;
        double decade = Math.Pow(10, Math.Floor(Math.Log10(span / Math.Max(1, most))));
        foreach (double step in Steps.Select(factor => factor * decade).Append(20 * decade))
        {
            double first = Math.Ceiling(From / UnitSize / step - 1e-9);
            double last = Math.Floor(To / UnitSize / step + 1e-9);
            if (last - first + 1 > most && step < 20 * decade)
            {
                continue;
            }

            int decimals = Math.Clamp((int)-Math.Floor(Math.Log10(step) + 1e-9), 0, 9);
            string format = "F" + decimals.ToString(CultureInfo.InvariantCulture);
            return
            [
                .. Enumerable.Range(0, Math.Max(0, (int)(last - first) + 1)).Take(most).Select(k => (first + k) * step)
                    .Select(value => new AxisTick(value * UnitSize, (value + 0.0).ToString(format, CultureInfo.InvariantCulture))),
            ];
        }

        return [];
    }

    private ImmutableArray<AxisTick> Decades(Dimension dimension, int most)
    {
        int first = (int)Math.Ceiling(Math.Log10(From) - 1e-9);
        int last = (int)Math.Floor(Math.Log10(To) + 1e-9);
        int step = Math.Max(1, (int)Math.Ceiling((last - first + 1) / (double)Math.Max(1, most)));
        return
        [
            .. Enumerable.Range(first, Math.Max(0, last - first + 1)).Where(power => (last - power) % step == 0)
                .Select(power => Math.Pow(10, power))
                .Select(value => new AxisTick(value, ValueText.Format(value, dimension))),
        ];
    }
}
