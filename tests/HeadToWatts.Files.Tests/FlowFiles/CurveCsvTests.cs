using HeadToWatts.Basis.Units;
using HeadToWatts.Files.FlowFiles;
using HeadToWatts.FlowRecords;

namespace HeadToWatts.Files.Tests.FlowFiles;

public sealed class CurveCsvTests
{
    [Theory]
    [InlineData("exceeded_pct,flow_cms\n5,8\n50,3.5\n95,0.25\n")]
    [InlineData("percent of time exceeded,flow (m3/s)\r\n95,0.25\r\n50,3.5\r\n5,8\r\n")]
    [InlineData("Exceeded (%)\tFlow (m³/s)\n5 %\t8\n50 %\t3.5\n95 %\t0.25")]
    [InlineData("Flow (m3/s);Percent exceeded\n8,0;5\n3,5;50\n0,25;95\n")]
    [InlineData("exceedance probability,flow m3/s\n0.05,8\n0.5,3.5\n0.95,0.25\n")]
    [InlineData("5\t8 m3/s\n50\t3.5 m3/s\n95\t0.25 m3/s\n")]
    [InlineData("percent,flow\n%,m3/s\n5,8\n50,3.5\n95,0.25\n")]
    [InlineData("exceeded_pct flow_m3/s\n5   8\n50  3.5\n95  0.25\n")]
    [InlineData("# a drop on a canal\nexceeded_pct,days,flow_m3s\n5,18,8\n50,182,3.5\n95,347,0.25\n")]
    public void Series_are_read_as_people_write_them(string text)
    {
        var file = FlowFileReader.ReadText("curve.csv", text, FlowFileOptions.Default).Value;
        Assert.Equal("curve-csv", file.Format);
        Assert.Equal([new(0, 8), new(0.05, 8), new(0.5, 3.5), new(0.95, 0.25), new(1, 0.25)], file.Curve!.Points);
        Assert.Equal(3, file.Report.Rows);
        Assert.Contains("beyond 95 % of the time the last flow holds", file.Report.Assumptions);
    }

    [Fact]
    public void Bare_numbers_need_a_unit_that_is_told_and_the_end_rule_can_be_dry()
    {
        Assert.False(FlowFileReader.ReadText("paste", "10\t5\n90\t1\n", FlowFileOptions.Default).IsGood);
        var file = FlowFileReader.ReadText("paste", "10\t5\n90\t1\n", new FlowFileOptions(UnitTable.LitrePerSecond, Beyond: BeyondLastRow.Dry)).Value;
        Assert.Equal(0, file.Curve!.FlowAt(1));
        Assert.Equal(0.001, file.Curve.FlowAt(0.9));
        Assert.Contains("beyond 90 % of the time there is no flow", file.Report.Assumptions);
    }

    [Fact]
    public void Every_problem_is_reported_at_once_with_its_row()
    {
        var problems = FlowFileReader.ReadText("c.csv",
            "exceeded_pct,flow_cfs\n-5,10\n10,9\n10,8\n50,8.5\n120,1\n60,-1\nx,2\n70,y\n80,\n", FlowFileOptions.Default).Problems;
        Assert.Equal(
            ["c.csv row 10", "c.csv row 2", "c.csv row 4", "c.csv row 5", "c.csv row 6", "c.csv row 7", "c.csv row 8", "c.csv row 9"],
            problems.Select(p => p.Where).Order(StringComparer.Ordinal));
    }

    [Fact]
    public void Mixed_units_are_refused()
    {
        var rows = FlowFileReader.ReadText("c.csv", "exceeded_pct,flow\n10,9 cfs\n20,8 L/s\n", FlowFileOptions.Default).Problems;
        Assert.Contains(rows, p => p.Where == "c.csv row 3" && p.Why.Contains("mixed", StringComparison.Ordinal));
        Assert.Contains(FlowFileReader.ReadText("c.csv", "exceeded_pct,flow_cfs\n10,9 L/s\n20,8 L/s\n", FlowFileOptions.Default).Problems, p => p.Why.Contains("mixed", StringComparison.Ordinal));
        Assert.Contains(FlowFileReader.ReadText("c.csv", "exceeded_pct,flow\n10,9 cfs\n20,8\n", FlowFileOptions.Default).Problems, p => p.Why.Contains("only some", StringComparison.Ordinal));
    }

    [Fact]
    public void Ratios_under_a_percent_header_are_refused()
    {
        var problem = Assert.Single(FlowFileReader.ReadText("c.csv", "exceeded_pct,flow_cfs\n0.1,9\n0.9,8\n", FlowFileOptions.Default).Problems);
        Assert.Contains("ratios", problem.Why, StringComparison.Ordinal);
    }

    [Fact]
    public void One_row_is_refused()
    {
        Assert.Contains("at least two rows", Assert.Single(FlowFileReader.ReadText("c.csv", "exceeded_pct,flow_cfs\n50,9\n", FlowFileOptions.Default).Problems).Why, StringComparison.Ordinal);
    }
}
