using PartPick.Values;

namespace PartPick.Catalog.Tests;

public sealed class PartCsvTests
{
    private const string Tail = "basis,supplier,supplierPart,package,currency,prices,minimumOrder,multiple,stock,excluded,note\n";

    private static readonly string ResistorHeader = "id,description,value (ohm),tolerance (%)," + Tail;

    public static TheoryData<PartKind> Kinds => [.. PartKinds.All];

    [Theory]
    [MemberData(nameof(Kinds))]
    public void Writing_what_was_read_gives_the_same_bytes(PartKind kind)
    {
        string written = Samples.Csv(kind, Samples.All.Where(part => part.Kind == kind));
        (IReadOnlyList<Part> parts, IReadOnlyList<Problem> problems) = PartCsv.Read(kind, new StringReader(written), "file.csv");
        Assert.Empty(problems);
        Assert.NotEmpty(parts);
        Assert.Equal(written, Samples.Csv(kind, parts));
    }

    [Fact]
    public void A_crystal_is_one_line_of_plain_numbers_in_the_units_of_the_header() => Assert.Equal(
        "id,description,cut,overtone,holder,frequency (Hz),load (pF),shunt (pF),motional (fF),resistance (ohm),driveLevel (uW),"
        + "tolerance (ppm),stability (ppm),ageing (ppm),ageingYearly (ppm),temperatureMin (degC),temperatureMax (degC),"
        + "parabola (ppm/K2),turnover (degC)," + Tail
        + "Y-4M-18,\"4 MHz, \"\"AT\"\", 18 pF\",fork,3,HC-49/U,4000000,18,5.5,12,100,500,30,50,3,1,-20,70,-0.034,25,"
        + "shunt=typical;motional=assumed;resistance=maximum,shop,A-1,HC-49/U,EUR,1:0.42;10:0.31;100:0.205,1,5,120,yes,"
        + "\"µ, Ω and a comma\"\n",
        Samples.Csv(PartKind.Crystal, Samples.Crystal));

    [Fact]
    public void The_points_of_a_counter_are_numbered_columns_after_its_own()
    {
        string header = Samples.Csv(PartKind.Counter).TrimEnd('\n');
        Assert.StartsWith(
            "id,description,stages,vt (V),cin (pF),cout (pF),cf (pF),taps,temperatureMin (degC),temperatureMax (degC),"
            + "supply 1 (V),gmMin 1 (mS),gm 1 (mS),gmMax 1 (mS),ro 1 (ohm),ron 1 (ohm),gain 1,delay 1 (ns),clockMin 1 (MHz),clock 1 (MHz),"
            + "supply 2 (V),",
            header, StringComparison.Ordinal);
        Assert.Contains(",clock 4 (MHz),basis,", header, StringComparison.Ordinal);
    }

    [Fact]
    public void Every_figure_comes_back_in_SI_units()
    {
        var crystal = (CrystalPart)ReadOne(PartKind.Crystal, Samples.Csv(PartKind.Crystal, Samples.Crystal));
        Assert.Equal(12e-15, crystal.MotionalFarads);
        Assert.Equal(30e-6, crystal.ToleranceRatio);
        Assert.Equal(-0.034e-6, crystal.ParabolaPerSquareKelvin);
        Assert.Equal(Basis.Assumed, crystal.BasisOf("motional"));
        Assert.Equal(Basis.Stated, crystal.BasisOf("frequency"));
        Assert.Equal(0.205m, crystal.Offer.Prices[2].UnitPrice);
        var inverter = (InverterPart)ReadOne(PartKind.Inverter, Samples.Csv(PartKind.Inverter, Samples.Inverter));
        Assert.Equal(Samples.Inverter.Points, inverter.Points);
        var counter = (CounterPart)ReadOne(PartKind.Counter, Samples.Csv(PartKind.Counter, Samples.Counter));
        Assert.Equal(Samples.Counter.Taps, counter.Taps);
        Assert.Null(counter.ThresholdVolts);
    }

    [Fact]
    public void Every_property_of_every_kind_comes_back_as_it_was()
    {
        foreach (Part expected in Samples.All)
        {
            Part actual = ReadOne(expected.Kind, Samples.Csv(expected.Kind, expected));
            Assert.Equal(expected.Offer.Prices, actual.Offer.Prices);
            Assert.Equal(expected.Offer, actual.Offer with { Prices = expected.Offer.Prices });
            Assert.Equal(expected.Basis, actual.Basis);

            // Lists are compared above, or by their own test; a record compares them by reference.
            Part comparable = actual with { Offer = expected.Offer, Basis = expected.Basis };
            comparable = (comparable, expected) switch
            {
                (CounterPart read, CounterPart wanted) => read with { Points = wanted.Points, Taps = wanted.Taps },
                (AmplifierPart read, AmplifierPart wanted) => read with { Points = wanted.Points },
                _ => comparable,
            };
            Assert.Equal(expected, comparable);
        }
    }

