using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Catalog.Import;
using PartPick.Commands;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>What the user says of a list that is to be imported.</summary>
public sealed record ImportWishes
{
    /// <summary>The path of the file as it was typed.</summary>
    public string File { get; init; } = "";

    /// <summary>The kind of its parts.</summary>
    public PartKind Kind { get; init; }

    /// <summary>The name of the column map to use; null for none.</summary>
    public string? Map { get; init; }

    /// <summary>The decimal sign, "point" or "comma"; null to find it.</summary>
    public string? DecimalSign { get; init; }

    /// <summary>The currency of prices that name none; empty for none.</summary>
    public string Currency { get; init; } = "";

    /// <summary>The supplier of rows that name none; empty for none.</summary>
    public string Supplier { get; init; } = "";

    /// <summary>What the columns are, by their headers: a field, a field and a unit, or nothing to leave one out.</summary>
    public ImmutableDictionary<string, string> Columns { get; init; } = ImmutableDictionary<string, string>.Empty;

    /// <summary>The path with the home directory in the place of a leading tilde.</summary>
    public string FullPath => File.StartsWith("~/", StringComparison.Ordinal)
        ? Path.Join(Environment.GetFolderPath(Environment.SpecialFolder.UserProfile), File[2..])
        : File;

    /// <summary>States what a column is; another column that was stated to be the same is no longer.</summary>
    /// <param name="header">Its header.</param>
    /// <param name="use">A field, a field and a unit, or nothing to leave it out; null to have it found again.</param>
    public ImportWishes With(string header, string? use)
    {
        ArgumentNullException.ThrowIfNull(header);
        if (use is null)
        {
            return this with { Columns = Columns.Remove(header) };
        }

        string field = use.Split(':')[0];
        ImmutableDictionary<string, string> others = field is "" or "price"
            ? Columns
            : Columns.RemoveRange(Columns.Where(pair => pair.Value.Split(':')[0] == field).Select(pair => pair.Key).ToList());
        return this with { Columns = others.SetItem(header, use) };
    }

    /// <summary>The request.</summary>
    /// <param name="date">The day.</param>
    /// <param name="dryRun">Whether nothing is to be written.</param>
    public ImportRequest Request(DateOnly date, bool dryRun) => new()
    {
        Kind = Kind,
        Name = Path.GetFileName(File),
        RejectedPath = ListFile.RejectedPathOf(FullPath),
        DryRun = dryRun,
        Map = Map,
        Columns = [.. Columns.Select(pair => $"{pair.Key}={pair.Value}")],
        DecimalSign = DecimalSign,
        Currency = Currency.Length > 0 ? Currency : null,
        Supplier = Supplier.Length > 0 ? Supplier : null,
        Date = date,
    };

    /// <summary>Finds the field that was typed, in full or by its beginning.</summary>
    /// <param name="text">What was typed: a field, a field and a unit behind a colon, or nothing to leave the column out.</param>
    public Result<string> ReadUse(string text)
    {
        ArgumentNullException.ThrowIfNull(text);
        string[] halves = text.Split(':', 2, StringSplitOptions.TrimEntries);
        string unit = halves.Length > 1 && halves[1].Length > 0 ? ":" + halves[1] : "";
        ImmutableArray<string> names = NamesLike(halves[0]);
        return halves[0].Length == 0 ? Result.Ok("")
            : names.Contains(halves[0]) ? Result.Ok(halves[0] + unit)
            : names.Length == 1 ? Result.Ok(names[0] + unit)
            : Result.Fail<string>(
                "column", $"{Problem.Quote(halves[0])} is no figure of {Kind.Word()}",
                names.IsEmpty ? "a name, or nothing to leave the column out" : "one of " + string.Join(", ", names));
    }

    /// <summary>The fields whose names begin as is typed.</summary>
    /// <param name="text">The beginning.</param>
    public ImmutableArray<string> NamesLike(string text) =>
        [.. ImportPreview.FieldNames(Kind).Where(name => name.StartsWith(text, StringComparison.OrdinalIgnoreCase))];
}
