namespace PartPick.Catalog.Import;

/// <summary>The digits and separators at the start of a cell, and what they say.</summary>
internal static class WrittenNumber
{
    /// <summary>Where the digits and separators of a text begin and end; equal where there are none.</summary>
    public static (int Start, int End) Locate(string text)
    {
        int start = 0;
        while (start < text.Length && !char.IsAsciiDigit(text[start]) && !(text[start] is '.' or ',' && Digit(text, start + 1)))
        {
            start++;
        }

        int end = start;
        while (end < text.Length
            && (char.IsAsciiDigit(text[end]) || (text[end] is '.' or ',' && Digit(text, end + 1)) || Groups(text, end)))
        {
            end++;
        }

        return (start, end);
    }

    /// <summary>What the separators say. Spaces and apostrophes between thousands say nothing.</summary>
    public static NumberEvidence Weigh(string number)
    {
        int comma = number.IndexOf(',', StringComparison.Ordinal);
        int point = number.IndexOf('.', StringComparison.Ordinal);
        if (comma < 0 && point < 0)
        {
            return NumberEvidence.None;
        }

        if (comma >= 0 && point >= 0)
        {
            bool commaLast = number.LastIndexOf(',') > number.LastIndexOf('.');
            char last = commaLast ? ',' : '.';
            return number.Count(letter => letter == last) == 1 && IsGrouped(number[..number.IndexOf(last, StringComparison.Ordinal)])
                ? commaLast ? NumberEvidence.Comma : NumberEvidence.Point
                : NumberEvidence.Wrong;
        }

        char only = comma >= 0 ? ',' : '.';
        if (number.Count(letter => letter == only) > 1)
        {
            return !IsGrouped(number) ? NumberEvidence.Wrong : only == ',' ? NumberEvidence.Point : NumberEvidence.Comma;
        }

        int place = Math.Max(comma, point);
        bool threefold = number.Length - place == 4 && place is >= 1 and <= 3 && number[0] != '0';
        return (threefold, only) switch
        {
            (true, ',') => NumberEvidence.CommaOrThousands,
            (true, _) => NumberEvidence.PointOrThousands,
            (false, ',') => NumberEvidence.Comma,
            _ => NumberEvidence.Point,
        };
    }

    /// <summary>The number with a decimal point and nothing between thousands; null where it can be read in two ways, or in none.</summary>
    public static string? Plain(string number, NumberNotation notation)
    {
        NumberEvidence evidence = Weigh(number);
        string bare = number.Replace(" ", "", StringComparison.Ordinal).Replace("'", "", StringComparison.Ordinal)
            .Replace("’", "", StringComparison.Ordinal);
        bool? commaDecimal = (evidence, notation) switch
        {
            (NumberEvidence.None, _) => false,
            (NumberEvidence.Wrong, _) => null,
            (NumberEvidence.Point, not NumberNotation.Comma) => false,
            (NumberEvidence.Comma, not NumberNotation.Point) => true,
            (NumberEvidence.PointOrThousands or NumberEvidence.CommaOrThousands, NumberNotation.Point) => false,
            (NumberEvidence.PointOrThousands or NumberEvidence.CommaOrThousands, NumberNotation.Comma) => true,

            // A notation that contradicts what the number shows by itself: better refused than read wrongly.
            _ => null,
        };
        return commaDecimal switch
        {
            null => null,
            true => bare.Replace(".", "", StringComparison.Ordinal).Replace(',', '.'),
            false => bare.Replace(",", "", StringComparison.Ordinal),
        };
    }

    private static bool Digit(string text, int at) => at < text.Length && char.IsAsciiDigit(text[at]);

    // A space or an apostrophe between a digit and three more.
    private static bool Groups(string text, int at) =>
        text[at] is ' ' or '\'' or '’' && at > 0 && char.IsAsciiDigit(text[at - 1])
        && Digit(text, at + 1) && Digit(text, at + 2) && Digit(text, at + 3) && !Digit(text, at + 4);

    // Groups of three, or, as in India, of two before the last three.
    private static bool IsGrouped(string number)
    {
        string[] groups = number.Split(',', '.', ' ', '\'', '’');
        return groups.Length == 1
            || (groups[0].Length is 1 or 2 or 3 && groups.Skip(1).All(group => group.Length == 3))
            || (groups.Length > 2 && groups[0].Length is 1 or 2 && groups[^1].Length == 3
                && groups.Skip(1).SkipLast(1).All(group => group.Length == 2) && !number.Contains('.', StringComparison.Ordinal));
    }
}
