using System.Collections.Immutable;
using System.Globalization;
using PartPick.Values;

namespace PartPick.Catalog.Fields;

/// <summary>The numbered columns of the supply points, and the way to the points and back.</summary>
internal static class PointFields
{
    private const int Most = 4;

    private static readonly PartField[] OfOnePoint =
    [
        new("supply", Dimension.Voltage, "V"), new("gmMin", Dimension.Transconductance, "mS", -3),
        new("gm", Dimension.Transconductance, "mS", -3), new("gmMax", Dimension.Transconductance, "mS", -3),
        new("ro", Dimension.Resistance, "ohm"), new("ron", Dimension.Resistance, "ohm"), new("gain", Dimension.Number),
        new("delay", Dimension.Time, "ns", -9), new("clockMin", Dimension.Frequency, "MHz", 6),
        new("clock", Dimension.Frequency, "MHz", 6),
    ];

    /// <summary>The columns of all points, point by point.</summary>
    public static IEnumerable<PartField> All => Enumerable.Range(1, Most)
        .SelectMany(number => OfOnePoint.Select(column => column with { Key = Numbered(column.Key, number) }));

    public static ImmutableArray<SupplyPoint> Read(DraftReader reader, bool buffered, bool needsGm)
    {
        var points = ImmutableArray.CreateBuilder<SupplyPoint>();
        for (int number = 1; number <= Most; number++)
        {
            string Key(string key) => Numbered(key, number);
            if (OfOnePoint.All(field => reader.Number(Key(field.Key)) is null))
            {
                continue;
            }

            if (points.Count != number - 1)
            {
                reader.Report(Key("supply"), "comes after an empty point", "points numbered without a gap");
            }

            points.Add(new SupplyPoint
            {
                SupplyVolts = reader.Required(Key("supply")),
                GmMinSiemens = reader.Number(Key("gmMin")),
                GmSiemens = reader.Number(Key("gm")),
                GmMaxSiemens = reader.Number(Key("gmMax")),
                RoOhms = reader.Number(Key("ro")),
                RonOhms = reader.Number(Key("ron")),
                Gain = reader.Number(Key("gain")),
                DelaySeconds = reader.Number(Key("delay")),
                ClockMinHz = reader.Number(Key("clockMin")),
                ClockHz = reader.Number(Key("clock")),
            });
            Check(reader, Key, buffered, needsGm);
        }

        CheckSupplies(reader, points);
        return points.ToImmutable();
    }

    public static void Fill(ImmutableArray<SupplyPoint> points, PartDraft draft)
    {
        if (points.Length > Most)
        {
            throw new ArgumentException($"A file holds at most {Most} supply points.", nameof(points));
        }

        for (int i = 0; i < points.Length; i++)
        {
            SupplyPoint point = points[i];
            string Key(string key) => Numbered(key, i + 1);
            draft.Set(Key("supply"), point.SupplyVolts);
            draft.Set(Key("gmMin"), point.GmMinSiemens);
            draft.Set(Key("gm"), point.GmSiemens);
            draft.Set(Key("gmMax"), point.GmMaxSiemens);
            draft.Set(Key("ro"), point.RoOhms);
            draft.Set(Key("ron"), point.RonOhms);
            draft.Set(Key("gain"), point.Gain);
            draft.Set(Key("delay"), point.DelaySeconds);
            draft.Set(Key("clockMin"), point.ClockMinHz);
            draft.Set(Key("clock"), point.ClockHz);
        }
    }

    private static void Check(DraftReader reader, Func<string, string> key, bool buffered, bool needsGm)
    {
        if (needsGm)
        {
            reader.Required(key("gm"));
        }

        if (buffered)
        {
            reader.Required(key("gain"));
            reader.Required(key("ron"));
        }

        foreach (string other in buffered ? new[] { "ro" } : ["ron", "gain"])
        {
            if (reader.Number(key(other)) is not null)
            {
                reader.Report(key(other), $"does not go with {(buffered ? "several stages" : "one stage")}", "an empty cell");
            }
        }

        reader.Ascending(key("gmMin"), key("gm"), key("gmMax"));
        reader.Ascending(key("clockMin"), key("clock"));
    }

    private static void CheckSupplies(DraftReader reader, ImmutableArray<SupplyPoint>.Builder points)
    {
        if (points.Count == 0)
        {
            reader.Report(Numbered("supply", 1), "is missing", "at least one supply voltage with its figures");
        }

        for (int i = 1; i < points.Count; i++)
        {
            if (points[i].SupplyVolts <= points[i - 1].SupplyVolts)
            {
                reader.Report(Numbered("supply", i + 1), "does not ascend", "supply voltages in ascending order");
            }
        }
    }

    private static string Numbered(string key, int number) => string.Create(CultureInfo.InvariantCulture, $"{key} {number}");
}
