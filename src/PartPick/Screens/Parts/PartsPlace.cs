namespace PartPick.Screens;

/// <summary>Where the keys go within the screens of the catalogue.</summary>
public enum PartsPlace
{
    /// <summary>The list of parts.</summary>
    List,

    /// <summary>One part.</summary>
    Part,

    /// <summary>The import of a list.</summary>
    Import,
}
