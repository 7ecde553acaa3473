using LiteDB;

namespace PartPick.Catalog.Mapping;

/// <summary>
/// Reads a collection piece by piece, in the order of its ids. The database keeps every page that one query has touched in memory until
/// that query ends (up to 100 000 pages of 8 KB), so a query for all would hold the whole file.
/// </summary>
internal static class PartPages
{
    private const int Piece = 5000;

    /// <summary>All documents of a collection that does not change meanwhile.</summary>
    public static IEnumerable<BsonDocument> All(ILiteCollection<BsonDocument> parts)
    {
        List<BsonDocument> piece = parts.Query().OrderBy(Id).Limit(Piece).ToList();
        while (piece.Count > 0)
        {
            foreach (BsonDocument document in piece)
            {
                yield return document;
            }

            BsonValue last = piece[^1]["_id"];
            piece = piece.Count < Piece ? [] : parts.Query().Where(BsonExpression.Create("$._id > @0", last)).OrderBy(Id).Limit(Piece).ToList();
        }
    }

    private static BsonExpression Id { get; } = BsonExpression.Create("$._id");
}
