using System.Collections.Immutable;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>A choice of the wanted sentence.</summary>
/// <param name="Key">The letter that picks it.</param>
/// <param name="Words">Its words in the sentence.</param>
/// <param name="Holds">Whether a requirement has it.</param>
/// <param name="Set">Gives a requirement this choice.</param>
public sealed record SentenceChoice(
    char Key, string Words, Func<Requirement, bool> Holds, Func<Requirement, Requirement> Set);

/// <summary>A value that is one of a few.</summary>
public sealed class ChoiceField : SentenceField
{
    private readonly ImmutableArray<SentenceChoice> _choices;

    /// <summary>Makes a field.</summary>
    /// <param name="name">Its name.</param>
    /// <param name="choices">The choices.</param>
    public ChoiceField(string name, IEnumerable<SentenceChoice> choices)
        : base(name)
    {
        _choices = [.. choices];
    }

    /// <inheritdoc/>
    public override string Help(Requirement requirement) =>
        "Space: " + string.Join(", ", _choices.Select(choice => choice.Words));

    /// <inheritdoc/>
    public override string Show(Requirement requirement) => _choices[IndexOf(requirement)].Words;

    /// <inheritdoc/>
    public override Requirement? Change(Requirement requirement, KeyPress key) =>
        IsNext(key) ? Next(requirement) : key.Name == KeyName.Letter ? Pick(requirement, key.Letter) : null;

    /// <summary>The requirement with the next choice.</summary>
    /// <param name="requirement">The requirement.</param>
    public Requirement Next(Requirement requirement) =>
        _choices[(IndexOf(requirement) + 1) % _choices.Length].Set(requirement);

    /// <summary>The requirement with the choice that a letter picks; null where it picks none.</summary>
    /// <param name="requirement">The requirement.</param>
    /// <param name="letter">The letter.</param>
    public Requirement? Pick(Requirement requirement, char letter) =>
        _choices.FirstOrDefault(choice => choice.Key == char.ToLowerInvariant(letter))?.Set(requirement);

    private int IndexOf(Requirement requirement)
    {
        for (int i = 0; i < _choices.Length; i++)
        {
            if (_choices[i].Holds(requirement))
            {
                return i;
            }
        }

        throw new InvalidOperationException($"The requirement has none of the choices of {Name}.");
    }
}
