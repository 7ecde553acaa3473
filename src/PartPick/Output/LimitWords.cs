using PartPick.Selection;

namespace PartPick.Output;

/// <summary>The words for the limits of a requirement.</summary>
internal static class LimitWords
{
    /// <summary>The key in JSON.</summary>
    public static string Key(Limit limit) => limit switch
    {
        Limit.StartUpTime => "startUpTime",
        _ => limit.ToString().ToLowerInvariant(),
    };

    /// <summary>The limit in words.</summary>
    public static string Words(Limit limit) => limit switch
    {
        Limit.Supply => "supply range",
        Limit.Temperature => "temperature range",
        Limit.Clock => "clock",
        Limit.Stock => "stock",
        Limit.Cost => "cost limit",
        Limit.Start => "start",
        Limit.Margin => "start-up margin",
        Limit.Error => "frequency error",
        Limit.Drive => "drive level",
        Limit.StartUpTime => "start-up time",
        _ => limit.ToString(),
    };
}
