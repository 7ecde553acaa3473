namespace PartPick.Catalog.Import;

/// <summary>
/// Between which figures parts of a kind are made (common practice, with room on both sides): decides a unit or a decimal sign
/// that a file leaves open, and catches figures that no part has.
/// </summary>
internal static class Plausible
{
    /// <summary>The least and the greatest figure in SI units; null where nothing is known.</summary>
    public static (double Least, double Greatest)? Of(PartKind kind, string field) => (kind, field) switch
    {
        (PartKind.Crystal, "frequency") => (30e3, 500e6),
        (PartKind.Crystal, "load") => (2e-12, 200e-12),
        (PartKind.Crystal, "shunt") => (0.1e-12, 50e-12),
        (PartKind.Crystal, "motional") => (0.1e-15, 200e-15),
        (PartKind.Crystal, "resistance") => (1, 1e6),
        (PartKind.Crystal, "driveLevel") => (10e-9, 10e-3),
        (PartKind.Crystal, "tolerance" or "stability") => (0.1e-6, 1000e-6),
        (PartKind.Crystal, "ageing" or "ageingYearly") => (0.01e-6, 100e-6),
        (PartKind.Capacitor, "value") => (0.05e-12, 1),
        (PartKind.Capacitor, "tolerance") => (0.0005, 1),
        (PartKind.Capacitor, "toleranceAbsolute") => (0.005e-12, 10e-12),
        (PartKind.Capacitor, "voltage") => (1, 10e3),
        (PartKind.Resistor, "value") => (1e-4, 1e12),
        (PartKind.Resistor, "tolerance") => (1e-5, 0.5),
        (PartKind.Transistor, "beta" or "betaMin" or "betaMax") => (2, 1e5),
        (PartKind.Transistor, "transitionFrequency") => (100e3, 500e9),
        (PartKind.Transistor, "currentMax") => (1e-3, 100),
        (PartKind.Transistor, "voltageMax") => (2, 2000),
        (PartKind.Transistor, "cje" or "cmu") => (0.01e-12, 10e-9),
        (PartKind.Transistor, "tf") => (0.1e-12, 10e-6),
        (PartKind.Transistor, "rbb") => (0.1, 10e3),
        (PartKind.Transistor, "vbe") => (0.2, 2),
        (PartKind.Inverter or PartKind.Counter or PartKind.Port, _) => OfAmplifier(field.Split(' ')[0]) ?? OfAny(field),
        _ => OfAny(field),
    };

    private static (double Least, double Greatest)? OfAmplifier(string field) => field switch
    {
        "supply" => (0.5, 60),
        "gmMin" or "gm" or "gmMax" => (10e-9, 1000),
        "ro" => (1, 1e9),
        "ron" => (0.01, 1e6),
        "gain" => (1.5, 1e7),
        "delay" => (0, 100e-6),
        "clockMin" or "clock" => (1e3, 10e9),
        "cin" or "cout" => (0.05e-12, 1e-9),
        "cf" => (0.001e-12, 100e-12),
        "criticalTransconductanceMax" => (1e-9, 1),
        "swing" => (0.01, 60),
        "frequencyMin" or "frequencyMax" => (1e3, 10e9),
        _ => null,
    };

    private static (double Least, double Greatest)? OfAny(string field) => field switch
    {
        "temperatureMin" => (-100, 30),
        "temperatureMax" => (20, 300),
        _ => null,
    };

    /// <summary>Whether a figure is one that parts have; zero counts as one only where nothing is known.</summary>
    public static bool Holds(PartKind kind, string field, double value) =>
        Of(kind, field) is not { } range || (value >= range.Least && value <= range.Greatest);
}
