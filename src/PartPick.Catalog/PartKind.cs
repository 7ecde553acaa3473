namespace PartPick.Catalog;

/// <summary>The kinds of parts; each has its own figures and its own CSV file.</summary>
public enum PartKind
{
    /// <summary>A quartz crystal.</summary>
    Crystal,

    /// <summary>A fixed capacitor.</summary>
    Capacitor,

    /// <summary>A fixed resistor.</summary>
    Resistor,

    /// <summary>A logic inverter.</summary>
    Inverter,

    /// <summary>A binary counter with an oscillator inverter.</summary>
    Counter,

    /// <summary>The oscillator port of a microcontroller.</summary>
    Port,

    /// <summary>A bipolar transistor.</summary>
    Transistor,
}
