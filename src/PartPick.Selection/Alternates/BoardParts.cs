using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>Every part of one circuit: those that a ranking varies and those that the circuit needs besides.</summary>
/// <param name="Choice">The parts that a ranking varies.</param>
/// <param name="Support">Feedback resistor, decoupling and coupling capacitor.</param>
public sealed record BoardParts(CandidateParts Choice, SupportParts Support)
{
    /// <summary>The parts of a choice with the support parts that a market offers for it.</summary>
    public static BoardParts Of(CandidateParts choice, Market market)
    {
        ArgumentNullException.ThrowIfNull(choice);
        return new BoardParts(choice, SupportParts.For(choice.Circuit, choice.Crystal.FrequencyHz, market));
    }

    /// <summary>The parts of an analysed circuit.</summary>
    /// <param name="candidate">The circuit.</param>
    public static BoardParts Of(Candidate candidate)
    {
        ArgumentNullException.ThrowIfNull(candidate);
        return new BoardParts(
            candidate.Choice,
            new SupportParts(
                In(PartRoles.Feedback) as ResistorPart,
                In(PartRoles.Decoupling) as CapacitorPart,
                In(PartRoles.Coupling) as CapacitorPart));

        Part? In(string role) => candidate.Parts.FirstOrDefault(use => use.Role == role)?.Part;
    }

    /// <summary>The places that hold a part, in the order of the parts list.</summary>
    public ImmutableArray<PartPlace> Places => [.. Enum.GetValues<PartPlace>().Where(place => At(place) is not null)];

    /// <summary>The part in a place; null where there is none.</summary>
    public Part? At(PartPlace place) => place switch
    {
        PartPlace.C1 => Choice.C1,
        PartPlace.C2 => Choice.C2,
        PartPlace.Decoupling => Support.Decoupling,
        PartPlace.Coupling => Support.Coupling,
        PartPlace.Series => Choice.Series,
        PartPlace.Feedback => Support.Feedback,
        PartPlace.BaseTop => Choice.BaseTop,
        PartPlace.BaseBottom => Choice.BaseBottom,
        PartPlace.Emitter => Choice.Emitter,
        PartPlace.Amplifier => Choice.Amplifier,
        PartPlace.Crystal => Choice.Crystal,
        _ => throw new ArgumentOutOfRangeException(nameof(place), place, "There is no such place."),
    };

    /// <summary>The same circuit with another part in a place.</summary>
    /// <param name="place">The place.</param>
    /// <param name="part">The part, of the kind that stands there.</param>
    public BoardParts With(PartPlace place, Part part) => place switch
    {
        PartPlace.C1 => this with { Choice = Choice with { C1 = (CapacitorPart)part } },
        PartPlace.C2 => this with { Choice = Choice with { C2 = (CapacitorPart)part } },
        PartPlace.Decoupling => this with { Support = Support with { Decoupling = (CapacitorPart)part } },
        PartPlace.Coupling => this with { Support = Support with { Coupling = (CapacitorPart)part } },
        PartPlace.Series => this with { Choice = Choice with { Series = (ResistorPart)part } },
        PartPlace.Feedback => this with { Support = Support with { Feedback = (ResistorPart)part } },
        PartPlace.BaseTop => this with { Choice = Choice with { BaseTop = (ResistorPart)part } },
        PartPlace.BaseBottom => this with { Choice = Choice with { BaseBottom = (ResistorPart)part } },
        PartPlace.Emitter => this with { Choice = Choice with { Emitter = (ResistorPart)part } },
        PartPlace.Amplifier => this with { Choice = Choice with { Amplifier = part } },
        PartPlace.Crystal => this with { Choice = Choice with { Crystal = (CrystalPart)part } },
        _ => throw new ArgumentOutOfRangeException(nameof(place), place, "There is no such place."),
    };
}
