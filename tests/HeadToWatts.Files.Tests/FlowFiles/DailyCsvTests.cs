using HeadToWatts.Basis.Units;
using HeadToWatts.Files.FlowFiles;

namespace HeadToWatts.Files.Tests.FlowFiles;

public sealed class DailyCsvTests
{
    private const double Cfs = 0.3048 * 0.3048 * 0.3048;

    [Theory]
    [InlineData("date,flow_cfs\n2020-02-28,10\n2020-02-29,20\n2020-03-01,0\n")]
    [InlineData("Date,Flow (ft3/s)\r\n2020/02/28,10\r\n2020/02/29,20\r\n2020/03/01,0")]
    [InlineData("\uFEFFDate\tDischarge [cfs]\n2/28/2020\t10\n2/29/2020\t20\n3/1/2020\t0\n")]
    [InlineData("date;flow cfs;flag\n28.2.2020;10,0;A\n29.2.2020;20,0;A\n1.3.2020;0,0;A\n")]
    [InlineData("Site,My canal\ndate,flow\nyyyy-mm-dd,cfs\n2020-02-28,10\n2020-02-29,20\n2020-03-01,0\n")]
    [InlineData("# made by hand\nsep=,\nday,\"flow, cfs\"\n28-Feb-2020,\"10\"\n29-Feb-2020,20\n\n1-Mar-2020,0\n")]
    [InlineData("date,flow_cfs\n2020-02-28 12:00:00.000,10\n2020-02-29T00:00,20\n2020-03-01 12:00 PM,0\n")]
    public void Tables_are_read_as_people_write_them(string text)
    {
        var file = FlowFileReader.ReadText("a.csv", text, FlowFileOptions.Default).Value;
        Assert.Equal("daily-csv", file.Format);
        Assert.Equal(new DateOnly(2020, 2, 28), file.Record!.FirstDay);
        Assert.Equal([10 * Cfs, 20 * Cfs, 0], file.Record.Flows.ToArray());
        Assert.Equal((3, 3, 1, 0), (file.Report.Rows, file.Report.Valid, file.Report.Zeros, file.Report.AbsentDays));
        Assert.Equal("cfs", file.Report.Unit.Symbol);
    }

    [Fact]
    public void Blanks_and_marks_are_missing_zeros_are_data_and_absent_days_are_counted()
    {
        var file = FlowFileReader.ReadText("a.csv",
            "date,flow_m3_s\n2020-01-01,NA\n2020-01-02,3\n2020-01-03,\n2020-01-04,-999\n2020-01-05,Ice\n2020-01-06,0\n2020-01-09,1\n2020-01-10,--\n", FlowFileOptions.Default).Value;
        var report = file.Report;
        Assert.Equal((8, 3, 3, 2, 2, 1), (report.Days, report.Valid, report.MissingValueRows, report.AbsentDays, report.RowsOutsidePeriod, report.Zeros));
        Assert.Equal(["NA", "(blank)", "-999", "Ice", "--"], report.MissingMarks.Select(m => m.Mark));
        Assert.Equal(4.0 / 3, file.Record!.MeanM3PerS, 1e-15);
    }

    [Fact]
    public void Day_and_month_are_never_guessed()
    {
        const string Open = "date,flow_cfs\n1/2/2020,1\n2/2/2020,2\n";
        var problem = Assert.Single(FlowFileReader.ReadText("a.csv", Open, FlowFileOptions.Default).Problems);
        Assert.Equal("a.csv row 2", problem.Where);
        Assert.Equal(new DateOnly(2020, 1, 2), FlowFileReader.ReadText("a.csv", Open, new FlowFileOptions(Order: DateOrder.MonthFirst)).Value.Record!.FirstDay);
        Assert.Equal(new DateOnly(2020, 2, 1), FlowFileReader.ReadText("a.csv", Open, new FlowFileOptions(Order: DateOrder.DayFirst)).Value.Record!.FirstDay);

        var shown = FlowFileReader.ReadText("a.csv", "date,flow_cfs\n1/2/2020,1\n13/2/2020,2\n", FlowFileOptions.Default).Value;
        Assert.Equal(new DateOnly(2020, 2, 1), shown.Record!.FirstDay);
        Assert.Contains(shown.Report.Assumptions, a => a.Contains("day/month/year, as row 3 shows (13/2/2020)", StringComparison.Ordinal));

        Assert.Contains("cannot both be right", Assert.Single(FlowFileReader.ReadText("a.csv", "date,flow_cfs\n13/2/2020,1\n2/13/2020,2\n", FlowFileOptions.Default).Problems).Why, StringComparison.Ordinal);
        Assert.Contains("order that was chosen", Assert.Single(FlowFileReader.ReadText("a.csv", "date,flow_cfs\n13/2/2020,1\n", new FlowFileOptions(Order: DateOrder.MonthFirst)).Problems).Why, StringComparison.Ordinal);
    }

    [Fact]
    public void Every_wrong_row_is_reported_with_its_number_in_the_file()
    {
        var problems = FlowFileReader.ReadText("canal.csv",
            "date,flow_cfs\n2020-02-30x,1\n2020-01-01,5\n2020-01-02,abc\n2020-02-30,3\n2020-01-03,<0.1\n2020-01-01,6\n2020-01-05,-4\n1/1/20,3\n45000,3\nTotal,99\n2020-01-06,1,234\n",
            FlowFileOptions.Default).Problems;
        Assert.Equal(
            ["canal.csv row 2", "canal.csv row 4", "canal.csv row 6", "canal.csv row 9", "canal.csv row 10", "canal.csv row 12", "canal.csv row 5"],
            problems.Select(p => p.Where).Take(7));

        var later = FlowFileReader.ReadText("canal.csv", "date,flow_cfs\n2020-01-01,5\n2020-01-01,6\n2020-01-05,-4\n", FlowFileOptions.Default).Problems;
        Assert.Equal(["canal.csv row 3", "canal.csv row 4"], later.Select(p => p.Where));
        Assert.Contains("another flow", later[0].Why, StringComparison.Ordinal);
        Assert.Contains("negative", later[1].Why, StringComparison.Ordinal);
    }

