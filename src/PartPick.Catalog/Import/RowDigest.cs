using System.Buffers.Binary;
using System.Runtime.InteropServices;
using System.Security.Cryptography;
using System.Text;

namespace PartPick.Catalog.Import;

/// <summary>A digest of a row and of how its columns are read: a row with the digest of an earlier one has the same figures.</summary>
internal sealed class RowDigest(string reading) : IDisposable
{
    private readonly byte[] _seed = SHA256.HashData(Encoding.UTF8.GetBytes(reading));
    private readonly IncrementalHash _hash = IncrementalHash.CreateHash(HashAlgorithmName.SHA256);

    /// <summary>The digests of rows of a file whose columns are used in a certain way.</summary>
    public static RowDigest For(ImportRequest request, ColumnUse[] uses)
    {
        string columns = string.Join('\n', uses.Select(use =>
            $"{use.Index}\t{use.Field}\t{use.Power}\t{use.Notation}\t"
            + $"{use.Quantity}\t{use.QuantityColumn}\t{use.Per}\t{use.PerColumn}\t{use.Currency}\t{use.Basis}\t{use.Exact}"));
        return new RowDigest($"{request.Kind.Word()}\n{request.Supplier}\n{columns}");
    }

    public UInt128 Of(ReadOnlySpan<char> row)
    {
        Span<byte> digest = stackalloc byte[32];
        _hash.AppendData(_seed);
        _hash.AppendData(MemoryMarshal.AsBytes(row));
        _hash.GetHashAndReset(digest);
        return BinaryPrimitives.ReadUInt128LittleEndian(digest);
    }

    public static byte[] Bytes(UInt128 digest)
    {
        byte[] bytes = new byte[16];
        BinaryPrimitives.WriteUInt128LittleEndian(bytes, digest);
        return bytes;
    }

    public static UInt128 Of(byte[] bytes) => bytes.Length == 16 ? BinaryPrimitives.ReadUInt128LittleEndian(bytes) : 0;

    public void Dispose() => _hash.Dispose();
}
