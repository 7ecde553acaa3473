using System.Globalization;
using PartPick.Catalog.Import;

namespace PartPick.Catalog.Tests.Import;

/// <summary>How the automatic proposal does on a list, held against what its author says of it.</summary>
internal sealed class UnseenScore
{
    private readonly List<string> _wrong = [];
    private readonly List<string> _missed = [];

    /// <summary>Columns that mean something to a catalogue.</summary>
    public int Meaningful { get; private set; }

    /// <summary>Columns among them that were taken for what they are.</summary>
    public int Right { get; private set; }

    /// <summary>Columns taken for what they are not, and figures that are not those of the list.</summary>
    public IReadOnlyList<string> Wrong => _wrong;

    /// <summary>Columns and figures that were not taken, rows that were refused.</summary>
    public IReadOnlyList<string> Missed => _missed;

    /// <summary>Holds a report, and the parts that came of it, against the lines of a truth.</summary>
    public static UnseenScore Of(ImportReport report, string[] truth, Func<string, Part?> find)
    {
        var score = new UnseenScore();
        var meant = truth.Where(line => line.StartsWith("column ", StringComparison.Ordinal)).Select(line => line[7..])
            .ToDictionary(line => line[..line.LastIndexOf('=')], line => line[(line.LastIndexOf('=') + 1)..].Split('|'));
        foreach (ImportColumn column in report.Columns)
        {
            score.Column(column, meant.TryGetValue(column.Header, out string[]? fields) ? fields : [""]);
        }

        foreach (string line in truth)
        {
            string[] words = line.Split(' ');
            switch (words[0])
            {
                case "rows" when words[1] + " " + words[2] != $"{report.Read} {report.Added}":
                    score._missed.Add($"{report.Added} of {report.Read} rows: {report.Rejections.FirstOrDefault()}");
                    break;
                case "part" when find(words[1]) is { } part:
                    score.Figures(part, words[2..]);
                    break;
                case "part":
                    score._missed.Add("part " + words[1]);
                    break;
            }
        }

        return score;
    }

    public override string ToString() =>
        $"{Right} of {Meaningful}, {Wrong.Count} wrong, {Missed.Count} missed"
        + string.Concat(Wrong.Select(each => "\n  WRONG " + each)) + string.Concat(Missed.Select(each => "\n  missed " + each));

    private void Column(ImportColumn column, string[] fields)
    {
        bool mayBeNothing = fields.Contains("");
        Meaningful += mayBeNothing ? 0 : 1;
        string field = column.Field ?? "";
        if (fields.Contains(field))
        {
            Right += mayBeNothing ? 0 : 1;
        }
        else if (field.Length > 0)
        {
            _wrong.Add($"{column.Header} = {field}: {column.Why}");
        }
        else
        {
            _missed.Add($"{column.Header} ({string.Join('|', fields)}): {column.Why}");
        }
    }

    private void Figures(Part part, string[] expected)
    {
        var figures = PartFigures.Of(part).ToDictionary(figure => figure.Key);
        foreach (string each in expected)
        {
            int sign = each.IndexOf('=', StringComparison.Ordinal);
            (string key, string value) = (each[..sign].Replace('_', ' '), each[(sign + 1)..].Replace('_', ' '));
            string found = "";
            if (key.StartsWith("price", StringComparison.Ordinal))
            {
                int quantity = key.Length > 5
                    ? int.Parse(key[6..], CultureInfo.InvariantCulture)
                    : part.Offer.Prices.FirstOrDefault().Quantity;
                PriceBreak step = part.Offer.Prices.FirstOrDefault(price => price.Quantity == quantity);
                found = step.Quantity == 0 ? "" : step.UnitPrice.ToString(CultureInfo.InvariantCulture);
            }
            else if (figures.TryGetValue(key, out PartFigure? figure) && part.BasisOf(key) != Basis.Assumed)
            {
                found = figure.Number?.ToString("R", CultureInfo.InvariantCulture) ?? figure.Text ?? "";
            }

            if (!Same(found, value))
            {
                // A missed column of minimum orders leaves the plain one; that is the miss itself and no further fault.
                bool missing = found.Length == 0 || (found == "1" && key is "minimumOrder" or "multiple");
                (missing ? _missed : _wrong).Add($"{part.Id} {key} is {found}, should be {value}");
            }
        }
    }

    private static bool Same(string found, string wanted) =>
        found == wanted
        || (double.TryParse(found, NumberStyles.Float, CultureInfo.InvariantCulture, out double one)
            && double.TryParse(wanted, NumberStyles.Float, CultureInfo.InvariantCulture, out double other)
            && Math.Abs(one - other) <= Math.Abs(other) * 1e-9);
}
