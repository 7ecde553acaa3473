using System.Text;
using Terminal.Gui.Drawing;

namespace PartPick.Screens;

/// <summary>The terminal: taken over, shown cells, and given back as it was.</summary>
/// <remarks>
/// All that is sent is in ECMA-48 and understood by a VT100, but for the alternate screen and the hidden cursor, which are asked for
/// only where the terminal's name says that it has them. Nothing is ever asked of the terminal, so no answer can arrive as keys.
/// </remarks>
internal sealed class TerminalLink : IDisposable
{
    private const string AlternateScreen = "\x1b[?1049h";
    private const string MainScreen = "\x1b[?1049l";
    private const string HideCursor = "\x1b[?25l";
    private const string ShowCursor = "\x1b[?25h";
    private const string PlainAndClear = "\x1b[m\x1b[H\x1b[2J";

    // Whatever the platform's console asked for: cursor keys and keypad as a terminal has them at first.
    private const string OrdinaryKeys = "\x1b[?1l\x1b>";

    private readonly Lock _lock = new();
    private readonly TerminalTraits _traits;
    private readonly CellWriter _cells;
    private readonly Encoding _encoding;
    private readonly Stream _output = Console.OpenStandardOutput();
    private readonly byte[]? _before = NativeTerminal.Read();
    private bool _isIn;

    /// <summary>Makes it, without touching the terminal.</summary>
    /// <param name="traits">What the terminal can show.</param>
    public TerminalLink(TerminalTraits traits)
    {
        _traits = traits;
        _cells = new CellWriter(new Pen(traits));
        _encoding = traits.IsUtf8 ? new UTF8Encoding(false) : Encoding.ASCII;
        AppDomain.CurrentDomain.ProcessExit += OnExit;
    }

    /// <summary>Takes the terminal over, or takes it over again: all of it is shown anew then.</summary>
    /// <param name="rows">Its rows.</param>
    /// <param name="columns">Its columns.</param>
    public void Enter(int rows, int columns)
    {
        lock (_lock)
        {
            if (_before is not null)
            {
                NativeTerminal.SetRaw(_before);
            }

            _isIn = true;
            _cells.Cleared(rows, columns);
            Send((_traits.HasAlternateScreen ? AlternateScreen : "") + (_traits.HidesCursor ? HideCursor : "") + PlainAndClear);
        }
    }

    /// <summary>Shows all of the cells anew, as after a change of the terminal's size.</summary>
    /// <param name="rows">Its rows.</param>
    /// <param name="columns">Its columns.</param>
    public void Clear(int rows, int columns)
    {
        lock (_lock)
        {
            if (_isIn)
            {
                _cells.Cleared(rows, columns);
                Send(PlainAndClear);
            }
        }
    }

    /// <summary>Shows the cells; nothing while the terminal is given back.</summary>
    /// <param name="cells">The cells, by row and column.</param>
    public void Show(Cell[,] cells)
    {
        lock (_lock)
        {
            if (_isIn)
            {
                Send(_cells.Changes(cells));
            }
        }
    }

    /// <summary>Gives the terminal back as it was, with the prompt's place free.</summary>
    public void Leave()
    {
        lock (_lock)
        {
            if (!_isIn)
            {
                return;
            }

            // First the modes: who sees the screen go may type at once.
            _isIn = false;
            GiveModesBack();

            // Cleared even where another screen is behind it: one that has become smaller in the meantime may not hide all of this one.
            Send(PlainAndClear + (_traits.HasAlternateScreen ? MainScreen : "") + (_traits.HidesCursor ? ShowCursor : "") + OrdinaryKeys);
        }
    }

    /// <inheritdoc/>
    public void Dispose()
    {
        Leave();
        AppDomain.CurrentDomain.ProcessExit -= OnExit;
    }

    // Also where something ended the program from the side. A write that waits for the terminal holds the lock: the modes at least.
    private void OnExit(object? sender, EventArgs arguments)
    {
        if (!_lock.TryEnter())
        {
            GiveModesBack();
            return;
        }

        try
        {
            Leave();
        }
        finally
        {
            _lock.Exit();
        }
    }

    private void GiveModesBack()
    {
        if (_before is not null)
        {
            NativeTerminal.Set(_before);
        }
    }

    private void Send(string text)
    {
        if (text.Length == 0)
        {
            return;
        }

        try
        {
            _output.Write(_encoding.GetBytes(text));
            _output.Flush();
        }
        catch (IOException)
        {
            // The terminal is gone; that is found where keys are read.
        }
    }
}
