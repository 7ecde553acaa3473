using System.Text;

namespace PartPick.Catalog.Tests.BuiltIn;

/// <summary>The built-in parts, and how the tests look at them.</summary>
internal static class BuiltInParts
{
    public const double Pico = 1e-12;
    public const double Femto = 1e-15;
    public const double Mega = 1e6;

    public static PartsCatalog Catalog => PartsCatalog.BuiltIn();

    public static IEnumerable<AmplifierPart> Amplifiers =>
        [.. Catalog.Inverters, .. Catalog.Counters, .. Catalog.Ports];

    public static byte[] FileBytes(PartKind kind)
    {
        using Stream stream = typeof(PartsCatalog).Assembly.GetManifestResourceStream($"catalog/{kind.Word()}.csv")
            ?? throw new InvalidOperationException($"There is no file of {kind.Word()}.");
        using var bytes = new MemoryStream();
        stream.CopyTo(bytes);
        return bytes.ToArray();
    }

    public static string FileText(PartKind kind) => Encoding.UTF8.GetString(FileBytes(kind));

    /// <summary>The cost of one when so many are bought, as cheaply as they can be.</summary>
    public static decimal CostEach(this Part part, int quantity) =>
        (part.Offer.CheapestPurchase(quantity) ?? throw new InvalidOperationException($"{part.Id} has no price.")).Total / quantity;

    /// <summary>Every pair of neighbours.</summary>
    public static IEnumerable<(T First, T Second)> Neighbours<T>(this IEnumerable<T> items)
    {
        T[] all = [.. items];
        return all.Zip(all.Skip(1));
    }
}
