namespace PartPick.Selection;

/// <summary>The words for the circuits in files and on the command line.</summary>
public static class CircuitWords
{
    private static readonly Dictionary<string, CircuitKind> Known = new(StringComparer.Ordinal)
    {
        ["gate"] = CircuitKind.Gate,
        ["counter"] = CircuitKind.Counter,
        ["port"] = CircuitKind.Port,
        ["follower"] = CircuitKind.Follower,
    };

    /// <summary>The circuits by their words.</summary>
    public static IReadOnlyDictionary<string, CircuitKind> ByWord => Known;

    /// <summary>The word for a circuit.</summary>
    /// <param name="kind">The circuit.</param>
    public static string Word(this CircuitKind kind) => kind switch
    {
        CircuitKind.Gate => "gate",
        CircuitKind.Counter => "counter",
        CircuitKind.Port => "port",
        CircuitKind.Follower => "follower",
        _ => throw new ArgumentOutOfRangeException(nameof(kind), kind, "Not a circuit."),
    };
}
