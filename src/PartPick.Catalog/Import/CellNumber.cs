using System.Globalization;
using PartPick.Values;

namespace PartPick.Catalog.Import;

/// <summary>Reads the number of a cell, with whatever unit and separators it has.</summary>
internal static class CellNumber
{
    /// <summary>Reads it in the SI unit; a problem without a place where it cannot be read with certainty.</summary>
    /// <param name="cell">The cell, not empty.</param>
    /// <param name="dimension">What it measures.</param>
    /// <param name="power">The power of ten of a number without a unit.</param>
    /// <param name="notation">Which sign is the decimal one.</param>
    /// <param name="allowNegative">Whether a negative number makes sense.</param>
    public static Result<double> Read(string cell, Dimension dimension, int power, NumberNotation notation, bool allowNegative)
    {
        string text = CellText.Bare(dimension == Dimension.Count ? cell.TrimStart('>', ' ').TrimEnd('+', ' ') : cell);
        (int start, int end) = WrittenNumber.Locate(text);
        string front = text[..start].Trim();
        string tail = text[end..];
        // "G1" is a shelf and no number of pieces or ratio of currents: a letter stands for the decimal sign of values only.
        if (dimension is Dimension.Count or Dimension.Number && front.Length > 0 && char.IsLetter(front[0]))
        {
            return Result.Fail<double>(
                "", $"{Problem.Quote(cell)} does not begin with a number", dimension == Dimension.Count ? "a whole number" : "a number");
        }

        if (start == end || IsLetterCode(front, tail))
        {
            return ValueText.ParseIn(text, dimension, power == ColumnUse.NoPlainNumbers ? 0 : power, "", allowNegative);
        }

        if (front is not ("" or "-" or "+"))
        {
            return Result.Fail<double>("", $"{Problem.Quote(cell)} does not begin with a number", "a number with its unit");
        }

        NumberNotation used = dimension == Dimension.Count ? Whole(text[start..end], notation) : notation;
        if (WrittenNumber.Plain(text[start..end], used) is not { } plain)
        {
            string number = text[start..end];
            return Result.Fail<double>(
                "", WrittenNumber.Weigh(number) switch
                {
                    NumberEvidence.Wrong => $"{Problem.Quote(cell)} is no number in any notation",
                    _ when notation == NumberNotation.Unknown =>
                        $"{Problem.Quote(cell)} can be read in two ways, with a decimal sign or with thousands",
                    _ => $"{Problem.Quote(cell)} has another decimal sign than the rest of its column",
                },
                "a number with one decimal sign, or --decimal point or comma");
        }

        (string exponent, string unit) = SplitExponent(tail);
        string known = UnitSpelling.Of(unit);
        if (known.Length == 0 && power == ColumnUse.NoPlainNumbers)
        {
            return Result.Fail<double>("", $"{Problem.Quote(cell)} has no unit, and more than one is possible", "a number with its unit");
        }

        return ValueText.ParseIn(
            $"{(front == "-" ? "-" : "")}{plain}{exponent} {known}", dimension, known.Length == 0 ? power : 0, "", allowNegative);
    }

    // A count has no decimals: 4,000 of them are four thousand, but 4.5 stays wrong.
    private static NumberNotation Whole(string number, NumberNotation notation) => WrittenNumber.Weigh(number) switch
    {
        NumberEvidence.CommaOrThousands when notation != NumberNotation.Comma || !number.EndsWith("000", StringComparison.Ordinal) =>
            NumberNotation.Point,
        NumberEvidence.PointOrThousands when !number.EndsWith("000", StringComparison.Ordinal) => NumberNotation.Comma,
        _ => notation,
    };

    // 4k7 and R47: the letter stands for the decimal sign.
    private static bool IsLetterCode(string front, string tail) =>
        (tail.Length > 1 && char.IsLetter(tail[0]) && char.IsAsciiDigit(tail[1])) || (front.Length == 1 && char.IsLetter(front[0]));

    private static (string Exponent, string Unit) SplitExponent(string tail)
    {
        if (tail.Length < 2 || tail[0] is not ('e' or 'E'))
        {
            return ("", tail);
        }

        int end = tail[1] is '+' or '-' ? 2 : 1;
        int first = end;
        while (end < tail.Length && char.IsAsciiDigit(tail[end]))
        {
            end++;
        }

        return end == first ? ("", tail) : (tail[..end], tail[end..]);
    }

    /// <summary>Whether a cell has a number and nothing behind it.</summary>
    public static bool HasNoUnit(string cell)
    {
        string text = CellText.Bare(cell);
        (int start, int end) = WrittenNumber.Locate(text);
        return end > start && UnitSpelling.Of(SplitExponent(text[end..]).Unit).Length == 0;
    }

    /// <summary>What the separators of a cell's number say.</summary>
    public static NumberEvidence Weigh(string cell)
    {
        string text = CellText.Bare(cell);
        (int start, int end) = WrittenNumber.Locate(text);
        return end > start ? WrittenNumber.Weigh(text[start..end]) : NumberEvidence.None;
    }

    /// <summary>A number for messages.</summary>
    public static string Text(int number) => number.ToString(CultureInfo.InvariantCulture);
}
