using System.Collections.Immutable;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>Which circuits may be used: any set of them but the empty one.</summary>
public sealed class CircuitsField() : SentenceField("circuits")
{
    private static readonly ImmutableArray<CircuitKind> Every = [.. Enum.GetValues<CircuitKind>()];

    /// <inheritdoc/>
    public override string Help(Requirement requirement) =>
        "g c p f: gate, counter, port, follower";

    /// <inheritdoc/>
    public override string Show(Requirement requirement)
    {
        ArgumentNullException.ThrowIfNull(requirement);
        CircuitKind[] chosen = [.. Every.Where(kind => requirement.Circuits.Contains(kind))];
        return chosen.Length == Every.Length
            ? "any circuit"
            : string.Join(" or ", chosen.Select(kind => kind.Word())) + (chosen.Length == 1 ? " alone" : "");
    }

    /// <inheritdoc/>
    public override Requirement? Change(Requirement requirement, KeyPress key) =>
        IsNext(key) ? Next(requirement) : key.Name == KeyName.Letter ? Toggle(requirement, key.Letter) : null;

    /// <summary>Puts a circuit in or takes it out.</summary>
    /// <param name="requirement">The requirement.</param>
    /// <param name="letter">First letter of the circuit.</param>
    /// <returns>The requirement; the same one where the last circuit would go; null where no circuit begins so.</returns>
    public static Requirement? Toggle(Requirement requirement, char letter)
    {
        ArgumentNullException.ThrowIfNull(requirement);
        foreach (CircuitKind kind in Every)
        {
            if (kind.Word()[0] == char.ToLowerInvariant(letter))
            {
                ImmutableArray<CircuitKind> circuits =
                    [.. Every.Where(other => requirement.Circuits.Contains(other) != (other == kind))];
                return circuits.IsEmpty ? requirement : requirement with { Circuits = circuits };
            }
        }

        return null;
    }

    /// <summary>Any circuit, then each one alone, then any again.</summary>
    /// <param name="requirement">The requirement.</param>
    public static Requirement Next(Requirement requirement)
    {
        ArgumentNullException.ThrowIfNull(requirement);
        int next = requirement.Circuits.Length == 1 ? Every.IndexOf(requirement.Circuits[0]) + 1 : 0;
        return requirement with { Circuits = next < Every.Length ? [Every[next]] : Every };
    }
}
