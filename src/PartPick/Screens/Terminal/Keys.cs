using System.Collections.Immutable;
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

    /// <summary>The keys; none where the screens have no use for it.</summary>
    /// <remarks>
    /// Esc and a key that follow each other fast, as they do on a slow line, arrive as that key with Alt: they are taken apart.
    /// </remarks>
    public static ImmutableArray<KeyPress> Of(Key key)
    {
        if (key.IsAlt)
        {
            return [new KeyPress(KeyName.Escape), .. Of(key.NoAlt)];
        }

        if (Named.TryGetValue(key, out KeyName name))
        {
            return [new KeyPress(name)];
        }

        return key.IsCtrl || key.AsRune is not { Value: >= ' ' and <= 0xffff } rune ? [] : [KeyPress.Of((char)rune.Value)];
    }
}
