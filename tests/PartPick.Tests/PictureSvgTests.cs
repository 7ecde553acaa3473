using System.Globalization;
using System.Xml.Linq;
using PartPick.Catalog;
using PartPick.Output;
using PartPick.Selection;
using PartPick.Tests.Screens;
using PartPick.Tests.Screens.Pictures;
using PartPick.Values;

namespace PartPick.Tests;

public class PictureSvgTests
{
    private static readonly XNamespace Svg = "http://www.w3.org/2000/svg";

    public static TheoryData<PictureKind> Kinds => [.. PictureKinds.All];

    [Theory]
    [MemberData(nameof(Kinds))]
    public void Every_picture_is_well_formed_names_its_circuit_and_stays_on_its_sheet(PictureKind kind)
    {
        foreach (Candidate candidate in SampleRanking.All)
        {
            XElement svg = Drawn(kind, candidate);

            Assert.Equal(Svg + "svg", svg.Name);
            Assert.Contains(candidate.Choice.Amplifier.Id, svg.Value, StringComparison.Ordinal);
            Assert.Contains(candidate.Choice.Crystal.Id, svg.Value, StringComparison.Ordinal);
            double width = Number(svg, "width"), height = Number(svg, "height");
            Assert.Equal($"0 0 {width} {height}", svg.Attribute("viewBox")!.Value);
            Assert.All(svg.Elements(Svg + "text"), text =>
            {
                Assert.InRange(Number(text, "x"), 0, width);
                Assert.InRange(Number(text, "y"), 0, height);
            });
        }
    }

    [Theory]
    [MemberData(nameof(Kinds))]
    public void Nothing_is_told_by_colour_and_both_light_and_dark_readers_see_it(PictureKind kind)
    {
        XElement svg = Drawn(kind, SampleRanking.Counter);

        string style = svg.Element(Svg + "style")!.Value;
        Assert.Contains("prefers-color-scheme: dark", style, StringComparison.Ordinal);
        string[] inks = [.. svg.Descendants().Attributes().Where(one => one.Name.LocalName is "fill" or "stroke").Select(one => one.Value).Distinct()];
        Assert.All(inks, ink => Assert.Contains(ink, new[] { "none", "currentColor" }));
    }

    [Fact]
    public void A_sheet_has_the_curves_limits_and_marks_of_its_numbers_at_their_places()
    {
        XElement svg = XElement.Parse(ChartSvg.Of(SampleChart.Of(), "of a test"));
        XElement[] curves = [.. svg.Elements(Svg + "polyline").Where(one => one.Attribute("class")!.Value == "curve")];

        // Two curves, and their two samples below.
        Assert.Equal(4, curves.Length);
        Assert.NotEqual(curves[0].Attribute("stroke-dasharray")?.Value, curves[1].Attribute("stroke-dasharray")?.Value);
        Assert.Equal(2, svg.Elements(Svg + "line").Count(one => one.Attribute("class")!.Value == "limit"));
        Assert.Single(svg.Elements(Svg + "polygon"));
        Assert.All(
            new[] { "A sample", "of a test", "supply (V)", "margin", "wanted 8", "at 5.5", "f  falling", "A  least 6 at 6 V", "on the front" },
            words => Assert.Contains(svg.Elements(Svg + "text"), text => text.Value == words));

        // The level curve lies at 6 of 0 to 10, the falling one begins at 9: both in pixels from the axis below.
        double bottom = Heights(svg.Elements(Svg + "polyline").First(one => one.Attribute("class")!.Value == "axis")).Max();
        double top = Heights(svg.Elements(Svg + "polyline").First(one => one.Attribute("class")!.Value == "axis")).Min();
        Assert.Equal(bottom - 0.6 * (bottom - top), Heights(curves[1])[0], 0.5);
        Assert.Equal(bottom - 0.9 * (bottom - top), Heights(curves[0])[0], 0.5);
    }

    [Fact]
    public void Ids_cannot_break_the_file()
    {
        const string hostile = "A<b>&\"'\u0001\ufffe]]>\ud83d\ude00\ud800";
        Candidate candidate = SampleRanking.Counter with
        {
            Choice = SampleRanking.Counter.Choice with { Crystal = SampleRanking.Counter.Choice.Crystal with { Id = hostile } },
        };
        foreach (PictureKind kind in PictureKinds.All)
        {
            Assert.Contains("A<b>&\"'", Drawn(kind, candidate).Value, StringComparison.Ordinal);
        }
    }

    [Fact]
    public void The_budget_says_each_term_and_its_figure()
    {
        XElement svg = Drawn(PictureKind.Budget, SampleRanking.Counter);
        ErrorBudget budget = SampleRanking.Counter.Budget!;

        string[] texts = [.. svg.Descendants(Svg + "text").Select(text => text.Value)];
        Assert.All(budget.Terms, term => Assert.Contains(term.Term, texts));
        Assert.Contains(texts, text => text.StartsWith(PartPick.Screens.Figures.Ppm(budget.WorstRatio) + " ppm", StringComparison.Ordinal));
        Assert.Equal(budget.Terms.Length + 3, svg.Descendants(Svg + "rect").Count(one => one.Attribute("class") is null));
    }

    private static XElement Drawn(PictureKind kind, Candidate candidate)
    {
        Requirement wanted = SampleRanking.Wanted with { SupplyMinVolts = 4.5, SupplyMaxVolts = 5.5 };
        CancellationToken stop = TestContext.Current.CancellationToken;
        Result<Chart>? chart = kind switch
        {
            PictureKind.Error => ErrorOverTemperature.Of(candidate, wanted),
            PictureKind.Margin when candidate.Choice.Amplifier is not PortPart => MarginOverSupply.Of(candidate, wanted, stop),
            PictureKind.Growth when candidate.Result.StartUpTimeSeconds is not null => GrowthAfterSwitchOn.Of(candidate, stop),
            PictureKind.Scatter => ErrorAgainstCost.Of(SampleRanking.Answer(wanted, [.. SampleRanking.All]), candidate),
            PictureKind.Budget or PictureKind.Schematic => null,
            _ => Result.Ok(SampleChart.Of()),
        };
        return XElement.Parse(PictureSvg.Of(kind, candidate, wanted, chart));
    }

    private static double[] Heights(XElement line) =>
        [.. line.Attribute("points")!.Value.Split(' ').Select(pair => double.Parse(pair.Split(',')[1], CultureInfo.InvariantCulture))];

    private static double Number(XElement element, string name) =>
        double.Parse(element.Attribute(name)!.Value, CultureInfo.InvariantCulture);
}
