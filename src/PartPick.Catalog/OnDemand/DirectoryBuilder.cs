using System.Text;

namespace PartPick.Catalog;

/// <summary>Makes a directory of parts that are given in the order of their ids.</summary>
internal sealed class DirectoryBuilder
{
    private readonly CurrencyCounts _counts = new();
    private readonly Dictionary<string, int> _words = new(StringComparer.Ordinal);
    private readonly Dictionary<string, int> _currencies = new(StringComparer.Ordinal);
    private readonly List<Row> _rows = [];
    private readonly List<byte> _idBytes = [];
    private readonly List<string> _others = [];

    /// <summary>Takes a part.</summary>
    public void Add(Part part)
    {
        _counts.Add(part.Offer);
        if (part is not CrystalPart crystal)
        {
            _others.Add(part.Id);
        }
        else if (crystal.Overtone == 1 && !crystal.Excluded && crystal.Offer.HasPrices)
        {
            _idBytes.AddRange(Encoding.UTF8.GetBytes(crystal.Id));
            CrystalOutline outline = CrystalOutline.Of(crystal) with { Package = null };
            int package = crystal.Package is null ? -1 : Number(_words, crystal.Package);
            _rows.Add(new Row(outline, package, Number(_currencies, crystal.Offer.Currency), _idBytes.Count));
        }
    }

    /// <summary>The columns of what was given.</summary>
    public DirectoryColumns Build(string mark)
    {
        string currency = _counts.Most;
        int wanted = _currencies.GetValueOrDefault(currency, -1);
        byte[] all = [.. _idBytes];
        var ids = new MemoryStream(all.Length);
        var ends = new List<int>();
        var rows = new List<Row>();
        for (int i = 0; i < _rows.Count; i++)
        {
            if (_rows[i].Currency == wanted)
            {
                int start = i == 0 ? 0 : _rows[i - 1].IdEnd;
                ids.Write(all, start, _rows[i].IdEnd - start);
                ends.Add((int)ids.Length);
                rows.Add(_rows[i]);
            }
        }

        return new DirectoryColumns
        {
            Mark = mark,
            Currency = currency,
            Frequencies = [.. rows.Select(row => row.Outline.FrequencyHz)],
            Loads = [.. rows.Select(row => row.Outline.LoadFarads ?? double.NaN)],
            Shunts = [.. rows.Select(row => row.Outline.ShuntFarads ?? double.NaN)],
            Motionals = [.. rows.Select(row => row.Outline.MotionalFarads ?? double.NaN)],
            Cuts = [.. rows.Select(row => (byte)row.Outline.Cut)],
            Packages = [.. rows.Select(row => row.Package)],
            IdEnds = [.. ends],
            IdBytes = ids.ToArray(),
            PackageWords = [.. _words.OrderBy(pair => pair.Value).Select(pair => pair.Key)],
            OtherIds = [.. _others],
        };
    }

    private static int Number(Dictionary<string, int> words, string word)
    {
        if (!words.TryGetValue(word, out int number))
        {
            number = words.Count;
            words.Add(word, number);
        }

        return number;
    }

    private readonly record struct Row(CrystalOutline Outline, int Package, int Currency, int IdEnd);
}