    [Fact]
    public void Repeats_and_disorder_are_mended_and_stated()
    {
        var file = FlowFileReader.ReadText("a.csv", "date,flow_cfs\n2020-01-03,3\n2020-01-01,1\n2020-01-01,1\n2020-01-03,\n2020-01-02,2\n", FlowFileOptions.Default).Value;
        Assert.Equal((2, 3), (file.Report.Duplicates, file.Report.OutOfOrder));
        Assert.Equal([1 * Cfs, 2 * Cfs, 3 * Cfs], file.Record!.Flows.ToArray());
        Assert.Equal(2, file.Report.Assumptions.Count(a => a.Contains("out of order", StringComparison.Ordinal) || a.Contains("repeat a day", StringComparison.Ordinal)));
    }

    [Fact]
    public void Units_come_from_the_header_or_are_told_and_never_both_ways()
    {
        const string Bare = "date,flow\n2020-01-01,5\n";
        Assert.Contains("unit", Assert.Single(FlowFileReader.ReadText("a.csv", Bare, FlowFileOptions.Default).Problems).Why, StringComparison.Ordinal);
        Assert.Equal(0.005, FlowFileReader.ReadText("a.csv", Bare, new FlowFileOptions(UnitTable.LitrePerSecond)).Value.Record!.MeanM3PerS, 1e-15);
        Assert.False(FlowFileReader.ReadText("a.csv", "date,flow_cfs\n2020-01-01,5\n", new FlowFileOptions(UnitTable.LitrePerSecond)).IsGood);
        Assert.Contains("'m' is not a unit of flow", Assert.Single(FlowFileReader.ReadText("a.csv", "date,flow (m)\n2020-01-01,5\n", FlowFileOptions.Default).Problems).Why, StringComparison.Ordinal);
        Assert.Contains("is not known", Assert.Single(FlowFileReader.ReadText("a.csv", "date,flow (buckets)\n2020-01-01,5\n", FlowFileOptions.Default).Problems).Why, StringComparison.Ordinal);
        Assert.False(FlowFileReader.ReadText("a.csv", Bare, new FlowFileOptions(UnitTable.Metre)).IsGood);
    }

    [Fact]
    public void The_column_is_the_one_named_as_flow_or_is_asked_for()
    {
        const string Text = "date,level,in_cfs,out_cfs\n2020-01-01,1,5,4\n";
        Assert.Contains("several columns", Assert.Single(FlowFileReader.ReadText("a.csv", Text, FlowFileOptions.Default).Problems).Why, StringComparison.Ordinal);
        Assert.Equal(4 * Cfs, FlowFileReader.ReadText("a.csv", Text, new FlowFileOptions(Column: "OUT_cfs")).Value.Record!.MeanM3PerS, 1e-15);
        Assert.Equal(5 * Cfs, FlowFileReader.ReadText("a.csv", Text, new FlowFileOptions(Column: "3")).Value.Record!.MeanM3PerS, 1e-15);
        Assert.False(FlowFileReader.ReadText("a.csv", Text, new FlowFileOptions(Column: "weir")).IsGood);
        Assert.False(FlowFileReader.ReadText("a.csv", "date,stage\n2020-01-01,1\n", new FlowFileOptions(UnitTable.CubicFootPerSecond)).IsGood);
    }

    [Fact]
    public void Commas_in_numbers_need_evidence()
    {
        Assert.Equal(1234.5, FlowFileReader.ReadText("a.csv", "date;flow (m3/s)\n2020-01-01;1.234,5\n", FlowFileOptions.Default).Value.Record!.MeanM3PerS);
        Assert.Equal(1234.5, FlowFileReader.ReadText("a.csv", "date,flow (m3/s)\n2020-01-01,\"1,234.5\"\n", FlowFileOptions.Default).Value.Record!.MeanM3PerS);
        Assert.Contains("comma", Assert.Single(FlowFileReader.ReadText("a.csv", "date;flow (m3/s)\n2020-01-01;1,234\n", FlowFileOptions.Default).Problems).Why, StringComparison.Ordinal);
    }

    // By hand: a straight rise by one an hour has its mean at noon; the second day is known up to 23:00.
    [Fact]
    public void Several_values_a_day_become_means_weighted_by_time()
    {
        var rows = string.Concat(Enumerable.Range(0, 48).Select(i => $"2020-01-0{1 + (i / 24)} {i % 24:00}:00,{i}\n"));
        var file = FlowFileReader.ReadText("a.csv", "time,flow_m3/s\n" + rows, FlowFileOptions.Default).Value;
        Assert.Equal([12.0, 35.5], file.Record!.Flows.ToArray());
        Assert.Equal((48, 2, 2), (file.Report.Rows, file.Report.Days, file.Report.Valid));
        Assert.Equal(TimeSpan.FromHours(1), file.Report.Quality!.Step);
    }

    [Fact]
    public void Fifty_problems_are_listed_and_the_rest_counted()
    {
        var rows = string.Concat(Enumerable.Range(0, 300).Select(i => $"2020-01-01,x{i}\n"));
        var problems = FlowFileReader.ReadText("a.csv", "date,flow_cfs\n" + rows, FlowFileOptions.Default).Problems;
        Assert.Equal(51, problems.Count);
        Assert.Equal("250 more problems", problems[^1].Read);
    }
}
