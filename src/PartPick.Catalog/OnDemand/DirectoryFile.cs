using System.Collections.Immutable;
using System.Runtime.InteropServices;
using System.Security.Cryptography;

namespace PartPick.Catalog;

/// <summary>
/// Keeps a directory in a file beside the catalogue, so that the parts need not be read again. Losing it, or not being able to write
/// it, costs nothing but time: it is only used where it is whole and carries the mark of the catalogue.
/// </summary>
internal static class DirectoryFile
{
    private const string Form = "parts directory 1";

    /// <summary>The path of the file beside a catalogue.</summary>
    public static string Beside(string catalog) => catalog + ".directory";

    /// <summary>Keeps a directory.</summary>
    public static void Write(string path, DirectoryColumns columns)
    {
        string unfinished = path + ".new";
        try
        {
            using (var stream = new MemoryStream())
            {
                using var writer = new BinaryWriter(stream);
                Write(writer, columns);
                ReadOnlySpan<byte> bytes = stream.GetBuffer().AsSpan(0, (int)stream.Length);
                using FileStream file = File.Create(unfinished);
                file.Write(SHA256.HashData(bytes));
                file.Write(bytes);
            }

            File.Move(unfinished, path, overwrite: true);
        }
        catch (Exception error) when (error is IOException or UnauthorizedAccessException)
        {
            // A full or read-only disk: the parts are read again next time.
            TryDelete(unfinished);
        }
    }

    /// <summary>Reads a directory; null where there is none of that mark, or none that is whole.</summary>
    public static PartsDirectory? Read(string path, string mark)
    {
        try
        {
            byte[] bytes = File.ReadAllBytes(path);
            if (bytes.Length < SHA256.HashSizeInBytes
                || !SHA256.HashData(bytes.AsSpan(SHA256.HashSizeInBytes)).AsSpan().SequenceEqual(bytes.AsSpan(0, SHA256.HashSizeInBytes)))
            {
                return null;
            }

            using var reader = new BinaryReader(new MemoryStream(bytes, SHA256.HashSizeInBytes, bytes.Length - SHA256.HashSizeInBytes));
            return reader.ReadString() == Form && reader.ReadString() == mark ? new PartsDirectory(Read(reader, mark)) : null;
        }
        catch (Exception error) when (error is IOException or UnauthorizedAccessException)
        {
            return null;
        }
    }

    private static void Write(BinaryWriter writer, DirectoryColumns columns)
    {
        writer.Write(Form);
        writer.Write(columns.Mark);
        writer.Write(columns.Currency);
        WriteColumn(writer, columns.Frequencies);
        WriteColumn(writer, columns.Loads);
        WriteColumn(writer, columns.Shunts);
        WriteColumn(writer, columns.Motionals);
        WriteColumn(writer, columns.Cuts);
        WriteColumn(writer, columns.Packages);
        WriteColumn(writer, columns.IdEnds);
        WriteColumn(writer, columns.IdBytes);
        WriteWords(writer, columns.PackageWords);
        WriteWords(writer, columns.OtherIds);
    }

    private static DirectoryColumns Read(BinaryReader reader, string mark) => new()
    {
        Mark = mark,
        Currency = reader.ReadString(),
        Frequencies = ReadColumn<double>(reader),
        Loads = ReadColumn<double>(reader),
        Shunts = ReadColumn<double>(reader),
        Motionals = ReadColumn<double>(reader),
        Cuts = ReadColumn<byte>(reader),
        Packages = ReadColumn<int>(reader),
        IdEnds = ReadColumn<int>(reader),
        IdBytes = ReadColumn<byte>(reader),
        PackageWords = ReadWords(reader),
        OtherIds = ReadWords(reader),
    };

    private static void WriteColumn<T>(BinaryWriter writer, T[] column)
        where T : unmanaged
    {
        writer.Write(column.Length);
        writer.Write(MemoryMarshal.AsBytes(column.AsSpan()));
    }

    private static T[] ReadColumn<T>(BinaryReader reader)
        where T : unmanaged
    {
        var column = new T[reader.ReadInt32()];
        reader.BaseStream.ReadExactly(MemoryMarshal.AsBytes(column.AsSpan()));
        return column;
    }

    private static void WriteWords(BinaryWriter writer, ImmutableArray<string> words)
    {
        writer.Write(words.Length);
        foreach (string word in words)
        {
            writer.Write(word);
        }
    }

    private static ImmutableArray<string> ReadWords(BinaryReader reader) =>
        [.. Enumerable.Range(0, reader.ReadInt32()).Select(_ => reader.ReadString())];

    private static void TryDelete(string path)
    {
        try
        {
            File.Delete(path);
        }
        catch (Exception error) when (error is IOException or UnauthorizedAccessException)
        {
            // It is overwritten next time.
        }
    }
}
