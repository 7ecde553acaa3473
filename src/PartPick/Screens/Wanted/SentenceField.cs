using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>One value of the wanted sentence.</summary>
public abstract class SentenceField
{
    /// <summary>Makes a field.</summary>
    /// <param name="name">Its name, for messages.</param>
    protected SentenceField(string name)
    {
        Name = name;
    }

    /// <summary>Its name, for messages: "output frequency".</summary>
    public string Name { get; }

    /// <summary>What can be done with it, in a few words.</summary>
    /// <param name="requirement">The requirement.</param>
    public abstract string Help(Requirement requirement);

    /// <summary>Its words in the sentence.</summary>
    /// <param name="requirement">The requirement.</param>
    public abstract string Show(Requirement requirement);

    /// <summary>The text with which a key begins typing; null where it begins none.</summary>
    /// <param name="requirement">The requirement.</param>
    /// <param name="key">The key.</param>
    public virtual string? Begin(Requirement requirement, KeyPress key) => null;

    /// <summary>The requirement after a key that changes the value at once; null where the key does not.</summary>
    /// <param name="requirement">The requirement.</param>
    /// <param name="key">The key.</param>
    public virtual Requirement? Change(Requirement requirement, KeyPress key) => null;

    /// <summary>Whether a key asks for the next of a few choices.</summary>
    /// <param name="key">The key.</param>
    protected static bool IsNext(KeyPress key) => key is { Name: KeyName.Enter } or { Name: KeyName.Letter, Letter: ' ' };
}
