using LiteDB;

namespace PartPick.Catalog.Mapping;

/// <summary>
/// Reads a collection piece by piece, in the order of its ids. The database keeps every page that one query has touched in memory until
/// that query ends (up to 100 000 pages of 8 KB), so a query for all would hold the whole file.
/// </summary>
internal static class PartPages
{
    private const int Piece = 2000;

    /// <summary>All documents of a collection that is not changed meanwhile.</summary>
    public static IEnumerable<BsonDocument> All(ILiteCollection<BsonDocument> parts)
    {
        ILiteQueryable<BsonDocument> from = parts.Query();
        int count = Piece;
        while (count == Piece)
        {
            (count, BsonValue last) = (0, BsonValue.Null);
            foreach (BsonDocument document in from.OrderBy(Id).Limit(Piece).ToEnumerable())
            {
                yield return document;
                (count, last) = (count + 1, document["_id"]);
            }

            from = parts.Query().Where(BsonExpression.Create("$._id > @0", last));
        }
    }

    private static BsonExpression Id { get; } = BsonExpression.Create("$._id");
}
