namespace PartPick.Screens;

/// <summary>Draws the heading and the rows of the list.</summary>
internal static class ListDrawing
{
    /// <summary>The heading.</summary>
    /// <param name="currency">The currency of the costs; empty where it is not known.</param>
    /// <param name="shape">The columns.</param>
    /// <param name="glyphs">The signs.</param>
    public static Line Heading(string currency, ListShape shape, Glyphs glyphs)
    {
        LineBuilder line = new LineBuilder(glyphs).Add("  ");
        Column(shape.HasCircuit, "circuit", 9, false);
        Column(shape.HasFrequency, "MHz", 9, true);
        Column(shape.HasFrequency, "", 1, false);
        Column(shape.HasLoad, "pF", 4, true);
        Column(shape.HasLoad, "", 1, false);
        Column(shape.HasCase, "case", 5, false);
        Column(true, "amplifier", 13, false);
        Column(shape.HasDivider, glyphs.IsAscii ? "div" : "÷", 5, true);
        Column(shape.HasDivider, "", 1, false);
        Column(true, shape.HasErrorBar ? "error ppm" : "ppm", shape.HasErrorBar ? 11 : 6, true);
        Column(true, "", 1, false);
        Column(true, "margin", shape.HasMarginBar ? 8 : 6, false);
        return shape.HasMarginBar && currency.Length is > 0 and <= 3
            ? line.Column("cost " + currency, 8, Tone.Quiet, true).Build()
            : line.Column("cost", shape.HasMarginBar ? 8 : 5, Tone.Quiet, true).Build();

        void Column(bool there, string text, int width, bool right)
        {
            if (there)
            {
                line.Column(text, width, Tone.Quiet, right);
            }
        }
    }

    /// <summary>A row.</summary>
    /// <param name="cells">Its texts.</param>
    /// <param name="here">Whether it is the chosen one.</param>
    /// <param name="sign">A sign that marks it; empty for none.</param>
    /// <param name="shape">The columns.</param>
    /// <param name="glyphs">The signs.</param>
    public static Line Row(CandidateCells cells, bool here, string sign, ListShape shape, Glyphs glyphs)
    {
        LimitUse? nearest = LimitUses.Nearest(cells.Uses);
        LineBuilder line = new LineBuilder(glyphs).Column((here ? glyphs.Chosen : " ") + sign, 2);
        Column(shape.HasCircuit, cells.Circuit, 8);
        Column(shape.HasFrequency, cells.FrequencyMegaHertz, 9, true);
        Column(shape.HasLoad, cells.LoadPicofarads, 4, true);
        Column(shape.HasCase, cells.Case, 4);
        Column(true, cells.Amplifier, 12);
        Column(shape.HasDivider, cells.Divider, 5, true);
        Figure(cells.ErrorPpm, 6, LimitName.Error, shape.HasErrorBar);
        Figure(cells.Margin, 5, LimitName.Margin, shape.HasMarginBar);
        return line.Column(cells.Cost, 5, ToneOf(LimitName.Cost), true).Build();

        void Column(bool there, string text, int width, bool right = false)
        {
            if (there)
            {
                line.Column(text, width, right: right).Add(" ");
            }
        }

        void Figure(string text, int width, LimitName name, bool bar)
        {
            line.Column(text, width, ToneOf(name), true).Add(" ");
            if (bar)
            {
                line.Add(Bars.Bar(Use(name).Used, ListShape.BarCells, glyphs), ToneOf(name)).Add(" ");
            }
        }

        LimitUse Use(LimitName name) => cells.Uses.First(use => use.Name == name);

        Tone ToneOf(LimitName name) =>
            Use(name).IsBroken ? Tone.Warning : ReferenceEquals(Use(name), nearest) ? Tone.Accent : Tone.Normal;
    }
}
