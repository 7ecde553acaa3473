using PartPick.Screens;
using PartPick.Selection;

namespace PartPick.Tests.Screens;

public class SentenceTests
{
    [Fact]
    public void The_sentence_reads_as_a_sentence()
    {
        var model = new SentenceModel(SampleRanking.Wanted, Glyphs.Drawn);
        string text = string.Join(' ', model.Draw(79, false).Select(line => line.Text.Trim()));
        Assert.Equal(
            "Wanted: 1 kHz square, within ±80 ppm for 5 years, 4.5 to 5.5 V, -10 to 50 °C, start-up margin 5, " +
            "self-starting within 50 ms, 200 boards at 2.50 each at most, two-layer board, C1, C2 of E12, any circuit; " +
            "error ×1, margin ×1, cost ×1.", text);
    }

    [Theory]
    [InlineData(20)]
    [InlineData(40)]
    [InlineData(79)]
    [InlineData(200)]
    public void No_line_is_wider_than_asked_and_no_value_is_broken(int width)
    {
        var model = new SentenceModel(SampleRanking.Wanted, Glyphs.Drawn);
        System.Collections.Immutable.ImmutableArray<Line> lines = model.Draw(width, true);
        Assert.All(lines, line => Assert.True(line.Text.TrimEnd().Length <= width, line.Text));
        Assert.Single(lines, line => line.Text.Contains("-10 to 50 °C", StringComparison.Ordinal));
    }

    [Theory]
    [InlineData("output frequency", "32k768", 32768)]
    [InlineData("output frequency", "4.096M", 4096000)]
    [InlineData("frequency error", "30", 30e-6)]
    [InlineData("frequency error", "3e-5", 30e-6)]
    [InlineData("frequency error", "0.01 %", 100e-6)]
    [InlineData("years of service", "10", 10)]
    [InlineData("lowest supply", "3V3", 3.3)]
    [InlineData("highest supply", "6", 6)]
    [InlineData("lowest temperature", "-40", -40)]
    [InlineData("highest temperature", "85", 85)]
    [InlineData("start-up margin", "10", 10)]
    [InlineData("start-up time", "20 ms", 0.02)]
    [InlineData("start-up time", "any", double.NaN)]
    [InlineData("boards", "1000", 1000)]
    [InlineData("cost limit", "1.25", 1.25)]
    [InlineData("cost limit", "", double.NaN)]
    [InlineData("weight of the error", "0", 0)]
    public void A_typed_value_becomes_the_requirements(string field, string text, double expected)
    {
        Requirement requirement = Taken(field, text);
        double actual = field switch
        {
            "output frequency" => requirement.OutputHz,
            "frequency error" => requirement.BudgetRatio,
            "years of service" => requirement.Years,
            "lowest supply" => requirement.SupplyMinVolts,
            "highest supply" => requirement.SupplyMaxVolts,
            "lowest temperature" => requirement.TemperatureMinCelsius,
            "highest temperature" => requirement.TemperatureMaxCelsius,
            "start-up margin" => requirement.Margin,
            "start-up time" => requirement.StartUpTimeSeconds ?? double.NaN,
            "boards" => requirement.Builds,
            "cost limit" => (double?)requirement.CostLimit ?? double.NaN,
            _ => requirement.Weights.Error,
        };
        Assert.Equal(expected, actual, double.IsNaN(expected) ? 0 : 1e-12 * Math.Abs(expected));
    }

