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
}
