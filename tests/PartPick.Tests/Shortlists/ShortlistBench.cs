using System.Text.Json;
using System.Text.Json.Nodes;

namespace PartPick.Tests.Shortlists;

/// <summary>A catalogue of a test's own, with lists of circuits that one ranking found.</summary>
internal sealed class ShortlistBench
{
    public const string River =
        """
        { "name": "river", "output": "1 kHz", "waveform": "square", "budget": "80 ppm", "temperature": [-10, 50], "startUpTime": "50 ms",
          "builds": 200 }
        """;

    private static readonly Lazy<string> Ranked = new(() =>
    {
        Run run = Run.Of("rank", Run.File(River), "--format", "json", "--top", "6");
        Assert.Equal(0, run.Status);
        return run.Output;
    });

    private readonly string _db = Path.Combine(Path.GetDirectoryName(Run.File(""))!, "own.db");

    /// <summary>The answer of the ranking.</summary>
    public static string Ranking => Ranked.Value;

    /// <summary>The path of the catalogue.</summary>
    public string Catalog => _db;

    /// <summary>A file of the tests' own that is not there yet.</summary>
    public string NewFile(string name) => Path.Combine(Path.GetDirectoryName(_db)!, name);

    public Run Of(params string[] arguments) => Run.Of([.. arguments, "--catalog", _db]);

    public Run WithInput(string input, params string[] arguments) => Run.WithInput(input, [.. arguments, "--catalog", _db]);

    /// <summary>Puts the first candidates of the ranking on a list.</summary>
    public ShortlistBench With(int count, string list = "logger")
    {
        for (int i = 1; i <= count; i++)
        {
            Run run = WithInput(Ranking, "shortlist", "add", list, "-", "--candidate", FormattableString.Invariant($"{i}"));
            Assert.True(run.Status == 0, run.Error);
        }

        return this;
    }

    public JsonElement List(string list = "logger")
    {
        Run run = Of("shortlist", "list", list, "--format", "json");
        Assert.True(run.Status == 0, run.Error);
        return run.Json;
    }

    /// <summary>Exports a kind, changes the rows of some ids, and imports it.</summary>
    public void Reimport(string kind, IReadOnlyCollection<string> ids, string column, Func<string, string> change)
    {
        string[] lines = Of("catalog", "export", kind).Output.Split('\n');
        int at = Array.IndexOf(CsvTexts.ByCsvHelper(lines[0], ',')[0], column);
        Assert.True(at >= 0);
        for (int i = 1; i < lines.Length; i++)
        {
            if (lines[i].Length > 0 && CsvTexts.ByCsvHelper(lines[i], ',')[0] is var cells && ids.Contains(cells[0]))
            {
                cells[at] = change(cells[at]);
                lines[i] = string.Join(',', cells.Select(cell => "\"" + cell.Replace("\"", "\"\"", StringComparison.Ordinal) + "\""));
            }
        }

        Run run = Of("catalog", "import", Run.File(string.Join('\n', lines), kind + ".csv"), "--kind", kind, "--format", "json");
        Assert.True(run.Status == 0, run.Error);
        Assert.Equal(ids.Count, run.Json.GetProperty("updated").GetInt32());
    }

    /// <summary>The id of the part in a place of a candidate.</summary>
    public static string PartOf(JsonElement candidate, string designator) => candidate.GetProperty("parts").EnumerateArray()
        .Single(part => part.GetProperty("designator").GetString() == designator).GetProperty("part").GetString()!;

    public static JsonObject Candidate(int number) => JsonNode.Parse(Ranking)!["candidates"]![number - 1]!.DeepClone().AsObject();
}
