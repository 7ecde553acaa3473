namespace PartPick.Screens;

/// <summary>What a piece of text means on the screen; how it looks is the terminal's matter.</summary>
public enum Tone
{
    /// <summary>Plain text.</summary>
    Normal,

    /// <summary>Less important: rules, headings, what is waiting to be replaced.</summary>
    Quiet,

    /// <summary>More important.</summary>
    Strong,

    /// <summary>The one accent: a value that can be changed, the limit that is nearest.</summary>
    Accent,

    /// <summary>What is chosen.</summary>
    Chosen,

    /// <summary>What has the accent or is to be watched, within what is chosen.</summary>
    ChosenAccent,

    /// <summary>The place where typing goes.</summary>
    Caret,

    /// <summary>Something is wrong or to be watched; always said in words or marks too.</summary>
    Warning,
}
