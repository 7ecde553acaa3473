using CsCheck;
using PartPick.Physics;
using PartPick.Physics.Circuits;
using PartPick.Physics.Devices;

namespace PartPick.Selection.Tests.Circuits;

public class CircuitFileRoundTripTests
{
    private static readonly Gen<double> Positive =
        Gen.Double[-15, 9].Select(Gen.Double[1, 10], (power, digits) => digits * Math.Pow(10, power));

    private static readonly Gen<Crystal> Crystals = Gen.Select(Positive, Positive.Nullable(), Positive, Positive, Positive)
        .Select((nominal, load, shunt, motional, resistance) => new Crystal
        {
            NominalHz = nominal,
            LoadFarads = load,
            ShuntFarads = shunt,
            MotionalFarads = motional,
            ResistanceOhms = resistance,
        });

    private static readonly Gen<CircuitDescription> Gates = Gen.Select(Crystals, Positive.Array[12], Gen.Bool, Gen.Bool, Gen.Int[0, 30])
        .Select((crystal, values, buffered, ideal, tap) => new CircuitDescription
        {
            Kind = ideal ? CircuitKind.Counter : CircuitKind.Port,
            Tap = tap,
            TargetHz = ideal ? null : values[0],
            Ratings = ideal ? CrystalRatings.None : new CrystalRatings { DriveLevelWatts = values[1], ToleranceRatio = values[2] },
            Circuit = new GateCircuit
            {
                Crystal = crystal,
                C1Farads = values[3],
                C2Farads = values[4],
                SupplyVolts = values[5],
                TemperatureCelsius = ideal ? -40.1 : 25,
                SeriesOhms = ideal ? 0 : values[6],
                FeedbackOhms = ideal ? double.PositiveInfinity : values[7],
                Strays = new Strays(values[8], 0, values[9]),
                Inverter = buffered
                    ? new BufferedInverter(values[10], values[11]) { DelaySeconds = values[1], InputFarads = values[2] }
                    : new OneStageInverter(values[10], ideal ? double.PositiveInfinity : values[11])
                    {
                        ThresholdVolts = values[1],
                        SwingVolts = ideal ? null : values[2],
                    },
            },
        });

    private static readonly Gen<CircuitDescription> Followers = Gen.Select(Crystals, Positive.Array[12], Gen.Bool)
        .Select((crystal, values, given) => new CircuitDescription
        {
            Kind = CircuitKind.Follower,
            Circuit = new FollowerCircuit
            {
                Crystal = crystal,
                C1Farads = values[0],
                C2Farads = values[1],
                SupplyVolts = values[2],
                BaseTopOhms = values[3],
                BaseBottomOhms = given ? double.PositiveInfinity : values[4],
                EmitterOhms = values[5],
                LoadOhms = given ? double.PositiveInfinity : values[6],
                EmitterCurrentAmps = given ? values[7] : null,
                Transistor = new Transistor
                {
                    Beta = values[8],
                    JunctionFarads = values[9],
                    TransitSeconds = values[10],
                    BaseEmitterVolts = values[11],
                },
            },
        });

    [Fact]
    public void Reading_what_was_written_gives_exactly_the_same_numbers() =>
        Gen.OneOf(Gates, Followers).Sample(
            description => CircuitFile.Read(CircuitFile.Write(description).ToJsonString(), "c.json").Value == description, iter: 2000);

    [Fact]
    public void Written_file_holds_no_part_references()
    {
        CircuitDescription plain = CircuitTexts.Read(CircuitTexts.Gate);
        CircuitDescription named = plain with { Crystal = Catalog.PartsCatalog.BuiltIn().Crystals[0] };

        Assert.Equal(CircuitFile.Write(plain).ToJsonString(), CircuitFile.Write(named).ToJsonString());
    }
}
