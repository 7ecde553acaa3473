namespace PartPick.Screens;

/// <summary>What became of a key in the sentence.</summary>
public enum SentenceAnswer
{
    /// <summary>The sentence has no use for it.</summary>
    NotMine,

    /// <summary>It is done.</summary>
    Done,

    /// <summary>The way leads out of the sentence, to the list.</summary>
    Leave,
}
