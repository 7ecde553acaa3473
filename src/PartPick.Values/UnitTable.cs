namespace PartPick.Values;

/// <summary>The spellings of the units of one dimension, and what its messages say.</summary>
internal sealed record UnitTable
{
    private static readonly Dictionary<Dimension, UnitTable> Tables = new()
    {
        [Dimension.Frequency] = Si("a frequency", "such as 4.096 MHz, 1 kHz or 32768", "Hz", "hz", "HZ"),
        [Dimension.Capacitance] = Si("a capacitance", "such as 22 pF, 4p7 or 22e-12", "F", "f") with { LargestPrefix = -3 },
        [Dimension.Resistance] = Si("a resistance", "such as 4k7, 2.2 MΩ or 470", "\u03A9") with
        {
            CodeLetter = 'R',
            Units = AtPower(0, "\u03A9", "\u2126", "ohm", "ohms", "Ohm", "Ohms", "OHM", "OHMS", "R"),
        },
        [Dimension.Transconductance] = Si("a transconductance", "such as 10 mS or 0.01", "S") with { Units = AtPower(0, "S", "A/V") },
        [Dimension.Voltage] = Si("a voltage", "such as 3.3 V, 3V3 or 5", "V", "v") with { CodeLetter = 'V' },
        [Dimension.Current] = Si("a current", "such as 1.5 mA or 0.0015", "A", "a"),
        [Dimension.Power] = Si("a power", "such as 100 uW or 1e-4", "W", "w"),
        [Dimension.Time] = Si("a time", "such as 50 ms, 8 ns or 0.05", "s"),
        [Dimension.Temperature] = new()
        {
            Noun = "a temperature",
            Example = "in degrees Celsius such as 25, -10 or 25 °C",
            Units = AtPower(0, "°C", "degC", "degc", "C", "\u2103"),
        },
        [Dimension.Relative] = new()
        {
            Noun = "a relative figure",
            Example = "such as 30 ppm, 5 % or 3e-5",
            Units = Ratios("", "PPM", "PPB"),
        },
        [Dimension.RelativePerKelvin] = new()
        {
            Noun = "a temperature coefficient",
            Example = "such as 30 ppm/K or 3e-5",
            Units = PerKelvin(""),
        },
        [Dimension.RelativePerSquareKelvin] = new()
        {
            Noun = "a parabolic coefficient",
            Example = "such as -0.034 ppm/K2 or -3.4e-8",
            Units = PerKelvin("2", "²", "^2"),
        },
        [Dimension.Number] = Si("a number", "such as 250, 1.5 or 2e3", ""),
        [Dimension.Count] = Si("a whole number", "from 0 to 2147483647 such as 12", ""),
    };

    /// <summary>What is meant, with its article.</summary>
    public required string Noun { get; init; }

    /// <summary>The end of a message that says what fits.</summary>
    public required string Example { get; init; }

    /// <summary>The unit as it is printed.</summary>
    public string Symbol { get; init; } = "";

    /// <summary>Spelling of a unit, and its power of ten.</summary>
    public required Dictionary<string, int> Units { get; init; }

    /// <summary>Spellings in another case, not taken after the prefix milli: 4 mhz may well mean 4 MHz.</summary>
    public string[] LooseUnits { get; init; } = [];

    /// <summary>Whether engineering prefixes are taken.</summary>
    public bool TakesPrefix { get; init; }

    /// <summary>The power of ten of the largest prefix that makes sense.</summary>
    public int LargestPrefix { get; init; } = 12;

    /// <summary>The letter of the unit that may stand for the decimal point, or NUL.</summary>
    public char CodeLetter { get; init; }

    /// <summary>What fits, for a message.</summary>
    public string Fits => $"{Noun} {Example}";

    public static UnitTable Of(Dimension dimension) =>
        Tables.TryGetValue(dimension, out UnitTable? table)
            ? table
            : throw new ArgumentOutOfRangeException(nameof(dimension), dimension, "Not a dimension.");

    private static UnitTable Si(string noun, string example, string symbol, params string[] loose) => new()
    {
        Noun = noun,
        Example = example,
        Symbol = symbol,
        Units = symbol.Length == 0 ? [] : AtPower(0, symbol),
        LooseUnits = loose,
        TakesPrefix = true,
    };

    private static Dictionary<string, int> AtPower(int power, params string[] spellings) =>
        spellings.ToDictionary(spelling => spelling, _ => power, StringComparer.Ordinal);

    private static Dictionary<string, int> PerKelvin(params string[] powers)
    {
        string[] kelvins = ["/K", "/°C", "/degC", "/C"];
        return powers.SelectMany(power => kelvins.SelectMany(unit => Ratios(unit + power))).ToDictionary(StringComparer.Ordinal);
    }

    private static Dictionary<string, int> Ratios(string suffix, string? alsoMillionth = null, string? alsoBillionth = null)
    {
        var units = new Dictionary<string, int>(StringComparer.Ordinal)
        {
            ["ppm" + suffix] = -6,
            ["ppb" + suffix] = -9,
            ["%" + suffix] = -2,
        };
        if (alsoMillionth is not null && alsoBillionth is not null)
        {
            units[alsoMillionth] = -6;
            units[alsoBillionth] = -9;
        }

        return suffix.Length == 0 ? units : new(units, StringComparer.Ordinal) { ["1" + suffix] = 0 };
    }
}
