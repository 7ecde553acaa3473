using System.Diagnostics;
using System.Runtime.InteropServices;
using System.Text;
using Microsoft.Win32.SafeHandles;

namespace PartPick.Benchmarks;

/// <summary>
/// A program in a terminal that only keeps what it is sent. It answers the questions that terminals
/// answer, so that a program which waits for answers does not wait in vain. Linux.
/// </summary>
internal sealed class PseudoTerminal : IDisposable
{
    private const int ReadWriteNotControlling = 0x102;

    // A question, and what an ordinary terminal in a window says to it.
    private static readonly (string Question, string Answer)[] Answers =
    [
        ("\x1b[6n", "\x1b[1;1R"),
        ("\x1b[0c", "\x1b[?1;2c"),
        ("\x1b]10;?\x1b\\", "\x1b]10;rgb:ffff/ffff/ffff\x1b\\"),
        ("\x1b]11;?\x1b\\", "\x1b]11;rgb:0000/0000/0000\x1b\\"),
    ];

    private readonly object _lock = new();
    private readonly StringBuilder _sent = new();
    private readonly FileStream _keys;
    private readonly SafeFileHandle _handle;
    private readonly Process _process;
    private readonly Decoder _decoder = Encoding.UTF8.GetDecoder();
    private int _unanswered;

    /// <summary>Starts a program.</summary>
    /// <param name="program">The program and its arguments, of which none has a quote in it.</param>
    /// <param name="catalog">The catalogue that it uses.</param>
    public PseudoTerminal(IEnumerable<string> program, string catalog)
    {
        _handle = new SafeFileHandle(Open(ReadWriteNotControlling), ownsHandle: true);
        byte[] name = new byte[128];
        if (_handle.IsInvalid || Grant(_handle) != 0 || Unlock(_handle) != 0 || Name(_handle, name, name.Length) != 0)
        {
            throw new InvalidOperationException("There is no pseudo-terminal to be had.");
        }

        string path = Encoding.ASCII.GetString(name).TrimEnd('\0');
        string command = string.Join(' ', program.Select(word => $"'{word}'"));
        var start = new ProcessStartInfo("setsid", ["sh", "-c", $"exec <{path} >{path} 2>&1; stty rows 40 cols 120; exec {command}"]);
        start.Environment["TERM"] = "xterm-256color";
        start.Environment["LC_ALL"] = "C.UTF-8";
        start.Environment["PARTPICK_CATALOG"] = catalog;
        foreach (string unwanted in new[] { "COLORTERM", "NO_COLOR", "TMUX", "DisableRealDriverIO" })
        {
            start.Environment.Remove(unwanted);
        }

        Started = Stopwatch.GetTimestamp();
        _process = Process.Start(start)!;
        _keys = new FileStream(_handle, FileAccess.ReadWrite, bufferSize: 0);
        new Thread(Read) { IsBackground = true }.Start();
    }

    /// <summary>When the program was started, in ticks of the stopwatch.</summary>
    public long Started { get; }

    /// <summary>Signs that were sent so far.</summary>
    public int Sent
    {
        get
        {
            lock (_lock)
            {
                return _sent.Length;
            }
        }
    }

    /// <summary>What was sent last, to be read.</summary>
    public string Last
    {
        get
        {
            lock (_lock)
            {
                return _sent.ToString(Math.Max(0, _sent.Length - 400), Math.Min(400, _sent.Length)).Replace('\x1b', '^');
            }
        }
    }

    /// <summary>Processor time of the program with all its threads, those that have ended among them.</summary>
    public TimeSpan Work
    {
        get
        {
            _process.Refresh();
            return _process.TotalProcessorTime;
        }
    }

    /// <summary>Types.</summary>
    /// <param name="keys">What the terminal sends for the keys.</param>
    /// <returns>Where in what was sent the answer begins.</returns>
    public int Type(string keys)
    {
        int from = Sent;
        _keys.Write(Encoding.UTF8.GetBytes(keys));
        return from;
    }

    /// <summary>Waits for something to be sent.</summary>
    /// <param name="text">What has to be in it; empty for anything.</param>
    /// <param name="from">Where it begins.</param>
    /// <param name="patience">The longest wait.</param>
    /// <returns>Whether it came.</returns>
    public bool WaitFor(string text, int from, TimeSpan patience)
    {
        long start = Stopwatch.GetTimestamp();
        lock (_lock)
        {
            while (_sent.Length <= from || !_sent.ToString(from, _sent.Length - from).Contains(text, StringComparison.Ordinal))
            {
                TimeSpan left = patience - Stopwatch.GetElapsedTime(start);
                if (left <= TimeSpan.Zero || !Monitor.Wait(_lock, left))
                {
                    return false;
                }
            }

            return true;
        }
    }

    /// <summary>Waits until nothing has been sent for a while.</summary>
    /// <param name="still">How long.</param>
    public void WaitForRest(TimeSpan still)
    {
        int before;
        do
        {
            before = Sent;
            Thread.Sleep(still);
        }
        while (Sent != before);
    }

    public void Dispose()
    {
        _process.Kill();
        _process.WaitForExit();
        _keys.Dispose();
        _process.Dispose();
    }

    private void Read()
    {
        byte[] bytes = new byte[65536];
        char[] signs = new char[65536];
        try
        {
            for (int count; (count = _keys.Read(bytes)) > 0;)
            {
                string came = new(signs, 0, _decoder.GetChars(bytes, 0, count, signs, 0));
                lock (_lock)
                {
                    _sent.Append(came);
                    Monitor.PulseAll(_lock);
                }

                Answer();
            }
        }
        catch (Exception error) when (error is IOException or ObjectDisposedException)
        {
            // The program has ended.
        }
    }

    private void Answer()
    {
        string text;
        lock (_lock)
        {
            text = _sent.ToString(_unanswered, _sent.Length - _unanswered);
        }

        foreach ((string question, string answer) in Answers)
        {
            int at = text.IndexOf(question, StringComparison.Ordinal);
            if (at >= 0)
            {
                _unanswered += at + question.Length;
                _keys.Write(Encoding.ASCII.GetBytes(answer));
                Answer();
                return;
            }
        }
    }

    [DllImport("libc", EntryPoint = "posix_openpt")]
    private static extern int Open(int how);

    [DllImport("libc", EntryPoint = "grantpt")]
    private static extern int Grant(SafeFileHandle terminal);

    [DllImport("libc", EntryPoint = "unlockpt")]
    private static extern int Unlock(SafeFileHandle terminal);

    [DllImport("libc", EntryPoint = "ptsname_r")]
    private static extern int Name(SafeFileHandle terminal, byte[] name, nint length);
}
