using System.Reflection;
using System.Security.Cryptography;
using System.Text;
using PartPick.Values;

namespace PartPick.Catalog;

/// <summary>The CSV files of the parts that travel inside the program.</summary>
/// <param name="texts">The text of each kind's file; a kind without a file has no parts.</param>
internal sealed class BuiltInFiles(IReadOnlyDictionary<PartKind, string> texts)
{
    /// <summary>The files in this assembly.</summary>
    public static BuiltInFiles Embedded()
    {
        Assembly assembly = typeof(BuiltInFiles).Assembly;
        var texts = new Dictionary<PartKind, string>();
        foreach (PartKind kind in PartKinds.All)
        {
            using Stream? stream = assembly.GetManifestResourceStream($"catalog/{kind.Word()}.csv");
            if (stream is not null)
            {
                using var reader = new StreamReader(stream, Encoding.UTF8);
                texts[kind] = reader.ReadToEnd();
            }
        }

        return new BuiltInFiles(texts);
    }

    /// <summary>The text of a kind's file; empty where there is none.</summary>
    public string TextOf(PartKind kind) => texts.GetValueOrDefault(kind, "");

    /// <summary>Changes whenever a file does.</summary>
    public string Fingerprint()
    {
        using var hash = IncrementalHash.CreateHash(HashAlgorithmName.SHA256);
        foreach (PartKind kind in PartKinds.All)
        {
            hash.AppendData(Encoding.UTF8.GetBytes($"{kind.Word()}\0{TextOf(kind)}\0"));
        }

        return Convert.ToHexString(hash.GetHashAndReset());
    }

    /// <summary>Reads the parts.</summary>
    /// <exception cref="BuiltInPartsException">A file is wrong, which is a mistake in the program.</exception>
    public PartsCatalog ReadCatalog()
    {
        var parts = new List<Part>();
        var ids = new HashSet<string>(StringComparer.Ordinal);
        foreach ((PartKind kind, string text) in texts)
        {
            (IReadOnlyList<Part> read, IReadOnlyList<Problem> problems) =
                PartCsv.Read(kind, new StringReader(text), kind.Word() + ".csv");
            Problem? first = problems.Count > 0 ? problems[0] : null;
            if (first is null && read.FirstOrDefault(part => !ids.Add(part.Id)) is { } twice)
            {
                first = new Problem(kind.Word() + ".csv", $"{Problem.Quote(twice.Id)} is the id of another kind too", "an id of its own");
            }

            if (first is not null)
            {
                throw new BuiltInPartsException($"The parts inside the program are wrong: {first}");
            }

            parts.AddRange(read);
        }

        return new PartsCatalog(parts);
    }
}
