using PartPick.Values;

namespace PartPick.Catalog.Import;

/// <summary>Units as lists of parts spell them, in any case and form, as the units that <see cref="ValueText"/> reads.</summary>
internal static class UnitSpelling
{
    private static readonly Dictionary<string, string> Any = new(StringComparer.OrdinalIgnoreCase)
    {
        ["pf"] = "pF", ["nf"] = "nF", ["uf"] = "uF", ["mfd"] = "uF", ["ff"] = "fF", ["pfd"] = "pF", ["picofarad"] = "pF",
        ["hz"] = "Hz", ["khz"] = "kHz", ["mhz"] = "MHz", ["ghz"] = "GHz", ["cps"] = "Hz",
        ["ohm"] = "ohm", ["ohms"] = "ohm", ["ω"] = "ohm", ["kohm"] = "kohm", ["kohms"] = "kohm", ["k ohm"] = "kohm", ["k ohms"] = "kohm",
        ["uw"] = "uW", ["nw"] = "nW", ["ppm"] = "ppm", ["ppb"] = "ppb", ["percent"] = "%", ["pct"] = "%", ["per cent"] = "%",
        ["ppm/year"] = "ppm", ["ppm/yr"] = "ppm", ["ppm/y"] = "ppm", ["ppm/a"] = "ppm", ["ppm per year"] = "ppm", ["ppm/year max"] = "ppm",
        ["ppm first year"] = "ppm", ["ppm / year"] = "ppm", ["ppm 1st year"] = "ppm", ["ppm/jahr"] = "ppm",
        ["v"] = "V", ["vdc"] = "V", ["v dc"] = "V", ["volt"] = "V", ["volts"] = "V", ["vac"] = "V?",
        ["c"] = "°C", ["degc"] = "°C", ["deg c"] = "°C", ["° c"] = "°C", ["ºc"] = "°C", ["º c"] = "°C", ["deg. c"] = "°C", ["°c"] = "°C",
        ["ma/v"] = "mS", ["µa/v"] = "uS", ["ua/v"] = "uS", ["mmho"] = "mS", ["mmhos"] = "mS", ["umho"] = "uS",
        ["farad"] = "F", ["farads"] = "F", ["microfarad"] = "uF", ["nanofarad"] = "nF", ["picofarads"] = "pF", ["hertz"] = "Hz",
        ["kilohertz"] = "kHz", ["megahertz"] = "MHz", ["гц"] = "Hz", ["кгц"] = "kHz", ["мгц"] = "MHz", ["пф"] = "pF", ["нф"] = "nF",
        ["мкф"] = "uF", ["ом"] = "ohm", ["ком"] = "kohm", ["мом"] = "Mohm", ["мквт"] = "uW", ["в"] = "V", ["ма"] = "mA", ["мгн"] = "mH",
        ["×10⁻⁶"] = "ppm", ["x10-6"] = "ppm", ["×10-6"] = "ppm", ["10-6"] = "ppm", ["10^-6"] = "ppm", ["x 10-6"] = "ppm",
        ["× 10-6"] = "ppm",
        ["x10^-6"] = "ppm", ["×10^-6"] = "ppm", ["* 10^-6"] = "ppm", ["e-6"] = "ppm", ["p.p.m"] = "ppm",
        ["ppm/℃"] = "ppm/°C", ["ppm/k"] = "ppm/K", ["ppm/c"] = "ppm/°C", ["ppm/°c"] = "ppm/°C", ["ppm/ºc"] = "ppm/°C",
        ["ppm / °c"] = "ppm/°C",
        ["℃"] = "°C", ["'c"] = "°C", ["°"] = "°C", ["kc"] = "kHz", ["mc"] = "MHz", ["pz"] = "", ["szt"] = "", ["ks"] = "", ["kpl"] = "",
        ["db"] = "", ["шт"] = "", ["个"] = "", ["個"] = "", ["ud"] = "", ["uds"] = "", ["pzas"] = "", ["pz."] = "", ["adet"] = "",
        ["v="] = "V", ["vpp"] = "V", ["vss"] = "V", ["vp-p"] = "V", ["v pp"] = "V", ["vcc"] = "V",
        ["volt dc"] = "V", ["vdcw"] = "V", ["ma max"] = "mA", ["ppm/an"] = "ppm", ["ppm/año"] = "ppm",
        ["ppm/anno"] = "ppm", ["ppm/ano"] = "ppm", ["ppm/år"] = "ppm", ["ppm/jaar"] = "ppm", ["ppm/rok"] = "ppm", ["ppm/annum"] = "ppm",
        ["ppm 1. jahr"] = "ppm", ["ppm/1st year"] = "ppm", ["ppm/1. jahr"] = "ppm",
        ["pcs"] = "", ["pcs."] = "", ["pc"] = "", ["stk"] = "", ["st"] = "", ["stück"] = "", ["ea"] = "", ["units"] = "", ["pieces"] = "",
        ["in stock"] = "",
    };

    private static readonly Dictionary<string, string> CaseCounts = new(StringComparer.Ordinal)
    {
        // Milli and mega differ in ohms and volts; megawatts, megaamperes, megavolts and megasiemens no part has.
        ["MA"] = "mA", ["MS"] = "mS", ["MV"] = "mV", ["MW"] = "mW", ["mW"] = "mW", ["mw"] = "mW", ["MOHM"] = "Mohm", ["MOhm"] = "Mohm", ["MOhms"] = "Mohm", ["Mohms"] = "Mohm",
        ["µF"] = "uF", ["μF"] = "uF", ["µW"] = "uW", ["μW"] = "uW", ["kΩ"] = "kohm", ["KΩ"] = "kohm", ["MΩ"] = "Mohm", ["mΩ"] = "mohm",
        ["Ω"] = "ohm", ["\u2126"] = "ohm",
    };

    /// <summary>The unit as it is read; the same text where the spelling is not known.</summary>
    public static string Of(string unit)
    {
        string trimmed = unit.Trim().TrimEnd('.');
        return CaseCounts.TryGetValue(trimmed, out string? exact) ? exact : Any.GetValueOrDefault(trimmed, trimmed);
    }

    /// <summary>The power of ten of a unit of a dimension; null where it is none of that dimension.</summary>
    public static int? PowerOf(string unit, Dimension dimension)
    {
        if (unit.Length == 0)
        {
            return 0;
        }

        Result<double> one = ValueText.Parse("1 " + Of(unit), dimension, "unit", allowNegative: true);
        return one.IsOk && one.Value > 0 ? (int)Math.Round(Math.Log10(one.Value)) : null;
    }
}
