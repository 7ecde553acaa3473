namespace PartPick.Screens;

/// <summary>A text that is being typed, and where the next letter goes.</summary>
/// <param name="text">The text to begin with; the caret stands behind it.</param>
/// <param name="longest">The most letters.</param>
public sealed class TypedText(string text, int longest = TypedText.Usual)
{
    private const int Usual = 60;

    /// <summary>The text.</summary>
    public string Text { get; private set; } = text;

    /// <summary>Where the next letter goes, from zero.</summary>
    public int Caret { get; private set; } = text.Length;

    /// <summary>Takes a key.</summary>
    /// <param name="key">The key.</param>
    /// <returns>Whether the text is another one now.</returns>
    public bool Press(KeyPress key)
    {
        string before = Text;
        switch (key.Name)
        {
            case KeyName.Left:
                Caret = Math.Max(0, Caret - 1);
                break;
            case KeyName.Right:
                Caret = Math.Min(Text.Length, Caret + 1);
                break;
            case KeyName.Home:
                Caret = 0;
                break;
            case KeyName.End:
                Caret = Text.Length;
                break;
            case KeyName.Backspace when Caret > 0:
                Text = Text.Remove(--Caret, 1);
                break;
            case KeyName.Delete when Caret < Text.Length:
                Text = Text.Remove(Caret, 1);
                break;
            case KeyName.Letter when !char.IsControl(key.Letter) && Text.Length < longest:
                Text = Text.Insert(Caret++, key.Letter.ToString());
                break;
        }

        return Text != before;
    }
}
