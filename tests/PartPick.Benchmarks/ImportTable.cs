using System.Diagnostics;
using System.Globalization;
using CsvHelper;
using LiteDB;
using PartPick.Catalog;
using PartPick.Catalog.Import;

namespace PartPick.Benchmarks;

/// <summary>
/// The import of a large list, beside what it cannot do without: reading the same file to strings, and inserting the same documents
/// with the same indexes. Times of one run; the ratios count.
/// </summary>
internal static class ImportTable
{
    private const int Chunk = 5000;

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
            CatalogStore.Load(db);
            TimeSpan first = Import(db, list, rows, 0);
            long peak = PeakBytes();
            TimeSpan second = Import(db, list, 0, rows);
            long peakAfter = PeakBytes();
            TimeSpan read = ReadStrings(list);
            TimeSpan insert = InsertSame(db, Path.Combine(folder, "same.db"));
            double sum = (read + insert).TotalSeconds;
            output.WriteLine(string.Create(CultureInfo.InvariantCulture, $"""
                rows {rows}, columns 15, file {new FileInfo(list).Length / 1e6:F0} MB, catalogue {new FileInfo(db).Length / 1e6:F0} MB
                reading to strings        {read.TotalSeconds,8:F2} s
                inserting the documents   {insert.TotalSeconds,8:F2} s
                sum                       {sum,8:F2} s   1.00
                import                    {first.TotalSeconds,8:F2} s   {first.TotalSeconds / sum:F2}
                the same again, unchanged {second.TotalSeconds,8:F2} s   {second / first:F2} of the first
                most memory in the first import {peak / 1e6:F0} MB, with the second {peakAfter / 1e6:F0} MB
                """));
            return 0;
        }
        finally
        {
            Directory.Delete(folder, recursive: true);
        }
    }

    private static TimeSpan Import(string db, string list, int added, int unchanged)
    {
        long start = Stopwatch.GetTimestamp();
        var request = new ImportRequest { Kind = PartKind.Crystal, Name = "list.csv", Date = new DateOnly(2026, 3, 1) };
        ImportReport report = CatalogImport.Run(db, File.OpenRead(list), request, null, CancellationToken.None).Value;
        return report.Added == added && report.Unchanged == unchanged
            ? Stopwatch.GetElapsedTime(start)
            : throw new InvalidOperationException(
                $"{report.Added} added, {report.Unchanged} unchanged, {report.Rejected} rejected: "
                + $"{report.Rejections.FirstOrDefault()}");
    }

    private static long PeakBytes()
    {
        using Process self = Process.GetCurrentProcess();
        return self.PeakWorkingSet64;
    }

    private static TimeSpan ReadStrings(string list)
    {
        long start = Stopwatch.GetTimestamp();
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

        return letters > 0 ? Stopwatch.GetElapsedTime(start) : throw new InvalidOperationException("Nothing was read.");
    }

    // Only the inserting is timed, not the reading of the documents that are inserted.
    private static TimeSpan InsertSame(string db, string target)
    {
        TimeSpan spent = TimeSpan.Zero;
        using var source = new LiteDatabase(Connection(db));
        var same = new LiteDatabase(Connection(target));
        ILiteCollection<BsonDocument> parts = same.GetCollection("parts");
        foreach (BsonDocument[] documents in source.GetCollection("parts").FindAll().Chunk(Chunk))
        {
            long start = Stopwatch.GetTimestamp();
            parts.InsertBulk(documents, documents.Length);
            spent += Stopwatch.GetElapsedTime(start);
        }

        long closing = Stopwatch.GetTimestamp();
        same.Dispose();
        return spent + Stopwatch.GetElapsedTime(closing);
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
