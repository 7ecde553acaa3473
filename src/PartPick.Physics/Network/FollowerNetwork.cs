using System.Numerics;
using PartPick.Physics.Circuits;

namespace PartPick.Physics.Network;

/// <summary>
/// The passive part of a follower circuit, nodes E, B, I. The device's forward current F = gm·v (small signals), or its
/// transport current (any amplitude), flows into E; F(1/β + sτF) flows from I to E with it.
/// </summary>
internal readonly struct FollowerNetwork : ILinearNetwork
{
    private readonly double _groundE;
    private readonly double _groundB;
    private readonly double _groundI;
    private readonly double _emitterSiemens;
    private readonly double _loadSiemens;
    private readonly double _baseSiemens;
    private readonly double _c1;
    private readonly double _junction;
    private readonly double _spreadingOhms;
    private readonly double _inverseBeta;
    private readonly double _transit;

    public FollowerNetwork(FollowerCircuit circuit)
    {
        _groundE = circuit.C2Farads + circuit.Strays.OutputFarads;
        _groundB = circuit.Crystal.ShuntFarads + circuit.Strays.AcrossFarads;
        _groundI = circuit.Transistor.CollectorFarads;
        _emitterSiemens = 1 / circuit.EmitterOhms;
        _loadSiemens = 1 / circuit.LoadOhms;
        _baseSiemens = 1 / circuit.BaseTopOhms + 1 / circuit.BaseBottomOhms;
        _c1 = circuit.C1Farads;
        _junction = circuit.Transistor.JunctionFarads;
        _spreadingOhms = circuit.Transistor.BaseSpreadingOhms;
        _inverseBeta = 1 / circuit.Transistor.Beta;
        _transit = circuit.Transistor.TransitSeconds;
    }

    /// <summary>Transfer impedances of the ports that the transistor and the crystal see.</summary>
    public FollowerPorts Ports(Complex s)
    {
        // The load stands behind a large capacitor: it answers to the signal, not to DC.
        double emitterSiemens = s == Complex.Zero ? _emitterSiemens : _emitterSiemens + _loadSiemens;
        var network = new ThreeNodeNetwork(
            s * _groundE + emitterSiemens,
            s * _groundB + _baseSiemens,
            s * _groundI,
            s * _c1,
            s * _junction,
            _spreadingOhms);
        network.Matrix(out Complex zEE, out Complex zEB, out Complex zEI, out Complex zBB, out Complex zBI, out Complex zII);
        Complex fromBase = _inverseBeta + s * _transit;
        Complex intoEmitter = 1 + fromBase;
        return new FollowerPorts(
            Own: zBB,
            Junction: zBI - zEB,
            Internal: zBI,
            Emitter: zEB,
            OwnPerForward: intoEmitter * zEB - fromBase * zBI,
            JunctionPerForward: intoEmitter * (zEI - zEE) - fromBase * (zII - zEI),
            InternalPerForward: intoEmitter * zEI - fromBase * zII,
            EmitterPerForward: intoEmitter * zEE - fromBase * zEI,
            OwnPerReverse: -zEB - zBI,
            JunctionPerReverse: -(zEI - zEE) - (zII - zEI),
            InternalPerReverse: -zEI - zII,
            EmitterPerReverse: -zEE - zEI);
    }

    /// <inheritdoc/>
    public Transfer At(Complex s)
    {
        FollowerPorts ports = Ports(s);
        return new Transfer(ports.Own, ports.Junction, ports.OwnPerForward, ports.JunctionPerForward);
    }
}

/// <summary>
/// Transfer impedances of a follower's passive network in ohms: of the crystal (own), the base–emitter junction I–E,
/// the internal base I and the emitter E, per crystal current, per forward transport current F and per reverse current R
/// (R flows out of both E and I into the collector).
/// </summary>
internal readonly record struct FollowerPorts(
    Complex Own,
    Complex Junction,
    Complex Internal,
    Complex Emitter,
    Complex OwnPerForward,
    Complex JunctionPerForward,
    Complex InternalPerForward,
    Complex EmitterPerForward,
    Complex OwnPerReverse,
    Complex JunctionPerReverse,
    Complex InternalPerReverse,
    Complex EmitterPerReverse);
