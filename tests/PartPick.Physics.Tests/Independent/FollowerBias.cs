using PartPick.Physics.Circuits;

namespace PartPick.Physics.Tests.Independent;

/// <summary>The operating point of a follower without oscillation, by bisection on the base–emitter voltage.</summary>
internal sealed record FollowerBias(double EmitterAmps, double BaseVolts, double EmitterVolts, double ThermalVolts, double SaturationAmps)
{
    private const double Boltzmann = 1.380649e-23;
    private const double ElementaryCharge = 1.602176634e-19;

    public double CollectorAmps { get; private init; }

    public double Transconductance => CollectorAmps / ThermalVolts;

    public static FollowerBias Of(FollowerCircuit circuit)
    {
        double thermal = Boltzmann * (circuit.TemperatureCelsius + 273.15) / ElementaryCharge;
        double stated = circuit.Transistor.BaseEmitterVolts - 2e-3 * (circuit.TemperatureCelsius - 25);
        double saturation = 1e-3 * Math.Exp(-stated / thermal);
        double beta = circuit.Transistor.Beta;
        if (circuit.EmitterCurrentAmps is { } given)
        {
            double collector = given * beta / (beta + 1);
            double emitterVolts = circuit.SupplyVolts / 2 - thermal * Math.Log(collector / saturation)
                - collector / beta * circuit.Transistor.BaseSpreadingOhms;
            return new FollowerBias(given, circuit.SupplyVolts / 2, emitterVolts, thermal, saturation) { CollectorAmps = collector };
        }

        double low = 0, high = 1.5;
        for (int k = 0; k < 200; k++)
        {
            double middle = (low + high) / 2;
            if (Excess(middle) > 0)
            {
                high = middle;
            }
            else
            {
                low = middle;
            }
        }

        double ic = saturation * Math.Exp(low / thermal);
        double ie = ic * (beta + 1) / beta;
        double ve = ie * circuit.EmitterOhms;
        return new FollowerBias(ie, ve + low + ic / beta * circuit.Transistor.BaseSpreadingOhms, ve, thermal, saturation)
        {
            CollectorAmps = ic,
        };

        // Base current asked by the transistor less base current offered by the resistors.
        double Excess(double junction)
        {
            double collector = saturation * Math.Exp(junction / thermal);
            double @base = collector / beta;
            double terminal = (collector + @base) * circuit.EmitterOhms + junction + @base * circuit.Transistor.BaseSpreadingOhms;
            double offered = (circuit.SupplyVolts - terminal) / circuit.BaseTopOhms - terminal / circuit.BaseBottomOhms;
            return @base - offered;
        }
    }
}
