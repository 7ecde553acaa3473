using PartPick.Values;

namespace PartPick.Catalog.Tests;

public sealed class PartsCatalogTests
{
    [Fact]
    public void Lists_are_ordered_by_ordinal_id_and_parts_are_found()
    {
        var catalog = new PartsCatalog(
        [
            Samples.Resistor with { Id = "b" }, Samples.Resistor with { Id = "a" }, Samples.Resistor with { Id = "B" },
            Samples.Crystal,
        ]);
        Assert.Equal(["B", "a", "b"], catalog.Resistors.Select(part => part.Id));
        Assert.Same(Samples.Crystal, catalog.Find("Y-4M-18"));
        Assert.Null(catalog.Find("y-4m-18"));
        Assert.Equal(3, catalog.OfKind(PartKind.Resistor).Count());
    }

    [Fact]
    public void Two_parts_of_one_id_are_refused() =>
        Assert.Throws<ArgumentException>(() => new PartsCatalog([Samples.Resistor, Samples.Capacitor with { Id = Samples.Resistor.Id }]));

    [Fact]
    public void The_parts_inside_the_program_are_read_without_a_problem() =>
        Assert.Equal(PartsCatalog.BuiltIn().All.Length, PartKinds.All.Sum(kind => PartsCatalog.BuiltIn().OfKind(kind).Count()));

    [Fact]
    public void The_files_inside_the_program_are_as_the_program_writes_them() => Assert.All(PartKinds.All, kind =>
    {
        string text = BuiltInFiles.Embedded().TextOf(kind);
        (IReadOnlyList<Part> parts, IReadOnlyList<Problem> problems) = PartCsv.Read(kind, new StringReader(text), kind.Word());
        Assert.Equal(text, text.Length == 0 ? "" : Samples.Csv(kind, parts));
        Assert.True(text.Length == 0 || problems.Count == 0);
    });

    [Fact]
    public void A_mistake_in_the_parts_inside_the_program_is_named()
    {
        var files = new BuiltInFiles(new Dictionary<PartKind, string> { [PartKind.Resistor] = "id\n" });
        Assert.Contains("resistors.csv line 1", Assert.Throws<BuiltInPartsException>(files.ReadCatalog).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Kinds_are_named_by_their_plural_words()
    {
        Assert.All(PartKinds.All, kind => Assert.Equal(kind, PartKinds.Named(kind.Word()).Value));
        Problem problem = PartKinds.Named("diodes", "--kind").Problem!;
        Assert.Equal(
            "--kind: 'diodes' is no kind of part; fits one of crystals, capacitors, resistors, inverters, counters, ports, transistors",
            problem.ToString());
    }
}
