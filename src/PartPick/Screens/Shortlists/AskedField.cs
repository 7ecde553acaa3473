namespace PartPick.Screens;

/// <summary>
/// A field that is asked for in place. The first letter typed into a field that was not touched replaces what stands there.
/// </summary>
/// <param name="name">Its name.</param>
/// <param name="text">What stands there at first.</param>
/// <param name="longest">The most letters.</param>
internal sealed class AskedField(string name, string text, int longest)
{
    private TypedText _typed = new(text, longest);
    private bool _untouched = true;

    /// <summary>Its name.</summary>
    public string Name => name;

    /// <summary>What stands there.</summary>
    public string Text => _typed.Text;

    /// <summary>Where the next letter goes.</summary>
    public int Caret => _typed.Caret;

    /// <summary>Takes a key.</summary>
    public void Press(KeyPress key)
    {
        if (_untouched && key.Name == KeyName.Letter)
        {
            _typed = new TypedText("", longest);
        }

        _untouched = false;
        _typed.Press(key);
    }
}
