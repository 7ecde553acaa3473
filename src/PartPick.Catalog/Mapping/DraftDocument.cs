using LiteDB;
using PartPick.Catalog.Fields;

namespace PartPick.Catalog.Mapping;

/// <summary>Figures by their keys as a document.</summary>
internal static class DraftDocument
{
    public static BsonDocument Write(PartShape shape, PartDraft draft)
    {
        var figures = new BsonDocument();
        foreach (PartField field in shape.Fields)
        {
            if (draft.Number(field.Key) is { } number)
            {
                figures[field.Key] = number;
            }
            else if (draft.Text(field.Key) is { } text)
            {
                figures[field.Key] = text;
            }
        }

        return figures;
    }

    public static PartDraft Read(PartShape shape, BsonDocument figures)
    {
        var draft = new PartDraft();
        foreach (PartField field in shape.Fields)
        {
            BsonValue value = figures[field.Key];
            if (field.Dimension is null && value.IsString)
            {
                draft.Set(field.Key, value.AsString);
            }
            else if (field.Dimension is not null && value.IsDouble && double.IsFinite(value.AsDouble))
            {
                draft.Set(field.Key, value.AsDouble);
            }
        }

        return draft;
    }
}
