namespace PartPick.Screens;

/// <summary>What a key meant to a page of the catalogue's screens.</summary>
public enum PartsAnswer
{
    /// <summary>It was taken.</summary>
    Taken,

    /// <summary>It is for someone else.</summary>
    NotMine,

    /// <summary>The page is to be left.</summary>
    Leave,

    /// <summary>What is chosen is to be opened.</summary>
    Open,
}
