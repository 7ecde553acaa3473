using System.Text;
using PartPick.Catalog.Import;
using PartPick.Values;

namespace PartPick.Catalog.Tests.Import;

public sealed class ImportPreviewTests : IDisposable
{
    private const string List =
        """
        Part No;Freq;CL (pF);ESR max;Remark
        A-1;4.096 MHz;18;100 Ohm;first
        A-2;eight;18;60 Ohm;second
        A-3;8 MHz;20;-;third
        """;

    private readonly string _directory = Directory.CreateTempSubdirectory("partpick-preview-").FullName;

    private string CatalogFile => Path.Combine(_directory, "catalog.db");

    public void Dispose() => Directory.Delete(_directory, recursive: true);

    [Fact]
    public void A_list_is_looked_at_as_its_import_reads_it()
    {
        ImportLook look = Look(Request());
        ImportReport report =
            CatalogImport.Run(CatalogFile, Bytes(), Request(), null, TestContext.Current.CancellationToken).Value;

        Assert.Equal(report.Columns, look.Columns);
        Assert.Equal((report.Encoding, report.Delimiter, report.HeaderLine), (look.Encoding, look.Delimiter, look.HeaderLine));
        Assert.Equal(report.Rejections.Select(each => (each.Line, each.Column)), look.Rows.Where(row => row.Rejection is not null)
            .Select(row => (row.Line, row.Rejection!.Column)));
        foreach (Part part in look.Rows.Select(row => row.Part).OfType<Part>())
        {
            Part imported = CatalogReading.Find(CatalogFile, part.Id).Value!.Part;
            Assert.Equal(PartFigures.Of(imported), PartFigures.Of(part));
        }

        Assert.Equal(2, look.Rows.Count(row => row.Part is not null));
        Assert.Equal(["18", "18", "20"], look.CellsOf(2, 3));
        Assert.True(look.HasNumbers);
    }

    [Fact]
    public void A_row_with_more_cells_than_the_header_is_refused_as_its_import_refuses_it()
    {
        byte[] list = Encoding.UTF8.GetBytes("Part No;Freq\nA-1;4 MHz\nA-2;8 MHz;12\nA-3;10 MHz;\n");
        ImportLook look = ImportPreview.Look(CatalogFile, new MemoryStream(list), Request()).Value;
        ImportReport report = CatalogImport.Run(
            CatalogFile, new MemoryStream(list), Request(), null, TestContext.Current.CancellationToken).Value;

        RowRejection rejected = Assert.Single(report.Rejections);
        Assert.Equal(3, rejected.Line);
        Assert.Equal(rejected, Assert.Single(look.Rows, row => row.Part is null).Rejection);
    }

    [Fact]
    public void A_stated_column_changes_what_is_read()
    {
        ImportLook look = Look(Request() with { Columns = ["CL (pF)=shunt:pF", "Remark=note"] });
        var part = (CrystalPart)look.Rows[0].Part!;
        Assert.Null(part.LoadFarads);
        Assert.Equal(18e-12, part.ShuntFarads!.Value, 1e-18);
        Assert.Equal("first", part.Note);
    }

    [Fact]
    public void Kept_columns_read_the_next_list_and_are_replaced_under_their_name()
    {
        Assert.Empty(ColumnMaps.Names(CatalogFile, PartKind.Crystal).Value);
        Assert.Equal("shop", ColumnMaps.Keep(CatalogFile, "shop", Bytes(), Request() with { Columns = ["CL (pF)=shunt:pF"] }).Value);
        Assert.Equal(["shop"], ColumnMaps.Names(CatalogFile, PartKind.Crystal).Value);
        Assert.Empty(ColumnMaps.Names(CatalogFile, PartKind.Resistor).Value);
        Assert.Equal("shunt", Look(Request() with { Map = "shop" }).Columns[2].Field);

        ColumnMaps.Keep(CatalogFile, "shop", Bytes(), Request());

        Assert.Equal("load", Look(Request() with { Map = "shop" }).Columns[2].Field);
    }

    [Fact]
    public void Looking_changes_nothing()
    {
        Look(Request());
        Assert.Null(CatalogReading.Undoable(CatalogFile).Value);
        Assert.Null(CatalogReading.Find(CatalogFile, "A-1").Value);
    }

    private static ImportRequest Request() => new() { Kind = PartKind.Crystal, Name = "list.csv", Date = new DateOnly(2026, 3, 1) };

    private static MemoryStream Bytes() => new(Encoding.UTF8.GetBytes(List));

    private ImportLook Look(ImportRequest request)
    {
        Result<ImportLook> look = ImportPreview.Look(CatalogFile, Bytes(), request);
        Assert.True(look.IsOk, look.Problem?.ToString());
        return look.Value;
    }
}
