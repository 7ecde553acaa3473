using System.Text.Json;

namespace PartPick.Tests;

/// <summary>The commands that change the catalogue, through the program's entry.</summary>
public class CatalogChangeCommandTests
{
    private const string List = "Part Number,Frequency,Load Cap.,Price (EUR)\nA1,4.000MHz,18pF,0.42\nA2,eight,18pF,0.42\n";

    private readonly string _db = Path.Combine(Path.GetDirectoryName(Run.File(""))!, "own.db");

    [Fact]
    public void Import_accounts_for_every_row_and_names_the_file_of_rejected_ones()
    {
        string file = Run.File(List, "list.csv");
        JsonElement report = Of("import", file, "--kind", "crystals", "--format", "json").Json;
        Assert.Equal(2, report.GetProperty("read").GetInt32());
        Assert.Equal(
            (1, 0, 0, 1),
            (Count(report, "added"), Count(report, "updated"), Count(report, "unchanged"), Count(report, "rejected")));
        string rejected = Path.Combine(Path.GetDirectoryName(file)!, "list.rejected.csv");
        Assert.Equal(rejected, report.GetProperty("rejectedFile").GetString());
        Assert.Contains("A2", File.ReadAllText(rejected), StringComparison.Ordinal);
        Assert.Equal("Frequency", report.GetProperty("rejections")[0].GetProperty("column").GetString());
        Assert.Equal(
            ["supplierPart", "frequency", "load", "price"],
            report.GetProperty("columns").EnumerateArray().Select(each => each.GetProperty("field").GetString()));
        JsonElement part = Of("show", "A1", "--format", "json").Json;
        Assert.StartsWith("list.csv line 2", part.GetProperty("origin").GetProperty("load").GetString(), StringComparison.Ordinal);
        Assert.Equal(
            ["cut", "overtone", "shunt", "motional", "resistance"],
            part.GetProperty("assumed").EnumerateArray().Select(key => key.GetString()));
    }

    [Fact]
    public void Import_reads_standard_input_and_undo_takes_it_back()
    {
        string rejected = Run.File("", "r.csv");
        Assert.Equal(
            0,
            Run.WithInput(List, "catalog", "import", "-", "--kind", "crystals", "--rejected", rejected, "--catalog", _db).Status);
        Assert.Equal(0, Of("undo").Status);
        Assert.Contains("no part of the catalogue", Of("show", "A1").WrongLine(), StringComparison.Ordinal);
        Assert.Contains("no import to take back", Of("undo").WrongLine(), StringComparison.Ordinal);
    }

    [Fact]
    public void Wrong_imports_are_one_line_each()
    {
        string file = Run.File(List, "list.csv");
        Assert.Contains("is not there", Of("import", "/no/such.csv", "--kind", "crystals").WrongLine(), StringComparison.Ordinal);
        Assert.Contains("is a directory", Of("import", "/tmp", "--kind", "crystals").WrongLine(), StringComparison.Ordinal);
        Assert.Contains("no kind of part", Of("import", file, "--kind", "valves").WrongLine(), StringComparison.Ordinal);
        Assert.Contains("--kind", Of("import", file).WrongLine(), StringComparison.Ordinal);
        Assert.Contains(
            "names no figure",
            Of("import", file, "--kind", "crystals", "--column", "Frequency=colour").WrongLine(),
            StringComparison.Ordinal);
        Assert.Contains("is empty", Of("import", Run.File("", "e.csv"), "--kind", "crystals").WrongLine(), StringComparison.Ordinal);
    }

    [Fact]
    public void A_backup_comes_back_also_in_the_place_of_a_damaged_catalogue()
    {
        Assert.Equal(0, Of("import", Run.File(List, "list.csv"), "--kind", "crystals").Status);
        string copy = Path.Combine(Path.GetDirectoryName(_db)!, "copy.db");
        Assert.Equal(0, Of("backup", copy).Status);
        Assert.Equal(0, Of("undo").Status);
        Assert.Equal(0, Of("restore", copy).Status);
        Assert.Equal(0, Of("show", "A1").Status);

        File.WriteAllText(_db, "damaged");
        Of("verify").WrongLine(3);
        Assert.Equal(0, Of("restore", copy).Status);
        Assert.Contains("all well", Of("verify").Output, StringComparison.Ordinal);
        Assert.Equal(0, Of("show", "A1").Status);
    }

