namespace PartPick.Catalog.Import;

/// <summary>The recipes of the fields of each kind.</summary>
internal static class Recipes
{
    private static readonly Dictionary<PartKind, ILookup<string, Recipe>> Kinds = PartKinds.All.ToDictionary(kind => kind, Gather);

    /// <summary>The recipes of a field; none where there are none.</summary>
    public static IEnumerable<Recipe> Of(PartKind kind, string field) => Kinds[kind][field];

    private static ILookup<string, Recipe> Gather(PartKind kind)
    {
        UInt128 always = Notions.Mark("part") | Notions.Mark("nominal");
        string[] sections = ["recipes all", "recipes " + kind.Word(), "recipes " + TradeWords.Family(kind)];
        return TradeWords.Lines().Where(line => sections.Contains(line.Section))
            .SelectMany(line => line.Phrases.Select(phrase => Read(line.Field, phrase, always))).ToLookup(recipe => recipe.Field);
    }

    private static Recipe Read(string field, string phrase, UInt128 always)
    {
        string[] notions = phrase.Split(' ', StringSplitOptions.RemoveEmptyEntries);
        UInt128 Marks(IEnumerable<string> names) => names.Aggregate((UInt128)0, (marks, name) => marks | Notions.Mark(name.TrimStart('?')));
        UInt128 required = Marks(notions.Where(name => !name.StartsWith('?')));
        return new Recipe(field, required, always | Marks(notions), TradeWords.IsTextual(field));
    }
}
