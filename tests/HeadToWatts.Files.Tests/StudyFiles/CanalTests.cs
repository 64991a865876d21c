using HeadToWatts.Files.StudyFiles;
using HeadToWatts.Hydraulics.Canals;
using HeadToWatts.Hydraulics.Canals.Sections;
using HeadToWatts.Studies;

namespace HeadToWatts.Files.Tests.StudyFiles;

/// <summary>A canal with its drop, from the study file to the result.</summary>
public class CanalTests
{
    private const string Head = "\"head\": { \"gross\": \"60 ft\" }";
    private const string Up = "{ \"shape\": \"rectangular\", \"width\": \"10 ft\", \"manningN\": 0.015, \"slope\": 0.0005, \"bed\": \"160 ft\", \"bank\": \"166 ft\" }";
    private const string Down = "{ \"shape\": \"trapezoidal\", \"width\": \"8 ft\", \"sideSlope\": 1.5, \"manningN\": 0.025, \"slope\": 0.0008, \"bed\": \"100 ft\" }";

    [Fact]
    public void Depths_and_energy_of_a_study_are_those_of_the_canal()
    {
        var result = Run("");
        var canal = result.Canal!;
        // The normal depth carries the flow by Manning (the formula itself is held by its own check values).
        var flow = canal.AtDesign.FlowM3PerS;
        Assert.Equal(flow, UniformFlow.FlowM3PerS(new RectangularSection(10 * 0.3048), canal.AtDesign.Upstream.NormalDepthM!.Value, 0.015, 0.0005), 1e-9);
        // Rectangular critical depth by hand: (q^2/g)^(1/3).
        var q = flow / (10 * 0.3048);
        Assert.Equal(Math.Cbrt(q * q / result.Site.GravityMPerS2), canal.AtDesign.Upstream.CriticalDepthM!.Value, 1e-9);
        Assert.Equal(canal.EnergyAbove!.BedM + canal.EnergyAbove.DepthM + canal.EnergyAbove.VelocityHeadM - (canal.EnergyBelow!.BedM + canal.EnergyBelow.DepthM + canal.EnergyBelow.VelocityHeadM), canal.FallOfEnergyM!.Value, 1e-12);
        Assert.True(canal.DrawdownLengthM > 0);
        Assert.All(canal.Drawdown, s => Assert.InRange(s.DepthM, canal.AtFull.Upstream.CriticalDepthM!.Value * 0.999, canal.AtFull.Upstream.NormalDepthM!.Value * 1.001));
        Assert.Contains(result.MethodsUsed, u => u.Method.Id == UniformFlow.Method.Id);
    }

    [Fact]
    public void The_tailwater_may_follow_the_canal_and_costs_head_at_high_flow()
    {
        var text = Samples.With(Head, $"\"head\": {{ \"headwater\": \"166 ft\", \"canal\": {{ \"upstream\": {Up}, \"downstream\": {Down}, \"setsLevels\": \"tailwater\", \"bypass\": \"the old drop\" }} }}");
        var result = Study.RunAll(Samples.Input(text))[0];
        Assert.True(result.Input.Head.Moves);
        var at = result.Head.Levels[0];
        var depth = UniformFlow.NormalDepthM(new TrapezoidalSection(8 * 0.3048, 1.5), at.PassingFlowM3PerS, 0.025, 0.0008)!.Value;
        // Read between sixty depths: within a centimetre of the depth itself.
        Assert.Equal((100 * 0.3048) + depth, at.TailwaterM, 0.01);
        Assert.True(result.Head.Levels[0].GrossHeadM < result.Head.Levels[^1].GrossHeadM);
    }

    [Fact]
    public void The_same_fall_counted_twice_is_refused()
    {
        var problem = Assert.Single(Samples.Problems(Canal("\"headwater\": \"166 ft\", \"tailwater\": \"104 ft\",", ", \"otherDrops\": [ { \"name\": \"Drop 4\", \"headwater\": \"180 ft\", \"tailwater\": \"150 ft\" } ]")));
        Assert.Contains("also counted in", problem.Why, StringComparison.Ordinal);
        Assert.Contains("never the head", problem.Accepted, StringComparison.Ordinal);
        Assert.Empty(Samples.Problems(Canal("\"headwater\": \"166 ft\", \"tailwater\": \"104 ft\",", ", \"otherDrops\": [ { \"name\": \"Drop 4\", \"headwater\": \"200 ft\", \"tailwater\": \"166 ft\" } ]")));
    }

    [Fact]
    public void A_shallow_basin_is_cautioned_and_a_deep_one_is_not()
    {
        var shallow = Run(", \"basin\": { \"width\": \"10 ft\", \"length\": \"8 ft\", \"floor\": \"100 ft\" }");
        Assert.Contains(HeadToWatts.Studies.Cautions.CautionRules.For(shallow, shallow.Show()), c => c.Id == "basin-too-small");
        var deep = Run(", \"basin\": { \"width\": \"10 ft\", \"length\": \"120 ft\", \"floor\": \"80 ft\" }");
        Assert.DoesNotContain(HeadToWatts.Studies.Cautions.CautionRules.For(deep, deep.Show()), c => c.Id == "basin-too-small");
    }

    [Theory]
    [InlineData("", true)]
    [InlineData(", \"bypass\": \"a side weir of 30 ft\"", false)]
    public void The_study_asks_what_passes_the_full_flow(string bypass, bool asks)
    {
        var result = Run(bypass);
        Assert.Equal(asks, HeadToWatts.Studies.Cautions.CautionRules.For(result, result.Show()).Any(c => c.Id == "bypass-not-stated"));
    }

    [Fact]
    public void A_canal_over_its_bank_is_cautioned()
    {
        var text = Canal("\"gross\": \"60 ft\",", "").Replace("\"bank\": \"166 ft\"", "\"bank\": \"161 ft\"", StringComparison.Ordinal);
        var result = Study.RunAll(Samples.Input(text))[0];
        Assert.Contains(HeadToWatts.Studies.Cautions.CautionRules.For(result, result.Show()), c => c.Id == "canal-fast-or-full" && c.Text.Contains("over its bank", StringComparison.Ordinal));
    }

    [Fact]
    public void Every_problem_of_a_canal_is_reported_together()
    {
        var text = Samples.With(Head, "\"head\": { \"gross\": \"60 ft\", \"canal\": { \"upstream\": { \"shape\": \"oval\", \"manningN\": 9, \"slope\": 0.001, \"bed\": \"3 ft\" }, \"downstream\": { \"shape\": \"circular\", \"manningN\": 0.02, \"slope\": 0.001, \"bed\": \"1 ft\" }, \"setsLevels\": \"some\" } }");
        Assert.Equal(
            ["downstream.diameter", "setsLevels", "upstream.manningN", "upstream.shape"],
            Samples.Problems(text).Select(p => p.Where["alternatives[0].head.canal.".Length..]).Order(StringComparer.Ordinal));
    }

    private static string Canal(string fall, string more) => Samples.With(Head, $"\"head\": {{ {fall} \"canal\": {{ \"upstream\": {Up}, \"downstream\": {Down}{more} }} }}");

    private static StudyResult Run(string more) => Study.RunAll(Samples.Input(Canal("\"gross\": \"60 ft\",", more)))[0];
}
