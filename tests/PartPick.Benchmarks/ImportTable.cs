using System.Diagnostics;
using System.Globalization;
using CsvHelper;
using LiteDB;
using PartPick.Catalog;
using PartPick.Catalog.Import;

namespace PartPick.Benchmarks;

/// <summary>
/// The import of a large list, beside what it cannot do without: reading the same file to strings, and inserting the same documents
/// with the same indexes. Times and processor times of one run; the ratios count. On a busy machine the time of
/// the import, which has two things to do at once, suffers more than that of the inserting; its processor time does not.
/// </summary>
internal static class ImportTable
{
    private const int Chunk = 5000;
    private const int WarmRows = 20_000;

    /// <summary>Measures and prints.</summary>
    /// <param name="arguments">The number of rows, 1000000 when left out.</param>
    /// <param name="output">Where to print.</param>
    public static int Print(string[] arguments, TextWriter output)
    {
        int rows = arguments.Length > 0 ? int.Parse(arguments[0], CultureInfo.InvariantCulture) : 1_000_000;
        string folder = Directory.CreateTempSubdirectory("partpick-import-bench-").FullName;
        try
        {
            string list = Path.Combine(folder, "list.csv");
            string db = Path.Combine(folder, "catalog.db");
            WriteList(list, rows);
            WarmUp(folder);
            CatalogStore.Load(db);
            (TimeSpan first, TimeSpan firstWork) = Timed(() => Import(db, list, rows, 0));
            long peak = PeakBytes();
            (TimeSpan second, TimeSpan secondWork) = Timed(() => Import(db, list, 0, rows));
            long peakAfter = PeakBytes();
            (TimeSpan read, TimeSpan readWork) = Timed(() => ReadStrings(list));
            (TimeSpan insert, TimeSpan insertWork) = InsertSame(db, Path.Combine(folder, "same.db"));
            double sum = (read + insert).TotalSeconds;
            double work = (readWork + insertWork).TotalSeconds;
            output.WriteLine(string.Create(CultureInfo.InvariantCulture, $"""
                rows {rows}, columns 15, file {new FileInfo(list).Length / 1e6:F0} MB, catalogue {new FileInfo(db).Length / 1e6:F0} MB
                                             time          processor
                reading to strings        {read.TotalSeconds,8:F2} s        {readWork.TotalSeconds,8:F2} s
                inserting the documents   {insert.TotalSeconds,8:F2} s        {insertWork.TotalSeconds,8:F2} s
                sum                       {sum,8:F2} s  1.00  {work,8:F2} s  1.00
                import                    {first.TotalSeconds,8:F2} s  {first.TotalSeconds / sum:F2}  {firstWork.TotalSeconds,8:F2} s  {firstWork.TotalSeconds / work:F2}
                the same again, unchanged {second.TotalSeconds,8:F2} s  {second / first:F2}  {secondWork.TotalSeconds,8:F2} s  {secondWork / firstWork:F2}   of the first import
                most memory in the first import {peak / 1e6:F0} MB, with the second {peakAfter / 1e6:F0} MB
                """));
            return 0;
        }
        finally
        {
            Directory.Delete(folder, recursive: true);
        }
    }

    // Compiles what is measured, so that a short list is not charged for it and the inserting is not spared it by coming last.
    private static void WarmUp(string folder)
    {
        string list = Path.Combine(folder, "warm.csv");
        string db = Path.Combine(folder, "warm.db");
        WriteList(list, WarmRows);
        CatalogStore.Load(db);
        Import(db, list, WarmRows, 0);
        Import(db, list, 0, WarmRows);
        ReadStrings(list);
        InsertSame(db, Path.Combine(folder, "warm-same.db"));
    }

    private static (TimeSpan Time, TimeSpan Work) Timed(Action action)
    {
        (long start, TimeSpan worked) = (Stopwatch.GetTimestamp(), Environment.CpuUsage.TotalTime);
        action();
        return (Stopwatch.GetElapsedTime(start), Environment.CpuUsage.TotalTime - worked);
    }

    private static void Import(string db, string list, int added, int unchanged)
    {
        var request = new ImportRequest { Kind = PartKind.Crystal, Name = "list.csv", Date = new DateOnly(2026, 3, 1) };
        ImportReport report = CatalogImport.Run(db, File.OpenRead(list), request, null, CancellationToken.None).Value;
        if (report.Added != added || report.Unchanged != unchanged)
        {
            throw new InvalidOperationException(
                $"{report.Added} added, {report.Unchanged} unchanged, {report.Rejected} rejected: "
                + $"{report.Rejections.FirstOrDefault()}");
        }
    }

    private static long PeakBytes()
    {
        using Process self = Process.GetCurrentProcess();
        return self.PeakWorkingSet64;
    }

    private static void ReadStrings(string list)
    {
        long letters = 0;
        using (CsvReader reader = CsvReader.FromFile(list))
        {
            while (reader.Read())
            {
                for (int i = 0; i < 15; i++)
                {
                    letters += reader.GetString(i).Length;
                }
            }
        }

        if (letters == 0)
        {
            throw new InvalidOperationException("Nothing was read.");
        }
    }

    // Only the inserting is timed, not the reading of the documents that are inserted.
    private static (TimeSpan Time, TimeSpan Work) InsertSame(string db, string target)
    {
        (TimeSpan spent, TimeSpan worked) = (TimeSpan.Zero, TimeSpan.Zero);
        void Add((TimeSpan Time, TimeSpan Work) piece) => (spent, worked) = (spent + piece.Time, worked + piece.Work);
        using var source = new LiteDatabase(Connection(db));
        var same = new LiteDatabase(Connection(target));
        ILiteCollection<BsonDocument> parts = same.GetCollection("parts");
        foreach (BsonDocument[] documents in source.GetCollection("parts").FindAll().Chunk(Chunk))
        {
            Add(Timed(() => parts.InsertBulk(documents, documents.Length)));
        }

        Add(Timed(same.Dispose));
        return (spent, worked);
    }

    private static ConnectionString Connection(string path) => new() { Filename = path, Collation = new Collation("/Ordinal") };

    /// <summary>Writes a list of crystals as a supplier might.</summary>
    public static void WriteList(string path, int rows)
    {
        var random = new Random(1);
        using var text = new StreamWriter(path) { NewLine = "\n" };
        text.WriteLine(
            "Part Number,Description,Frequency (MHz),Load Cap.,ESR max,Freq Tol,Freq Stab,Operating Temp,"
            + "Drive Level (uW),Package,Stock,MOQ,Price,Qty 100 price,Currency");
        for (int i = 0; i < rows; i++)
        {
            double price = random.Next(10, 300) / 100.0;
            text.WriteLine(string.Create(
                CultureInfo.InvariantCulture,
                $"XT-{i:D7},crystal number {i},{random.Next(3, 50)}.{random.Next(10, 999999):D6},{random.Next(6, 33)}pF,"
                + $"{random.Next(2, 20) * 10} Ohm,±{random.Next(1, 6) * 10}ppm,±{random.Next(1, 10) * 10}ppm,"
                + $"-{random.Next(1, 5) * 10}°C ~ {random.Next(6, 10) * 10}°C,{random.Next(1, 6) * 100},"
                + $"SMD {random.Next(16, 80)}25,{random.Next(0, 50000)},{random.Next(1, 11)},{price:F2},{price * 0.7:F3},EUR"));
        }
    }
}
