using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>The trade's words for what the model names.</summary>
public static class Trade
{
    /// <summary>The words for a limit.</summary>
    /// <param name="limit">The limit.</param>
    public static string Words(Limit limit) => limit switch
    {
        Limit.Supply => "the supply",
        Limit.Temperature => "the temperatures",
        Limit.Clock => "the amplifier's clock limit",
        Limit.Stock => "the stock",
        Limit.Cost => "the cost",
        Limit.Start => "not starting by itself",
        Limit.Margin => "the start-up margin",
        Limit.Error => "the frequency error",
        Limit.Drive => "the drive level",
        Limit.StartUpTime => "the start-up time",
        _ => throw new ArgumentOutOfRangeException(nameof(limit), limit, "Not a limit."),
    };

    /// <summary>A divider in words: "stage 12 (÷4096)"; empty for the oscillator itself.</summary>
    /// <param name="tap">The stage.</param>
    public static string Stage(int tap) => tap == 0 ? "" : FormattableString.Invariant($"stage {tap} (÷{1L << tap})");
}
