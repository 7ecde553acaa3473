using LiteDB;

namespace PartPick.Catalog.Mapping;

/// <summary>A small text under a key.</summary>
internal static class TextDocument
{
    /// <summary>What the file says about itself.</summary>
    public const string AboutCollection = "about";

    /// <summary>The texts that the program keeps from one run to the next.</summary>
    public const string SettingsCollection = "settings";

    /// <summary>The column maps, each a text under its name.</summary>
    public const string MapsCollection = "maps";

    private const string Text = "text";

    public static BsonDocument Write(string key, string text) => new() { ["_id"] = key, [Text] = text };

    public static string? Read(BsonDocument? document) => document is not null && document[Text].IsString ? document[Text].AsString : null;
}
