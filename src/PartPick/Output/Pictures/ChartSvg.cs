using PartPick.Selection;

namespace PartPick.Output;

/// <summary>Draws a picture of numbers as SVG. Curves differ by their strokes and letters, never by colour.</summary>
internal sealed class ChartSvg
{
    private const double Width = 760;
    private const double Left = 96;
    private const double Right = 40;
    private const double Top = SvgSheet.Head + 24;
    private const double High = 340;
    private const double Bottom = Top + High;
    private const double LetterWidth = 7;

    private readonly SvgText _svg = new();
    private readonly Chart _chart;

    private ChartSvg(Chart chart) => _chart = chart;

    /// <summary>The SVG file.</summary>
    /// <param name="chart">The numbers.</param>
    /// <param name="subtitle">Of which circuit they are.</param>
    public static string Of(Chart chart, string subtitle)
    {
        var drawing = new ChartSvg(chart);
        drawing.Axes();
        foreach (ChartBand band in chart.Bands)
        {
            drawing.Band(band);
        }

        foreach (ChartLimit limit in chart.Limits)
        {
            drawing.Limit(limit);
        }

        for (int i = 0; i < chart.Curves.Length; i++)
        {
            drawing.Curve(chart.Curves[i], i);
        }

        foreach (ChartSpot spot in chart.Spots)
        {
            ChartSvgKey.Spot(drawing._svg, spot.Kind, drawing.X(spot.Point.X), drawing.Y(spot.Point.Y));
        }

        foreach (ChartMark mark in chart.Marks)
        {
            (double x, double y) = (drawing.X(mark.Point.X), drawing.Y(mark.Point.Y));
            drawing._svg.Circle(x, y, 4, "full").Text(x + (x > Width - Right - 20 ? -8 : 8), y - 8, mark.Letter.ToString(), "letter",
                x > Width - Right - 20 ? "end" : "start");
        }

        double end = ChartSvgKey.Draw(drawing._svg, chart, Left, Bottom + 62, Width);
        return SvgSheet.Of(chart.Title, subtitle, Width, end, drawing._svg.ToString());
    }

    private double X(double value) => Left + Clamped(_chart.X.Place(value)) * (Width - Left - Right);

    private double Y(double value) => Bottom - Clamped(_chart.Y.Place(value)) * High;

    // What lies far outside would only make a renderer's numbers large.
    private static double Clamped(double place) => Math.Clamp(place, -0.02, 1.02);

    private void Axes()
    {
        foreach (AxisTick tick in _chart.X.Ticks(9))
        {
            _svg.Line(X(tick.Value), Top, X(tick.Value), Bottom, "grid").Line(X(tick.Value), Bottom, X(tick.Value), Bottom + 5, "axis")
                .Text(X(tick.Value), Bottom + 20, tick.Text, anchor: "middle");
        }

        foreach (AxisTick tick in _chart.Y.Ticks(9))
        {
            _svg.Line(Left, Y(tick.Value), Width - Right, Y(tick.Value), "grid").Line(Left - 5, Y(tick.Value), Left, Y(tick.Value), "axis")
                .Text(Left - 9, Y(tick.Value) + 4, tick.Text, anchor: "end");
        }

        _svg.Points([(Left, Top), (Left, Bottom), (Width - Right, Bottom)], "axis")
            .Text(16, Top - 8, _chart.Y.Heading)
            .Text(Width - Right, Bottom + 40, _chart.X.Heading, anchor: "end");
    }

    private void Band(ChartBand band)
    {
        IEnumerable<(double X, double Y)> high = band.Points.Select(point => (X(point.X), Y(point.High)));
        IEnumerable<(double X, double Y)> low = band.Points.Reverse().Select(point => (X(point.X), Y(point.Low)));
        _svg.Points([.. high, .. low], "band", isClosed: true);
    }

    private void Limit(ChartLimit limit)
    {
        if (limit.IsUpright)
        {
            double x = X(limit.Value);
            bool before = x + limit.Words.Length * LetterWidth > Width - Right;
            _svg.Line(x, Top, x, Bottom, "limit").Text(x + (before ? -6 : 6), Top + 12, limit.Words, anchor: before ? "end" : "start");
            return;
        }

        double y = Y(limit.Value);
        _svg.Line(Left, y, Width - Right, y, "limit").Text(Width - Right, y < Top + 20 ? y + 15 : y - 6, limit.Words, anchor: "end");
    }

    // The letter stands on the curve at a place of its own.
    private void Curve(ChartCurve curve, int number)
    {
        (double X, double Y)[] points = [.. curve.Points.Select(point => (X(point.X), Y(point.Y)))];
        _svg.Points(points, "curve", ChartSvgKey.Strokes(number));
        double x = points[0].X + (number + 0.5) / _chart.Curves.Length * (points[^1].X - points[0].X);
        int at = Math.Max(1, Array.FindIndex(points, point => point.X >= x));
        (double X, double Y) from = points[at - 1], to = points[Math.Min(at, points.Length - 1)];
        double part = to.X == from.X ? 0 : (x - from.X) / (to.X - from.X);
        _svg.Text(x - 4, from.Y + part * (to.Y - from.Y) - 7, curve.Letter.ToString(), "letter", "end");
    }
}
