using System.Diagnostics;
using System.Globalization;
using System.Runtime.InteropServices;
using System.Text;

namespace PartPick.Tests.Screens;

/// <summary>
/// A real terminal with a shell in it: a window of tmux that nobody sees. Everything waits for what it expects, since the machine may be
/// slow; nothing waits for a time.
/// </summary>
internal sealed class TmuxTerminal : IDisposable
{
    private const string Mark = "begins here";

    private static readonly TimeSpan Patience = TimeSpan.FromSeconds(90);

    // Its server keeps its socket there, so that nothing of it stays behind and nobody else's is met.
    private readonly string _folder;
    private int _asked;

    /// <summary>Opens a window.</summary>
    /// <param name="term">What the programs in it take the terminal for.</param>
    /// <param name="locale">The locale of the programs.</param>
    /// <param name="width">Its columns.</param>
    /// <param name="height">Its rows.</param>
    public TmuxTerminal(string term, string locale, int width, int height)
    {
        Assert.SkipWhen(Missing is not null, Missing ?? "");
        _folder = Directory.CreateTempSubdirectory("partpick-tmux-").FullName;
        string program = Path.Combine(_folder, "partpick");
        string library = Path.Combine(AppContext.BaseDirectory, "partpick.dll");
        File.WriteAllText(program, $"echo $$ >'{Pid}'\necho {Mark}\nexec '{Host}' '{library}' \"$@\"\n");
        string shell = $"exec env -i PATH=\"$PATH\" HOME='{_folder}' PS1='ready> ' TERM={term} LC_ALL={locale}"
            + $" DOTNET_NOLOGO=1 PARTPICK_CATALOG='{Path.Combine(_folder, "catalog.db")}' sh -i";
        Tmux(
            "-f", "/dev/null", "-u", "new-session", "-d", "-x", Text(width), "-y", Text(height),
            shell);
        Tmux("pipe-pane", $"cat >'{Sent}'");
        WaitFor("ready>");
    }

    /// <summary>Why there are no such terminals here; null where there are.</summary>
    public static string? Missing { get; } = FindMissing();

    /// <summary>All that the program wrote to the terminal from its first start on, up to what a shell wrote afterwards.</summary>
    public string Written
    {
        get
        {
            string all = Encoding.Latin1.GetString(File.ReadAllBytes(Sent));
            int from = all.IndexOf(Mark + "\r\n", StringComparison.Ordinal);
            int end = all.IndexOf("ready>", Math.Max(0, from), StringComparison.Ordinal);
            return end < 0 ? all[from..] : all[from..end];
        }
    }

    public string[] Rows => Tmux("capture-pane", "-p").TrimEnd('\n').Split('\n');

    private string Pid => Path.Combine(_folder, "pid");

    private string Sent => Path.Combine(_folder, "sent");

    // The tests may run in the host of the SDK or in their own.
    private static string Host => Environment.ProcessPath is { } running && Path.GetFileNameWithoutExtension(running) == "dotnet"
        ? running
        : Environment.GetEnvironmentVariable("DOTNET_HOST_PATH")
            ?? Path.GetFullPath(Path.Combine(RuntimeEnvironment.GetRuntimeDirectory(), "..", "..", "..", "dotnet"));

    /// <summary>Starts the program from the shell, on the catalogue of this terminal.</summary>
    public void Start(string arguments = "") => Type($"sh '{Path.Combine(_folder, "partpick")}' {arguments}", "Enter");

    /// <summary>Presses keys by tmux's names for them; what is no name is typed.</summary>
    public void Type(params string[] keys) => Tmux(["send-keys", .. keys]);

    public void Resize(int width, int height) => Tmux("resize-window", "-x", Text(width), "-y", Text(height));

    /// <summary>Sends the program a signal.</summary>
    public void Signal(string name) => Execute("kill", ["-s", name, File.ReadAllText(Pid).Trim()]);

    /// <summary>Whether the program still runs.</summary>
    public bool Runs => Directory.Exists("/proc") && Directory.Exists("/proc/" + File.ReadAllText(Pid).Trim());

    /// <summary>What the shell answers to a command.</summary>
    public string Ask(string command)
    {
        string answer = Path.Combine(_folder, "answer" + ++_asked);
        Type($"{command} >'{answer}.part' && mv '{answer}.part' '{answer}'", "Enter");
        WaitUntil(() => File.Exists(answer), "an answer to " + command);
        return File.ReadAllText(answer);
    }

    /// <summary>One of tmux's notes about the window: 0 or 1.</summary>
    public string Flag(string name) => Tmux("display-message", "-p", $"#{{{name}}}").Trim();

    public void WaitFor(string text) => WaitUntil(() => Rows.Any(row => row.Contains(text, StringComparison.Ordinal)), text);

    public void WaitUntilGone(string text) =>
        WaitUntil(() => !Rows.Any(row => row.Contains(text, StringComparison.Ordinal)), "that this is gone: " + text);

    public void WaitUntil(Func<bool> isSo, string what)
    {
        long start = TimeProvider.System.GetTimestamp();
        while (!isSo())
        {
            Assert.True(
                TimeProvider.System.GetElapsedTime(start) < Patience,
                $"Waited in vain for {what}; on the screen:\n" + string.Join('\n', Rows));
            Thread.Sleep(50);
        }
    }

    public void HangUp() => Tmux("kill-server");

    public void Dispose()
    {
        Execute("tmux", ["kill-server"], _folder);
        WaitForEnd();
        Directory.Delete(_folder, recursive: true);
    }

    private static string? FindMissing()
    {
        if (OperatingSystem.IsWindows())
        {
            return "tmux does not run on Windows";
        }

        try
        {
            return Execute("tmux", ["-V"]).Status == 0 ? null : "tmux does not start";
        }
        catch (System.ComponentModel.Win32Exception)
        {
            return "tmux is not installed";
        }
    }

    private static string Text(int number) => number.ToString(CultureInfo.InvariantCulture);

    private static (int Status, string Output, string Error) Execute(string program, IEnumerable<string> arguments, string? sockets = null)
    {
        var start = new ProcessStartInfo(program, arguments) { RedirectStandardOutput = true, RedirectStandardError = true };
        start.Environment.Remove("TMUX");
        if (sockets is not null)
        {
            start.Environment["TMUX_TMPDIR"] = sockets;
        }

        using Process process = Process.Start(start)!;
        Task<string> error = process.StandardError.ReadToEndAsync();
        string output = process.StandardOutput.ReadToEnd();
        process.WaitForExit();
        return (process.ExitCode, output, error.Result);
    }

    private string Tmux(params string[] arguments)
    {
        (int status, string output, string error) = Execute("tmux", arguments, _folder);
        Assert.True(status == 0, $"tmux {string.Join(' ', arguments)}: {error}");
        return output;
    }

    // The program ends by itself when its terminal is gone; it is not left behind in any case.
    private void WaitForEnd()
    {
        if (!File.Exists(Pid))
        {
            return;
        }

        long start = TimeProvider.System.GetTimestamp();
        while (Runs)
        {
            if (TimeProvider.System.GetElapsedTime(start) > Patience)
            {
                Signal("KILL");
            }

            Thread.Sleep(50);
        }
    }
}
