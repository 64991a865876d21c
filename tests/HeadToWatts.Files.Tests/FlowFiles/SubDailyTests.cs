using System.Globalization;
using System.Text;
using HeadToWatts.Files.FlowFiles;
using HeadToWatts.Files.FlowFiles.Recipes;
using HeadToWatts.FlowRecords.Quality;
using HeadToWatts.FlowRecords.SubDaily;

namespace HeadToWatts.Files.Tests.FlowFiles;

public sealed class SubDailyTests
{
    // Flow rises by one each hour of real time from midnight standard time, so that each day's mean is that of its noon.
    private static string LocalClock(string zoneId, DateTime firstStandard, int days)
    {
        var zone = TimeZoneInfo.FindSystemTimeZoneById(zoneId);
        var rows = new StringBuilder("time,flow_m3/s\n");
        for (var quarter = 0; quarter <= days * 96; quarter++)
        {
            var utc = DateTime.SpecifyKind(firstStandard.AddMinutes(15 * quarter) - zone.BaseUtcOffset, DateTimeKind.Utc);
            rows.Append(CultureInfo.InvariantCulture, $"{TimeZoneInfo.ConvertTimeFromUtc(utc, zone):yyyy-MM-dd HH:mm},{quarter / 4.0}\n");
        }

        return rows.ToString();
    }

    private static FlowFileOptions ByClock(RecipeClock clock) =>
        new(Recipe: new ReadingRecipe { HeaderRows = 1, DateOrder = RecipeDateOrder.YearMonthDay, Clock = clock });

    [Theory]
    [InlineData("America/Denver", 2020, 10, 30)]
    [InlineData("America/Denver", 2021, 3, 12)]
    [InlineData("Europe/Berlin", 2020, 10, 23)]
    public void A_named_zone_carries_days_over_the_change_of_the_clock(string zone, int year, int month, int day)
    {
        var first = new DateTime(year, month, day, 0, 0, 0, DateTimeKind.Unspecified);
        var file = FlowFileReader.ReadText("a.csv", LocalClock(zone, first, 4), ByClock(new RecipeClock(TimeZoneInfo.FindSystemTimeZoneById(zone)))).Value;
        Assert.Equal([12.0, 36, 60, 84], file.Record!.Flows.ToArray().Select(q => Math.Round(q, 9)));
        Assert.Equal(0, file.Report.OutOfOrder + file.Report.Duplicates);
    }

    [Fact]
    public void A_repeated_hour_on_a_Sunday_of_autumn_shows_the_clock_without_being_told()
    {
        var first = new DateTime(2020, 10, 30, 0, 0, 0, DateTimeKind.Unspecified);
        var file = FlowFileReader.ReadText("a.csv", LocalClock("America/Denver", first, 4), FlowFileOptions.Default).Value;
        Assert.Equal([12.0, 36, 60, 84], file.Record!.Flows.ToArray().Select(q => Math.Round(q, 9)));
        Assert.Contains(file.Report.Assumptions, a => a.Contains("daylight-saving", StringComparison.Ordinal));
    }

    [Fact]
    public void A_repeated_hour_with_a_clock_that_stands_still_is_a_repeat_and_refused()
    {
        var first = new DateTime(2020, 10, 30, 0, 0, 0, DateTimeKind.Unspecified);
        var read = FlowFileReader.ReadText("a.csv", LocalClock("America/Denver", first, 4), ByClock(new RecipeClock(OffsetMin: -420)));
        Assert.Contains(read.Problems, p => p.Why.Contains("another flow for the same time", StringComparison.Ordinal));
    }

    [Fact]
    public void Times_in_a_column_of_their_own_and_24_00_are_read()
    {
        var rows = string.Concat(Enumerable.Range(1, 24).Select(h => $"1/13/2020;{h}:00;{h}\n"));
        var file = FlowFileReader.ReadText("a.csv", "date;time;flow (m3/s)\n1/13/2020;0:00;0\n" + rows + "1/14/2020;1:00;25\n", FlowFileOptions.Default).Value;
        Assert.Equal(12, Assert.Single(file.Record!.Flows.ToArray()), 1e-12);
    }

    [Fact]
    public void Offsets_beside_the_times_are_obeyed_and_must_stand_beside_all()
    {
        const string Rows = "time,flow_m3/s\n2020-01-01T00:00Z,4\n2020-01-01T12:00+01:00,4\n2020-01-01T23:45Z,4\n";
        var options = new FlowFileOptions(SubDaily: new SubDailySettings(0.9, TimeSpan.FromHours(13)));
        Assert.Equal(4, Assert.Single(FlowFileReader.ReadText("a.csv", Rows, options).Value.Record!.Flows.ToArray()), 1e-12);
        Assert.Contains("only some times", Assert.Single(FlowFileReader.ReadText("a.csv", Rows.Replace("+01:00", "", StringComparison.Ordinal), options).Problems).Why, StringComparison.Ordinal);
    }

    [Fact]
    public void Too_little_of_every_day_is_refused_and_partial_days_are_told()
    {
        var rows = string.Concat(Enumerable.Range(0, 12).Select(h => $"2020-01-01 {h:00}:00,5\n"));
        Assert.Contains("90 %", Assert.Single(FlowFileReader.ReadText("a.csv", "time,flow_cfs\n" + rows, FlowFileOptions.Default).Problems).Why, StringComparison.Ordinal);
        var half = FlowFileReader.ReadText("a.csv", "time,flow_cfs\n" + rows, new FlowFileOptions(SubDaily: new SubDailySettings(0.4))).Value;
        Assert.Equal(1, half.Report.Valid);
        var more = rows + string.Concat(Enumerable.Range(0, 24).Select(h => $"2020-01-02 {h:00}:00,5\n"));
        Assert.Equal(1, FlowFileReader.ReadText("a.csv", "time,flow_cfs\n" + more, FlowFileOptions.Default).Value.Report.Quality!.Find(QualityKind.PartialDay)!.Count);
    }

    [Fact]
    public void A_large_file_tells_how_far_it_has_come_and_can_be_stopped()
    {
        var text = new StringBuilder("time,flow_cfs\n");
        var at = new DateTime(2000, 1, 1, 0, 0, 0, DateTimeKind.Unspecified);
        for (var i = 0; i < 60_000; i++)
            text.Append(CultureInfo.InvariantCulture, $"{at.AddMinutes(15 * i):yyyy-MM-dd HH:mm},{10 + (i % 7)}\n");
        var bytes = Encoding.UTF8.GetBytes(text.ToString());

        var told = new List<double>();
        var file = FlowFileReader.Read("a.csv", new MemoryStream(bytes), FlowFileOptions.Default, new Told(told.Add), default).Value;
        Assert.Equal(625, file.Report.Valid);
        Assert.Equal(told.Order(), told);
        Assert.Equal(1, told[^1]);
        Assert.True(told.Count >= 4 && told[0] < 0.5);

        using var stop = new CancellationTokenSource();
        Assert.Throws<OperationCanceledException>(() => FlowFileReader.Read("a.csv", new MemoryStream(bytes), FlowFileOptions.Default, new Told(_ => stop.Cancel()), stop.Token));
    }

    private sealed class Told(Action<double> tell) : IProgress<double>
    {
        public void Report(double value) => tell(value);
    }
}
