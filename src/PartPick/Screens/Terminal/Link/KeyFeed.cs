using System.Collections.Concurrent;
using System.Text;
using Terminal.Gui.App;
using Terminal.Gui.Drivers;
using Terminal.Gui.Input;

namespace PartPick.Screens;

/// <summary>
/// Hands what was typed to the toolkit, which tells keys apart. Esc is told apart here: the toolkit takes Esc and a letter that arrive
/// together, as on a slow line, for one key, and loses both where a third follows at once.
/// </summary>
/// <param name="app">The toolkit.</param>
internal sealed class KeyFeed(IApplication app)
{
    private const char Escape = '\x1b';

    // An Esc that nothing follows within this time is the key and not the beginning of another key's sequence.
    private static readonly TimeSpan Alone = TimeSpan.FromMilliseconds(50);

    private readonly ConcurrentQueue<string> _typed = new();
    private readonly InputProcessorImpl<char> _keys = (InputProcessorImpl<char>)app.Driver!.GetInputProcessor();
    private bool _holdsEscape;
    private long _heldSince;

    /// <summary>Takes what was typed; called from any thread.</summary>
    /// <param name="typed">The signs.</param>
    public void Take(ReadOnlySpan<char> typed) => _typed.Enqueue(typed.ToString());

    /// <summary>Hands on what was taken. Called on the screen's thread.</summary>
    public void HandOn()
    {
        while (_typed.TryDequeue(out string? typed))
        {
            HandOn(typed);
        }

        if (_holdsEscape && TimeProvider.System.GetElapsedTime(_heldSince) > Alone)
        {
            _holdsEscape = false;
            app.Keyboard.RaiseKeyDownEvent(Key.Esc);
        }
    }

    private void HandOn(string typed)
    {
        var text = new StringBuilder();
        foreach (char sign in typed)
        {
            if (_holdsEscape)
            {
                _holdsEscape = false;
                if (sign is '[' or 'O')
                {
                    text.Append(Escape).Append(sign);
                    continue;
                }

                Type(text);
                app.Keyboard.RaiseKeyDownEvent(Key.Esc);
            }

            if (sign == Escape)
            {
                _holdsEscape = true;
                _heldSince = TimeProvider.System.GetTimestamp();
            }
            else
            {
                text.Append(sign);
            }
        }

        Type(text);
    }

    private void Type(StringBuilder text)
    {
        for (int i = 0; i < text.Length; i++)
        {
            _keys.InputQueue.Enqueue(text[i]);
        }

        _keys.ProcessQueue();
        text.Clear();
    }
}
