using System.Globalization;
using CsCheck;
using HeadToWatts.FlowRecords;
using HeadToWatts.FlowRecords.Ratings;

namespace HeadToWatts.Calculations.Tests.FlowRecords.Ratings;

public sealed class RatingTests
{
    private static readonly RatingTable Simple = RatingTable.FromRows([new(1, 0), new(2, 4), new(3, 10)], RatingInterpolation.Linear, 0, "rating").Value;

    private static readonly Gen<RatingTable> Tables = Gen.Select(
        Gen.Select(Gen.Double[0.01, 1], Gen.Double[0, 5]).Array[2, 12], Gen.Bool, Gen.Double[-3, 3]).Select((steps, isLog, startM) =>
    {
        var rows = new List<RatingRow>();
        double stageM = startM, flow = 0.01;
        foreach (var (rise, more) in steps)
        {
            stageM += rise;
            flow += more;
            rows.Add(new RatingRow(stageM, flow));
        }

        return RatingTable.FromRows(rows, isLog ? RatingInterpolation.LogLog : RatingInterpolation.Linear, startM, "rating").Value;
    });

    [Fact]
    public void Tables_read_as_another_library_reads_them()
    {
        foreach (var (id, kind) in new[] { ("rating-table-linear", RatingInterpolation.Linear), ("rating-table-log-log", RatingInterpolation.LogLog) })
        {
            foreach (var row in CheckText.Rows(id))
            {
                RatingRow[] rows = [.. row.Text("table").Split(';').Select(p => p.Split(':')).Select(p => new RatingRow(Number(p[0]), Number(p[1])))];
                var table = RatingTable.FromRows(rows, kind, row["offsetM"], row.Where).Value;
                Assert.Equal(id, table.Method.Id);
                row.Check(table.At(row["stageM"]).FlowM3PerS);
            }
        }
    }

    [Fact]
    public void Equations_meet_values_from_outside()
    {
        foreach (var row in CheckText.Rows("rating-equation"))
            row.Check(new RatingEquation(row["coefficient"], row["zeroFlowStageM"], row["exponent"]).At(row["stageM"]).FlowM3PerS);
    }

    [Fact]
    public void A_rating_never_falls_as_the_stage_rises() =>
        Gen.Select(Tables, Gen.Double[-1, 12], Gen.Double[0, 3]).Sample((table, aboveM, moreM) =>
        {
            var stageM = table.LowestStageM + aboveM;
            double Flow(double h) => table.At(h, OutsideRating.Extend).FlowM3PerS;
            Assert.True(Flow(stageM + moreM) >= Flow(stageM) - (1e-12 * Flow(stageM)));
            Assert.True(Flow(stageM) >= 0);
        });

    [Fact]
    public void A_rating_passes_through_its_rows() =>
        Tables.Sample(table => Assert.All(table.Rows, r => Assert.Equal(r.FlowM3PerS, table.At(r.StageM).FlowM3PerS)));

    [Theory]
    [InlineData(0.5, OutsideRating.LeaveOut, double.NaN, RatingPlace.Below)]
    [InlineData(0.5, OutsideRating.HoldEnd, 0, RatingPlace.Below)]
    [InlineData(0.5, OutsideRating.Extend, 0, RatingPlace.Below)]
    [InlineData(2.5, OutsideRating.LeaveOut, 7, RatingPlace.Within)]
    [InlineData(4, OutsideRating.LeaveOut, double.NaN, RatingPlace.Above)]
    [InlineData(4, OutsideRating.HoldEnd, 10, RatingPlace.Above)]
    [InlineData(4, OutsideRating.Extend, 16, RatingPlace.Above)]
    [InlineData(double.NaN, OutsideRating.Extend, double.NaN, RatingPlace.Missing)]
    public void Outside_the_table_a_stage_is_told_apart_whatever_is_done_with_it(double stageM, OutsideRating outside, double flow, RatingPlace place) =>
        Assert.Equal(new RatedFlow(flow, place), Simple.At(stageM, outside));

    [Fact]
    public void Stages_outside_are_counted_and_named()
    {
        var series = RatedSeries.Of([0.2, 1.5, double.NaN, 5, 2, 0.9], Simple);
        Assert.Equal(new RatingCounts(2, 2, 1, 0, 1), series.Counts);
        Assert.Equal(3, series.Counts.Outside);
        Assert.Equal([0, 3, 5], series.FirstOutside);
        Assert.Equal([double.NaN, 2, double.NaN, double.NaN, 4, double.NaN], series.FlowsM3PerS);
        Assert.Equal(RatingMethodId, Assert.Single(series.Uses).Method.Id);
    }

