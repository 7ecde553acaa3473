using System.Diagnostics;
using System.Text;
using PartPick.Catalog.Import;
using PartPick.Values;

namespace PartPick.Catalog.Tests.Import;

/// <summary>Files that no one wrote by hand: memory stays bounded, and what is wrong is one line.</summary>
public sealed class HostileInputTests : IDisposable
{
    private readonly ImportBench _bench = new();

    public void Dispose() => _bench.Dispose();

    [Theory]
    [InlineData("", 'x')]
    [InlineData("Part No,Frequency\nA1,", 'x')]
    [InlineData("Part No,Frequency\nA1,\"", 'x')]
    [InlineData("Part No,Frequency\nA1,\"", '"')]
    [InlineData("Part No,Frequency\nA1", ',')]
    public void A_line_of_hundreds_of_megabytes_takes_little_memory(string start, char filler)
    {
        long before = GC.GetTotalMemory(forceFullCollection: true);
        var stream = new EndlessStream(start, (byte)filler, 300_000_000);
        Result<ImportReport> result = CatalogImport.Run(_bench.Db, stream, _bench.Request(), null, TestContext.Current.CancellationToken);
        Assert.True(GC.GetTotalMemory(forceFullCollection: false) - before < 100_000_000);
        if (start.Length == 0)
        {
            Assert.Contains("line 1 is longer", result.Problem!.ToString(), StringComparison.Ordinal);
        }
        else
        {
            Assert.Equal((1, 1), (result.Value.Read, result.Value.Rejected));
        }
    }

    [Fact]
    public void What_follows_a_row_that_is_too_long_is_read()
    {
        string text = "Part No,Frequency\nA1," + new string('y', 2_000_000) + "\nA2,8 MHz\n";
        ImportReport report = _bench.Run(text);
        Assert.Equal((2, 1, 1), (report.Read, report.Added, report.Rejected));
        Assert.Equal(2, report.Rejections[0].Line);
        Assert.Equal("list.csv line 3, 2026-03-01", _bench.Entry("A2").Origin["frequency"]);
    }

    [Fact]
    public void A_million_columns_are_refused_in_one_line()
    {
        byte[] bytes = Encoding.UTF8.GetBytes("Part No,Frequency" + new string(',', 1_000_000) + "\nA1,8 MHz\n");
        Assert.DoesNotContain('\n', _bench.Try(_bench.Request(), bytes).Problem!.ToString());
        ImportReport wide = _bench.Run("Part No,Frequency\nA1,8 MHz" + new string(',', 200_000) + "x\nA2,9 MHz\n");
        Assert.Equal((2, 1, 1), (wide.Read, wide.Added, wide.Rejected));
    }

    [Fact]
    public void Many_quotes_that_are_not_closed_cost_their_own_lines_alone_and_little_time()
    {
        var text = new StringBuilder("Part No,Frequency\n");
        for (int i = 0; i < 4000; i++)
        {
            text.Append(i % 2 == 0 ? $"A{i},\"8 MHz\n" : $"A{i},8 MHz\n");
        }

        var clock = Stopwatch.StartNew();
        ImportReport report = _bench.Run(text.ToString());
        Assert.Equal(4000, report.Read);
        Assert.InRange(report.Added, 1, 2000);
        Assert.InRange(clock.ElapsedMilliseconds, 0, 20_000);
    }

    [Fact]
    public void Random_bytes_never_throw_and_every_row_is_accounted_for()
    {
        var random = new Random(3);
        for (int i = 0; i < 60; i++)
        {
            byte[] noise = new byte[random.Next(1, 3000)];
            random.NextBytes(noise);
            byte[] bytes = i % 2 == 0 ? noise : [.. "Part No,Frequency,Load,Price (EUR)\n"u8, .. noise];
            Result<ImportReport> result = _bench.Try(_bench.Request() with { DryRun = true }, bytes);
            if (result.IsOk)
            {
                Assert.Equal(result.Value.Read, result.Value.Added + result.Value.Updated + result.Value.Unchanged + result.Value.Rejected);
            }
            else
            {
                Assert.DoesNotContain(result.Problem.ToString(), char.IsControl);
            }
        }
    }

    private sealed class EndlessStream(string start, byte filler, long length) : Stream
    {
        private readonly byte[] _start = Encoding.UTF8.GetBytes(start);
        private long _at;

        public override bool CanRead => true;

        public override bool CanSeek => false;

        public override bool CanWrite => false;

        public override long Length => throw new NotSupportedException();

        public override long Position { get => _at; set => throw new NotSupportedException(); }

        public override int Read(byte[] buffer, int offset, int count)
        {
            int given = (int)Math.Min(count, length - _at);
            buffer.AsSpan(offset, given).Fill(filler);
            for (long i = _at; i < Math.Min(_start.Length, _at + given); i++)
            {
                buffer[offset + (int)(i - _at)] = _start[i];
            }

            _at += given;
            return given;
        }

        public override void Flush()
        {
        }

        public override long Seek(long offset, SeekOrigin origin) => throw new NotSupportedException();

        public override void SetLength(long value) => throw new NotSupportedException();

        public override void Write(byte[] buffer, int offset, int count) => throw new NotSupportedException();
    }
}
