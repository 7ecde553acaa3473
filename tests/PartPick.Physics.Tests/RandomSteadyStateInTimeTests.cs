using PartPick.Physics.Circuits;
using PartPick.Physics.Tests.Independent;

namespace PartPick.Physics.Tests;

/// <summary>
/// The steady state of circuits drawn at random against an integration in time (arithmetic on the model's definitions).
/// </summary>
public sealed class RandomSteadyStateInTimeTests
{
    private const double Pico = 1e-12;

    [Theory]
    [InlineData("one stage")]
    [InlineData("clock")]
    [InlineData("follower")]
    public void Circuits_drawn_at_random_agree(string kind)
    {
        var random = new Random(78);
        for (int k = 0; k < 8; k++)
        {
            OscillatorCircuit circuit = RandomCircuits.LowQuality(RandomCircuits.Next(random, kind));
            if (TimeDomain.Settle(circuit) is { } time)
            {
                TimeDomainAgreement.Check(circuit, time, 0.01, 0.1 * Pico);
            }
        }
    }
}
