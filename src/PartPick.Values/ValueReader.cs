using System.Globalization;

namespace PartPick.Values;

/// <summary>Takes a written value apart: sign, digits, exponent, prefix and unit.</summary>
internal static class ValueReader
{
    private const int LongestText = 200;

    /// <summary>Reads a value; gives what is wrong, or null and the value.</summary>
    public static string? Read(string text, UnitTable table, int plainPower, out double value)
    {
        value = 0;
        if (text.Length > LongestText)
        {
            return $"{Problem.Quote(text)} is too long for a value";
        }

        string rest = WithPlainSpaces(text).Trim();
        if (rest.Length == 0)
        {
            return "the value is empty";
        }

        bool negative = TakeSign(ref rest);
        int end = 0;
        while (end < rest.Length && (char.IsAsciiDigit(rest[end]) || rest[end] is '.' or ','))
        {
            end++;
        }

        string mantissa = rest[..end];
        string tail = rest[end..];
        int power;
        if (LetterCode(mantissa, tail, table, out string codeMantissa, out string codeTail, out int codePower))
        {
            if (codeTail.Length > 0 && !table.Units.ContainsKey(codeTail))
            {
                return UnfitUnit(text, codeTail, table);
            }

            (mantissa, power) = (codeMantissa, codePower);
        }
        else
        {
            if (mantissa.All(letter => letter is '.' or ','))
            {
                return $"{Problem.Quote(text)} has no number in front";
            }

            if (PointOf(ref mantissa) is { } ambiguous)
            {
                return $"{Problem.Quote(text)} {ambiguous}";
            }

            int exponent = TakeExponent(ref tail);
            string unit = tail.Replace(" ", "", StringComparison.Ordinal);
            if (unit.Length == 0)
            {
                power = exponent + plainPower;
            }
            else if (UnitPower(unit, table) is { } unitPower)
            {
                power = exponent + unitPower;
            }
            else
            {
                return UnfitUnit(text, unit, table);
            }
        }

        string number = string.Create(CultureInfo.InvariantCulture, $"{(negative ? "-" : "")}{mantissa}e{power}");
        if (!double.TryParse(number, NumberStyles.Float, CultureInfo.InvariantCulture, out value))
        {
            return $"{Problem.Quote(text)} is not a number";
        }

        if (!double.IsFinite(value) || (value == 0 && mantissa.Any(digit => digit is >= '1' and <= '9')))
        {
            return $"{Problem.Quote(text)} is too {(value == 0 ? "near zero" : "large")} to be stored";
        }

        value += 0.0; // minus zero becomes zero
        return null;
    }

    private static string WithPlainSpaces(string text) =>
        text.Replace('\u00A0', ' ').Replace('\u202F', ' ').Replace('\u2009', ' ');

    private static bool TakeSign(ref string rest)
    {
        if (rest[0] == '±')
        {
            rest = rest[1..].TrimStart();
        }
        else if (rest.StartsWith("+/-", StringComparison.Ordinal))
        {
            rest = rest[3..].TrimStart();
        }

        bool negative = rest.Length > 0 && rest[0] is '-' or '\u2212';
        if (negative || (rest.Length > 0 && rest[0] == '+'))
        {
            rest = rest[1..];
        }

        return negative;
    }

    /// <summary>4k7, 4R7, p47: one letter stands for the decimal point, with nothing but digits around it.</summary>
    private static bool LetterCode(
        string front, string tail, UnitTable table, out string mantissa, out string unit, out int power)
    {
        (mantissa, unit, power) = ("", "", 0);
        if (!table.TakesPrefix || tail.Length < 2 || !char.IsAsciiDigit(tail[1]) || !front.All(char.IsAsciiDigit)
            || !(tail[0] == table.CodeLetter || (Prefix.TryRead(tail[0], out power) && power <= table.LargestPrefix)))
        {
            return false;
        }

        int end = 1;
        while (end < tail.Length && char.IsAsciiDigit(tail[end]))
        {
            end++;
        }

        mantissa = $"{(front.Length == 0 ? "0" : front)}.{tail[1..end]}";
        unit = tail[end..].TrimStart();
        return true;
    }

    /// <summary>Makes the decimal mark a point; says why where a comma may be a separator of thousands.</summary>
    private static string? PointOf(ref string mantissa)
    {
        int comma = mantissa.IndexOf(',', StringComparison.Ordinal);
        if (comma < 0)
        {
            return mantissa.Count(letter => letter == '.') > 1 ? "has more than one decimal point" : null;
        }

        string whole = mantissa[..comma];
        string fraction = mantissa[(comma + 1)..];
        if (fraction.Contains(',', StringComparison.Ordinal) || mantissa.Contains('.', StringComparison.Ordinal))
        {
            return "has a comma that may separate thousands; write it with one decimal point";
        }

        if (fraction.Length == 3 && whole.Length is 1 or 2 or 3 && whole[0] != '0')
        {
            return "has a comma that may be decimal or separate thousands; write a decimal point, or no comma";
        }

        mantissa = $"{whole}.{fraction}";
        return null;
    }

    /// <summary>Takes e-12 from the front of the tail. Exponents beyond all reason are cut to one that overflows.</summary>
    private static int TakeExponent(ref string tail)
    {
        if (tail.Length < 2 || tail[0] is not ('e' or 'E'))
        {
            return 0;
        }

        int start = tail[1] is '+' or '-' or '\u2212' ? 2 : 1;
        int end = start;
        while (end < tail.Length && char.IsAsciiDigit(tail[end]))
        {
            end++;
        }

        if (end == start)
        {
            return 0;
        }

        string digits = tail[start..end].TrimStart('0');
        int size = digits.Length switch
        {
            0 => 0,
            > 5 => 99999,
            _ => int.Parse(digits, NumberStyles.None, CultureInfo.InvariantCulture),
        };
        bool negative = tail[1] is '-' or '\u2212';
        tail = tail[end..];
        return negative ? -size : size;
    }

    private static int? UnitPower(string unit, UnitTable table)
    {
        if (table.Units.TryGetValue(unit, out int power))
        {
            return power;
        }

        if (table.TakesPrefix && Prefix.TryRead(unit[0], out int prefix) && prefix <= table.LargestPrefix)
        {
            string rest = unit[1..];
            if (rest.Length == 0 || table.Units.ContainsKey(rest) || (unit[0] != 'm' && table.LooseUnits.Contains(rest)))
            {
                return prefix;
            }
        }

        return table.LooseUnits.Contains(unit) ? 0 : null;
    }

    private static string UnfitUnit(string text, string unit, UnitTable table) =>
        table.LooseUnits.Any(loose => unit == "m" + loose)
            ? $"{Problem.Quote(text)} may mean milli or mega; write m{table.Symbol} or M{table.Symbol}"
            : $"{Problem.Quote(text)} ends in {Problem.Quote(unit)}, which does not fit {table.Noun}";
}
