using System.Collections.Immutable;

namespace PartPick.Screens;

/// <summary>Moves through the values of the sentence.</summary>
/// <param name="start">Number of the value to begin at, from zero.</param>
internal sealed class SentenceWalk(int start)
{
    /// <summary>Number of the value that is chosen, from zero.</summary>
    public int At { get; private set; } = start;

    /// <summary>Takes a key.</summary>
    /// <param name="key">The key.</param>
    /// <param name="places">Where each value begins.</param>
    /// <returns>What became of it; null where it does not move.</returns>
    public SentenceAnswer? Press(KeyPress key, ImmutableArray<(int Row, int Column)> places)
    {
        int last = places.Length - 1;
        return key.Name switch
        {
            KeyName.Escape => SentenceAnswer.Leave,
            KeyName.Tab => At == last ? SentenceAnswer.Leave : To(At + 1),
            KeyName.BackTab => At == 0 ? SentenceAnswer.Leave : To(At - 1),
            KeyName.Right => To(Math.Min(At + 1, last)),
            KeyName.Left => To(Math.Max(At - 1, 0)),
            KeyName.Home => To(0),
            KeyName.End => To(last),
            KeyName.Up => Row(-1, places) ?? SentenceAnswer.Done,
            KeyName.Down => Row(1, places) ?? SentenceAnswer.Leave,
            _ => null,
        };
    }

    private SentenceAnswer To(int at)
    {
        At = at;
        return SentenceAnswer.Done;
    }

    // To the nearest value of the row above or below; null where there is none.
    private SentenceAnswer? Row(int step, ImmutableArray<(int Row, int Column)> places)
    {
        (int row, int column) = places[At];
        var there = Enumerable.Range(0, places.Length).Where(i => places[i].Row == row + step).ToList();
        return there.Count == 0 ? null : To(there.MinBy(i => Math.Abs(places[i].Column - column)));
    }
}
