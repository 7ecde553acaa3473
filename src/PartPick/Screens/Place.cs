namespace PartPick.Screens;

/// <summary>Where the keys go.</summary>
public enum Place
{
    /// <summary>The ranked list.</summary>
    List,

    /// <summary>The wanted sentence.</summary>
    Sentence,

    /// <summary>The page of one circuit.</summary>
    Circuit,

    /// <summary>The screens of the catalogue.</summary>
    Parts,
}
