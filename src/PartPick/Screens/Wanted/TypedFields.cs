using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>Makes the values of the sentence that are typed.</summary>
internal static class TypedFields
{
    /// <summary>A value with a unit and a range.</summary>
    public static TypedField Value(
        string name,
        string fits,
        Dimension dimension,
        Func<Requirement, double> get,
        Func<Requirement, double, Requirement> set,
        Func<Requirement, double, string?> check,
        Func<Requirement, string>? show = null)
    {
        string Text(Requirement requirement) => ValueText.FormatExact(get(requirement), dimension);
        return new TypedField(name, fits, show ?? Text, Text, Take, BeginsNumber);

        Result<Requirement> Take(Requirement requirement, string text) =>
            Read(text, dimension, name).Then(value => check(requirement, value) is { } unfit
                ? Result.Fail<Requirement>(name, Problem.Quote(text) + " " + unfit, fits)
                : Result.Ok(set(requirement, value)));
    }

    /// <summary>A limit that may be left out: "any" or nothing typed means no limit.</summary>
    public static TypedField Optional(
        string name,
        string fits,
        Dimension dimension,
        Func<Requirement, string> show,
        Func<Requirement, string> text,
        Func<Requirement, double?, Requirement> set)
    {
        return new TypedField(name, fits, show, text, Take, letter => letter is 'a' or 'A' || BeginsNumber(letter));

        Result<Requirement> Take(Requirement requirement, string typed) =>
            string.IsNullOrWhiteSpace(typed) || typed.Trim().Equals("any", StringComparison.OrdinalIgnoreCase)
                ? Result.Ok(set(requirement, null))
                : ValueText.Parse(typed, dimension, name).Then(value => value > 0
                    ? Result.Ok(set(requirement, value))
                    : Result.Fail<Requirement>(name, Problem.Quote(typed) + " is not above zero", fits));
    }

    public static bool BeginsNumber(char letter) => char.IsAsciiDigit(letter) || letter is '+' or '-' or '.' or ',' or '±';

    /// <summary>A bare number of one or more would be 100 % or more as a ratio: it is meant in ppm.</summary>
    private static Result<double> Read(string text, Dimension dimension, string name)
    {
        Result<double> plain = ValueText.Parse(text, dimension, name);
        return dimension == Dimension.Relative && plain.IsOk && plain.Value >= 1
            ? ValueText.ParseIn(text, dimension, -6, name)
            : plain;
    }
}