    [Fact]
    public void A_cell_may_be_any_form_of_a_value_and_columns_may_be_in_any_order()
    {
        const string text =
            "tolerance (%),value (ohm),id,description,basis,supplier,supplierPart,package,currency,prices,minimumOrder,multiple,"
            + "stock,excluded,note\r\n±1 %,4k7,R1,one,,,,,,,,,,,\r\n1,\"4,7k\",R2,two,,,,,,,,,,,\r\n";
        (IReadOnlyList<Part> parts, IReadOnlyList<Problem> problems) = PartCsv.Read(PartKind.Resistor, new StringReader(text), "r.csv");
        Assert.Empty(problems);
        Assert.All(parts.Cast<ResistorPart>(), part => Assert.Equal((4700, 0.01), (part.ValueOhms, part.ToleranceRatio)));
    }

    [Theory]
    [InlineData("R1,one,22 pF,1,,,,,,,,,,,", "r.csv line 2, column value (ohm)", "does not fit a resistance")]
    [InlineData("R1,one,,1,,,,,,,,,,,", "r.csv line 2, column value (ohm)", "is missing")]
    [InlineData("R1,one,0,1,,,,,,,,,,,", "r.csv line 2, column value (ohm)", "is zero")]
    [InlineData(",one,10,1,,,,,,,,,,,", "r.csv line 2, column id", "is missing")]
    [InlineData("R 1,one,10,1,,,,,,,,,,,", "r.csv line 2, column id", "is no id")]
    [InlineData("R1,,10,1,,,,,,,,,,,", "r.csv line 2, column description", "is missing")]
    [InlineData("R1,one,10,1,value=guessed,,,,,,,,,,", "r.csv line 2, column basis", "is no basis")]
    [InlineData("R1,one,10,1,load=typical,,,,,,,,,,", "r.csv line 2, column basis", "is no figure")]
    [InlineData("R1,one,10,1,value=typical;value=maximum,,,,,,,,,,", "r.csv line 2, column basis", "twice")]
    [InlineData("R1,one,10,1,,,,,EUR,1-2,,,,,", "r.csv line 2, column prices", "is no price")]
    [InlineData("R1,one,10,1,,,,,EUR,10:1;5:2,,,,,", "r.csv line 2, column prices", "does not ascend")]
    [InlineData("R1,one,10,1,,,,,,1:1,,,,,", "r.csv line 2, column currency", "is missing")]
    [InlineData("R1,one,10,1,,,,,,,0,,,,", "r.csv line 2, column minimumOrder", "is zero")]
    [InlineData("R1,one,10,1,,,,,,,,,1.5,,", "r.csv line 2, column stock", "whole number")]
    [InlineData("R1,one,10,1,,,,,,,,,,no,", "r.csv line 2, column excluded", "is neither")]
    [InlineData("R1,one,10,1,,,,,,,,,,,\u001b[31m", "r.csv line 2, column note", "control character")]
    [InlineData("R1,one,10,1", "r.csv line 2", "has 4 cells")]
    [InlineData("R1,\"one\"x,10,1,,,,,,,,,,,", "r.csv line 2", "quote")]
    [InlineData("R1,\"one,10,1,,,,,,,,,,,", "r.csv line 2", "quote")]
    public void A_wrong_row_is_left_out_and_its_place_named(string row, string where, string what)
    {
        (IReadOnlyList<Part> parts, IReadOnlyList<Problem> problems) =
            PartCsv.Read(PartKind.Resistor, new StringReader(ResistorHeader + row + "\n"), "r.csv");
        Assert.Empty(parts);
        Problem problem = Assert.Single(problems);
        Assert.Equal(where, problem.Where);
        Assert.Contains(what, problem.What, StringComparison.Ordinal);
        Assert.NotEmpty(problem.Fits);
    }

    [Fact]
    public void A_second_part_of_the_same_id_is_left_out_and_the_rows_around_are_kept()
    {
        string text = ResistorHeader + "R1,one,10,1,,,,,,,,,,,\nR1,again,20,1,,,,,,,,,,,\nR2,two,30,1,,,,,,,,,,,\n";
        (IReadOnlyList<Part> parts, IReadOnlyList<Problem> problems) = PartCsv.Read(PartKind.Resistor, new StringReader(text), "r.csv");
        Assert.Equal(["R1", "R2"], parts.Select(part => part.Id));
        Assert.Equal(
            "r.csv line 3, column id: 'R1' is already in line 2; fits an id of its own", Assert.Single(problems).ToString());
    }

