namespace PartPick.Catalog.Tests.BuiltIn;

public class FileTests
{
    public static TheoryData<PartKind> Kinds => [.. PartKinds.All];

    [Theory]
    [MemberData(nameof(Kinds))]
    public void Every_row_is_read(PartKind kind)
    {
        string text = BuiltInParts.FileText(kind);

        var (parts, problems) = PartCsv.Read(kind, new StringReader(text), "file");

        Assert.Empty(problems);
        Assert.Equal(text.Count(character => character == '\n') - 1, parts.Count);
        Assert.Equal(parts.Count, BuiltInParts.Catalog.OfKind(kind).Count());
    }

    [Theory]
    [MemberData(nameof(Kinds))]
    public void Written_again_a_file_is_the_same(PartKind kind)
    {
        string text = BuiltInParts.FileText(kind);
        var (parts, _) = PartCsv.Read(kind, new StringReader(text), "file");

        var written = new StringWriter();
        PartCsv.Write(kind, parts, written);

        Assert.Equal(text, written.ToString());
    }

    [Theory]
    [MemberData(nameof(Kinds))]
    public void A_file_is_plain_text_with_line_feeds(PartKind kind)
    {
        byte[] bytes = BuiltInParts.FileBytes(kind);

        Assert.All(bytes, each => Assert.InRange(each, (byte)'\n', (byte)'~'));
        Assert.DoesNotContain((byte)'\r', bytes);
        Assert.Equal((byte)'\n', bytes[^1]);
    }

    [Theory]
    [InlineData(PartKind.Crystal, 200)]
    [InlineData(PartKind.Capacitor, 250)]
    [InlineData(PartKind.Resistor, 177)]
    [InlineData(PartKind.Inverter, 12)]
    [InlineData(PartKind.Counter, 4)]
    [InlineData(PartKind.Port, 8)]
    [InlineData(PartKind.Transistor, 10)]
    public void There_are_enough_parts_to_choose_from(PartKind kind, int least) =>
        Assert.True(BuiltInParts.Catalog.OfKind(kind).Count() >= least);

    [Fact]
    public void No_two_ids_differ_by_case_alone() =>
        Assert.Distinct(BuiltInParts.Catalog.All.Select(part => part.Id), StringComparer.OrdinalIgnoreCase);
}
