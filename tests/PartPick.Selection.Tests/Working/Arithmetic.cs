using System.Globalization;

namespace PartPick.Selection.Tests.Working;

/// <summary>
/// Evaluates the numbers of a working step by itself: sums, products (also by standing side by side), quotients, powers, sqrt, ln,
/// magnitudes between bars, and values with prefixes and units.
/// </summary>
internal sealed class Arithmetic
{
    // SI, CODATA exact; the constants that the formulas name.
    private const double Boltzmann = 1.380649e-23;

    private static readonly Dictionary<string, double> Units = new(StringComparer.Ordinal)
    {
        ["ppm"] = 1e-6, ["ppm/pF"] = 1e6, ["ppm/K"] = 1e-6, ["ppm/K^2"] = 1e-6, ["%"] = 0.01, ["/s"] = 1, ["EUR"] = 1, ["K"] = 1, ["H"] = 1,
        ["A/V^2"] = 1, ["/V"] = 1,
    };

    private static readonly Dictionary<string, double> Prefixes = new(StringComparer.Ordinal)
    {
        [""] = 1, ["a"] = 1e-18, ["f"] = 1e-15, ["p"] = 1e-12, ["n"] = 1e-9, ["µ"] = 1e-6, ["m"] = 1e-3, ["k"] = 1e3, ["M"] = 1e6,
        ["G"] = 1e9,
    };

    private static readonly string[] Bases = ["F", "Hz", "Ω", "S", "V", "A", "W", "s"];

    private readonly string _text;
    private int _at;

    private Arithmetic(string text) => _text = text;

    /// <summary>The value in SI units.</summary>
    public static double Of(string text)
    {
        var one = new Arithmetic(text);
        double value = one.Sum();
        Assert.True(one._at == text.Length, $"'{text}' is not understood from '{text[one._at..]}' on.");
        return value;
    }

    private double Sum()
    {
        double value = Product();
        while (true)
        {
            Skip();
            if (Take("+"))
            {
                value += Product();
            }
            else if (Take("-"))
            {
                value -= Product();
            }
            else
            {
                return value;
            }
        }
    }

    private double Product()
    {
        double value = Power();
        while (true)
        {
            Skip();
            if (Take("/"))
            {
                value /= Power();
            }
            else if (_at < _text.Length && (char.IsAsciiLetterOrDigit(_text[_at]) || _text[_at] == '('))
            {
                value *= Power();
            }
            else
            {
                return value;
            }
        }
    }

    private double Power()
    {
        double value = Atom();
        return Take("^") ? Math.Pow(value, Atom()) : value;
    }

    private double Atom()
    {
        Skip();
        if (Take("-"))
        {
            return -Atom();
        }

        foreach ((string open, string close, Func<double, double> of) in new (string, string, Func<double, double>)[]
        {
            ("sqrt(", ")", Math.Sqrt), ("ln(", ")", Math.Log), ("(", ")", value => value), ("|", "|", Math.Abs),
        })
        {
            if (Take(open))
            {
                double inner = Sum();
                Skip();
                Assert.True(Take(close), $"'{_text}' lacks a '{close}'.");
                return of(inner);
            }
        }

        if (Take("pi"))
        {
            return Math.PI;
        }

        return Take("k ") ? Boltzmann : Number();
    }

    private double Number()
    {
        int start = _at;
        while (_at < _text.Length
            && (char.IsAsciiDigit(_text[_at]) || _text[_at] == '.'
                || (_text[_at] is 'E' or 'e' && _at + 1 < _text.Length
                    && (_text[_at + 1] is '-' or '+' || char.IsAsciiDigit(_text[_at + 1])))
                || (_text[_at] is '-' or '+' && _text[_at - 1] is 'E' or 'e')))
        {
            _at++;
        }

        Assert.True(_at > start, $"'{_text}' has no number at '{_text[start..]}'.");
        double value = double.Parse(_text[start.._at], CultureInfo.InvariantCulture);
        return value * Unit();
    }

    // A unit stands one space behind its number.
    private double Unit()
    {
        if (_at >= _text.Length || _text[_at] != ' ')
        {
            return 1;
        }

        int end = _at + 1;
        while (end < _text.Length && !char.IsWhiteSpace(_text[end]) && _text[end] is not (')' or '(' or '|'))
        {
            end++;
        }

        foreach (int stop in Stops(_text, _at + 1, end))
        {
            if (Factor(_text[(_at + 1)..stop]) is { } factor)
            {
                _at = stop;
                return factor;
            }
        }

        return 1;
    }

    // "Hz/(…": the whole word, or what stands before a quotient.
    private static IEnumerable<int> Stops(string text, int start, int end)
    {
        yield return end;
        int quotient = text.IndexOf('/', start, end - start);
        if (quotient > start)
        {
            yield return quotient;
        }
    }

    private static double? Factor(string word)
    {
        if (Units.TryGetValue(word, out double known))
        {
            return known;
        }

        foreach (string unit in Bases)
        {
            if (word.EndsWith(unit, StringComparison.Ordinal) && Prefixes.TryGetValue(word[..^unit.Length], out double prefix))
            {
                return prefix;
            }
        }

        return null;
    }

    private bool Take(string sign)
    {
        if (string.CompareOrdinal(_text, _at, sign, 0, sign.Length) != 0)
        {
            return false;
        }

        _at += sign.Length;
        return true;
    }

    private void Skip()
    {
        while (_at < _text.Length && _text[_at] == ' ')
        {
            _at++;
        }
    }
}
