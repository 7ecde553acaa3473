namespace PartPick.Selection;

/// <summary>One key of a requirement.</summary>
/// <param name="Name">The key in a file, and the option's name after two hyphens.</param>
/// <param name="Fits">What fits, with an example.</param>
/// <param name="Shape">How its value is written on a command line.</param>
public sealed record RequirementKey(string Name, string Fits, RequirementShape Shape = RequirementShape.One)
{
    /// <summary>The name with hyphens instead of capitals: <c>start-up-time</c>.</summary>
    public string Hyphenated =>
        string.Concat(Name.Select(letter => char.IsAsciiLetterUpper(letter) ? "-" + char.ToLowerInvariant(letter) : letter.ToString()));
}

/// <summary>How the value of a requirement's key is written on a command line.</summary>
public enum RequirementShape
{
    /// <summary>One value or word.</summary>
    One,

    /// <summary>Two values, or one of the form <c>a..b</c>.</summary>
    Range,

    /// <summary>Several words or numbers.</summary>
    List,

    /// <summary>True where it is given without a value.</summary>
    Flag,
}

/// <summary>The keys of a requirement, in the order of the file.</summary>
public static class RequirementKeys
{
    /// <summary>All keys.</summary>
    public static IReadOnlyList<RequirementKey> All { get; } =
    [
        new("name", "a name for the requirement"),
        new("output", "the wanted output frequency such as 1 kHz"),
        new("waveform", "square, sine or any"),
        new("budget", "the largest frequency error such as 80 ppm"),
        new("supply", "one supply voltage or two such as 4.5 V..5.5 V", RequirementShape.Range),
        new("temperature", "the lowest and highest ambient temperature in °C such as -10..50", RequirementShape.Range),
        new("years", "the years of service such as 5"),
        new("margin", "the smallest start-up margin such as 5"),
        new("allowDisturbance", "true where a circuit may need a disturbance to start", RequirementShape.Flag),
        new("startUpTime", "the longest start-up time such as 50 ms"),
        new("builds", "the number of boards such as 200"),
        new("costLimit", "the highest cost per unit such as 2.50"),
        new("board", "breadboard, two-layer, four-layer, or an object with input, output, across and uncertainty"),
        new("capacitorSeries", "the series of the load capacitors such as E12"),
        new("resistorSeries", "the series of the damping resistor such as E12"),
        new("biasSeries", "the series of the follower's bias resistors such as E3"),
        new("circuits", "some of gate, counter, port, follower", RequirementShape.List),
        new("weights", "an object with error, margin and cost, or three numbers in this order", RequirementShape.List),
    ];

    /// <summary>The names alone.</summary>
    public static IReadOnlyList<string> Names { get; } = [.. All.Select(key => key.Name)];

    /// <summary>Finds a key by its name.</summary>
    /// <param name="name">The name in a file.</param>
    /// <exception cref="InvalidOperationException">There is no such key.</exception>
    public static RequirementKey Of(string name) => All.First(key => key.Name == name);
}
