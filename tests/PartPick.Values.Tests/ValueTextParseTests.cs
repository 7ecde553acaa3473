namespace PartPick.Values.Tests;

public sealed class ValueTextParseTests
{
    public static TheoryData<string, Dimension, double> Readable => new()
    {
        { "22e-12", Dimension.Capacitance, 22e-12 },
        { "22 pF", Dimension.Capacitance, 22e-12 },
        { "22p", Dimension.Capacitance, 22e-12 },
        { "22pf", Dimension.Capacitance, 22e-12 },
        { "12 fF", Dimension.Capacitance, 12e-15 },
        { "12f", Dimension.Capacitance, 12e-15 },
        { "1 F", Dimension.Capacitance, 1 },
        { "0,1 µF", Dimension.Capacitance, 1e-7 },
        { "0.1 \u03BCF", Dimension.Capacitance, 1e-7 },
        { "0.1uF", Dimension.Capacitance, 1e-7 },
        { "4.096 MHz", Dimension.Frequency, 4.096e6 },
        { "4.096M", Dimension.Frequency, 4.096e6 },
        { "4M096", Dimension.Frequency, 4.096e6 },
        { "4 mHz", Dimension.Frequency, 4e-3 },
        { "4 MHZ", Dimension.Frequency, 4e6 },
        { "32768", Dimension.Frequency, 32768 },
        { "32.768 KHz", Dimension.Frequency, 32768 },
        { "1\u00A0kHz", Dimension.Frequency, 1000 },
        { "0.5mW", Dimension.Power, 5e-4 },
        { "500 uW", Dimension.Power, 5e-4 },
        { "4,7k", Dimension.Resistance, 4700 },
        { "1234,567", Dimension.Resistance, 1234.567 },
        { "0,100", Dimension.Resistance, 0.1 },
        { ",5", Dimension.Resistance, 0.5 },
        { "2.2 MΩ", Dimension.Resistance, 2.2e6 },
        { "2.2 M\u2126", Dimension.Resistance, 2.2e6 },
        { "100 ohm", Dimension.Resistance, 100 },
        { "100 ohms", Dimension.Resistance, 100 },
        { "4.7 kohm", Dimension.Resistance, 4700 },
        { "4.7 k Ω", Dimension.Resistance, 4700 },
        { "4.7KR", Dimension.Resistance, 4700 },
        { "1e3", Dimension.Resistance, 1000 },
        { "+47", Dimension.Resistance, 47 },
        { "-0", Dimension.Resistance, 0 },
        { "10 mS", Dimension.Transconductance, 0.01 },
        { "10 mA/V", Dimension.Transconductance, 0.01 },
        { "3V3", Dimension.Voltage, 3.3 },
        { "5 V", Dimension.Voltage, 5 },
        { "1.5 mA", Dimension.Current, 1.5e-3 },
        { "8 ns", Dimension.Time, 8e-9 },
        { "25", Dimension.Temperature, 25 },
        { "-10", Dimension.Temperature, -10 },
        { "\u221240 °C", Dimension.Temperature, -40 },
        { "25 degC", Dimension.Temperature, 25 },
        { "25C", Dimension.Temperature, 25 },
        { "30 ppm", Dimension.Relative, 3e-5 },
        { "±30 ppm", Dimension.Relative, 3e-5 },
        { "± 5%", Dimension.Relative, 0.05 },
        { "+/-50ppb", Dimension.Relative, 5e-8 },
        { "0.1", Dimension.Relative, 0.1 },
        { "30 ppm/K", Dimension.RelativePerKelvin, 3e-5 },
        { "30ppm/°C", Dimension.RelativePerKelvin, 3e-5 },
        { "0.03 ppm/K²", Dimension.RelativePerSquareKelvin, 3e-8 },
        { "2k", Dimension.Number, 2000 },
        { "200", Dimension.Count, 200 },
    };

    // IEC 60062: the resistor codes were seen in public tables, the capacitor codes are from memory.
    public static TheoryData<string, Dimension, double> LetterCodes => new()
    {
        { "R47", Dimension.Resistance, 0.47 },
        { "4R7", Dimension.Resistance, 4.7 },
        { "2R2", Dimension.Resistance, 2.2 },
        { "470R", Dimension.Resistance, 470 },
        { "4k7", Dimension.Resistance, 4700 },
        { "4K7", Dimension.Resistance, 4700 },
        { "47K3", Dimension.Resistance, 47300 },
        { "4M7", Dimension.Resistance, 4.7e6 },
        { "4k7Ω", Dimension.Resistance, 4700 },
        { "p47", Dimension.Capacitance, 0.47e-12 },
        { "4p7", Dimension.Capacitance, 4.7e-12 },
        { "4p7 F", Dimension.Capacitance, 4.7e-12 },
        { "n47", Dimension.Capacitance, 0.47e-9 },
        { "4n7", Dimension.Capacitance, 4.7e-9 },
        { "2u2", Dimension.Capacitance, 2.2e-6 },
        { "2µ2", Dimension.Capacitance, 2.2e-6 },
    };

