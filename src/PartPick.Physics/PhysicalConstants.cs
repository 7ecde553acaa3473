namespace PartPick.Physics;

/// <summary>Constants of the SI, exact by definition.</summary>
public static class PhysicalConstants
{
    /// <summary>Boltzmann constant k in J/K.</summary>
    public const double BoltzmannJoulesPerKelvin = 1.380649e-23;

    /// <summary>Elementary charge q in coulombs.</summary>
    public const double ElementaryChargeCoulombs = 1.602176634e-19;

    /// <summary>0 °C in kelvins.</summary>
    public const double ZeroCelsiusKelvins = 273.15;

    /// <summary>Thermal voltage kT/q in volts.</summary>
    /// <param name="celsius">Temperature in °C.</param>
    public static double ThermalVolts(double celsius) =>
        BoltzmannJoulesPerKelvin * (celsius + ZeroCelsiusKelvins) / ElementaryChargeCoulombs;
}