    [Theory]
    [InlineData("output frequency", "0")]
    [InlineData("output frequency", "-4 MHz")]
    [InlineData("output frequency", "4 V")]
    [InlineData("frequency error", "0")]
    [InlineData("frequency error", "200 %")]
    [InlineData("lowest supply", "0 V")]
    [InlineData("highest supply", "101 V")]
    [InlineData("lowest temperature", "-300")]
    [InlineData("highest temperature", "301")]
    [InlineData("start-up margin", "0.5")]
    [InlineData("start-up time", "0")]
    [InlineData("boards", "0")]
    [InlineData("boards", "1.5")]
    [InlineData("cost limit", "-1")]
    [InlineData("weight of the cost", "101")]
    public void A_value_that_does_not_fit_is_refused_with_the_field_and_what_fits(string field, string text)
    {
        SentenceModel model = At(field);
        model.Press(new KeyPress(KeyName.Delete));
        foreach (char letter in text)
        {
            model.Press(KeyPress.Of(letter));
        }

        model.Press(new KeyPress(KeyName.Enter));
        Assert.NotNull(model.Problem);
        Assert.Equal(field, model.Problem.Where);
        Assert.NotEmpty(model.Problem.Fits);
        Assert.Equal(SampleRanking.Wanted, model.Accepted);
        Assert.NotNull(model.Typed);
    }

    [Theory]
    [InlineData("lowest supply", "12", 12, 12, -10, 50)]
    [InlineData("highest supply", "3.6", 3.6, 3.6, -10, 50)]
    [InlineData("lowest temperature", "60", 4.5, 5.5, 60, 60)]
    [InlineData("highest temperature", "-20", 4.5, 5.5, -20, -20)]
    public void An_end_of_a_range_takes_the_other_one_along(
        string field, string text, double lowVolts, double highVolts, double lowCelsius, double highCelsius)
    {
        Requirement requirement = Taken(field, text);
        Assert.Equal((lowVolts, highVolts), (requirement.SupplyMinVolts, requirement.SupplyMaxVolts));
        Assert.Equal((lowCelsius, highCelsius), (requirement.TemperatureMinCelsius, requirement.TemperatureMaxCelsius));
    }

    [Fact]
    public void A_half_typed_end_of_a_range_moves_nothing_until_it_is_kept()
    {
        SentenceModel model = At("highest supply");
        model.Press(KeyPress.Of('1'));
        Assert.Equal(1, model.Current.SupplyMinVolts);
        model.Press(KeyPress.Of('2'));
        Assert.Equal(4.5, model.Current.SupplyMinVolts);
        model.Press(new KeyPress(KeyName.Enter));
        Assert.Equal((4.5, 12), (model.Accepted.SupplyMinVolts, model.Accepted.SupplyMaxVolts));
    }

    [Fact]
    public void What_was_refused_stays_named_until_the_text_fits()
    {
        SentenceModel model = At("boards");
        model.Press(KeyPress.Of('0'));
        Assert.Null(model.Problem);
        model.Press(new KeyPress(KeyName.Tab));
        Assert.NotNull(model.Problem);
        Assert.Equal("boards", model.Field.Name);
        model.Press(KeyPress.Of('0'));
        Assert.Contains("'00'", model.Problem.What, StringComparison.Ordinal);
        model.Press(new KeyPress(KeyName.Home));
        Assert.NotNull(model.Problem);
        model.Press(KeyPress.Of('3'));
        Assert.Null(model.Problem);
    }

    [Fact]
    public void A_short_sentence_shows_the_rows_about_the_chosen_value()
    {
        SentenceModel model = At("weight of the cost");
        Assert.Equal(3, model.Draw(40, true, 3).Length);
        Assert.Contains("cost ×1.", model.Draw(40, true, 3)[^1].Text, StringComparison.Ordinal);
        System.Collections.Immutable.ImmutableArray<Line> first = model.Draw(40, false, 3);
        Assert.StartsWith(" Wanted: 1 kHz", first[0].Text, StringComparison.Ordinal);
        Assert.EndsWith("…", first[^1].Text, StringComparison.Ordinal);
        Assert.All(first, line => Assert.True(line.Width <= 40));
    }

    [Fact]
    public void Every_help_fits_beside_the_keys_at_80_columns()
    {
        foreach (SentenceField field in Sentence.Pieces(SampleRanking.Wanted).Select(piece => piece.Field).OfType<SentenceField>())
        {
            string help = $"{field.Name}: {field.Help(SampleRanking.Wanted)}";
            Assert.True(help.Length <= 50, help);
        }
    }

