using System.Text;
using Microsoft.Win32.SafeHandles;

namespace PartPick.Screens;

/// <summary>Reads what is typed, on a thread of its own that only waits.</summary>
internal sealed class KeyIntake
{
    private const int ReadAtOnce = 1024;

    private static readonly TimeSpan Look = TimeSpan.FromMilliseconds(20);

    private volatile bool _rests;

    /// <summary>Starts to read, until the terminal is gone or the program ends.</summary>
    /// <param name="take">Takes the characters; called from another thread.</param>
    /// <param name="gone">Told that the terminal is gone; called from another thread.</param>
    public void Start(Action<ReadOnlySpan<char>> take, Action gone)
    {
        var thread = new Thread(() => Read(take, gone)) { IsBackground = true, Name = "keys" };
        thread.Start();
    }

    /// <summary>Leaves what is typed from now on to another program: the shell.</summary>
    public void Rest() => _rests = true;

    /// <summary>Reads again.</summary>
    public void GoOn() => _rests = false;

    private void Read(Action<ReadOnlySpan<char>> take, Action gone)
    {
        using var input = new FileStream(new SafeFileHandle(0, ownsHandle: false), FileAccess.Read, bufferSize: 0);
        Decoder decoder = Encoding.UTF8.GetDecoder();
        byte[] bytes = new byte[ReadAtOnce];
        char[] signs = new char[ReadAtOnce + 1];
        while (true)
        {
            NativeTerminal.WaitForInput();
            if (_rests)
            {
                Thread.Sleep(Look);
                continue;
            }

            int count;
            try
            {
                count = input.Read(bytes);
            }
            catch (IOException)
            {
                count = 0;
            }

            if (count == 0)
            {
                gone();
                return;
            }

            int length = decoder.GetChars(bytes.AsSpan(0, count), signs, flush: false);
            take(signs.AsSpan(0, length));
        }
    }
}
