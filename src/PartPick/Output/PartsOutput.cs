using System.Text.Json.Nodes;
using PartPick.Catalog;
using PartPick.Commands;

namespace PartPick.Output;

/// <summary>
/// Prints parts of one kind as they come, without holding them; only a table, whose columns fit all rows, waits for the last.
/// </summary>
internal sealed class PartsOutput : IDisposable
{
    private readonly TextWriter _output;
    private readonly OutputFormat _format;
    private readonly PartKind _kind;
    private readonly List<CatalogEntry> _entries = [];
    private PartCsvWriter? _csv;
    private bool _hasBegun;

    /// <summary>Prints nothing yet: what cannot be read leaves the output empty.</summary>
    public PartsOutput(TextWriter output, OutputFormat format, PartKind kind) => (_output, _format, _kind) = (output, format, kind);

    private PartCsvWriter Csv => _csv ??= new PartCsvWriter(_kind, _output);

    /// <summary>Prints a part.</summary>
    public void Write(CatalogEntry entry)
    {
        switch (_format)
        {
            case OutputFormat.Json:
                _output.Write(_hasBegun ? ",\n" : "[\n");
                _output.Write(JsonOutput.Indented(PartJson.Of(entry)));
                break;
            case OutputFormat.Csv:
                Csv.Write(entry.Part);
                break;
            default:
                _entries.Add(entry);
                break;
        }

        _hasBegun = true;
    }

    /// <summary>Ends.</summary>
    public void End()
    {
        switch (_format)
        {
            case OutputFormat.Json when _hasBegun:
                _output.WriteLine();
                _output.WriteLine("]");
                break;
            case OutputFormat.Json:
                JsonOutput.Write(_output, new JsonArray());
                break;
            case OutputFormat.Csv:
                _ = Csv;
                break;
            default:
                PartTable.WriteList(_output, _kind, _entries);
                break;
        }
    }

    /// <summary>Writes what is left.</summary>
    public void Dispose() => _csv?.Dispose();
}
