using HeadToWatts.Basis.Quantities;
using HeadToWatts.EnergyYield;
using HeadToWatts.FlowRecords;
using HeadToWatts.Turbines;

namespace HeadToWatts.Calculations.Tests.EnergyYield;

public class TurbineRankingTests
{
    private static readonly FlowDurationCurve Varied = Plants.Curve(new(0, 1.2), new(0.3, 1), new(0.6, 0.6), new(1, 0.2));

    // Common practice, no source: which families serve at which heads.
    [Theory]
    [InlineData(4.2, 60, "kaplan propeller")]
    [InlineData(300, 0.3, "pelton turgo")]
    [InlineData(2.5, 1.5, "screw water-wheel kaplan propeller")]
    [InlineData(60, 8, "francis")]
    [InlineData(25, 0.3, "crossflow pump-as-turbine francis propeller")]
    public void The_first_type_is_one_the_trade_would_name(double headM, double flowM3PerS, string usual)
    {
        var ranking = Rank(headM, flowM3PerS, null);
        Assert.Contains(ranking[0].Type.Id, usual.Split(' '));
        Assert.True(ranking[0].Fit.IsInside);
    }

    [Fact]
    public void Every_type_is_ranked_once_those_inside_their_envelope_first()
    {
        var ranking = Rank(10, 3, null);
        Assert.Equal(TurbineTypes.All.Select(t => t.Id).Order(StringComparer.Ordinal), ranking.Select(c => c.Type.Id).Order(StringComparer.Ordinal));
        var inside = ranking.TakeWhile(c => c.Fit.IsInside).ToList();
        Assert.NotEmpty(inside);
        Assert.All(ranking.Skip(inside.Count), c => Assert.False(c.Fit.IsInside));
        Assert.Equal(inside.OrderByDescending(c => c.AnnualEnergyKwh * Math.Pow(0.97, c.UnitCount - 1)), inside);
        Assert.Equal(ranking.Skip(inside.Count).OrderBy(c => c.Fit.DecadesOutside), ranking.Skip(inside.Count));
        Assert.All(ranking, c =>
        {
            Assert.Equal(4, c.EnergyKwhByUnits.Count);
            Assert.InRange(c.UnitCount, 1, 4);
            Assert.Equal(3, c.UnitFlowM3PerS * c.UnitCount, 1e-12);
            Assert.True(c.EfficiencyAtHalfLoad <= c.PeakEfficiency);
            Assert.InRange(c.ShareOfYearBelowLeast, 0, 1);
        });
    }

    [Theory]
    [InlineData(1)]
    [InlineData(3)]
    [InlineData(6)]
    public void A_number_of_units_that_was_given_is_kept(int units)
    {
        Assert.All(Rank(10, 3, units), c => Assert.Equal(units, c.UnitCount));
        Assert.All(Rank(10, 3, units), c => Assert.True(c.AnnualEnergyKwh > 0));
    }

    [Fact]
    public void More_units_help_a_machine_without_turndown_on_a_flow_that_varies()
    {
        var propeller = Rank(10, 3, null).Single(c => c.Type.Id == "propeller");
        Assert.True(propeller.EnergyKwhByUnits[3] > propeller.EnergyKwhByUnits[0] * 1.03);
        Assert.True(propeller.UnitCount > 1);
    }

    private static IReadOnlyList<TurbineCandidate> Rank(double headM, double flowM3PerS, int? units)
    {
        var rows = Varied.Rows.Select(r => r with { FlowM3PerS = r.FlowM3PerS * flowM3PerS }).ToArray();
        return TurbineRanking.Rank(Plants.Site(), GrossHead.FromMetres(headM), Plants.NoPipe, Plants.Lossless, Plants.Supply(Plants.Curve(rows)), flowM3PerS, 60, units);
    }
}