    [Theory]
    [MemberData(nameof(Readable))]
    [MemberData(nameof(LetterCodes))]
    public void Parse_reads_the_written_forms_to_the_last_bit(string text, Dimension dimension, double expected)
    {
        Result<double> result = ValueText.Parse(text, dimension, "field");
        Assert.True(result.IsOk, result.ToString());
        Assert.Equal(expected, result.Value);
    }

    [Theory]
    [InlineData("", Dimension.Capacitance, "empty")]
    [InlineData("   ", Dimension.Capacitance, "empty")]
    [InlineData("pF", Dimension.Capacitance, "no number")]
    [InlineData("k", Dimension.Resistance, "no number")]
    [InlineData("R", Dimension.Resistance, "no number")]
    [InlineData(".", Dimension.Resistance, "no number")]
    [InlineData("±", Dimension.Relative, "no number")]
    [InlineData("-", Dimension.Temperature, "no number")]
    [InlineData("NaN", Dimension.Number, "no number")]
    [InlineData("Infinity", Dimension.Number, "no number")]
    [InlineData("-∞", Dimension.Temperature, "no number")]
    [InlineData("1e400", Dimension.Resistance, "too large")]
    [InlineData("1e99999999999999999999", Dimension.Resistance, "too large")]
    [InlineData("1e-400", Dimension.Resistance, "too near zero")]
    [InlineData("-5", Dimension.Resistance, "negative")]
    [InlineData("-30 ppm", Dimension.Relative, "negative")]
    [InlineData("-300", Dimension.Temperature, "absolute zero")]
    [InlineData("22 pF", Dimension.Frequency, "does not fit a frequency")]
    [InlineData("4 MHz", Dimension.Capacitance, "does not fit a capacitance")]
    [InlineData("4R7", Dimension.Capacitance, "does not fit")]
    [InlineData("104K", Dimension.Capacitance, "does not fit")]
    [InlineData("4k7F", Dimension.Resistance, "does not fit")]
    [InlineData("4.7k5", Dimension.Resistance, "does not fit")]
    [InlineData("4k7k", Dimension.Resistance, "does not fit")]
    [InlineData("10 ms", Dimension.Transconductance, "does not fit")]
    [InlineData("10 S", Dimension.Time, "does not fit")]
    [InlineData("298 K", Dimension.Temperature, "does not fit")]
    [InlineData("30 ppm/K", Dimension.Relative, "does not fit")]
    [InlineData("30k", Dimension.Relative, "does not fit")]
    [InlineData("1e", Dimension.Resistance, "does not fit")]
    [InlineData("12 5 pF", Dimension.Capacitance, "does not fit")]
    [InlineData("4 mhz", Dimension.Frequency, "milli or mega")]
    [InlineData("4,700", Dimension.Resistance, "comma")]
    [InlineData("4,096 MHz", Dimension.Frequency, "comma")]
    [InlineData("1,234.5", Dimension.Resistance, "comma")]
    [InlineData("1,2,3", Dimension.Resistance, "comma")]
    [InlineData("1.2.3", Dimension.Resistance, "more than one")]
    [InlineData("2.5", Dimension.Count, "whole number")]
    [InlineData("3e9", Dimension.Count, "whole number")]
    public void Parse_says_what_is_wrong_names_the_field_and_says_what_fits(string text, Dimension dimension, string expected)
    {
        Result<double> result = ValueText.Parse(text, dimension, "the field");
        Assert.False(result.IsOk);
        Assert.Equal("the field", result.Problem.Where);
        Assert.Contains(expected, result.Problem.What, StringComparison.Ordinal);
        Assert.Contains("such as", result.Problem.Fits, StringComparison.Ordinal);
        Assert.StartsWith("the field: ", result.Problem.ToString(), StringComparison.Ordinal);
    }

    [Fact]
    public void Parse_takes_a_negative_where_it_makes_sense() =>
        Assert.Equal(-750e-6, ValueText.Parse("-750 ppm/K", Dimension.RelativePerKelvin, "field", allowNegative: true).Value);

    [Fact]
    public void Parse_takes_no_text_as_an_empty_value() =>
        Assert.False(ValueText.Parse(null, Dimension.Number, "field").IsOk);

    [Fact]
    public void ParseIn_reads_a_plain_number_in_the_unit_of_the_column_and_any_other_form_as_it_stands()
    {
        Assert.Equal(22e-12, ValueText.ParseIn("22", Dimension.Capacitance, -12, "field").Value);
        Assert.Equal(2.2e-11, ValueText.ParseIn("2.2e1", Dimension.Capacitance, -12, "field").Value);
        Assert.Equal(22e-9, ValueText.ParseIn("22 nF", Dimension.Capacitance, -12, "field").Value);
        Assert.Equal(4.7e-12, ValueText.ParseIn("4p7", Dimension.Capacitance, -12, "field").Value);
    }

    [Fact]
    public void A_problem_is_one_line_however_strange_the_text()
    {
        Problem problem = ValueText.Parse("12\r\n\u001b[31m" + new string('x', 150), Dimension.Number, "a\nb").Problem!;
        Assert.DoesNotContain(problem.ToString(), letter => char.IsControl(letter));
        Assert.True(problem.What.Length < 160);
    }
}
