using System.Globalization;

namespace PartPick.Values;

/// <summary>A finite number as decimal digits and a power of ten, so that shifting the decimal point is exact.</summary>
/// <param name="IsNegative">Whether there is a minus.</param>
/// <param name="Digits">The significant digits without leading or trailing zeros; <c>0</c> for zero.</param>
/// <param name="Power">The power of ten of the first digit.</param>
internal readonly record struct DecimalDigits(bool IsNegative, string Digits, int Power)
{
    /// <summary>The digits of a number: the shortest that read back as the same number, or rounded to a count.</summary>
    public static DecimalDigits Of(double value, int? significantDigits)
    {
        if (value == 0)
        {
            return new DecimalDigits(false, "0", 0);
        }

        // E16 would print 17 digits where fewer do; the shortest form is "R", laid out here as digits and a power.
        string text = significantDigits is { } count
            ? value.ToString($"E{count - 1}", CultureInfo.InvariantCulture)
            : value.ToString("R", CultureInfo.InvariantCulture);
        bool negative = text[0] == '-';
        string unsigned = negative ? text[1..] : text;
        int mark = unsigned.IndexOf('E', StringComparison.Ordinal);
        int power = mark < 0 ? 0 : int.Parse(unsigned[(mark + 1)..], NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture);
        string mantissa = mark < 0 ? unsigned : unsigned[..mark];
        int point = mantissa.IndexOf('.', StringComparison.Ordinal);
        string whole = point < 0 ? mantissa : mantissa[..point];
        string all = point < 0 ? mantissa : whole + mantissa[(point + 1)..];
        int leading = all.Length - all.TrimStart('0').Length;
        return new DecimalDigits(negative, all.Trim('0'), power + whole.Length - 1 - leading);
    }

    /// <summary>The number times a power of ten.</summary>
    public DecimalDigits ScaledBy(int power) => Digits == "0" ? this : this with { Power = Power + power };

    /// <summary>The number without an exponent where that is at most a line of digits, else with one.</summary>
    public string ToPlainText()
    {
        string sign = IsNegative ? "-" : "";
        if (Power is < -7 or > 15)
        {
            string fraction = Digits.Length > 1 ? "." + Digits[1..] : "";
            return string.Create(CultureInfo.InvariantCulture, $"{sign}{Digits[0]}{fraction}e{Power}");
        }

        if (Power < 0)
        {
            return sign + "0." + new string('0', -Power - 1) + Digits;
        }

        return Digits.Length <= Power + 1
            ? sign + Digits.PadRight(Power + 1, '0')
            : sign + Digits[..(Power + 1)] + "." + Digits[(Power + 1)..];
    }
}
