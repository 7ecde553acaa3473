namespace PartPick.Selection;

/// <summary>Why a part was left out before the circuit was analysed with it. Each reason is certain: such a part cannot fit.</summary>
public enum LeftOut
{
    /// <summary>It is kept out of every search.</summary>
    Excluded,

    /// <summary>It has no price in the currency of the catalogue.</summary>
    Price,

    /// <summary>Its package is another one, and only equal packages are wanted.</summary>
    Package,

    /// <summary>A crystal for an overtone.</summary>
    Overtone,

    /// <summary>Whatever the load, the crystal does not reach the frequency.</summary>
    Frequency,

    /// <summary>The spreads of the crystal alone break the error budget.</summary>
    CrystalError,

    /// <summary>It is not specified over the required temperatures.</summary>
    Temperature,

    /// <summary>The crystal is beyond what the amplifier is guaranteed for.</summary>
    Clock,

    /// <summary>A counter without the divider stage.</summary>
    Stage,

    /// <summary>A capacitor whose dielectric does not serve in its place.</summary>
    Dielectric,

    /// <summary>A capacitor that bears less than the highest supply.</summary>
    Voltage,

    /// <summary>A value that does not serve in its place, whatever the circuit.</summary>
    Value,

    /// <summary>The stock does not cover the build.</summary>
    Stock,

    /// <summary>The circuit costs more with it than is allowed.</summary>
    Cost,

    /// <summary>The amplifier is not specified over the supply range.</summary>
    Supply,

    /// <summary>The circuit does not build up with the required margin at some corner.</summary>
    Margin,
}
