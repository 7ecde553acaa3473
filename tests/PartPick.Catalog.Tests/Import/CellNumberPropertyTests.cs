using System.Globalization;
using PartPick.Catalog.Import;
using PartPick.Values;

namespace PartPick.Catalog.Tests.Import;

/// <summary>What is printed is read again, in every unit and notation, for many random numbers.</summary>
public class CellNumberPropertyTests
{
    private static readonly (Dimension Dimension, string Unit, int Power)[] Units =
    [
        (Dimension.Frequency, "MHz", 6), (Dimension.Frequency, "kHz", 3), (Dimension.Frequency, "Hz", 0),
        (Dimension.Capacitance, "pF", -12), (Dimension.Capacitance, "nF", -9), (Dimension.Capacitance, "uF", -6),
        (Dimension.Capacitance, "fF", -15), (Dimension.Resistance, "Ohm", 0), (Dimension.Resistance, "kOhm", 3),
        (Dimension.Resistance, "MOhm", 6), (Dimension.Power, "uW", -6), (Dimension.Power, "mW", -3),
        (Dimension.Relative, "ppm", -6), (Dimension.Relative, "%", -2), (Dimension.Voltage, "VDC", 0), (Dimension.Current, "mA", -3),
    ];

    [Fact]
    public void A_number_with_its_unit_is_read_as_it_was_printed_in_every_notation()
    {
        var random = new Random(11);
        for (int i = 0; i < 20_000; i++)
        {
            (Dimension dimension, string unit, int power) = Units[random.Next(Units.Length)];
            decimal number = Math.Round((decimal)Math.Pow(10, (random.NextDouble() * 7) - 2), random.Next(0, 5)) + 0.00001m;
            bool comma = random.Next(2) == 0;
            bool grouped = random.Next(2) == 0;
            string text = number.ToString(grouped ? "#,##0.00000" : "0.00000", CultureInfo.InvariantCulture);
            text = comma ? text.Replace(',', ' ').Replace('.', ',').Replace(' ', '.') : text;
            string mark = random.Next(3) switch { 0 => "±", 1 => "", _ => "< " };
            string gap = random.Next(2) == 0 ? " " : "";
            string cell = $"{mark}{text}{gap}{unit}{(random.Next(3) == 0 ? " max" : "")}";
            double expected = double.Parse(
                string.Create(CultureInfo.InvariantCulture, $"{number}e{power}"), CultureInfo.InvariantCulture);
            foreach (NumberNotation notation in new[] { comma ? NumberNotation.Comma : NumberNotation.Point, NumberNotation.Unknown })
            {
                Result<double> read = CellNumber.Read(cell, dimension, ColumnUse.NoPlainNumbers, notation, false);
                Assert.True(read.IsOk, $"{cell}: {read.Problem}");
                Assert.Equal(expected, read.Value);
            }

            Result<double> wrong = CellNumber.Read(cell, dimension, 0, comma ? NumberNotation.Point : NumberNotation.Comma, false);
            Assert.False(wrong.IsOk, $"{cell} was read as {wrong} in the other notation");
        }
    }

    [Fact]
    public void A_number_that_can_be_read_in_two_ways_is_refused_until_the_notation_is_known()
    {
        var random = new Random(12);
        for (int i = 0; i < 2000; i++)
        {
            (int whole, int thousandths, char sign) = (random.Next(1, 1000), random.Next(0, 1000), random.Next(2) == 0 ? ',' : '.');
            string cell = string.Create(CultureInfo.InvariantCulture, $"{whole}{sign}{thousandths:D3} ohm");
            Assert.False(CellNumber.Read(cell, Dimension.Resistance, 0, NumberNotation.Unknown, false).IsOk, cell);
            double asPoint = CellNumber.Read(cell, Dimension.Resistance, 0, NumberNotation.Point, false).Value;
            double asComma = CellNumber.Read(cell, Dimension.Resistance, 0, NumberNotation.Comma, false).Value;
            double thousands = (whole * 1000.0) + thousandths;
            Assert.Equal(sign == '.' ? (thousands / 1000, thousands) : (thousands, thousands / 1000), (asPoint, asComma));
        }
    }

    [Fact]
    public void No_text_makes_reading_throw()
    {
        var random = new Random(13);
        const string letters = "0123456789.,-+±eEkMpµFHzΩ %()@<>~'\0\u00A0 abcR";
        for (int i = 0; i < 20_000; i++)
        {
            string text = string.Concat(Enumerable.Range(0, random.Next(1, 12)).Select(_ => letters[random.Next(letters.Length)]));
            foreach (NumberNotation notation in Enum.GetValues<NumberNotation>())
            {
                Result<double> read = CellNumber.Read(text, Dimension.Frequency, 6, notation, true);
                Assert.True(!read.IsOk || double.IsFinite(read.Value), text);
                _ = PriceCells.List(text, notation);
                _ = PriceCells.Price(text, notation);
            }

            _ = TemperatureRange.Read(text);
            _ = HeaderCell.Of(text);
            _ = PriceHeader.Of(text);
        }
    }
}
