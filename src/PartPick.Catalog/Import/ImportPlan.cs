using System.Collections.Immutable;
using PartPick.Values;

namespace PartPick.Catalog.Import;

/// <summary>How a file is going to be read: its layout, and what becomes of each column.</summary>
/// <param name="Layout">The layout.</param>
/// <param name="Uses">The columns.</param>
internal sealed record ImportPlan(FileLayout Layout, ColumnUse[] Uses)
{
    /// <summary>Whether some column tells the parts apart.</summary>
    public bool TellsPartsApart => Uses.Any(use => use.Field is "id" or "supplierPart");

    /// <summary>Makes the plan for a file, from what is stated, what is kept under a name, and what the file shows.</summary>
    /// <param name="path">The path of the catalogue.</param>
    /// <param name="text">The text; its beginning is read.</param>
    /// <param name="request">What is to be imported, and how.</param>
    public static Result<ImportPlan> Make(string path, SourceText text, ImportRequest request)
    {
        Result<List<ColumnWish>> wishes = CatalogImport.Wishes(path, request);
        if (!wishes.IsOk)
        {
            return Result.Fail<ImportPlan>(wishes.Problem);
        }

        Result<FileLayout> found = FileLayout.Find(text.Reader, request.Name, request.Kind, wishes.Value);
        return found.Map(layout => new ImportPlan(
            layout, new ColumnProposal(request.Kind, layout.Sample, ImportOptions.Of(request)).For(layout.Header, wishes.Value)));
    }

    /// <summary>The columns for a report.</summary>
    public ImmutableArray<ImportColumn> Columns() =>
    [
        .. Uses.Select(use => new ImportColumn(
            CellText.Harmless(use.Header), use.Field, use.Power == ColumnUse.NoPlainNumbers ? "" : use.Unit, use.Why)),
    ];
}
