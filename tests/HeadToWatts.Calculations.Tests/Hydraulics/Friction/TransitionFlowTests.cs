using HeadToWatts.Hydraulics.Friction;

namespace HeadToWatts.Calculations.Tests.Hydraulics.Friction;

public class TransitionFlowTests
{
    [Fact]
    public void Laminar_factors_equal_independent_values()
    {
        foreach (var row in CheckRows.With(TransitionFlow.Laminar.Id, "reynolds"))
            row.Check(TestPipes.Factor("colebrook-white", row["reynolds"], 0.001));
    }

    [Fact]
    public void The_transition_meets_both_neighbours()
    {
        foreach (var row in CheckRows.With(TransitionFlow.Transition.Id, "reynolds"))
            row.Check(TestPipes.Factor("colebrook-white", row["reynolds"], row["relativeRoughness"]));
    }

    [Theory]
    [InlineData("colebrook-white")]
    [InlineData("swamee-jain")]
    [InlineData("haaland")]
    [InlineData("churchill")]
    public void The_loss_has_no_jump_from_laminar_to_turbulent_flow(string id)
    {
        var formula = TestPipes.Formula(id);
        foreach (var roughness in new[] { 0, 1e-5, 1e-3, 0.05 })
        {
            double[] losses = [.. Enumerable.Range(0, 40_001).Select(i => formula.LossPerMetre(TestPipes.AtReynolds(1000 + (0.1 * i), roughness)))];
            Assert.All(losses.Zip(losses.Skip(1)), p => Assert.True(p.Second > p.First && p.Second < p.First * 1.001));
        }
    }

    [Theory]
    [InlineData(0, FlowRegime.Still)]
    [InlineData(1999, FlowRegime.Laminar)]
    [InlineData(2000, FlowRegime.Transition)]
    [InlineData(4000, FlowRegime.Transition)]
    [InlineData(4001, FlowRegime.Turbulent)]
    public void The_regime_follows_the_Reynolds_number(double reynolds, FlowRegime regime) =>
        Assert.Equal(regime, TransitionFlow.RegimeAt(reynolds));

    [Fact]
    public void Uses_name_every_regime_that_a_span_of_flows_passes()
    {
        var formula = FrictionFormulas.Default;
        string[] Ids(double from, double to) =>
            [.. formula.UsesBetween(TestPipes.AtReynolds(from, 1e-4), TestPipes.AtReynolds(to, 1e-4)).Select(u => u.Method.Id)];

        Assert.Empty(Ids(0, 0));
        Assert.Equal(["darcy-weisbach", "laminar-poiseuille"], Ids(0, 1500));
        Assert.Equal(["darcy-weisbach", "transition-interpolation"], Ids(2500, 3000));
        Assert.Equal(["darcy-weisbach", "colebrook-white"], Ids(5000, 1e6));
        Assert.Equal(["darcy-weisbach", "colebrook-white", "transition-interpolation", "laminar-poiseuille"], Ids(0, 1e6));
    }
}
