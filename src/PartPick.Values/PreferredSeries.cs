using System.Globalization;

namespace PartPick.Values;

/// <summary>A series of preferred values: E3 to E192 of IEC 60063.</summary>
public sealed class PreferredSeries
{
    // IEC 60063: from 2.7 to 4.7 and at 8.2 the list differs from the rounded powers of ten.
    private static readonly int[] TwentyFour =
        [10, 11, 12, 13, 15, 16, 18, 20, 22, 24, 27, 30, 33, 36, 39, 43, 47, 51, 56, 62, 68, 75, 82, 91];

    private static readonly PreferredSeries[] Known =
        [.. new[] { 3, 6, 12, 24, 48, 96, 192 }.Select(count => new PreferredSeries(count))];

    private readonly int[] _whole;
    private readonly int _wholePower;

    private PreferredSeries(int count)
    {
        Name = string.Create(CultureInfo.InvariantCulture, $"E{count}");
        (_whole, _wholePower) = count <= 24
            ? ([.. TwentyFour.Where((_, index) => index % (24 / count) == 0)], 1)
            : (ThreeFigures(count), 2);
        MantissasOfDecade = Array.AsReadOnly(Array.ConvertAll(_whole, whole => InDecade(whole, 0)));
    }

    /// <summary>All the series, the coarsest first.</summary>
    public static IReadOnlyList<PreferredSeries> All { get; } = Array.AsReadOnly(Known);

    /// <summary>The name: E3, E6, E12, E24, E48, E96 or E192.</summary>
    public string Name { get; }

    /// <summary>The values of one decade, from 1 to below 10, ascending.</summary>
    public IReadOnlyList<double> MantissasOfDecade { get; }

    /// <summary>Finds a series by its name.</summary>
    /// <param name="name">E3, E6, E12, E24, E48, E96 or E192, in either case.</param>
    /// <param name="where">The name of the field, for the problem.</param>
    /// <returns>The series, or the problem.</returns>
    public static Result<PreferredSeries> Named(string? name, string where = "series")
    {
        string wanted = (name ?? "").Trim();
        PreferredSeries? found = Known.FirstOrDefault(series => series.Name.Equals(wanted, StringComparison.OrdinalIgnoreCase));
        return found is not null
            ? Result.Ok(found)
            : Result.Fail<PreferredSeries>(where, $"{Problem.Quote(name)} is no series of preferred values",
                "one of " + string.Join(", ", Known.Select(series => series.Name)));
    }

    /// <summary>The values from one limit to another, both included, ascending.</summary>
    /// <param name="min">The lower limit, above zero and finite.</param>
    /// <param name="max">The upper limit, finite; below <paramref name="min"/> there are no values.</param>
    /// <returns>The values.</returns>
    public IReadOnlyList<double> ValuesBetween(double min, double max)
    {
        CheckPositive(min);
        if (!double.IsFinite(max))
        {
            throw new ArgumentOutOfRangeException(nameof(max), max, "The upper limit has to be finite.");
        }

        var values = new List<double>();
        for (int decade = DecadeOf(min); max >= min && decade <= DecadeOf(max); decade++)
        {
            values.AddRange(_whole.Select(whole => InDecade(whole, decade)).Where(value => value >= min && value <= max));
        }

        return values;
    }

    /// <summary>The value that differs least from the one given; of two as near, the lower.</summary>
    /// <param name="value">A value above zero, finite.</param>
    /// <returns>The nearest preferred value.</returns>
    public double Nearest(double value)
    {
        CheckPositive(value);
        int decade = DecadeOf(value);
        double[] candidates = [.. _whole.Select(whole => InDecade(whole, decade)), InDecade(_whole[0], decade + 1)];
        return candidates.Where(double.IsFinite).MinBy(candidate => Math.Abs(candidate - value));
    }

    /// <summary>The name of the series.</summary>
    public override string ToString() => Name;

    // The powers of ten rounded to three figures; the one exception of IEC 60063 is 9.20, where the formula gives 9.19.
    private static int[] ThreeFigures(int count) =>
        [.. Enumerable.Range(0, count).Select(k => (int)Math.Round(100 * Math.Pow(10, (double)k / count)))
            .Select(whole => whole == 919 ? 920 : whole)];

    // From decimal text, so that 22 in the decade of pico is the same double as 22e-12.
    private double InDecade(int whole, int decade) => double.Parse(
        string.Create(CultureInfo.InvariantCulture, $"{whole}e{decade - _wholePower}"), CultureInfo.InvariantCulture);

    private static int DecadeOf(double value) => DecimalDigits.Of(value, null).Power;

    private static void CheckPositive(double value)
    {
        if (!(value > 0) || !double.IsFinite(value))
        {
            throw new ArgumentOutOfRangeException(nameof(value), value, "Preferred values are above zero and finite.");
        }
    }
}
