using System.Collections.Immutable;
using System.Globalization;
using PartPick.Values;

namespace PartPick.Catalog.Fields;

internal sealed class CounterShape() : AmplifierShape(PartKind.Counter, Text("taps"))
{
    protected override AmplifierPart BuildAmplifier(DraftReader reader, string id, string description, Offer offer) =>
        new CounterPart { Id = id, Description = description, Offer = offer, Stages = 1, Points = [], Taps = ReadTaps(reader) };

    protected override void FillOwn(Part part, PartDraft draft)
    {
        base.FillOwn(part, draft);
        draft.Set("taps", string.Join(';', ((CounterPart)part).Taps.Select(tap => tap.ToString(CultureInfo.InvariantCulture))));
    }

    private static ImmutableArray<int> ReadTaps(DraftReader reader)
    {
        var taps = ImmutableArray.CreateBuilder<int>();
        foreach (string entry in reader.RequiredText("taps").Split(';', StringSplitOptions.RemoveEmptyEntries))
        {
            if (!int.TryParse(entry.Trim(), NumberStyles.None, CultureInfo.InvariantCulture, out int tap)
                || tap is < 1 or > 62
                || (taps.Count > 0 && tap <= taps[^1]))
            {
                reader.Report("taps", $"{Problem.Quote(entry)} is no further stage", "ascending stages from 1 to 62 such as 4;5;6;7");
                return [];
            }

            taps.Add(tap);
        }

        return taps.ToImmutable();
    }
}
