namespace PartPick.Screens;

/// <summary>The keys that the screens know.</summary>
public enum KeyName
{
    /// <summary>A letter, digit or sign; <see cref="KeyPress.Letter"/> says which.</summary>
    Letter,

    /// <summary>Enter.</summary>
    Enter,

    /// <summary>Esc.</summary>
    Escape,

    /// <summary>Tab.</summary>
    Tab,

    /// <summary>Shift and Tab.</summary>
    BackTab,

    /// <summary>Arrow up.</summary>
    Up,

    /// <summary>Arrow down.</summary>
    Down,

    /// <summary>Arrow left.</summary>
    Left,

    /// <summary>Arrow right.</summary>
    Right,

    /// <summary>A page up.</summary>
    PageUp,

    /// <summary>A page down.</summary>
    PageDown,

    /// <summary>Home.</summary>
    Home,

    /// <summary>End.</summary>
    End,

    /// <summary>Backspace.</summary>
    Backspace,

    /// <summary>Delete.</summary>
    Delete,
}

/// <summary>A key that was pressed.</summary>
/// <param name="Name">Which key.</param>
/// <param name="Letter">The letter, digit or sign; zero for all other keys.</param>
public readonly record struct KeyPress(KeyName Name, char Letter = '\0')
{
    /// <summary>A press of a letter.</summary>
    /// <param name="letter">The letter.</param>
    public static KeyPress Of(char letter) => new(KeyName.Letter, letter);
}
