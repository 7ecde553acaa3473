using System.Numerics;
using PartPick.Physics.Circuits;

namespace PartPick.Physics.Network;

/// <summary>The passive part of a gate circuit, nodes A, B, D, with a conductance of choice at the inverter's output.</summary>
internal readonly struct GateNetwork : ILinearNetwork
{
    private readonly double _groundA;
    private readonly double _groundB;
    private readonly double _groundD;
    private readonly double _across;
    private readonly double _feedback;
    private readonly double _feedbackSiemens;
    private readonly double _outputSiemens;
    private readonly double _seriesOhms;
    private readonly double _delay;

    /// <param name="circuit">The circuit.</param>
    /// <param name="outputSiemens">Linear conductance from the inverter's output to ground, in siemens.</param>
    public GateNetwork(GateCircuit circuit, double outputSiemens)
    {
        _groundA = circuit.C1Farads + circuit.Inverter.InputFarads + circuit.Strays.InputFarads;
        _groundB = circuit.C2Farads + circuit.Strays.OutputFarads;
        _groundD = circuit.Inverter.OutputFarads;
        _across = circuit.Crystal.ShuntFarads + circuit.Strays.AcrossFarads;
        _feedback = circuit.Inverter.FeedbackFarads;
        _feedbackSiemens = 1 / circuit.FeedbackOhms;
        _outputSiemens = outputSiemens;
        _seriesOhms = circuit.SeriesOhms;
        _delay = circuit.Inverter.DelaySeconds;
    }

    /// <summary>Transfer impedances of the ports the inverter and the crystal see.</summary>
    public GatePorts Ports(Complex s)
    {
        var network = new ThreeNodeNetwork(
            s * _groundA,
            s * _groundB,
            s * _groundD + _outputSiemens,
            s * _across,
            s * _feedback + _feedbackSiemens,
            _seriesOhms);
        network.Floating(out Complex zA, out Complex across, out Complex zD, out Complex zAD, out Complex zDD);
        return new GatePorts(across, zA, zD, zAD, zDD);
    }

    /// <summary>Phase factor e^(−sτ) of the inverter's excess delay.</summary>
    public Complex Delay(Complex s) => _delay == 0 ? Complex.One : Complex.Exp(-s * _delay);

    /// <inheritdoc/>
    public Transfer At(Complex s)
    {
        GatePorts ports = Ports(s);
        Complex delay = -Delay(s);
        return new Transfer(ports.Own, delay * ports.Input, ports.Output, delay * ports.InputPerSource);
    }
}

/// <summary>Transfer impedances of a gate's passive network in ohms.</summary>
/// <param name="Own">Voltage across the crystal per crystal current.</param>
/// <param name="Input">Voltage of A per crystal current.</param>
/// <param name="Output">Voltage of D per crystal current; also voltage across the crystal per current into D.</param>
/// <param name="InputPerSource">Voltage of A per current into D.</param>
/// <param name="OutputPerSource">Voltage of D per current into D.</param>
internal readonly record struct GatePorts(Complex Own, Complex Input, Complex Output, Complex InputPerSource, Complex OutputPerSource);
