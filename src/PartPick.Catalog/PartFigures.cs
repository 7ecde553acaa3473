using System.Collections.Immutable;
using PartPick.Catalog.Fields;

namespace PartPick.Catalog;

/// <summary>The figures of a part one by one, whatever its kind.</summary>
public static class PartFigures
{
    /// <summary>The figures that are there, in the order of the columns of the kind's file.</summary>
    /// <param name="part">The part.</param>
    /// <returns>The figures; absent ones are left out.</returns>
    public static ImmutableArray<PartFigure> Of(Part part)
    {
        ArgumentNullException.ThrowIfNull(part);
        PartShape shape = PartShape.Of(part.Kind);
        PartDraft draft = shape.DraftOf(part);
        return
        [
            .. shape.Fields.Where(field => draft.Has(field.Key)).Select(field => new PartFigure(
                field.Key, field.Dimension, draft.Number(field.Key), draft.Text(field.Key), part.BasisOf(field.BasisKey))),
        ];
    }

    /// <summary>The keys of figures that are usual ones of the class: marked so, or absent where the model has a usual figure.</summary>
    /// <param name="part">The part.</param>
    /// <returns>The keys, in the order of the columns.</returns>
    public static ImmutableArray<string> AssumedOf(Part part)
    {
        ArgumentNullException.ThrowIfNull(part);
        PartDraft draft = PartShape.Of(part.Kind).DraftOf(part);
        return
        [
            .. PartShape.Of(part.Kind).Fields.Select(field => field.BasisKey).Distinct()
                .Where(key => part.BasisOf(key) == Basis.Assumed || (part is CrystalPart && IsDefaulted(key) && !draft.Has(key))),
        ];
    }

    private static bool IsDefaulted(string key) => key is "shunt" or "motional" or "resistance";
}
