namespace PartPick;

internal static class Program
{
    private static int Main(string[] args)
    {
        using var stop = new CancellationTokenSource();
        Console.CancelKeyPress += (_, press) =>
        {
            // The second press ends the process whatever it is doing.
            press.Cancel = !stop.IsCancellationRequested;
            stop.Cancel();
        };
        return CommandLine.Run(args, Surroundings.OfProcess(stop.Token));
    }
}
