namespace PartPick.Catalog.Import;

/// <summary>The parts that a catalogue holds, by id and by the supplier's number, with the digests of their rows.</summary>
internal sealed class KnownParts
{
    private readonly Dictionary<string, KnownPart> _byId = new(StringComparer.Ordinal);
    private readonly Dictionary<string, KnownPart> _byNumber = new(StringComparer.Ordinal);

    /// <summary>Reads them from a catalogue.</summary>
    public static KnownParts Of(CatalogFile file)
    {
        var known = new KnownParts();
        foreach (KnownPart part in file.ReadKnown())
        {
            known.Add(part);
        }

        return known;
    }

    public void Add(KnownPart part)
    {
        _byId[part.Id] = part;
        if (part.SupplierPart is { } number)
        {
            part.Next = _byNumber.GetValueOrDefault(number);
            _byNumber[number] = part;
        }
    }

    public KnownPart? WithId(string id) => _byId.GetValueOrDefault(id);

    /// <summary>The part with a supplier's number; a row that names no supplier fits where only one supplier has that number.</summary>
    public KnownPart? WithNumber(PartKind kind, string number, string? supplier)
    {
        (KnownPart? found, int count) = (null, 0);
        for (KnownPart? part = _byNumber.GetValueOrDefault(number); part is not null; part = part.Next)
        {
            if (part.Kind != kind)
            {
                continue;
            }

            if (supplier is not null && string.Equals(part.Supplier, supplier, StringComparison.Ordinal))
            {
                return part;
            }

            if (supplier is null || part.Supplier is null)
            {
                (found, count) = (part, count + 1);
            }
        }

        return count == 1 ? found : null;
    }

    /// <summary>An id that no part has yet.</summary>
    public string FreeId(string wanted, string? supplier)
    {
        if (!_byId.ContainsKey(wanted))
        {
            return wanted;
        }

        string longer = supplier is null ? wanted : RowCompletion.IdOf($"{supplier}-{wanted}");
        string free = longer;
        for (int i = 2; _byId.ContainsKey(free); i++)
        {
            free = RowCompletion.IdOf($"{longer}-{CellNumber.Text(i)}");
        }

        return free;
    }
}
