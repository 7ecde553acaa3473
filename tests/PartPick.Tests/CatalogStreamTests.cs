using System.Text.Encodings.Web;
using System.Text.Json;
using PartPick.Catalog;

namespace PartPick.Tests;

public class CatalogStreamTests
{
    private static readonly JsonSerializerOptions Readable = new()
    {
        WriteIndented = true,
        NewLine = "\n",
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
    };

    [Fact]
    public void A_list_in_pieces_is_one_JSON_document_as_it_is_printed_elsewhere()
    {
        Run list = Run.Of("catalog", "list", "ports", "--format", "json");
        string whole = JsonSerializer.Serialize(list.Json, Readable);
        Assert.Equal(PartsCatalog.BuiltIn().Ports.Length, list.Json.GetArrayLength());
        Assert.Equal(whole + "\n", list.Output);
        Assert.Equal("[]\n", Run.Of("catalog", "list", "ports", "--filter", "no such text", "--format", "json").Output);
    }

    [Fact]
    public void An_empty_export_still_has_its_header() =>
        Assert.StartsWith(
            "id,description,", Run.Of("catalog", "list", "ports", "--filter", "no such text", "--format", "csv").Output,
            StringComparison.Ordinal);

    [Fact]
    public void Conditions_narrow_a_list_and_a_wrong_one_is_one_line()
    {
        JsonElement list = Run.Of("catalog", "list", "crystals", "--filter", "H49 load=18p", "--format", "json").Json;
        Assert.Equal(
            PartsCatalog.BuiltIn().Crystals.Count(part => part.LoadFarads is > 17.99e-12 and < 18.01e-12
                && part.Id.Contains("H49", StringComparison.Ordinal)),
            list.GetArrayLength());
        Assert.Contains(
            "is no figure that crystals are listed with", Run.Of("catalog", "list", "crystals", "--filter", "loud<3").WrongLine(),
            StringComparison.Ordinal);
    }

    [Fact]
    public void A_part_that_cannot_be_written_leaves_no_unfinished_file()
    {
        string folder = Directory.CreateTempSubdirectory("partpick-export-").FullName;
        try
        {
            string path = Path.Combine(folder, "ports.csv");
            Assert.Equal(0, Run.Of("catalog", "export", "ports", "--to", path).Status);
            Assert.Equal(["ports.csv"], Directory.GetFiles(folder).Select(Path.GetFileName));
            string broken = Path.Combine(folder, "broken.db");
            File.WriteAllText(broken, "no catalogue");
            Assert.Equal(3, Run.Of("catalog", "export", "ports", "--to", Path.Combine(folder, "new.csv"), "--catalog", broken).Status);
            Assert.DoesNotContain(Directory.GetFiles(folder), file => file.Contains("new.csv", StringComparison.Ordinal));
        }
        finally
        {
            Directory.Delete(folder, recursive: true);
        }
    }
}
