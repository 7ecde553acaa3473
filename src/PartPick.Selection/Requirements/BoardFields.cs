using System.Text.Json;
using System.Text.Json.Nodes;
using PartPick.Selection.Files;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>The board of a requirement: a preset's name, or its strays and how far they may be off.</summary>
internal static class BoardFields
{
    private const string OwnName = "own";
    private const double UsualUncertainty = 0.3;

    private static readonly string[] Keys = ["input", "output", "across", "uncertainty"];

    private static string Fits =>
        string.Join(", ", Board.Presets.Select(board => board.Name)) + ", or an object with " + string.Join(", ", Keys);

    /// <summary>Reads the board; null where it is absent or wrong.</summary>
    public static Board? Read(FieldReader fields)
    {
        if (fields.Raw("board") is not { Value.ValueKind: JsonValueKind.Object })
        {
            var presets = Board.Presets.ToDictionary(board => board.Name, board => new Choice(board), StringComparer.Ordinal);
            return fields.Word("board", presets, Fits)?.Board;
        }

        FieldReader own = fields.Object("board", Fits)!;
        own.Allow("a board", Keys);
        double uncertainty = own.Optional("uncertainty", Dimension.Relative) ?? UsualUncertainty;
        if (uncertainty >= 1)
        {
            own.Reject("uncertainty", "is the whole of the strays or more", "below 100 %, such as 30 %");
        }

        return new Board(OwnName, StrayFields.ReadValues(own), uncertainty);
    }

    /// <summary>Writes a preset by its name, any other board with its values.</summary>
    public static JsonNode Write(Board board)
    {
        if (Board.Presets.Contains(board))
        {
            return JsonValue.Create(board.Name);
        }

        JsonObject own = StrayFields.Write(board.Strays);
        own["uncertainty"] = board.UncertaintyRatio;
        return own;
    }

    private readonly record struct Choice(Board Board);
}
