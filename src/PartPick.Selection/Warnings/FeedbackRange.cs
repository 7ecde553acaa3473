namespace PartPick.Selection;

/// <summary>The usual range of a feedback resistor.</summary>
/// <param name="LeastOhms">Smallest usual value in ohms.</param>
/// <param name="MostOhms">Largest usual value in ohms.</param>
public readonly record struct FeedbackRange(double LeastOhms, double MostOhms)
{
    // ST AN2867, Table 3: 32.768 kHz 10 to 25 MΩ; 1 MHz 5 to 10; 10 MHz 1 to 5; 20 MHz 0.47 to 5 MΩ.
    private static readonly (double Hertz, double Least, double Most)[] Table =
        [(32768, 10e6, 25e6), (1e6, 5e6, 10e6), (10e6, 1e6, 5e6), (20e6, 0.47e6, 5e6)];

    /// <summary>The range at a frequency; between two rows of the table, what either of them allows.</summary>
    /// <param name="hertz">Frequency in hertz.</param>
    public static FeedbackRange At(double hertz)
    {
        (double Hertz, double Least, double Most) below = Table.LastOrDefault(row => row.Hertz <= hertz, Table[0]);
        (double Hertz, double Least, double Most) above = Table.FirstOrDefault(row => row.Hertz >= hertz, Table[^1]);
        return new FeedbackRange(Math.Min(below.Least, above.Least), Math.Max(below.Most, above.Most));
    }
}
