using System.Globalization;

namespace PartPick.Selection;

/// <summary>The identifier of a choice: the ids of its parts, in a fixed order.</summary>
public static class CandidateId
{
    /// <summary>Makes the identifier.</summary>
    public static string Of(CandidateParts choice)
    {
        ArgumentNullException.ThrowIfNull(choice);
        string?[] parts =
        [
            choice.Circuit.ToString().ToLowerInvariant(),
            choice.Crystal.Id,
            choice.Amplifier.Id,
            choice.Tap > 0 ? string.Create(CultureInfo.InvariantCulture, $"stage{choice.Tap}") : null,
            choice.C1.Id,
            choice.C2.Id,
            choice.Series?.Id,
            choice.BaseTop?.Id,
            choice.BaseBottom?.Id,
            choice.Emitter?.Id,
        ];
        return string.Join('+', parts.Where(part => part is not null));
    }
}
