namespace PartPick.Selection.Tests.Circuits;

/// <summary>Circuit files for the tests.</summary>
internal static class CircuitTexts
{
    public const string Gate = """
        {
          "circuit": "gate",
          "crystal": { "frequency": "4 MHz", "load": "18 pF", "shunt": "5 pF", "motional": "12 fF", "resistance": "100",
                       "driveLevel": "500 uW", "tolerance": "30 ppm", "stability": "50 ppm", "ageing": "3 ppm" },
          "amplifier": { "gm": "10 mS", "ro": "2k", "vt": "0.8 V", "cin": "3 pF", "cout": "5 pF", "cf": "0.5 pF" },
          "c1": "22 pF", "c2": "22 pF", "rs": "220", "rf": "1M",
          "strays": { "input": "3 pF", "output": "3 pF", "across": "1 pF" },
          "supply": "5 V", "temperature": 25, "tap": 0, "target": "4 MHz"
        }
        """;

    public const string Follower = """
        {
          "circuit": "follower",
          "crystal": { "frequency": 8e6, "load": "20p", "shunt": "4p", "motional": "15f", "resistance": 30 },
          "amplifier": { "beta": 200, "cje": "9 pF", "tf": "0.6 ns", "cmu": "3 pF", "rbb": 90 },
          "c1": "100p", "c2": "100p", "rbTop": "47k", "rbBottom": "47k", "re": "2k2", "rl": "10k", "supply": 5
        }
        """;

    public static CircuitDescription Read(string json) => CircuitFile.Read(json, "circuit.json").Value;

    /// <summary>The gate file with a piece of its text replaced.</summary>
    public static string GateWith(string old, string replacement)
    {
        Assert.Contains(old, Gate, StringComparison.Ordinal);
        return Gate.Replace(old, replacement, StringComparison.Ordinal);
    }
}
