using PartPick.Selection;

namespace PartPick.Tests.Screens.Pictures;

/// <summary>A picture with one of everything, of numbers that are easy to follow.</summary>
internal static class SampleChart
{
    public static Chart Of(bool limits = true) => new("A sample", new ChartAxis("supply", "V", 4, 6), new ChartAxis("margin", "", 0, 10))
    {
        Bands = [new ChartBand("spread", [new BandPoint(4, 1, 3), new BandPoint(6, 1, 5)])],
        Curves =
        [
            new ChartCurve('f', "falling", [new ChartPoint(4, 9), new ChartPoint(6, 6)]),
            new ChartCurve('l', "level", [new ChartPoint(4, 6), new ChartPoint(6, 6)]),
        ],
        Limits = limits ? [new ChartLimit("wanted 8", 8), new ChartLimit("at 5.5", 5.5, IsUpright: true)] : [],
        Spots = [new ChartSpot(SpotKind.Other, new ChartPoint(4.5, 7.5)), new ChartSpot(SpotKind.Front, new ChartPoint(5, 2))],
        Marks = [new ChartMark('A', "least 6 at 6 V", new ChartPoint(6, 6))],
        Notes = ["A note with ±5 % in it."],
    };
}
