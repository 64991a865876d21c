using HeadToWatts.FlowRecords;
using HeadToWatts.FlowRecords.Statistics;
using HeadToWatts.Studies.Results;

namespace HeadToWatts.Calculations.Tests.Studies;

/// <summary>What a study says of its record; the statistics themselves are held where they are reckoned.</summary>
public class RecordSummaryTests
{
    [Fact]
    public void A_typed_curve_has_no_summary() =>
        Assert.Null(TestStudies.Quiet.WithCurve(BeyondLastRow.Hold, new(0, 2), new(1, 1)).Run().Summary);

    [Fact]
    public void The_summary_names_whole_years_and_a_dry_and_a_wet_one()
    {
        // Each year flows at one rate throughout, so that its place is known: 2001 is the driest, 2012 the wettest.
        var flow = TestStudies.Quiet.Flow with { Record = TestStudies.Record(12, (day, _) => 1 + Math.Floor(day / 365.25)) };
        var summary = RecordSummary.Of(flow)!;
        Assert.Equal(12, summary.Years.Whole.Count);
        Assert.Equal(2001, summary.Classes!.Dry.Year);
        Assert.Equal(2012, summary.Classes.Wet.Year);
        Assert.Equal(365, summary.DayOfYear.Count);
        Assert.Equal(12, summary.Months.Count);
        Assert.Equal(["all days", "median year", "dry year 2001", "wet year 2012"], summary.Curves.Select(c => c.Name));
    }

    [Fact]
    public void Water_years_begin_in_October_and_energy_follows_them()
    {
        var flow = TestStudies.Quiet.WithFlow(f => f with { YearKind = YearKind.Water });
        var result = flow.Run();
        // Twelve calendar years hold eleven whole water years, 2002 to 2012, and a piece at each end.
        Assert.Equal(11, result.Summary!.Years.Whole.Count);
        Assert.Equal(Enumerable.Range(2002, 11), result.Energy.Days!.Years.Where(y => y.IsWhole).Select(y => y.Year));
        Assert.Equal(13, result.Energy.Days.Years.Count);
        var calendar = TestStudies.Quiet.Run();
        Assert.Equal(1, calendar.Energy.Days!.Years.Sum(y => y.EnergyKwh) / result.Energy.Days.Years.Sum(y => y.EnergyKwh), 1e-12);
    }

    [Fact]
    public void The_days_add_up_to_the_years()
    {
        var days = TestStudies.Quiet.Run().Energy.Days!;
        Assert.Equal(TestStudies.TwelveYears.DayCount, days.EnergyOfDaysKwh.Count);
        Assert.Equal(1, days.EnergyOfDaysKwh.Where(e => !double.IsNaN(e)).Sum() / days.Years.Sum(y => y.EnergyKwh), 1e-12);
    }

    [Theory]
    [InlineData(2, "too few years")]
    [InlineData(12, "none: dry every year")]
    public void Where_there_is_no_7Q10_the_summary_says_why(int years, string why)
    {
        var flow = TestStudies.Quiet.Flow with { Record = TestStudies.Record(years, (day, q) => day % 365 < 60 ? 0 : q) };
        Assert.Equal(why, RecordSummary.Of(flow)!.WhyNoSevenQTen);
    }
}
