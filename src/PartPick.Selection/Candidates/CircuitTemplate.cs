using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Physics.Circuits;
using PartPick.Physics.Devices;

namespace PartPick.Selection;

/// <summary>
/// A circuit, crystal and amplifier on the requirement's board, ready to be completed with values at any operating point.
/// </summary>
public sealed class CircuitTemplate
{
    private readonly Requirement _requirement;
    private readonly Dictionary<(double Supply, DeviceStrength Strength), Inverter> _inverters = [];
    private readonly Dictionary<DeviceStrength, Transistor> _transistors = [];
    private readonly Part _amplifier;
    private readonly double _feedbackOhms;

    private CircuitTemplate(Requirement requirement, CircuitKind kind, CrystalModel crystal, Part amplifier, double feedbackOhms)
    {
        _requirement = requirement;
        _amplifier = amplifier;
        Kind = kind;
        Crystal = crystal;
        _feedbackOhms = feedbackOhms;
        Corners = OperatingPoint.Corners(requirement, kind);
        AmplifierCorners = OperatingPoint.AtNominalCapacitances(requirement, kind);
    }

    /// <summary>The circuit.</summary>
    public CircuitKind Kind { get; }

    /// <summary>The crystal.</summary>
    public CrystalModel Crystal { get; }

    /// <summary>All corners.</summary>
    public ImmutableArray<OperatingPoint> Corners { get; }

    /// <summary>The corners of amplifier, supply and ambient.</summary>
    public ImmutableArray<OperatingPoint> AmplifierCorners { get; }

    /// <summary>Makes the template; null where the amplifier is not specified over the whole supply range.</summary>
    /// <param name="requirement">What is needed.</param>
    /// <param name="kind">The circuit.</param>
    /// <param name="crystal">The crystal.</param>
    /// <param name="amplifier">Inverter, counter, port or transistor.</param>
    /// <param name="feedbackOhms">Feedback resistor of a gate in ohms.</param>
    public static CircuitTemplate? Create(
        Requirement requirement, CircuitKind kind, CrystalModel crystal, Part amplifier, double feedbackOhms)
    {
        ArgumentNullException.ThrowIfNull(requirement);
        var template = new CircuitTemplate(requirement, kind, crystal, amplifier, feedbackOhms);
        return template.TakeDevices(amplifier) ? template : null;
    }

    /// <summary>The circuit with values at a corner; capacitors move by their tolerances, strays by the board's uncertainty.</summary>
    /// <param name="values">Nominal values.</param>
    /// <param name="point">The operating point.</param>
    /// <param name="c1Tolerance">Tolerance of C1 as a ratio; matters only off the nominal capacitances.</param>
    /// <param name="c2Tolerance">Tolerance of C2 as a ratio; matters only off the nominal capacitances.</param>
    public OscillatorCircuit At(in CircuitValues values, OperatingPoint point, double c1Tolerance = 0, double c2Tolerance = 0)
    {
        ArgumentNullException.ThrowIfNull(point);
        double c1 = values.C1Farads * (1 + point.Capacitances * c1Tolerance);
        double c2 = values.C2Farads * (1 + point.Capacitances * c2Tolerance);
        Strays nominal = _requirement.Board.Strays;
        double scale = 1 + point.Capacitances * _requirement.Board.UncertaintyRatio;
        Strays strays = point.Capacitances == 0
            ? nominal
            : new Strays(nominal.InputFarads * scale, nominal.OutputFarads * scale, nominal.AcrossFarads * scale);
        if (Kind == CircuitKind.Follower)
        {
            return new FollowerCircuit
            {
                Crystal = Crystal.Crystal,
                C1Farads = c1,
                C2Farads = c2,
                Strays = strays,
                SupplyVolts = point.SupplyVolts,
                TemperatureCelsius = point.TemperatureCelsius,
                Transistor = _transistors[point.Strength],
                BaseTopOhms = values.BaseTopOhms,
                BaseBottomOhms = values.BaseBottomOhms,
                EmitterOhms = values.EmitterOhms,
            };
        }

        return new GateCircuit
        {
            Crystal = Crystal.Crystal,
            C1Farads = c1,
            C2Farads = c2,
            Strays = strays,
            SupplyVolts = point.SupplyVolts,
            TemperatureCelsius = point.TemperatureCelsius,
            Inverter = InverterAt(point),
            SeriesOhms = values.SeriesOhms,
            FeedbackOhms = _feedbackOhms,
        };
    }

    // The corners' devices are at hand; one between them is made when it is asked for.
    private Inverter InverterAt(OperatingPoint point) =>
        _inverters.TryGetValue((point.SupplyVolts, point.Strength), out Inverter? device) ? device
        : InverterModel.At((AmplifierPart)_amplifier, point.SupplyVolts, point.Strength)
            ?? throw new ArgumentOutOfRangeException(nameof(point), point, "The amplifier is not specified there.");

    private bool TakeDevices(Part amplifier)
    {
        if (amplifier is TransistorPart transistor)
        {
            foreach (DeviceStrength strength in Enum.GetValues<DeviceStrength>())
            {
                _transistors[strength] = TransistorModel.At(transistor, strength);
            }

            return transistor.VoltageMaxVolts is not { } most || most >= _requirement.SupplyMaxVolts;
        }

        var inverter = (AmplifierPart)amplifier;
        double middle = _requirement.NominalSupplyVolts;
        return Take(middle, DeviceStrength.Typical)
            && Take(_requirement.SupplyMinVolts, DeviceStrength.Weakest)
            && Take(_requirement.SupplyMinVolts, DeviceStrength.Strongest)
            && Take(_requirement.SupplyMaxVolts, DeviceStrength.Weakest)
            && Take(_requirement.SupplyMaxVolts, DeviceStrength.Strongest);

        bool Take(double supplyVolts, DeviceStrength strength)
        {
            if (InverterModel.At(inverter, supplyVolts, strength) is not { } device)
            {
                return false;
            }

            _inverters[(supplyVolts, strength)] = device;
            return true;
        }
    }
}
