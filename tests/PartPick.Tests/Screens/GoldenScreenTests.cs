using System.Globalization;
using PartPick.Screens;
using Terminal.Gui.Input;

namespace PartPick.Tests.Screens;

/// <summary>
/// Whole screens as a person sees them, kept in Golden/ for a person to review. After a change that is meant, run these tests with
/// PARTPICK_ACCEPT=1, which writes the files anew, and read what git shows as changed.
/// </summary>
public sealed class GoldenScreenTests : IDisposable
{
    private const string Accept = "PARTPICK_ACCEPT";

    // One line for each screen: how one gets there from the list.
    private static readonly Dictionary<string, Action<Bench>> Scenes = new()
    {
        ["list"] = _ => { },
        ["list of misses"] = bench =>
        {
            bench.Ranking.Answer = SampleRanking.Nothing;
            bench.Press(new Key('e'), Key.Tab, new Key(' '), Key.Enter, Key.Esc);
        },
        ["circuit"] = bench => bench.Press(Key.Enter),
        ["circuit, follower"] = bench => bench.Press(Key.End, Key.Enter),
        ["sentence"] = bench => bench.Press(new Key('e'), Key.Tab, Key.Tab),
        ["sentence, a wrong value"] = bench =>
        {
            bench.Press(new Key('e'), Key.Tab, Key.Tab);
            bench.Type("20 pF");
            bench.Press(Key.Enter);
        },
        ["keys"] = bench => bench.Press(new Key('?')),
        ["shortlist, asked"] = bench => bench.Press(new Key('s')),
        ["shortlist"] = bench => bench.Do(new Key('s'), Key.Enter, Key.CursorDown, new Key('s'), Key.Enter, new Key('l')),
        ["catalogue"] = bench => bench.Press(new Key('c')),
        ["catalogue, a part"] = bench =>
        {
            bench.Press(new Key('c'));
            bench.Settle();
            bench.Press(Key.Enter);
        },
    };

    private readonly string _directory = Directory.CreateTempSubdirectory("partpick-golden-").FullName;

    public static TheoryData<string, int, int, bool> All
    {
        get
        {
            var all = new TheoryData<string, int, int, bool>();
            foreach (string scene in Scenes.Keys)
            {
                all.Add(scene, 80, 24, false);
                all.Add(scene, 80, 24, true);
                all.Add(scene, 120, 40, false);
                all.Add(scene, 120, 40, true);
            }

            return all;
        }
    }

    private static string Folder
    {
        get
        {
            var folder = new DirectoryInfo(AppContext.BaseDirectory);
            while (!File.Exists(Path.Combine(folder.FullName, "PartPick.sln")))
            {
                folder = folder.Parent ?? throw new InvalidOperationException("These tests run within a clone of the repository.");
            }

            return Directory.CreateDirectory(Path.Combine(folder.FullName, "tests", "PartPick.Tests", "Screens", "Golden")).FullName;
        }
    }

    public void Dispose() => Directory.Delete(_directory, recursive: true);

    [Theory]
    [MemberData(nameof(All))]
    public void The_screen_looks_as_it_was_accepted(string scene, int width, int height, bool ascii)
    {
        string database = Path.Combine(_directory, "catalog.db");
        using var bench = new Bench(width, height, glyphs: ascii ? Glyphs.Ascii : Glyphs.Drawn, catalogue: database);
        bench.KeepLists(database);
        Scenes[scene](bench);
        bench.Settle();
        string today = DateTime.Today.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture);
        string shown = string.Join('\n', bench.Rows).Replace(today, "2026-03-01", StringComparison.Ordinal) + "\n";
        string name = string.Create(
            CultureInfo.InvariantCulture, $"{scene.Replace(", ", "-").Replace(' ', '-')}-{width}x{height}{(ascii ? "-ascii" : "")}.txt");
        string file = Path.Combine(Folder, name);
        if (Environment.GetEnvironmentVariable(Accept) == "1")
        {
            File.WriteAllText(file, shown);
            return;
        }

        Assert.True(File.Exists(file), $"There is no {name} yet: run with {Accept}=1, and read it.\n{shown}");
        string accepted = File.ReadAllText(file);
        Assert.True(
            shown == accepted,
            $"{name} is not what the screen looks like. Is it better? Then run with {Accept}=1.\n{Compare(accepted, shown)}");
    }

    [Fact]
    public void No_accepted_screen_is_left_over()
    {
        string[] names = [.. Scenes.Keys.Select(scene => scene.Replace(", ", "-").Replace(' ', '-'))];
        Assert.All(
            Directory.GetFiles(Folder).Select(Path.GetFileName),
            file => Assert.Contains(names, name => file!.StartsWith(name + "-80x24", StringComparison.Ordinal)
                || file.StartsWith(name + "-120x40", StringComparison.Ordinal)));
    }

    [Fact]
    public void Every_accepted_ASCII_screen_is_ASCII() => Assert.All(
        Directory.GetFiles(Folder, "*-ascii.txt"), file => Assert.DoesNotContain(File.ReadAllText(file), sign => !char.IsAscii(sign)));

    // The rows that differ, the accepted one first.
    private static string Compare(string accepted, string shown)
    {
        string[] before = accepted.Split('\n'), now = shown.Split('\n');
        return string.Join('\n', Enumerable.Range(0, Math.Max(before.Length, now.Length))
            .Select(i => (Before: before.ElementAtOrDefault(i) ?? "", Now: now.ElementAtOrDefault(i) ?? ""))
            .Where(pair => pair.Before != pair.Now)
            .Select(pair => $"- {pair.Before}\n+ {pair.Now}"));
    }
}