    [Fact]
    public void A_file_that_is_no_catalogue_is_not_restored()
    {
        Assert.Equal(0, Of("info").Status);
        byte[] before = File.ReadAllBytes(_db);
        Assert.Contains("no catalogue", Of("restore", Run.File("text", "x.db")).WrongLine(), StringComparison.Ordinal);
        Assert.Contains("is not there", Of("restore", "/no/such.db").WrongLine(), StringComparison.Ordinal);
        Assert.Contains("cannot be written", Of("backup", "/no/such/copy.db").WrongLine(), StringComparison.Ordinal);
        Assert.Equal(before, File.ReadAllBytes(_db));
    }

    [Fact]
    public void A_catalogue_that_another_holds_is_in_use_for_every_change()
    {
        Assert.Equal(0, Of("info").Status);
        using var held = new FileStream(_db + ".change.lock", FileMode.OpenOrCreate, FileAccess.ReadWrite, FileShare.None);
        Assert.Contains("in use", Of("import", Run.File(List, "list.csv"), "--kind", "crystals").WrongLine(3), StringComparison.Ordinal);
        Assert.Contains("in use", Of("undo").WrongLine(3), StringComparison.Ordinal);
        Assert.Equal(0, Of("list", "ports").Status);
    }

    [Fact]
    public void What_is_set_by_hand_outlives_imports_and_undo()
    {
        Assert.Equal(0, Of("import", Run.File(List, "list.csv"), "--kind", "crystals").Status);
        Assert.Equal(0, Of("set", "A1", "resistance=45", "note=measured", "excluded=yes", "load=20 pF").Status);
        string dearer = Run.File(List.Replace("0.42", "0.50", StringComparison.Ordinal), "list.csv");
        Assert.Equal(0, Of("import", dearer, "--kind", "crystals").Status);
        JsonElement part = Of("show", "A1", "--format", "json").Json;
        Assert.Equal(45, part.GetProperty("resistance").GetDouble());
        Assert.Equal(20e-12, part.GetProperty("load").GetDouble());
        Assert.True(part.GetProperty("excluded").GetBoolean());
        Assert.Equal(0.50m, part.GetProperty("prices")[0].GetProperty("price").GetDecimal());
        Assert.StartsWith("set by hand", part.GetProperty("origin").GetProperty("load").GetString(), StringComparison.Ordinal);
        Assert.Equal(0, Of("undo").Status);
        part = Of("show", "A1", "--format", "json").Json;
        Assert.Equal(0.42m, part.GetProperty("prices")[0].GetProperty("price").GetDecimal());
        Assert.Equal(45, part.GetProperty("resistance").GetDouble());

        Assert.Equal(0, Of("set", "A1", "--back", "load").Status);
        Assert.Equal(18e-12, Of("show", "A1", "--format", "json").Json.GetProperty("load").GetDouble());
    }

    [Fact]
    public void Wrong_figures_by_hand_are_one_line_and_change_nothing()
    {
        Assert.Equal(0, Of("import", Run.File(List, "list.csv"), "--kind", "crystals").Status);
        string before = Of("show", "A1").Output;
        Assert.Contains("does not fit", Of("set", "A1", "note=x", "load=18 V").WrongLine(), StringComparison.Ordinal);
        Assert.Contains("is no figure", Of("set", "A1", "colour=red").WrongLine(), StringComparison.Ordinal);
        Assert.Contains("frequency", Of("set", "A1", "frequency=").WrongLine(), StringComparison.Ordinal);
        Assert.Contains("no part of the catalogue", Of("set", "no-such", "note=x").WrongLine(), StringComparison.Ordinal);
        Assert.Contains("KEY=VALUE", Of("set", "A1", "note").WrongLine(), StringComparison.Ordinal);
        Assert.Equal(before, Of("show", "A1").Output);
    }

    private Run Of(params string[] arguments) => Run.Of(["catalog", .. arguments, "--catalog", _db]);

    private static int Count(JsonElement report, string key) => report.GetProperty(key).GetInt32();
}
