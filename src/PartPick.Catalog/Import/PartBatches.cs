using LiteDB;

namespace PartPick.Catalog.Import;

/// <summary>Writes new parts batch by batch, while the next rows are read.</summary>
/// <param name="file">The catalogue.</param>
internal sealed class PartBatches(CatalogFile file)
{
    private const int BatchRows = 500;

    private List<BsonDocument> _batch = new(BatchRows);
    private Task _writing = Task.CompletedTask;

    /// <summary>Adds a part whose id is new.</summary>
    public void Add(BsonDocument part)
    {
        _batch.Add(part);
        if (_batch.Count >= BatchRows)
        {
            Begin();
        }
    }

    /// <summary>Waits for the batch that is being written; the file is free then.</summary>
    public void Wait() => _writing.GetAwaiter().GetResult();

    /// <summary>Writes the rest.</summary>
    public void Finish()
    {
        Begin();
        Wait();
    }

    /// <summary>Waits for what is being written, whatever becomes of it.</summary>
    public void Abandon() => ((IAsyncResult)_writing).AsyncWaitHandle.WaitOne();

    private void Begin()
    {
        Wait();
        if (_batch.Count > 0)
        {
            List<BsonDocument> full = _batch;
            _batch = new(BatchRows);
            _writing = Task.Run(() => file.InsertNew(full));
        }
    }
}