    [Fact]
    public void Missing_unknown_and_doubled_columns_are_reported()
    {
        string text = ResistorHeader.Replace("note", "notes,stock", StringComparison.Ordinal);
        (IReadOnlyList<Part> parts, IReadOnlyList<Problem> problems) = PartCsv.Read(PartKind.Resistor, new StringReader(text), "r.csv");
        Assert.Empty(parts);
        Assert.Equal(
            ["the column 'note' is missing", "the column 'notes' is not known", "the column 'stock' is there twice"],
            problems.Select(problem => problem.What));
        Assert.NotEmpty(PartCsv.Read(PartKind.Resistor, new StringReader(""), "r.csv").Problems);
    }

    [Theory]
    [InlineData("cut", "GT", "cut", "is no cut")]
    [InlineData("overtone", "2", "overtone", "not one of the choices")]
    [InlineData("frequency (Hz)", "", "frequency (Hz)", "is missing")]
    [InlineData("temperatureMax (degC)", "-30", "temperatureMax (degC)", "is below temperatureMin")]
    [InlineData("load (pF)", "0", "load (pF)", "is zero")]
    public void A_crystal_that_means_nothing_is_reported(string column, string cell, string where, string what) =>
        AssertReported(PartKind.Crystal, Samples.Crystal, column, cell, where, what);

    [Theory]
    [InlineData("tolerance (%)", "", "tolerance (%)", "is missing")]
    [InlineData("toleranceAbsolute (pF)", "0.5", "tolerance (%)", "is given twice")]
    public void A_capacitor_has_one_tolerance(string column, string cell, string where, string what) =>
        AssertReported(PartKind.Capacitor, Samples.Capacitor, column, cell, where, what);

    [Theory]
    [InlineData("stages", "2", "stages", "not one of the choices")]
    [InlineData("gain 1", "", "gain 1", "is missing")]
    [InlineData("ro 2 (ohm)", "100", "ro 2 (ohm)", "does not go with several stages")]
    [InlineData("gmMax 1 (mS)", "1", "gmMax 1 (mS)", "is below gm 1")]
    [InlineData("supply 2 (V)", "2", "supply 2 (V)", "does not ascend")]
    [InlineData("supply 1 (V)", "", "supply 1 (V)", "is missing")]
    [InlineData("supply 4 (V)", "6", "supply 4 (V)", "comes after an empty point")]
    public void An_inverter_whose_points_do_not_fit_together_is_reported(string column, string cell, string where, string what) =>
        AssertReported(PartKind.Inverter, Samples.Inverter, column, cell, where, what);

    [Theory]
    [InlineData("taps", "", "taps", "is missing")]
    [InlineData("taps", "4;4", "taps", "no further stage")]
    [InlineData("taps", "x", "taps", "no further stage")]
    [InlineData("gm 1 (mS)", "", "gm 1 (mS)", "is missing")]
    [InlineData("ron 1 (ohm)", "100", "ron 1 (ohm)", "does not go with one stage")]
    [InlineData("supply 1 (V)", "-5", "supply 1 (V)", "negative")]
    public void A_counter_that_means_nothing_is_reported(string column, string cell, string where, string what) =>
        AssertReported(PartKind.Counter, Samples.Counter, column, cell, where, what);

    [Fact]
    public void A_port_needs_a_transconductance_of_one_sort_or_the_other() => AssertReported(
        PartKind.Port, Samples.Port, "criticalTransconductanceMax (mS)", "", "gm 1 (mS)", "is missing");

    [Fact]
    public void Writing_a_part_under_another_kind_is_refused() =>
        Assert.Throws<ArgumentException>(() => Samples.Csv(PartKind.Resistor, Samples.Capacitor));

    private static Part ReadOne(PartKind kind, string text)
    {
        (IReadOnlyList<Part> parts, IReadOnlyList<Problem> problems) = PartCsv.Read(kind, new StringReader(text), "file.csv");
        Assert.Empty(problems);
        return Assert.Single(parts);
    }

    private static void AssertReported(PartKind kind, Part good, string column, string cell, string where, string what)
    {
        Part plain = good with { Description = "plain", Note = null };
        string[] lines = Samples.Csv(kind, plain).Split('\n');
        string[] header = lines[0].Split(',');
        string[] cells = lines[1].Split(',');
        cells[Array.IndexOf(header, column)] = cell;
        string text = $"{lines[0]}\n{string.Join(',', cells)}\n";
        (IReadOnlyList<Part> parts, IReadOnlyList<Problem> problems) = PartCsv.Read(kind, new StringReader(text), "f.csv");
        Assert.Empty(parts);
        Assert.Contains(problems, problem =>
            problem.Where == $"f.csv line 2, column {where}" && problem.What.Contains(what, StringComparison.Ordinal));
    }
}
