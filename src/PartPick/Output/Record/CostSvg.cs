using System.Globalization;
using System.Text;
using PartPick.Selection;

namespace PartPick.Output;

/// <summary>Draws the cost per unit over the number of boards, both logarithmic, with the number of this build marked.</summary>
internal static class CostSvg
{
    private const int Left = 60;
    private const int Top = 8;
    private const int Wide = 640;
    private const int High = 150;
    private const int Width = 860;
    private const int Height = High + 40;

    /// <summary>The picture as an SVG element.</summary>
    /// <param name="curve">The costs.</param>
    /// <param name="builds">The number of boards that is marked.</param>
    /// <param name="title">What it shows, for who cannot see it.</param>
    public static string Of(CostCurve curve, int builds, string title)
    {
        double[] costs = [.. Enumerable.Range(1, curve.Most).Select(count => (double)curve.UnitCost(count))];
        double low = Math.Log(costs.Min());
        double high = Math.Max(Math.Log(costs.Max()), low + 1e-9);
        var points = new StringBuilder();
        for (int count = 1; count <= curve.Most; count++)
        {
            // What lies on the straight between its neighbours would only make the file longer.
            if (count == 1 || count == curve.Most || costs[count - 1] != costs[count - 2] || costs[count - 1] != costs[count])
            {
                points.Append(CultureInfo.InvariantCulture, $"{X(count):0.#},{Y(costs[count - 1]):0.#} ");
            }
        }

        var marks = new StringBuilder();
        for (int count = 1; count <= curve.Most; count *= 10)
        {
            marks.Append(
                CultureInfo.InvariantCulture,
                $"<text x=\"{X(count):0}\" y=\"{Top + High + 16}\" text-anchor=\"middle\">{count}</text>\n");
        }

        return string.Create(
            CultureInfo.InvariantCulture,
            $"""
            <svg class="bars costs" xmlns="http://www.w3.org/2000/svg" role="img" width="{Width}" height="{Height}"
            viewBox="0 0 {Width} {Height}"><title>{Html.Encode(title)}</title>
            <path d="M{Left},{Top} V{Top + High} H{Left + Wide}" fill="none" stroke="currentColor"/>
            <polyline points="{points.ToString().TrimEnd()}" fill="none" stroke="currentColor" stroke-width="2"/>
            <line x1="{X(builds):0.#}" y1="{Top}" x2="{X(builds):0.#}" y2="{Top + High}" stroke="currentColor" stroke-dasharray="3 3"/>
            <text x="{Left - 6}" y="{Top + 10}" text-anchor="end">{costs.Max():0.000}</text>
            <text x="{Left - 6}" y="{Top + High}" text-anchor="end">{costs.Min():0.000}</text>
            <text x="{X(builds):0}" y="{Top + High + 30}" text-anchor="middle">{builds} boards: {costs[builds - 1]:0.000}</text>
            {marks}</svg>
            """);

        double X(int count) => Left + Math.Log(count) / Math.Log(curve.Most) * Wide;

        double Y(double cost) => Top + (high - Math.Log(cost)) / (high - low) * High;
    }
}
