using BenchmarkDotNet.Configs;
using BenchmarkDotNet.Running;
using PartPick.Benchmarks;

if (args is ["--rankings", .. var rest])
{
    return RankingTable.Print(rest, Console.Out, Console.Error);
}

if (args is ["--browse", .. var parts])
{
    return BrowseTable.Print(parts, Console.Out);
}

if (args is ["--large", .. var large])
{
    return LargeTable.Print(large, Console.Out);
}

if (args is ["--scale", .. var scale])
{
    return ScaleTable.Print(scale, Console.Out, Console.Error);
}

if (args is ["--midsize", .. var worlds])
{
    return MidsizeTable.Print(worlds, Console.Out, Console.Error);
}

if (args is ["--screens", .. var screens])
{
    return ScreensTable.Print(screens, Console.Out);
}

if (args is ["--empty-screen"])
{
    return EmptyScreen.Run();
}

if (args is ["--import", .. var size])
{
    return ImportTable.Print(size, Console.Out);
}

Compare(args);
return 0;

// In a method of its own: what only measures screens does not load the library.
static void Compare(string[] args)
{
    // Reports go beside what the build makes, whatever folder this is started in.
    string reports = Path.GetFullPath(Path.Combine(AppContext.BaseDirectory, "..", "..", "..", "benchmarks"));
    ManualConfig config = DefaultConfig.Instance.WithArtifactsPath(reports).HideColumns("Error", "StdDev", "RatioSD");
    BenchmarkSwitcher.FromAssembly(typeof(RankingTable).Assembly).Run(args, config);
}
