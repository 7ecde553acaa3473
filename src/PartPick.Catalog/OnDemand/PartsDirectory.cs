using System.Collections.Immutable;
using System.Text;

namespace PartPick.Catalog;

/// <summary>
/// What a large catalogue holds that a ranking can use: of each crystal that is for sale its outline and its id, of the other parts
/// their ids. Never changed. Crystals that are excluded, without a price in the main currency or used on an overtone are not in it.
/// </summary>
public sealed class PartsDirectory
{
    private readonly DirectoryColumns _columns;

    internal PartsDirectory(DirectoryColumns columns) => _columns = columns;

    /// <summary>The currency in which most parts of the catalogue are priced.</summary>
    public string Currency => _columns.Currency;

    /// <summary>Number of crystals.</summary>
    public int Crystals => _columns.Frequencies.Length;

    /// <summary>The mark that the catalogue carries as long as its parts are these.</summary>
    internal string Mark => _columns.Mark;

    internal ImmutableArray<string> OtherIds => _columns.OtherIds;

    /// <summary>The outline of a crystal.</summary>
    /// <param name="place">Its place, from zero; in the order of the ids.</param>
    public CrystalOutline this[int place] => new(
        _columns.Frequencies[place], (CrystalCut)_columns.Cuts[place], Known(_columns.Loads[place]), Known(_columns.Shunts[place]),
        Known(_columns.Motionals[place]), _columns.Packages[place] is var package and >= 0 ? _columns.PackageWords[package] : null);

    /// <summary>The id of a crystal.</summary>
    internal string IdOf(int place)
    {
        int start = place == 0 ? 0 : _columns.IdEnds[place - 1];
        return Encoding.UTF8.GetString(_columns.IdBytes, start, _columns.IdEnds[place] - start);
    }

    private static double? Known(double figure) => double.IsNaN(figure) ? null : figure;
}
