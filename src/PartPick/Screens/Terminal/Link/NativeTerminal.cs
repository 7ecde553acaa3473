using System.Runtime.InteropServices;

namespace PartPick.Screens;

/// <summary>
/// What the platform has no call for: a terminal that hands every key on at once, and stopping like any program of the shell.
/// </summary>
internal static class NativeTerminal
{
    private const int Input = 0;
    private const int Now = 0;
    private const short Readable = 1;

    // struct termios takes 60 bytes on Linux and 72 on macOS; it is only ever kept, changed by cfmakeraw and handed back.
    private const int StateBytes = 256;

    private static int StopSignal => OperatingSystem.IsLinux() ? 20 : 18;

    /// <summary>How the terminal is set; null where there is none.</summary>
    public static byte[]? Read()
    {
        byte[] state = new byte[StateBytes];
        return GetState(Input, state) == 0 ? state : null;
    }

    /// <summary>Sets the terminal as it was.</summary>
    /// <param name="state">What <see cref="Read"/> returned.</param>
    public static void Set(byte[] state) => _ = SetState(Input, Now, state);

    /// <summary>Lets every key through at once and unseen, Ctrl-C and Ctrl-Z among them.</summary>
    /// <param name="state">What <see cref="Read"/> returned; not changed.</param>
    public static void SetRaw(byte[] state)
    {
        byte[] raw = [.. state];
        MakeRaw(raw);
        Set(raw);
    }

    /// <summary>Stops the program and whatever runs with it in the foreground, as Ctrl-Z does; returns when it goes on.</summary>
    public static void Stop() => _ = Kill(0, StopSignal);

    /// <summary>Waits until something can be read, without reading it.</summary>
    public static void WaitForInput()
    {
        Waiting[] one = [new Waiting(Input, Readable)];
        _ = Poll(one, 1, -1);
    }

    [DllImport("libc", EntryPoint = "poll")]
    private static extern int Poll([In, Out] Waiting[] terminals, nuint count, int milliseconds);

    [DllImport("libc", EntryPoint = "tcgetattr")]
    private static extern int GetState(int terminal, [In, Out] byte[] state);

    [DllImport("libc", EntryPoint = "tcsetattr")]
    private static extern int SetState(int terminal, int when, byte[] state);

    [DllImport("libc", EntryPoint = "cfmakeraw")]
    private static extern void MakeRaw([In, Out] byte[] state);

    [DllImport("libc", EntryPoint = "kill")]
    private static extern int Kill(int process, int signal);

    private struct Waiting(int terminal, short events)
    {
        public int Terminal = terminal;
        public short Events = events;
        public short Happened = 0;
    }
}
