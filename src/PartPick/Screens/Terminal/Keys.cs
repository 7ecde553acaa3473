using Terminal.Gui.Input;

namespace PartPick.Screens;

/// <summary>Turns the terminal's keys into those that the screens know.</summary>
internal static class Keys
{
    private static readonly Dictionary<Key, KeyName> Named = new()
    {
        [Key.Enter] = KeyName.Enter,
        [Key.Esc] = KeyName.Escape,
        [Key.Tab] = KeyName.Tab,
        [Key.Tab.WithShift] = KeyName.BackTab,
        [Key.CursorUp] = KeyName.Up,
        [Key.CursorDown] = KeyName.Down,
        [Key.CursorLeft] = KeyName.Left,
        [Key.CursorRight] = KeyName.Right,
        [Key.PageUp] = KeyName.PageUp,
        [Key.PageDown] = KeyName.PageDown,
        [Key.Home] = KeyName.Home,
        [Key.End] = KeyName.End,
        [Key.Backspace] = KeyName.Backspace,
        [Key.Delete] = KeyName.Delete,
    };

    /// <summary>The key; null where the screens have no use for it.</summary>
    public static KeyPress? Of(Key key)
    {
        if (Named.TryGetValue(key, out KeyName name))
        {
            return new KeyPress(name);
        }

        return key.IsCtrl || key.IsAlt || key.AsRune is not { Value: >= ' ' and <= 0xffff } rune
            ? null
            : KeyPress.Of((char)rune.Value);
    }
}
