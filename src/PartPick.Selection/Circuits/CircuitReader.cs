using System.Text.Json;
using PartPick.Catalog;
using PartPick.Physics;
using PartPick.Physics.Circuits;
using PartPick.Selection.Files;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>Reads the outermost object of a circuit file.</summary>
internal sealed class CircuitReader
{
    private static readonly string[] Shared =
        ["circuit", "crystal", "amplifier", "c1", "c2", "strays", "supply", "temperature", "tap", "target"];

    private static readonly string[] GateKeys = [.. Shared, "rs", "rf"];
    private static readonly string[] FollowerKeys = [.. Shared, "rb", "rbTop", "rbBottom", "re", "rl", "emitterCurrent"];

    private readonly ProblemBox _box = new();
    private readonly FieldReader _fields;
    private readonly PartsCatalog? _catalog;

    private CircuitReader(JsonElement root, string fileName, PartsCatalog? catalog)
    {
        _fields = FieldReader.Of(root, fileName + ": ", _box);
        _catalog = catalog;
    }

    public static Result<CircuitDescription> Read(JsonElement root, string fileName, PartsCatalog? catalog) =>
        new CircuitReader(root, fileName, catalog).Read();

    private Result<CircuitDescription> Read()
    {
        if (_fields.Word("circuit", CircuitWords.ByWord) is not { } kind)
        {
            _fields.Reject("circuit", "is missing", "one of " + string.Join(", ", CircuitWords.ByWord.Keys));
            return _box.Result<CircuitDescription>(() => throw new InvalidOperationException("There is no circuit."));
        }

        _fields.Allow(kind == CircuitKind.Follower ? "a follower circuit" : $"a {kind.Word()} circuit",
            kind == CircuitKind.Follower ? FollowerKeys : GateKeys);
        CircuitCommon common = ReadCommon(kind);
        OscillatorCircuit circuit = kind == CircuitKind.Follower
            ? FollowerFields.Read(_fields, common, _catalog, out Part? amplifier)
            : GateFields.Read(_fields, common, _catalog, out amplifier);
        CapacitanceCheck.Of(_fields, circuit);
        int tap = (int)(_fields.Optional("tap", Dimension.Count) ?? 0);
        if (tap > 30)
        {
            _fields.Reject("tap", $"stage {tap} divides beyond all use", "a stage from 0 to 30");
        }

        double? target = _fields.Optional("target", Dimension.Frequency, positive: true);
        return _box.Result(() => new CircuitDescription
        {
            Kind = kind,
            Circuit = circuit,
            Tap = tap,
            TargetHz = target,
            Ratings = common.Ratings,
            Crystal = common.CrystalPart,
            Amplifier = amplifier,
            C1 = common.C1Part,
            C2 = common.C2Part,
        });
    }

    private CircuitCommon ReadCommon(CircuitKind kind)
    {
        (Crystal crystal, CrystalRatings ratings, CrystalPart? part) = ReadCrystal();
        (double c1, CapacitorPart? c1Part) = ReadCapacitor("c1");
        (double c2, CapacitorPart? c2Part) = ReadCapacitor("c2");
        return new CircuitCommon
        {
            Kind = kind,
            Crystal = crystal,
            Ratings = ratings,
            CrystalPart = part,
            C1Farads = c1,
            C1Part = c1Part,
            C2Farads = c2,
            C2Part = c2Part,
            Strays = StrayFields.Read(_fields.Object("strays", StrayFields.Fits)),
            SupplyVolts = _fields.Needed("supply", Dimension.Voltage),
            TemperatureCelsius = _fields.Optional("temperature", Dimension.Temperature) ?? 25,
        };
    }

    private (Crystal Crystal, CrystalRatings Ratings, CrystalPart? Part) ReadCrystal()
    {
        const string fits = "an object with frequency, motional and resistance, or with the id of a part";
        FieldReader? fields = _fields.Object("crystal", fits);
        if (fields is null)
        {
            _fields.Reject("crystal", "is missing", fits);
            return (new Crystal { NominalHz = 1, MotionalFarads = 1, ResistanceOhms = 1 }, CrystalRatings.None, null);
        }

        if (PartReference.Find<CrystalPart>(fields, _catalog, "a crystal of the catalogue") is { } part)
        {
            return (PartPhysics.Crystal(part), PartPhysics.Ratings(part), part);
        }

        (Crystal crystal, CrystalRatings ratings) = CrystalFields.Read(fields);
        return (crystal, ratings, null);
    }

    private (double Farads, CapacitorPart? Part) ReadCapacitor(string key)
    {
        if (_fields.Raw(key) is not { Value.ValueKind: JsonValueKind.Object })
        {
            return (_fields.Optional(key, Dimension.Capacitance) ?? 0, null);
        }

        FieldReader fields = _fields.Object(key, "a capacitance, or the id of a part")!;
        if (!fields.Has(PartReference.Key))
        {
            fields.Reject(PartReference.Key, "is missing", "a capacitance such as 22 pF, or the id of a capacitor");
        }

        CapacitorPart? part = PartReference.Find<CapacitorPart>(fields, _catalog, "a capacitor of the catalogue");
        return (part?.ValueFarads ?? 0, part);
    }
}
