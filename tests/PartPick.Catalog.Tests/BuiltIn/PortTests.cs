namespace PartPick.Catalog.Tests.BuiltIn;

public class PortTests
{
    private static PortPart[] All => [.. BuiltInParts.Catalog.Ports];

    private static PortPart[] Slow => [.. All.Where(port => port.FrequencyMaxHz < 1e6)];

    private static PortPart[] Fast => [.. All.Where(port => port.FrequencyMaxHz >= 1e6)];

    [Fact]
    public void A_port_states_either_its_transconductance_or_the_largest_critical_one()
    {
        Assert.All(All, port => Assert.All(port.Points, point =>
            Assert.True(port.CriticalTransconductanceMaxSiemens is null == point.GmSiemens is not null, port.Id)));
        Assert.Contains(Slow, port => port.CriticalTransconductanceMaxSiemens is null);
        Assert.Contains(Slow, port => port.CriticalTransconductanceMaxSiemens is not null);
        Assert.Contains(Fast, port => port.CriticalTransconductanceMaxSiemens is null);
        Assert.Contains(Fast, port => port.CriticalTransconductanceMaxSiemens is not null);
    }

    [Fact]
    public void Slow_ports_are_for_tuning_forks_and_fast_ones_for_megahertz()
    {
        Assert.Equal(4, Slow.Length);
        Assert.Equal(4, Fast.Length);
        Assert.All(Slow, port => Assert.True(port is { FrequencyMinHz: < 32768, FrequencyMaxHz: > 32768 }));
        Assert.All(Fast, port => Assert.True(port is { FrequencyMinHz: >= 1e6, FrequencyMaxHz: >= 24e6 and <= 48e6 }));
    }

    [Fact]
    public void Transconductance_is_that_of_such_ports()
    {
        Assert.All(Slow.SelectMany(port => port.Points).Where(point => point.GmMinSiemens is not null), point =>
            Assert.InRange(point.GmMinSiemens!.Value, 5e-6, 25e-6));
        Assert.All(Slow.Where(port => port.CriticalTransconductanceMaxSiemens is not null), port =>
            Assert.InRange(port.CriticalTransconductanceMaxSiemens!.Value, 0.5e-6, 2.5e-6));

        // Makers' data sheets: 3.5 to 25 mS.
        Assert.All(Fast.SelectMany(port => port.Points).Where(point => point.GmSiemens is not null), point =>
            Assert.True(point is { GmMinSiemens: >= 3.5e-3, GmSiemens: <= 25e-3 }));
        Assert.All(Fast.Where(port => port.CriticalTransconductanceMaxSiemens is not null), port =>
            Assert.InRange(port.CriticalTransconductanceMaxSiemens!.Value, 1e-3, 2e-3));
    }

    [Fact]
    public void Pin_capacitances_are_those_of_makers_data_sheets()
    {
        Assert.All(Slow, port => Assert.InRange(port.InputFarads!.Value / BuiltInParts.Pico, 2.3, 3.7));
        Assert.All(Slow, port => Assert.InRange(port.OutputFarads!.Value / BuiltInParts.Pico, 2.3, 3.7));
        Assert.All(Fast, port => Assert.InRange(port.InputFarads!.Value / BuiltInParts.Pico, 5.8, 6.7));
        Assert.All(Fast, port => Assert.InRange(port.OutputFarads!.Value / BuiltInParts.Pico, 3.1, 4.2));
    }

    [Fact]
    public void A_stated_swing_is_below_the_lowest_supply() => Assert.All(
        All.Where(port => port.SwingVolts is not null), port => Assert.True(port.SwingVolts < port.Points[0].SupplyVolts, port.Id));

    [Fact]
    public void Every_slow_port_holds_its_swing_down() => Assert.All(Slow, port => Assert.InRange(port.SwingVolts!.Value, 0.3, 1.1));

    [Fact]
    public void A_port_costs_nothing_because_it_is_on_the_board_anyway() => Assert.All(All, port =>
    {
        Assert.Equal(0, port.CostEach(1000));
        Assert.Equal("on the board anyway", port.Note);
    });
}
