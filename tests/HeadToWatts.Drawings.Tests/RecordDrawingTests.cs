using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.FlowRecords.Statistics;

namespace HeadToWatts.Drawings.Tests;

/// <summary>The pictures of a daily record say what the record holds.</summary>
public class RecordDrawingTests
{
    [Fact]
    public void The_calendar_counts_full_days_dry_days_and_days_without_a_value()
    {
        // Ten days of 2021: four at the full flow or over, three at half, two dry, one blank.
        double[] shares = [1, 1.2, 1, 2, 0.5, 0.5, 0.5, 0, 0, double.NaN];
        var drawing = DayCalendar.Draw(new DayCalendarInput(new DateOnly(2021, 3, 1), shares, 1, "Daily flow", "the design flow", "the design flow or more"), DrawingSize.Wide);
        Assert.Contains("1 year. 44 % of the days reach the design flow, 22 % have none; 1 day without a value.", drawing.Description, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(1, 2)]
    [InlineData(10, 1)]
    public void A_calendar_has_a_line_for_each_year_from_its_first_month_on(int firstMonth, int years)
    {
        // 1 October 2020 to 30 June 2021 lies in two calendar years and in one water year.
        var days = new DateOnly(2021, 7, 1).DayNumber - new DateOnly(2020, 10, 1).DayNumber;
        var drawing = DayCalendar.Draw(new DayCalendarInput(new DateOnly(2020, 10, 1), [.. Enumerable.Repeat(0.6, days)], firstMonth, "Daily flow", "full", "full"), DrawingSize.Wide);
        Assert.StartsWith(years == 1 ? "1 year." : "2 years.", drawing.Description, StringComparison.Ordinal);
    }

    [Fact]
    public void The_time_line_names_the_longest_gap()
    {
        var input = new GapTimelineInput(new DateOnly(2010, 1, 1), new DateOnly(2019, 12, 31), [new(new DateOnly(2012, 3, 4), 12), new(new DateOnly(2015, 6, 1), 40)]);
        Assert.Equal("1 Jan 2010 to 31 Dec 2019: 2 gaps, 52 days; longest 40 days from 1 Jun 2015.", GapTimeline.Draw(input, DrawingSize.Wide with { Height = 110 }).Description);
    }

    [Fact]
    public void The_hydrograph_names_the_highest_and_lowest_of_the_medians()
    {
        DayOfYearBand[] days = [.. Enumerable.Range(0, 360).Select(i => (Month: (i / 30) + 1, Day: (i % 30) + 1)).Where(d => d.Month != 2 || d.Day <= 28)
            .Select(d => new DayOfYearBand(d.Month, d.Day, 20, 1, d is { Month: 6, Day: 10 } ? 5 : d is { Month: 12, Day: 3 } ? 1.5 : 2, 6))];
        var drawing = HydrographChart.Draw(new HydrographInput(days, 10, 3), UnitDisplay.For(UnitSystem.SI, 3), DrawingSize.Wide);
        Assert.Contains("highest, 5.00 m3/s, about 10 Jun", drawing.Description, StringComparison.Ordinal);
        Assert.Contains("lowest, 1.50 m3/s, about 3 Dec", drawing.Description, StringComparison.Ordinal);
    }
}
