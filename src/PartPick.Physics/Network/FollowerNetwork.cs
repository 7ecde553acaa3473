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
        _emitterSiemens = 1 / circuit.EmitterOhms + 1 / circuit.LoadOhms;
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
        var network = new ThreeNodeNetwork(
            s * _groundE + _emitterSiemens,
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
            OwnPerForward: intoEmitter * zEB - fromBase * zBI,
            JunctionPerForward: intoEmitter * (zEI - zEE) - fromBase * (zII - zEI),
            InternalPerForward: intoEmitter * zEI - fromBase * zII,
            OwnPerReverse: -zEB - zBI);
    }

    /// <inheritdoc/>
    public Transfer At(Complex s) => Ports(s).Forward;
}

/// <summary>
/// Transfer impedances of a follower's passive network in ohms: of the crystal (own), the base–emitter junction I–E and the
/// internal base I, per crystal current, per forward transport current F and per reverse current R (R flows out of both E and
/// I into the collector).
/// </summary>
internal readonly record struct FollowerPorts(
    Complex Own,
    Complex Junction,
    Complex Internal,
    Complex OwnPerForward,
    Complex JunctionPerForward,
    Complex InternalPerForward,
    Complex OwnPerReverse)
{
    /// <summary>The network as its forward current sees it.</summary>
    public Transfer Forward => new(Own, Junction, OwnPerForward, JunctionPerForward);
}