    [Fact]
    public void Every_typed_value_accepts_its_own_text()
    {
        foreach (TypedField field in Sentence.Pieces(SampleRanking.Wanted).Select(piece => piece.Field).OfType<TypedField>())
        {
            Values.Result<Requirement> again = field.Take(SampleRanking.Wanted, field.EditText(SampleRanking.Wanted));
            Assert.Equal(SampleRanking.Wanted, again.Value);
        }
    }

    [Fact]
    public void Every_choice_comes_round_again()
    {
        foreach (ChoiceField field in Sentence.Pieces(SampleRanking.Wanted).Select(piece => piece.Field).OfType<ChoiceField>())
        {
            var seen = new HashSet<string>();
            Requirement requirement = SampleRanking.Wanted;
            while (seen.Add(field.Show(requirement)))
            {
                requirement = field.Next(requirement);
            }

            Assert.True(seen.Count >= 2, field.Name);
            Assert.Equal(SampleRanking.Wanted, requirement);
        }
    }

    [Fact]
    public void Circuits_go_in_and_out_but_never_all_out()
    {
        Requirement one = CircuitsField.Next(SampleRanking.Wanted);
        Assert.Equal([CircuitKind.Gate], one.Circuits);
        Assert.Same(one, CircuitsField.Toggle(one, 'g'));
        Assert.Equal([CircuitKind.Gate, CircuitKind.Follower], CircuitsField.Toggle(one, 'f')!.Circuits);
        Assert.Null(CircuitsField.Toggle(one, 'x'));
        Assert.Equal("gate or follower", new CircuitsField().Show(CircuitsField.Toggle(one, 'f')!));
    }

    [Fact]
    public void A_board_of_ones_own_stays_among_the_choices()
    {
        var own = new Board("own", new Physics.Circuits.Strays(1e-12, 2e-12, 0), 0.1);
        Requirement requirement = SampleRanking.Wanted with { Board = own };
        ChoiceField field = Sentence.Pieces(requirement).Select(piece => piece.Field).OfType<ChoiceField>().Single(f => f.Name == "board");
        Requirement next = field.Next(requirement);
        Assert.NotEqual(own, next.Board);
        Assert.Equal(own, field.Pick(next, 'o')!.Board);
    }

    [Fact]
    public void The_caret_moves_and_letters_go_where_it_is()
    {
        SentenceModel model = At("output frequency");
        model.Press(new KeyPress(KeyName.Enter));
        Assert.Equal("1 kHz", model.Typed);
        model.Press(new KeyPress(KeyName.Home));
        model.Press(KeyPress.Of('2'));
        model.Press(new KeyPress(KeyName.Delete));
        Assert.Equal("2 kHz", model.Typed);
        Assert.Equal(2000, model.Current.OutputHz);
        Assert.Equal(1000, model.Accepted.OutputHz);
    }

    [Fact]
    public void Down_moves_by_lines_and_from_the_last_one_out()
    {
        SentenceModel model = At("output frequency");
        model.Draw(79, true);
        var answers = new List<SentenceAnswer>();
        while (answers.Count < 10 && (answers.Count == 0 || answers[^1] == SentenceAnswer.Done))
        {
            answers.Add(model.Press(new KeyPress(KeyName.Down)));
        }

        Assert.Equal(SentenceAnswer.Leave, answers[^1]);
        Assert.Equal(model.Draw(79, true).Length, answers.Count);
    }

    private static Requirement Taken(string field, string text)
    {
        SentenceModel model = At(field);
        model.Press(new KeyPress(KeyName.Delete));
        foreach (char letter in text)
        {
            model.Press(KeyPress.Of(letter));
        }

        model.Press(new KeyPress(KeyName.Enter));
        Assert.Null(model.Problem);
        return model.Accepted;
    }

    private static SentenceModel At(string field)
    {
        var model = new SentenceModel(SampleRanking.Wanted, Glyphs.Drawn);
        model.Press(new KeyPress(KeyName.Home));
        while (model.Field.Name != field)
        {
            Assert.Equal(SentenceAnswer.Done, model.Press(new KeyPress(KeyName.Tab)));
        }

        return model;
    }
}
