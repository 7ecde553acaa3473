using System.Collections.Immutable;
using System.Text.Json;
using System.Text.Json.Nodes;
using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>Which part stands where in a circuit, by ids: what is kept of a choice, and found again in today's catalogue.</summary>
/// <param name="Circuit">The circuit.</param>
/// <param name="Tap">Divider stage whose output is taken; zero for the oscillator itself.</param>
/// <param name="Ids">The ids by place: <c>crystal</c>, <c>amplifier</c>, <c>c1</c>, <c>c2</c>, <c>rs</c>, <c>rbTop</c> and so on.</param>
public sealed record ChosenParts(CircuitKind Circuit, int Tap, ImmutableSortedDictionary<string, string> Ids)
{
    private static readonly string[] Needed = ["crystal", "amplifier", "c1", "c2"];

    /// <summary>The ids of a choice with its support parts.</summary>
    /// <param name="choice">The choice.</param>
    /// <param name="support">Its support parts.</param>
    public static ChosenParts Of(CandidateParts choice, SupportParts support)
    {
        ArgumentNullException.ThrowIfNull(choice);
        ArgumentNullException.ThrowIfNull(support);
        var ids = ImmutableSortedDictionary.CreateBuilder<string, string>(StringComparer.Ordinal);
        Add("crystal", choice.Crystal);
        Add("amplifier", choice.Amplifier);
        Add("c1", choice.C1);
        Add("c2", choice.C2);
        Add("rs", choice.Series);
        Add("rbTop", choice.BaseTop);
        Add("rbBottom", choice.BaseBottom);
        Add("re", choice.Emitter);
        Add("rf", support.Feedback);
        Add("decoupling", support.Decoupling);
        Add("coupling", support.Coupling);
        return new ChosenParts(choice.Circuit, choice.Tap, ids.ToImmutable());

        void Add(string place, Part? part)
        {
            if (part is not null)
            {
                ids.Add(place, part.Id);
            }
        }
    }

    /// <summary>Reads what <see cref="ToJson"/> has written; null where the text is something else.</summary>
    /// <param name="json">The text.</param>
    public static ChosenParts? Read(string json)
    {
        try
        {
            JsonObject root = JsonNode.Parse(json)!.AsObject();
            var ids = root["parts"]!.AsObject()
                .ToImmutableSortedDictionary(pair => pair.Key, pair => pair.Value!.GetValue<string>(), StringComparer.Ordinal);
            return CircuitWords.ByWord.TryGetValue(root["circuit"]!.GetValue<string>(), out CircuitKind kind) && Needed.All(ids.ContainsKey)
                ? new ChosenParts(kind, root["tap"]!.GetValue<int>(), ids)
                : null;
        }
        catch (Exception error) when (error is JsonException or InvalidOperationException or NullReferenceException or FormatException)
        {
            return null;
        }
    }

    /// <summary>The choice as JSON.</summary>
    public JsonObject ToJson() => new()
    {
        ["circuit"] = Circuit.Word(),
        ["tap"] = Tap,
        ["parts"] = new JsonObject(Ids.Select(pair => KeyValuePair.Create(pair.Key, (JsonNode?)pair.Value))),
    };

    /// <summary>The parts of a catalogue that are meant; null where one is not there, or is of another kind.</summary>
    /// <param name="catalog">The catalogue.</param>
    public (CandidateParts Choice, SupportParts Support)? In(PartsCatalog catalog)
    {
        ArgumentNullException.ThrowIfNull(catalog);
        bool whole = true;
        if (Find<CrystalPart>("crystal") is not { } crystal || Find<Part>("amplifier") is not { } amplifier
            || Find<CapacitorPart>("c1") is not { } c1 || Find<CapacitorPart>("c2") is not { } c2 || !CanAmplify(amplifier))
        {
            return null;
        }

        var choice = new CandidateParts
        {
            Circuit = Circuit,
            Tap = Tap,
            Crystal = crystal,
            Amplifier = amplifier,
            C1 = c1,
            C2 = c2,
            Series = Find<ResistorPart>("rs"),
            BaseTop = Find<ResistorPart>("rbTop"),
            BaseBottom = Find<ResistorPart>("rbBottom"),
            Emitter = Find<ResistorPart>("re"),
        };
        var support = new SupportParts(Find<ResistorPart>("rf"), Find<CapacitorPart>("decoupling"), Find<CapacitorPart>("coupling"));
        return whole ? (choice, support) : null;

        T? Find<T>(string place)
            where T : Part
        {
            T? part = Ids.TryGetValue(place, out string? id) ? catalog.Find(id) as T : null;
            whole &= part is not null || id is null;
            return part;
        }
    }

    private bool CanAmplify(Part part) => Circuit switch
    {
        CircuitKind.Gate => part is InverterPart,
        CircuitKind.Counter => part is CounterPart,
        CircuitKind.Port => part is PortPart,
        _ => part is TransistorPart,
    };
}
