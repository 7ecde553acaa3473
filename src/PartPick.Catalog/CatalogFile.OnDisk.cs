using LiteDB;

namespace PartPick.Catalog;

/// <content>The file as a whole: copied, published, looked at before it is opened, removed.</content>
internal sealed partial class CatalogFile
{
    /// <summary>Copies a catalogue that no one else has open, whole.</summary>
    public static bool Copy(string path, string copy)
    {
        // Opening and closing applies what a process that died left in the log beside the file.
        using (Open(path))
        {
        }

        Delete(copy);
        File.Copy(path, copy);
        return true;
    }

    /// <summary>Puts a changed copy in the place of the catalogue; the settings that were kept meanwhile come along.</summary>
    public static bool TakePlace(string copy, string path)
    {
        using (CatalogFile changed = Open(copy), current = Open(path))
        {
            foreach (BsonDocument setting in current.Settings.FindAll())
            {
                changed.Settings.Upsert(setting);
            }
        }

        Publish(copy, path);
        return true;
    }

    /// <summary>Forces a closed file to the disk and puts it in the place of another.</summary>
    public static void Publish(string copy, string path)
    {
        using (var stream = new FileStream(copy, FileMode.Open, FileAccess.ReadWrite))
        {
            stream.Flush(flushToDisk: true);
        }

        // What a damaged file of this name left in its log must not be applied to the new one.
        File.Delete(LogOf(path));
        File.Move(copy, path, overwrite: true);
    }

    // A file of whole pages that carries the mark of the file format: anything else would be taken for a new, empty file.
    private static bool LooksWhole(string path)
    {
        using FileStream stream = File.OpenRead(path);
        if (stream.Length < PageBytes || stream.Length % PageBytes != 0)
        {
            return false;
        }

        ReadOnlySpan<byte> mark = "** This is a LiteDB file **"u8;
        Span<byte> start = stackalloc byte[MarkOffset + 27];
        stream.ReadExactly(start);
        return start[MarkOffset..].SequenceEqual(mark);
    }

    /// <summary>Removes a file with its log, where they are there.</summary>
    public static void Delete(string path)
    {
        File.Delete(path);
        File.Delete(LogOf(path));
    }

    private static string LogOf(string path) => Path.Combine(
        Path.GetDirectoryName(path) ?? "", $"{Path.GetFileNameWithoutExtension(path)}-log{Path.GetExtension(path)}");
}
