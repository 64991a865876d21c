using HeadToWatts.FlowRecords;
using MathNet.Numerics.Statistics;

namespace HeadToWatts.Calculations.Tests.FlowRecords;

public sealed class PlottingPositionTests
{
    private static readonly double[] Sample = [0.31, 12.4, 3.7, 5.9, 0, 8.25, 3.7, 20.6, 1.15, 6.02, 4.4];

    public static TheoryData<string> Ids => [.. PlottingPositions.All.Select(p => p.Id)];

    [Theory]
    [MemberData(nameof(Ids))]
    public void Values_from_outside_are_met(string id)
    {
        var position = PlottingPositions.Find(id)!;
        var record = new DailyRecord(new DateOnly(2001, 1, 1), Sample, "");
        var curve = FlowDurationCurve.FromRecord(record, position, OperatingSeason.WholeYear);
        var checkedRows = 0;
        foreach (var row in CheckValueFile.OfMethod(position.Method.Id).SelectMany(f => f.Rows))
        {
            checkedRows++;
            row.Check(row.Text("quantity") switch
            {
                "return period" => 1 / position.Exceedance((int)row["m"], (int)row["n"]),
                "exceedance" => position.Exceedance((int)row["m"], (int)row["n"]),
                "flow of the sample" => curve.FlowAt(row["exceedance"]),
                var other => throw new InvalidOperationException(other),
            });
        }

        Assert.True(checkedRows >= 7);
    }

    // Independent: MathNet.Numerics names the same definitions R4 (California, seen from the other end), R5 (Hazen), R6 (Weibull).
    [Fact]
    public void Quantile_definitions_of_another_library_agree()
    {
        var random = new System.Random(7);
        double[] flows = [.. Enumerable.Range(0, 400).Select(_ => Math.Exp(2 * random.NextDouble() * random.NextDouble()))];
        double[] negated = [.. flows.Select(q => -q)];
        for (var p = 0.01; p < 0.995; p += 0.01)
        {
            Close(MathNet.Numerics.Statistics.Statistics.QuantileCustom(flows, 1 - p, QuantileDefinition.Weibull), PlottingPositions.Weibull, p);
            Close(MathNet.Numerics.Statistics.Statistics.QuantileCustom(flows, 1 - p, QuantileDefinition.Hazen), PlottingPositions.Hazen, p);
            Close(-MathNet.Numerics.Statistics.Statistics.QuantileCustom(negated, p, QuantileDefinition.California), PlottingPositions.California, p);
        }

        void Close(double expected, PlottingPosition position, double p)
        {
            var record = new DailyRecord(new DateOnly(1990, 10, 1), flows, "");
            var curve = FlowDurationCurve.FromRecord(record, position, OperatingSeason.WholeYear);
            Assert.Equal(expected, curve.FlowAt(p), 1e-9);
        }
    }

    [Fact]
    public void Weibull_is_the_default_and_names_are_found_without_regard_to_case()
    {
        Assert.Same(PlottingPositions.Weibull, PlottingPositions.Default);
        Assert.Same(PlottingPositions.Hazen, PlottingPositions.Find("HAZEN"));
        Assert.Null(PlottingPositions.Find("blom"));
        Assert.Throws<ArgumentOutOfRangeException>(() => PlottingPositions.Weibull.Exceedance(0, 5));
        Assert.Throws<ArgumentOutOfRangeException>(() => PlottingPositions.Weibull.Exceedance(6, 5));
    }
}
