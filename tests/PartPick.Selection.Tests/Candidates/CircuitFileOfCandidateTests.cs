using PartPick.Physics;
using PartPick.Selection.Tests.Ranking;

namespace PartPick.Selection.Tests.Candidates;

/// <summary>A candidate's circuit file is the candidate: read back, it gives the same figures to the last bit.</summary>
public class CircuitFileOfCandidateTests
{
    private static readonly Dictionary<CircuitKind, int> Seeds = Enumerable.Range(0, 60)
        .GroupBy(seed => SmallWorld.Draw(seed).Requirement.Circuits[0])
        .ToDictionary(group => group.Key, group => group.First(seed => Rank(seed).Candidates.Length > 0));

    [Theory]
    [InlineData(CircuitKind.Gate)]
    [InlineData(CircuitKind.Counter)]
    [InlineData(CircuitKind.Port)]
    [InlineData(CircuitKind.Follower)]
    public void Every_candidate_read_back_gives_the_same_bits(CircuitKind kind)
    {
        RankingResult ranking = Rank(Seeds[kind]);

        Assert.NotEmpty(ranking.Candidates);
        Assert.All(ranking.Candidates.Take(4), candidate =>
        {
            CircuitDescription described = candidate.Describe(ranking.Requirement.OutputHz);
            string text = CircuitFile.Write(described).ToJsonString();
            CircuitDescription read = CircuitFile.Read(text, "candidate.json").Value;

            Assert.Equal(kind, read.Kind);
            Assert.Equal(candidate.Nominal, read.Circuit);
            Assert.Equal(candidate.Result, OscillatorAnalysis.Analyse(read.Circuit));
            Assert.Equal(
                CircuitResults.ToJson(described, candidate.Result, []).ToJsonString(),
                CircuitResults.ToJson(read, OscillatorAnalysis.Analyse(read.Circuit), []).ToJsonString());
        });
    }

    private static RankingResult Rank(int seed)
    {
        SmallWorld world = SmallWorld.Draw(seed);
        return Ranker.Rank(world.Requirement, world.Catalog, new RankingOptions { Top = 4 });
    }
}
