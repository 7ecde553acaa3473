using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>Sets the dots and letters of a picture: bands below, then curves, single points, marks, and limits where room is left.</summary>
internal static class ChartPlot
{
    private const char Edge = ':';

    /// <summary>The field of dots.</summary>
    /// <param name="chart">The numbers.</param>
    /// <param name="width">Width in cells.</param>
    /// <param name="height">Height in cells.</param>
    /// <param name="glyphs">The signs.</param>
    public static PlotDots Of(Chart chart, int width, int height, Glyphs glyphs)
    {
        var dots = new PlotDots(width, height, glyphs);
        foreach (ChartBand band in chart.Bands)
        {
            Edges(dots, chart, band);
        }

        // In ASCII the first curve, which is what the picture is about, covers the others.
        foreach (ChartCurve curve in chart.Curves.Reverse())
        {
            Curve(dots, chart, curve);
        }

        for (int i = 0; i < chart.Curves.Length; i++)
        {
            Letters(dots, chart, chart.Curves[i], i);
        }

        foreach (ChartSpot spot in chart.Spots)
        {
            (int x, int y) = Place(dots, chart, spot.Point);
            dots.Letter(x, y, ChartKey.Sign(spot.Kind, glyphs));
        }

        foreach (ChartMark mark in chart.Marks)
        {
            (int x, int y) = Place(dots, chart, mark.Point);
            dots.Letter(Math.Clamp(x, 0, dots.DotsAcross - 1), Math.Clamp(y, 0, dots.DotsDown - 1), mark.Letter);
        }

        foreach (ChartBand band in chart.Bands)
        {
            Inside(dots, chart, band, glyphs);
        }

        foreach (ChartLimit limit in chart.Limits)
        {
            ChartLimits.Draw(dots, chart, limit, glyphs);
        }

        return dots;
    }

    private static (int X, int Y) Place(PlotDots dots, Chart chart, ChartPoint point) =>
        (dots.Column(chart.X.Place(point.X)), dots.Row(chart.Y.Place(point.Y)));

    private static void Edges(PlotDots dots, Chart chart, ChartBand band)
    {
        for (int i = 0; i < band.Points.Length; i++)
        {
            (BandPoint from, BandPoint to) = (band.Points[Math.Max(0, i - 1)], band.Points[i]);
            (int x1, int low1) = Place(dots, chart, new ChartPoint(from.X, from.Low));
            (int x2, int low2) = Place(dots, chart, new ChartPoint(to.X, to.Low));
            dots.Stroke(x1, low1, x2, low2, Edge);
            dots.Stroke(x1, dots.Row(chart.Y.Place(from.High)), x2, dots.Row(chart.Y.Place(to.High)), Edge);
        }
    }

    // Every other cell between the edges that nothing else is in.
    private static void Inside(PlotDots dots, Chart chart, ChartBand band, Glyphs glyphs)
    {
        for (int column = 0; column < dots.Width; column += 2)
        {
            BandPoint at = band.Points.MinBy(point => Math.Abs(dots.Column(chart.X.Place(point.X)) / dots.Across - column));
            int top = dots.Row(chart.Y.Place(at.High)) / dots.Down;
            int bottom = dots.Row(chart.Y.Place(at.Low)) / dots.Down;
            foreach (int row in Enumerable.Range(top + 1, Math.Max(0, bottom - top - 1)).Where(row => dots.IsEmpty(column, row, 1)))
            {
                dots.Words(column, row, glyphs.Free.ToString());
            }
        }
    }

    private static void Curve(PlotDots dots, Chart chart, ChartCurve curve)
    {
        (int X, int Y)[] places = [.. curve.Points.Select(point => Place(dots, chart, point))];
        for (int i = 0; i < places.Length; i++)
        {
            (int X, int Y) before = places[Math.Max(0, i - 1)];
            dots.Stroke(before.X, before.Y, places[i].X, places[i].Y, curve.Letter);
        }
    }

    // A curve's letter stands on it in a few places, another curve's elsewhere.
    private static void Letters(PlotDots dots, Chart chart, ChartCurve curve, int number)
    {
        const int most = 3;
        int count = chart.Curves.Length;
        (int X, int Y)[] places = [.. curve.Points.Select(point => Place(dots, chart, point))];
        for (int k = 0; k < most; k++)
        {
            double place = (k * count + number + 0.5) / (most * count);
            int column = (int)(places[0].X + place * (places[^1].X - places[0].X));
            int at = Math.Max(1, Array.FindIndex(places, each => each.X >= column));
            ((int X, int Y) from, (int X, int Y) to) = (places[Math.Min(at, places.Length) - 1], places[Math.Min(at, places.Length - 1)]);
            double part = to.X == from.X ? 0 : (double)(column - from.X) / (to.X - from.X);
            dots.Letter(column, (int)Math.Round(from.Y + part * (to.Y - from.Y)), curve.Letter);
        }
    }
}
