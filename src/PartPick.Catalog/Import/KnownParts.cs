using System.Buffers.Binary;
using System.Runtime.InteropServices;
using System.Security.Cryptography;

namespace PartPick.Catalog.Import;

/// <summary>The parts that a catalogue holds, by id and by the supplier's number, with the digests of their rows.</summary>
internal sealed class KnownParts
{
    private readonly PieceList<KnownPart> _parts = new();
    private readonly Dictionary<string, int> _suppliers = new(StringComparer.Ordinal);

    // The ids that do not follow from the supplier's number.
    private readonly Dictionary<int, string> _ids = [];
    private int[] _byId = Empty(1 << 12);
    private int[] _byNumber = Empty(1 << 12);
    private string? _lastText;
    private UInt128 _lastDigest;

    /// <summary>Reads them from a catalogue.</summary>
    public static KnownParts Of(CatalogFile file)
    {
        var known = new KnownParts();
        foreach ((string id, PartKind kind, string? supplier, string? number, UInt128 row) in file.ReadKnown())
        {
            known.Add(id, kind, supplier, number, row);
        }

        return known;
    }

    /// <summary>A part, to be read and changed in its place.</summary>
    public ref KnownPart this[int part] => ref _parts[part];

    /// <summary>Adds a part and gives its place.</summary>
    public int Add(string id, PartKind kind, string? supplier, string? number, UInt128 row)
    {
        if (_parts.Count == _byId.Length)
        {
            Widen();
        }

        int place = _parts.Add(new KnownPart
        {
            Id = Digest(id),
            Number = number is null ? 0 : Digest(number),
            Row = row,
            Kind = kind,
            Supplier = supplier is null ? -1 : SupplierOf(supplier),
        });
        if (number is null || RowCompletion.IdOf(number) != id)
        {
            _ids[place] = id;
        }

        Link(place);
        return place;
    }

    /// <summary>The place of the part with an id; -1 for none.</summary>
    public int WithId(string id)
    {
        UInt128 digest = Digest(id);
        int part = _byId[Slot(digest, _byId)];
        while (part >= 0 && _parts[part].Id != digest)
        {
            part = _parts[part].NextById;
        }

        return part;
    }

    /// <summary>
    /// The place of the part with a supplier's number; a row that names no supplier fits where only one supplier has that number.
    /// </summary>
    public int WithNumber(PartKind kind, string number, string? supplier)
    {
        UInt128 digest = Digest(number);
        int wanted = supplier is null ? -1 : _suppliers.GetValueOrDefault(supplier, -2);
        (int found, int count) = (-1, 0);
        for (int place = _byNumber[Slot(digest, _byNumber)]; place >= 0; place = _parts[place].NextByNumber)
        {
            ref KnownPart part = ref _parts[place];
            if (part.Number != digest || part.Kind != kind)
            {
                continue;
            }

            if (supplier is not null && part.Supplier == wanted)
            {
                return place;
            }

            if (supplier is null || part.Supplier < 0)
            {
                (found, count) = (place, count + 1);
            }
        }

        return count == 1 ? found : -1;
    }

    /// <summary>The id of a part that was found by its number.</summary>
    public string IdOf(int part, string? number) => _ids.TryGetValue(part, out string? id) ? id : RowCompletion.IdOf(number!);

    /// <summary>An id that no part has yet.</summary>
    public string FreeId(string wanted, string? supplier)
    {
        if (WithId(wanted) < 0)
        {
            return wanted;
        }

        string longer = supplier is null ? wanted : RowCompletion.IdOf($"{supplier}-{wanted}");
        string free = longer;
        for (int i = 2; WithId(free) >= 0; i++)
        {
            free = RowCompletion.IdOf($"{longer}-{CellNumber.Text(i)}");
        }

        return free;
    }

    private UInt128 Digest(string text)
    {
        // Mostly the same text is asked for several times in a row: the number that also is the id.
        if (text == _lastText)
        {
            return _lastDigest;
        }

        Span<byte> digest = stackalloc byte[32];
        SHA256.HashData(MemoryMarshal.AsBytes(text.AsSpan()), digest);
        (_lastText, _lastDigest) = (text, BinaryPrimitives.ReadUInt128LittleEndian(digest) | 1);
        return _lastDigest;
    }

    private static int[] Empty(int length)
    {
        int[] slots = new int[length];
        slots.AsSpan().Fill(-1);
        return slots;
    }

    private static int Slot(UInt128 digest, int[] slots) => (int)((uint)(ulong)(digest >> 32) & (uint)(slots.Length - 1));

    private int SupplierOf(string supplier)
    {
        if (!_suppliers.TryGetValue(supplier, out int place))
        {
            place = _suppliers.Count;
            _suppliers[supplier] = place;
        }

        return place;
    }

    private void Link(int place)
    {
        ref KnownPart part = ref _parts[place];
        int id = Slot(part.Id, _byId);
        (part.NextById, _byId[id]) = (_byId[id], place);
        if (part.Number != 0)
        {
            int number = Slot(part.Number, _byNumber);
            (part.NextByNumber, _byNumber[number]) = (_byNumber[number], place);
        }
    }

    private void Widen()
    {
        (_byId, _byNumber) = (Empty(_byId.Length * 2), Empty(_byId.Length * 2));
        for (int i = 0; i < _parts.Count; i++)
        {
            Link(i);
        }
    }
}
