using CsvHelper;
using PartPick.Catalog.Fields;

namespace PartPick.Catalog;

/// <summary>Writes the CSV file of a kind part by part, as <see cref="PartCsv"/> reads it.</summary>
public sealed class PartCsvWriter : IDisposable
{
    private readonly PartShape _shape;
    private readonly CsvWriter _writer;

    /// <summary>Writes the header.</summary>
    /// <param name="kind">The kind of the parts.</param>
    /// <param name="text">Where to write; it is not closed.</param>
    public PartCsvWriter(PartKind kind, TextWriter text)
    {
        CsvWriterOptions options = CsvWriterOptions.Default with { NewLine = "\n", Separator = ',', WriteByteOrderMark = false };
        _shape = PartShape.Of(kind);
        _writer = CsvWriter.Create(text, options, true);
        _writer.WriteRecord([.. _shape.Fields.Select(field => field.Header)]);
    }

    /// <summary>Writes a part.</summary>
    /// <param name="part">The part.</param>
    /// <exception cref="ArgumentException">It is of another kind.</exception>
    public void Write(Part part)
    {
        ArgumentNullException.ThrowIfNull(part);
        if (part.Kind != _shape.Kind)
        {
            throw new ArgumentException($"{part.Id} is not one of the {_shape.Kind.Word()}.", nameof(part));
        }

        PartDraft draft = _shape.DraftOf(part);
        _writer.WriteRecord([.. _shape.Fields.Select(field => field.Write(draft))]);
    }

    /// <summary>Writes what is left.</summary>
    public void Dispose()
    {
        _writer.Flush();
        _writer.Dispose();
    }
}
