using PartPick.Catalog.Fields;
using PartPick.Values;

namespace PartPick.Catalog.Browsing;

/// <summary>A condition on a figure that parts are listed with.</summary>
/// <param name="Number">The place of the figure among the number columns.</param>
/// <param name="Sign">One of <see cref="Signs"/>.</param>
/// <param name="Bound">What it is held against, in SI units.</param>
internal sealed record FigureCondition(int Number, string Sign, double Bound)
{
    /// <summary>The signs, the longer ones first.</summary>
    public static readonly string[] Signs = ["<=", ">=", "<", ">", "="];

    // Values that are written alike are alike, whatever the last binary digit.
    private const double Same = 1e-9;

    /// <summary>Reads a condition.</summary>
    public static Result<FigureCondition> Read(PartKind kind, string key, string sign, string value, string where)
    {
        ListColumn[] columns = [.. ListColumns.Of(kind).Where(column => column.IsNumber)];
        int number = Array.FindIndex(columns, column => Word(column) == key);
        if (number < 0)
        {
            return Result.Fail<FigureCondition>(
                where,
                $"{Problem.Quote(key)} is no figure that {kind.Word()} are listed with",
                $"words, or one of {string.Join(", ", columns.Select(Word))} with < <= = >= > and a value");
        }

        Dimension dimension =
            PartShape.Of(kind).Fields.FirstOrDefault(field => field.Key == columns[number].Key)?.Dimension ?? Dimension.Number;
        return ValueText.Parse(value, dimension, where + " " + key).Map(bound => new FigureCondition(number, sign, bound));
    }

    /// <summary>Whether a figure meets it; one that is absent, NaN, never does.</summary>
    public bool Holds(double value) => Sign switch
    {
        "<" => value < Bound && !IsSame(value),
        ">" => value > Bound && !IsSame(value),
        "<=" => value <= Bound || IsSame(value),
        ">=" => value >= Bound || IsSame(value),
        _ => IsSame(value),
    };

    private static string Word(ListColumn column) => column.Key.Replace(" ", "", StringComparison.Ordinal);

    private bool IsSame(double value) => Math.Abs(value - Bound) <= Same * Math.Abs(Bound);
}
