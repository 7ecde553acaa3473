using System.Collections.Immutable;

namespace PartPick.Catalog;

/// <summary>A set of parts, held in memory and never changed. Every list is ordered by id, ordinal.</summary>
public sealed class PartsCatalog
{
    private static readonly Lazy<PartsCatalog> Embedded = new(() => BuiltInFiles.Embedded().ReadCatalog());

    private readonly Dictionary<string, Part> _byId;
    private readonly Lazy<string> _currency;

    /// <summary>Makes a catalogue of parts.</summary>
    /// <param name="parts">The parts, in any order.</param>
    /// <exception cref="ArgumentException">Two parts have the same id.</exception>
    public PartsCatalog(IEnumerable<Part> parts)
        : this(parts, null)
    {
    }

    /// <summary>Makes a catalogue of some of the parts of a larger one, which has a main currency of its own.</summary>
    internal PartsCatalog(IEnumerable<Part> parts, string? currency)
    {
        ArgumentNullException.ThrowIfNull(parts);
        All = [.. parts.OrderBy(part => part.Id, StringComparer.Ordinal)];
        _byId = All.ToDictionary(part => part.Id, StringComparer.Ordinal);
        Crystals = [.. All.OfType<CrystalPart>()];
        Capacitors = [.. All.OfType<CapacitorPart>()];
        Resistors = [.. All.OfType<ResistorPart>()];
        Inverters = [.. All.OfType<InverterPart>()];
        Counters = [.. All.OfType<CounterPart>()];
        Ports = [.. All.OfType<PortPart>()];
        Transistors = [.. All.OfType<TransistorPart>()];
        _currency = currency is null ? new Lazy<string>(MostUsedCurrency) : new Lazy<string>(currency);
    }

    /// <summary>A catalogue without parts.</summary>
    public static PartsCatalog Empty { get; } = new([]);

    /// <summary>All parts.</summary>
    public ImmutableArray<Part> All { get; }

    /// <summary>The crystals.</summary>
    public ImmutableArray<CrystalPart> Crystals { get; }

    /// <summary>The capacitors.</summary>
    public ImmutableArray<CapacitorPart> Capacitors { get; }

    /// <summary>The resistors.</summary>
    public ImmutableArray<ResistorPart> Resistors { get; }

    /// <summary>The inverters.</summary>
    public ImmutableArray<InverterPart> Inverters { get; }

    /// <summary>The counters.</summary>
    public ImmutableArray<CounterPart> Counters { get; }

    /// <summary>The ports.</summary>
    public ImmutableArray<PortPart> Ports { get; }

    /// <summary>The transistors.</summary>
    public ImmutableArray<TransistorPart> Transistors { get; }

    /// <summary>The currency in which most parts are priced, the first by ordinal of equally many; empty where none is priced.</summary>
    public string Currency => _currency.Value;

    /// <summary>The parts that travel inside the program.</summary>
    /// <returns>The catalogue, read once.</returns>
    /// <exception cref="BuiltInPartsException">The files in the program are wrong.</exception>
    public static PartsCatalog BuiltIn() => Embedded.Value;

    /// <summary>The parts of one kind.</summary>
    /// <param name="kind">The kind.</param>
    /// <returns>The parts.</returns>
    public IEnumerable<Part> OfKind(PartKind kind) => All.Where(part => part.Kind == kind);

    /// <summary>Finds a part.</summary>
    /// <param name="id">Its id.</param>
    /// <returns>The part; null when there is none.</returns>
    public Part? Find(string id) => _byId.GetValueOrDefault(id);

    private string MostUsedCurrency()
    {
        var counts = new CurrencyCounts();
        foreach (Part part in All)
        {
            counts.Add(part.Offer);
        }

        return counts.Most;
    }
}
