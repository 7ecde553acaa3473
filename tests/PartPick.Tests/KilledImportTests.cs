using System.Diagnostics;
using System.Globalization;
using System.Text;

namespace PartPick.Tests;

/// <summary>
/// An import that is killed at a random moment, in a process of its own: the catalogue then is as it was, or holds all of the import.
/// The variable PARTPICK_KILL_ROUNDS sets the number of rounds.
/// </summary>
public sealed class KilledImportTests : IDisposable
{
    private const int Rows = 12_000;

    private readonly string _folder = Directory.CreateTempSubdirectory("partpick-kill-").FullName;

    public void Dispose() => Directory.Delete(_folder, recursive: true);

    [Fact]
    public void A_killed_import_leaves_all_or_nothing()
    {
        int rounds = int.TryParse(Environment.GetEnvironmentVariable("PARTPICK_KILL_ROUNDS"), out int stated) ? stated : 4;
        string list = WriteList("list.csv", "18 pF", Rows);
        string before = WriteList("before.csv", "20 pF", 500);
        string db = Path.Combine(_folder, "catalog.db");
        Assert.Equal(0, Run.Of("catalog", "import", before, "--kind", "crystals", "--catalog", db).Status);
        byte[] start = File.ReadAllBytes(db);
        string old = Run.Of("catalog", "export", "crystals", "--catalog", db).Output;

        var clock = Stopwatch.StartNew();
        using (Process whole = Import(list, db))
        {
            whole.WaitForExit();
            Assert.Equal(0, whole.ExitCode);
        }

        double length = clock.Elapsed.TotalMilliseconds;
        string complete = Run.Of("catalog", "export", "crystals", "--catalog", db).Output;
        Assert.NotEqual(old, complete);
        int seed = Environment.TickCount;
        var random = new Random(seed);
        int killed = 0;
        for (int round = 0; round < rounds; round++)
        {
            File.WriteAllBytes(db, start);
            using Process import = Import(list, db);
            double moment = length * (0.1 + (0.9 * random.NextDouble()));
            if (!import.WaitForExit((int)moment))
            {
                import.Kill();
                killed++;
                import.WaitForExit();
            }

            string told = string.Create(
                CultureInfo.InvariantCulture,
                $"seed {seed}, round {round}, killed after {moment:F0} of {length:F0} ms");
            Run verify = Run.Of("catalog", "verify", "--catalog", db);
            Assert.True(verify.Status == 0, $"{told}: {verify.Output}{verify.Error}");
            string after = Run.Of("catalog", "export", "crystals", "--catalog", db).Output;
            Assert.True(after == old || after == complete, $"{told}: {after.Length} characters, not {old.Length} or {complete.Length}");
        }

        Assert.Equal(0, Run.Of("catalog", "import", list, "--kind", "crystals", "--catalog", db).Status);
        Assert.Equal(complete, Run.Of("catalog", "export", "crystals", "--catalog", db).Output);
        Assert.Empty(Directory.GetFiles(_folder, "*.copy*"));
        TestContext.Current.TestOutputHelper?.WriteLine($"{killed} of {rounds} killed within {length:F0} ms");
    }

    private static Process Import(string list, string db)
    {
        string program = Path.Combine(AppContext.BaseDirectory, "partpick.dll");
        string host = Environment.ProcessPath is { } running && Path.GetFileNameWithoutExtension(running) == "dotnet"
            ? running
            : "dotnet";
        var start = new ProcessStartInfo(host)
        {
            RedirectStandardOutput = true,
            RedirectStandardError = true,
        };
        foreach (string argument in new[] { program, "catalog", "import", list, "--kind", "crystals", "--catalog", db })
        {
            start.ArgumentList.Add(argument);
        }

        return Process.Start(start)!;
    }

    // Some parts are there already and change; most are new.
    private string WriteList(string name, string load, int rows)
    {
        var text = new StringBuilder("Part Number,Frequency,Load,ESR\n");
        for (int i = 0; i < rows; i++)
        {
            text.Append(CultureInfo.InvariantCulture, $"K{i},{4 + (i % 20)} MHz,{load},50 Ohm\n");
        }

        string path = Path.Combine(_folder, name);
        File.WriteAllText(path, text.ToString());
        return path;
    }
}
