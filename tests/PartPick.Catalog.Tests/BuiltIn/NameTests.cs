using System.Globalization;
using System.Text.RegularExpressions;

namespace PartPick.Catalog.Tests.BuiltIn;

/// <summary>The parts are generic: their names are made of the trade's words and of their own figures, and nothing else.</summary>
public partial class NameTests
{
    private static readonly HashSet<string> TradeWords =
    [
        "MHz", "kHz", "pF", "nF", "uF", "ohm", "kohm", "Mohm", "V", "series", "resonance", "tuning", "fork", "C0G", "X7R", "Y5V",
        "decoupling", "unbuffered", "buffered", "fast", "low-voltage", "CMOS", "HC", "HCT", "B-series", "single", "sextuple",
        "inverter", "of", "low", "strength", "wide", "temperature", "supply", "to", "three", "gain", "stages", "may", "need", "a",
        "disturbance", "start", "crystal", "oscillators", "or", "more", "14-stage", "24-stage", "binary", "counter", "with",
        "oscillator", "microcontroller", "lowest", "power", "medium", "high", "drive", "stated", "transconductance", "strong",
        "amplitude", "held", "on", "the", "board", "anyway", "NPN", "general", "purpose", "switch", "radio", "frequency", "band",
        "oscillate", "at", "very", "without", "base", "resistor",
    ];

    [Fact]
    public void Descriptions_and_notes_hold_only_words_of_the_trade()
    {
        IEnumerable<string> words = BuiltInParts.Catalog.All
            .SelectMany(part => $"{part.Description} {part.Note}".Split([' ', ',', ':'], StringSplitOptions.RemoveEmptyEntries))
            .Where(word => word != "%" && !double.TryParse(word, NumberStyles.Float, CultureInfo.InvariantCulture, out _));

        Assert.All(words.Distinct(), word => Assert.Contains(word, TradeWords));
    }

    [Fact]
    public void No_supplier_is_named() =>
        Assert.All(BuiltInParts.Catalog.All, part => Assert.Contains(part.Supplier, new[] { null, "illustrative" }));

    [Fact]
    public void Crystals_are_named_by_frequency_load_holder_and_tolerance()
    {
        var holders = new Dictionary<string, string>
        {
            ["H49"] = "HC-49/U", ["L49"] = "HC-49/S", ["5032"] = "5032", ["3225"] = "3225",
            ["C26"] = "cylinder 2x6", ["C38"] = "cylinder 3x8", ["3215"] = "3215", ["2012"] = "2012",
        };
        foreach (CrystalPart crystal in BuiltInParts.Catalog.Crystals)
        {
            Match id = CrystalId().Match(crystal.Id);
            Assert.True(id.Success, crystal.Id);
            double unit = id.Groups["unit"].Value == "M" ? 1e6 : 1e3;
            Assert.Equal(crystal.FrequencyHz, Number($"{id.Groups["whole"]}.{id.Groups["part"]}") * unit, 0.5);
            Assert.Equal(holders[id.Groups["holder"].Value], crystal.Holder);
            Assert.Equal(crystal.ToleranceRatio!.Value, Number(id.Groups["tolerance"].Value) * 1e-6, 1e-12);
            double? load = id.Groups["load"].Value == "S" ? null : Number(id.Groups["load"].Value.Replace('P', '.')) * 1e-12;
            Assert.Equal(load is null, crystal.LoadFarads is null);
            Assert.Equal(load ?? 0, crystal.LoadFarads ?? 0, 1e-18);
        }
    }

    [Theory]
    [InlineData(PartKind.Capacitor, @"^C-(\d{3}p\d?|\d+[nu]\d?)-(C0G|X7R|Y5V)-(\d+|0p\d+)-(0402|0603|0805|TH)$")]
    [InlineData(PartKind.Resistor, @"^R-\d+[RKM]\d?-[15]-(0603|TH)$")]
    [InlineData(PartKind.Inverter, @"^INV-(HC|HCT|FC|LV|BS)-[UB]-\d$")]
    [InlineData(PartKind.Counter, @"^CNT-(14|24)-(HC|HCT|BS)$")]
    [InlineData(PartKind.Port, @"^MCU-[KM]HZ-[A-D]$")]
    [InlineData(PartKind.Transistor, @"^TR-(GP|RF)-\d{4}-[AB]$")]
    public void Other_ids_follow_one_scheme_for_each_kind(PartKind kind, string scheme) =>
        Assert.All(BuiltInParts.Catalog.OfKind(kind), part => Assert.Matches(scheme, part.Id));

    private static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);

    [GeneratedRegex(@"^X-(?<whole>\d\d)(?<unit>[MK])(?<part>\d+)-(?<load>S|\d\d(P5)?)-(?<holder>\w+)-(?<tolerance>\d\d)$")]
    private static partial Regex CrystalId();
}