    [Fact]
    public void A_shift_holds_from_its_day_until_the_next()
    {
        var first = new DateOnly(2020, 6, 1);
        var shifts = StageShifts.Of([new(first.AddDays(3), -0.25), new(first.AddDays(1), 0.5)], "shifts").Value;
        var (record, series) = RatedSeries.OfDays(first, [2, 2, 2, 2], Simple, OutsideRating.LeaveOut, shifts, "Ditch");
        Assert.Equal([4.0, 7, 7, 3], record.Flows.ToArray());
        Assert.Equal(4, series.Counts.Within);
        Assert.Contains("rating table of 3 rows", record.Description, StringComparison.Ordinal);
        Assert.Single(StageShifts.Of([new(first, 0.1), new(first, 0.2)], "shifts").Problems);
    }

    [Fact]
    public void A_log_log_table_may_start_at_no_flow_and_at_its_offset()
    {
        var table = RatingTable.FromRows([new(0.7, 0), new(1, 0.2), new(2, 3)], RatingInterpolation.LogLog, 0.7, "rating").Value;
        Assert.Equal(0, table.At(0.7).FlowM3PerS);
        Assert.Equal(0.1, table.At(0.85).FlowM3PerS, 1e-12);
        Assert.Equal(Math.Exp(0.5 * (Math.Log(0.2) + Math.Log(3))), table.At(0.7 + Math.Sqrt(0.3 * 1.3)).FlowM3PerS, 1e-12);
    }

    [Fact]
    public void Every_fault_of_a_table_is_named()
    {
        var problems = RatingTable.FromRows(
            [new(1, 1), new(2, 0.5), new(2, 0.7), new(3, -1), new(double.NaN, 2), new(0.1, 0.1)], RatingInterpolation.LogLog, 0.2, "rating").Problems;
        Assert.Equal(5, problems.Count);
        Assert.Contains(problems, p => p.Why.Contains("falls as the stage rises", StringComparison.Ordinal));
        Assert.Contains(problems, p => p.Why.Contains("below the offset", StringComparison.Ordinal));
        Assert.Single(RatingTable.FromRows([new(1, 1)], RatingInterpolation.Linear, 0, "rating").Problems);
        Assert.Throws<ArgumentOutOfRangeException>(() => new RatingEquation(0, 0, 1.5));
        Assert.Throws<ArgumentOutOfRangeException>(() => new RatingEquation(1, 0, double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => new RatingEquation(1, 2, 1.5, 1));
    }

    // Two tables of the Bureau of Reclamation that stand beside the repository where it is developed.
    [SkippableTheory]
    [InlineData("usbr_ETCW_canal_rating.txt", RatingInterpolation.LogLog, 14, 0.2, 2.7, 200)]
    [InlineData("usbr_BICW_rating.txt", RatingInterpolation.Linear, 35, 68, 71.4, 353)]
    public void Agency_rating_tables_are_taken_whole(string file, RatingInterpolation kind, int count, double lowestFt, double highestFt, double mostCfs)
    {
        const double foot = 0.3048;
        var path = Path.GetFullPath(Path.Combine(CheckValueFile.Root(), "..", "shared", "reference", "flow", file));
        Skip.IfNot(File.Exists(path), "the reference rating tables are not beside the repository");
        var lines = File.ReadAllLines(path);
        Assert.Equal(kind == RatingInterpolation.LogLog, lines.Any(l => l.Contains("LOGLOG", StringComparison.Ordinal)));
        RatingRow[] rows = [.. lines
            .Select(l => l.Split(' ', StringSplitOptions.RemoveEmptyEntries))
            .Where(c => c.Length == 2 && c.All(t => double.TryParse(t, NumberStyles.Float, CultureInfo.InvariantCulture, out _)))
            .Select(c => new RatingRow(Number(c[0]) * foot, Number(c[1]) * foot * foot * foot))];
        var table = RatingTable.FromRows(rows, kind, 0, file).Value;
        Assert.Equal(count, table.Rows.Count);
        Assert.Equal(lowestFt, table.LowestStageM / foot, 1e-6);
        Assert.Equal(highestFt, table.HighestStageM / foot, 1e-5);
        Assert.Equal(mostCfs, table.Rows[^1].FlowM3PerS / (foot * foot * foot), 1e-6);
        Assert.Equal(RatingPlace.Above, table.At(table.HighestStageM + 0.01).Place);
    }

    private const string RatingMethodId = "rating-table-linear";

    private static double Number(string text) => double.Parse(text, NumberStyles.Float, CultureInfo.InvariantCulture);
}
