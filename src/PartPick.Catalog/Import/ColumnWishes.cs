using PartPick.Catalog.Fields;
using PartPick.Values;

namespace PartPick.Catalog.Import;

/// <summary>Reads columns that are stated as HEADER=FIELD:UNIT.</summary>
internal static class ColumnWishes
{
    public static Result<List<ColumnWish>> Read(PartKind kind, IEnumerable<string> texts)
    {
        var wishes = new List<ColumnWish>();
        foreach (string text in texts)
        {
            int equals = text.LastIndexOf('=');
            string header = equals < 0 ? text : text[..equals];
            string[] rest = equals < 0 ? [""] : text[(equals + 1)..].Split(':', 2, StringSplitOptions.TrimEntries);
            string unit = rest.Length > 1 ? rest[1] : "";
            PartField? field = PartShape.Of(kind).Fields.FirstOrDefault(each => each.Key == rest[0]);
            if (header.Trim().Length == 0 || (rest[0].Length > 0 && !ImportFields.Names(kind).Contains(rest[0])))
            {
                return Result.Fail<List<ColumnWish>>(
                    "--column", $"{Problem.Quote(text)} names no figure of {kind.Word()}",
                    "HEADER=FIELD or HEADER=FIELD:UNIT with one of "
                        + string.Join(", ", ImportFields.Names(kind)));
            }

            if (unit.Length > 0 && field?.Dimension is { } dimension && UnitSpelling.PowerOf(unit, dimension) is null)
            {
                return Result.Fail<List<ColumnWish>>(
                    "--column",
                    $"{Problem.Quote(unit)} is no unit of {field.Key}",
                    field.Unit.Length > 0 ? "a unit such as " + field.Unit : "no unit");
            }

            wishes.Add(new ColumnWish(header.Trim(), rest[0].Length > 0 ? rest[0] : null, unit));
        }

        return Result.Ok(wishes);
    }
}
