using System.Globalization;
using System.Text.Json;

namespace PartPick.Tests;

/// <summary>Circuits of any numbers, sensible or not, are answered with figures or refused in one line: no fault, no missing key.</summary>
public class AnyNumbersTests
{
    private const int Draws = 15;

    private static readonly string[] Gate = ["gate", "counter", "port"];

    [Theory]
    [InlineData(1)]
    [InlineData(2)]
    public void Any_numbers_are_answered_or_refused(int seed)
    {
        var random = new Random(seed);
        for (int k = 0; k < Draws; k++)
        {
            string circuit = random.Next(3) == 0 ? Follower(random) : OfInverter(random);
            Run run = Run.WithInput(circuit, "check", "-", "--format", "json");

            Assert.True(run.Status is 0 or 1 or 2, run.Error + circuit);
            if (run.Status == 2)
            {
                run.WrongLine();
            }
            else
            {
                Assert.True(run.Json.GetProperty("startUpMargin").ValueKind is JsonValueKind.Number or JsonValueKind.Null, circuit);
                Assert.Equal(run.Status == 0, run.Json.GetProperty("start").GetString() != "none");
            }
        }
    }

    private static string OfInverter(Random random)
    {
        string amplifier = random.Next(2) == 0
            ? $$"""{ "gm": {{N(random, -2)}}, "ro": {{N(random, 4)}}, "vt": {{N(random, 0)}}, "cin": {{N(random, -11.5)}} }"""
            : $$"""{ "gain": {{N(random, 3)}}, "ron": {{N(random, 2)}}, "delay": {{N(random, -8)}}, "cout": {{N(random, -11.5)}} }""";
        return $$"""
            { "circuit": "{{Gate[random.Next(3)]}}", "crystal": {{Crystal(random)}}, "amplifier": {{amplifier}},
              "c1": {{N(random, -10.5)}}, "c2": {{N(random, -10.5)}}, "rs": {{N(random, 2.5)}}, "rf": {{N(random, 6)}},
              "strays": { "input": {{N(random, -11.5)}}, "output": {{N(random, -11.5)}}, "across": {{N(random, -12)}} },
              "supply": {{N(random, 0.7)}} }
            """;
    }

    private static string Follower(Random random) => $$"""
        { "circuit": "follower", "crystal": {{Crystal(random)}},
          "amplifier": { "beta": {{N(random, 2)}}, "cje": {{N(random, -11)}}, "tf": {{N(random, -9.3)}}, "rbb": {{N(random, 1.5)}} },
          "c1": {{N(random, -10)}}, "c2": {{N(random, -10)}}, "rb": {{N(random, 5)}}, "re": {{N(random, 3)}}, "supply": {{N(random, 0.8)}} }
        """;

    private static string Crystal(Random random) => $$"""
        { "frequency": {{N(random, 6.7)}}, "load": {{N(random, -10.7)}}, "shunt": {{N(random, -11.4)}}, "motional": {{N(random, -14)}},
          "resistance": {{N(random, 1.8)}} }
        """;

    // Mostly near a usual power of ten, now and then anywhere.
    private static string N(Random random, double usual)
    {
        double power = random.Next(12) == 0 ? random.NextDouble() * 80 - 60 : usual + random.NextDouble() - 0.5;
        return Math.Pow(10, power).ToString("R", CultureInfo.InvariantCulture);
    }
}
