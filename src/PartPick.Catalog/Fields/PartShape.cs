using PartPick.Values;

namespace PartPick.Catalog.Fields;

/// <summary>A kind of part in files: its columns in order, and the way from a draft to a part and back.</summary>
internal abstract class PartShape
{
    private static readonly Dictionary<PartKind, PartShape> Shapes = new PartShape[]
    {
        new CrystalShape(), new CapacitorShape(), new ResistorShape(), new InverterShape(), new CounterShape(), new PortShape(),
        new TransistorShape(),
    }.ToDictionary(shape => shape.Kind);

    private readonly string[] _basisKeys;

    protected PartShape(PartKind kind, params PartField[] own)
    {
        Kind = kind;
        Fields =
        [
            Text("id"), Text("description"), .. own, Text("basis"), Text("supplier"), Text("supplierPart"), Text("package"),
            Text("currency"), Text("prices"), Count("minimumOrder"), Count("multiple"), Count("stock"), Text("excluded"), Text("note"),
        ];
        _basisKeys = [.. own.Select(field => field.BasisKey).Distinct()];
    }

    public PartKind Kind { get; }

    /// <summary>All fields, in the order of the columns.</summary>
    public IReadOnlyList<PartField> Fields { get; }

    public static PartShape Of(PartKind kind) => Shapes[kind];

    /// <summary>Makes the part of a draft; null, with problems in the reader, where the figures make no part.</summary>
    public Part? Build(DraftReader reader)
    {
        string id = reader.RequiredText("id");
        if (id.Length > 64 || id.Any(char.IsWhiteSpace))
        {
            reader.Report("id", $"{Problem.Quote(id)} is no id", "at most 64 characters without spaces");
        }

        Part own = BuildOwn(reader, id, reader.RequiredText("description"), ReadOffer(reader));
        if (reader.Text("excluded") is not (null or "yes"))
        {
            reader.Report("excluded", $"{Problem.Quote(reader.Text("excluded"))} is neither", "yes, or nothing");
        }

        Part whole = own with
        {
            Supplier = reader.Text("supplier"),
            SupplierPart = reader.Text("supplierPart"),
            Package = reader.Text("package"),
            Stock = reader.Whole("stock"),
            Excluded = reader.Text("excluded") is not null,
            Note = reader.Text("note"),
            Basis = BasisText.Read(reader.Text("basis"), _basisKeys, reader) ?? own.Basis,
        };
        return reader.Problems.Count == 0 ? whole : null;
    }

    /// <summary>The draft of a part of this kind.</summary>
    public PartDraft DraftOf(Part part)
    {
        var draft = new PartDraft();
        draft.Set("id", part.Id);
        draft.Set("description", part.Description);
        draft.Set("basis", BasisText.Write(part, _basisKeys));
        draft.Set("supplier", part.Supplier);
        draft.Set("supplierPart", part.SupplierPart);
        draft.Set("package", part.Package);
        draft.Set("currency", part.Offer.Currency);
        draft.Set("prices", PricesText.Write(part.Offer));
        draft.Set("minimumOrder", part.Offer.MinimumOrder);
        draft.Set("multiple", part.Offer.Multiple);
        draft.Set("stock", part.Stock);
        draft.Set("excluded", part.Excluded ? "yes" : null);
        draft.Set("note", part.Note);
        FillOwn(part, draft);
        return draft;
    }

    protected abstract Part BuildOwn(DraftReader reader, string id, string description, Offer offer);

    protected abstract void FillOwn(Part part, PartDraft draft);

    protected static PartField Text(string key) => new(key, null);

    protected static PartField Count(string key) => new(key, Dimension.Count);

    protected static PartField Ratio(string key, string unit) => new(key, Dimension.Relative, unit, unit == "%" ? -2 : -6);

    protected static PartField Picofarads(string key) => new(key, Dimension.Capacitance, "pF", -12);

    protected static PartField Ohms(string key) => new(key, Dimension.Resistance, "ohm");

    protected static PartField Volts(string key) => new(key, Dimension.Voltage, "V");

    protected static PartField Celsius(string key) => new(key, Dimension.Temperature, "degC");

    private static Offer ReadOffer(DraftReader reader)
    {
        var offer = new Offer(
            reader.Text("currency") ?? "", PricesText.Read(reader.Text("prices"), reader),
            reader.Whole("minimumOrder") ?? 1, reader.Whole("multiple") ?? 1);
        if (offer.HasPrices && offer.Currency.Length == 0)
        {
            reader.Report("currency", "is missing beside prices", "a currency such as EUR");
        }

        foreach (string key in new[] { "minimumOrder", "multiple" })
        {
            if (reader.Whole(key) == 0)
            {
                reader.Report(key, "is zero", "a whole number from 1");
            }
        }

        return offer;
    }
}
