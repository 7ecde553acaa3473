namespace PartPick.Catalog.Import;

/// <summary>What the user stated about an import.</summary>
internal sealed record ImportOptions
{
    /// <summary>The decimal sign; unknown to find it.</summary>
    public NumberNotation Notation { get; init; }

    /// <summary>The currency of prices that name none.</summary>
    public string? Currency { get; init; }

    /// <summary>What a request states.</summary>
    public static ImportOptions Of(ImportRequest request) => new()
    {
        Notation = request.DecimalSign switch
        {
            "comma" => NumberNotation.Comma,
            "point" => NumberNotation.Point,
            _ => NumberNotation.Unknown,
        },
        Currency = request.Currency,
    };
}
