using HeadToWatts.Files.FlowFiles;
using HeadToWatts.Files.StudyFiles;
using HeadToWatts.FlowRecords.Quality;
using HeadToWatts.FlowRecords.Ratings;
using HeadToWatts.Studies;

using HeadToWatts.Files.Tests.StudyFiles;

namespace HeadToWatts.Files.Tests.FlowFiles;

/// <summary>Files of water levels that become flows by a rating.</summary>
public class StageFileTests
{
    private const double Cfs = 0.028316846592;

    private static readonly RatingDocument Table = new()
    {
        Kind = "table",
        Rows = [new() { Level = "1 ft", Flow = "0 cfs" }, new() { Level = "2 ft", Flow = "10 cfs" }, new() { Level = "3 ft", Flow = "30 cfs" }],
    };

    [Fact]
    public void Daily_levels_become_flows_and_those_outside_are_left_out_and_counted()
    {
        var file = Read("date,stage_ft\n2020-01-01,1.5\n2020-01-02,2.5\n2020-01-03,3.4\n2020-01-04,0.8\n2020-01-05,2\n", Table);
        var flows = file.Record!.Flows.ToArray();
        // Straight between the rows by hand: 5, 20, beyond the table twice, 10 cfs.
        Assert.Equal([5, 20], flows[..2].Select(q => Math.Round(q / Cfs, 9)));
        Assert.True(double.IsNaN(flows[2]) && double.IsNaN(flows[3]));
        Assert.Equal(10, flows[4] / Cfs, 1e-9);
        var outside = file.Report.Quality!.Find(QualityKind.OutsideRating)!;
        Assert.Equal(2, outside.Count);
        Assert.Equal([4, 5], outside.Examples.Select(e => e.Row));
        Assert.Contains("above 3 ft", outside.Examples[0].Text, StringComparison.Ordinal);
        Assert.Contains("left out", outside.Done, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("held", 30)]
    [InlineData("carried on", 38)]
    public void A_level_above_the_table_is_held_or_carried_on_when_that_is_chosen(string choice, double cfs)
    {
        var rating = new RatingDocument { Kind = "table", Rows = Table.Rows, Outside = choice };
        // The last piece rises 20 cfs a foot: 30 + 0.4 x 20 = 38 cfs.
        Assert.Equal(cfs, Read("date,stage_ft\n2020-01-01,3.4\n2020-01-02,2\n", rating).Record!.Flows[0] / Cfs, 1e-9);
    }

    [Fact]
    public void Every_reading_is_rated_before_the_daily_mean_is_taken()
    {
        // Q = 4 h^2 from 0 to 1 m and back over one day, read hourly: the mean of the rated flows, straight between the hours,
        // is 4/24 x the trapezoid sum of (i/12)^2, that is 4/3 + 1/216 m3/s; the rated mean level would be 1 m3/s.
        var rows = string.Concat(Enumerable.Range(0, 25).Select(i => $"2020-06-0{1 + (i / 24)} {i % 24:00}:00,{(i <= 12 ? i : 24 - i) / 12.0:R}\n"));
        var rating = new RatingDocument { Kind = "equation", Coefficient = "4", Exponent = "2", ZeroFlow = "0 m", Highest = "2 m" };
        var file = Read("time,stage (m)\n" + rows, rating);
        Assert.Equal((4.0 / 3) + (1.0 / 216), file.Record!.Flows[0], 1e-9);
    }

    [Fact]
    public void A_shift_holds_from_its_day_on()
    {
        var rating = new RatingDocument { Kind = "table", Rows = Table.Rows, Shifts = [new() { From = "2020-01-02", Shift = "0.5 ft" }] };
        var flows = Read("date,stage_ft\n2020-01-01,1.5\n2020-01-02,1.5\n", rating).Record!.Flows.ToArray();
        Assert.Equal([5, 10], flows.Select(q => Math.Round(q / Cfs, 9)));
    }

    [Fact]
    public void A_weir_is_read_over_its_crest()
    {
        // Francis with two end contractions: Q = 1.84 (L - 0.2 h) h^1.5 in SI, as the device's own check values hold; here at h = 0.3 m over L = 2 m.
        var device = new RatingDocument { Kind = "contracted-weir", Width = "2 m", CrestLevel = "10 m" };
        var flow = Read("date,level (m)\n2020-01-01,10.3\n2020-01-02,10.2\n", device).Record!.Flows[0];
        var expected = new HeadToWatts.FlowRecords.Devices.ContractedRectangularWeir(2, 2).At(0.3).FlowM3PerS;
        Assert.Equal(expected, flow, 1e-12);
        Assert.InRange(flow, 0.55, 0.62);
    }

    [Fact]
    public void A_file_of_flows_is_refused_with_a_rating_and_a_file_of_levels_without_one()
    {
        var flows = FlowFileReader.ReadText("a.csv", "date,flow_cfs\n2020-01-01,1.5\n2020-01-02,2.5\n", Options(Table));
        Assert.Contains(flows.Problems, p => p.Why.Contains("unit of the water levels is not given", StringComparison.Ordinal));
        var levels = FlowFileReader.ReadText("a.csv", "date,stage_ft\n2020-01-01,1.5\n2020-01-02,2.5\n", FlowFileOptions.Default);
        Assert.Contains(levels.Problems, p => p.Why.Contains("needs a rating", StringComparison.Ordinal));
        var agency = FlowFileReader.ReadText("a.rdb", "# USGS\nagency_cd\tsite_no\tdatetime\t1_00060_00003\t1_00060_00003_cd\n5s\t15s\t20d\t14n\t10s\nUSGS\t1\t2020-01-01\t5\tA\nUSGS\t1\t2020-01-02\t6\tA\n", Options(Table));
        Assert.False(agency.IsGood);
    }

    [Fact]
    public void Every_problem_of_a_rating_is_reported_together()
    {
        var problems = RatingBuilder.Build(new RatingDocument { Kind = "equation", Coefficient = "none", Outside = "perhaps", Shifts = [new() { From = "soon", Shift = "1 ft" }] }, "r").Problems;
        Assert.Equal(["r.coefficient", "r.exponent", "r.outside", "r.shifts[0].from", "r.zeroFlow"], problems.Select(p => p.Where).Distinct().Order(StringComparer.Ordinal));
        Assert.Contains("table, equation, suppressed-weir", Assert.Single(RatingBuilder.Build(new RatingDocument { Kind = "guess" }, "r").Problems).Accepted, StringComparison.Ordinal);
    }

    [Fact]
    public void A_study_reads_levels_by_its_rating_and_cautions_of_those_outside()
    {
        var days = string.Concat(Enumerable.Range(0, 400).Select(i => $"{new DateOnly(2020, 1, 1).AddDays(i):yyyy-MM-dd},{(i == 7 ? 3.6 : 2 + (0.5 * Math.Sin(i / 60.0))):0.###}\n"));
        const string curve = """
            "curve": [
                      { "exceeded": "10 %", "flow": "40 cfs" },
                      { "exceeded": "50 %", "flow": "20 cfs" },
                      { "exceeded": "95 %", "flow": "5 cfs" }
                    ],
            """;
        var text = Samples.With(curve, "\"record\": { \"file\": \"levels.csv\", \"rating\": { \"kind\": \"table\", \"rows\": [ { \"level\": \"1 ft\", \"flow\": \"0 cfs\" }, { \"level\": \"3 ft\", \"flow\": \"30 cfs\" } ] } },");
        var files = new FolderFlowFiles(_ => new MemoryStream(System.Text.Encoding.UTF8.GetBytes("date,stage_ft\n" + days)));
        var input = StudyBuilder.Build(StudyFileReader.Parse("s.json", text).Value, files).Value;
        Assert.Contains(input.Alternatives[0].Flow.Findings, f => f.StartsWith("Found: Water levels outside the rating: 1 ", StringComparison.Ordinal));
        var result = Study.RunAll(input)[0];
        Assert.Contains(HeadToWatts.Studies.Cautions.CautionRules.For(result, result.Show()), c => c.Id == "stages-outside-rating");
    }

    private static FlowFileOptions Options(RatingDocument rating) => new(Stage: RatingBuilder.Build(rating, "rating").Value);

    private static FlowFile Read(string text, RatingDocument rating)
    {
        var reading = FlowFileReader.ReadText("levels.csv", text, Options(rating));
        Assert.True(reading.IsGood, string.Join("; ", reading.Problems));
        return reading.Value;
    }
}
