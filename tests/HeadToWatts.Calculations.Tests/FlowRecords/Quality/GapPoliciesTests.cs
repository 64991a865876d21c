using HeadToWatts.FlowRecords;
using HeadToWatts.FlowRecords.Quality;

namespace HeadToWatts.Calculations.Tests.FlowRecords.Quality;

public sealed class GapPoliciesTests
{
    private const double None = double.NaN;

    [Fact]
    public void Gaps_up_to_the_length_are_filled_by_a_straight_line_and_longer_ones_stay()
    {
        var record = new DailyRecord(new DateOnly(2020, 1, 1), [1, None, None, 4, None, None, None, 8], "");
        var done = GapPolicies.Apply(record, new RecordPolicies(GapPolicy.Interpolated, 2), "record").Value;
        Assert.Equal([1, 2, 3, 4, None, None, None, 8], done.Record.Flows.ToArray());
        Assert.Equal(2, done.FilledDays);
        Assert.Contains("3 days in longer gaps were left out", Assert.Single(done.Done), StringComparison.Ordinal);
    }

    [Fact]
    public void Whole_years_are_kept_and_the_rest_is_left_out()
    {
        // 2019 lacks a day; 2020 (366 days) and 2022 are whole; 2021 lacks its last day.
        var first = new DateOnly(2018, 6, 1);
        var flows = new double[new DateOnly(2022, 12, 31).DayNumber - first.DayNumber + 1];
        Array.Fill(flows, 2.0);
        flows[new DateOnly(2019, 5, 5).DayNumber - first.DayNumber] = None;
        flows[new DateOnly(2021, 12, 31).DayNumber - first.DayNumber] = None;
        var done = GapPolicies.Apply(new DailyRecord(first, flows, ""), new RecordPolicies(GapPolicy.WholeYearsOnly), "record").Value;
        Assert.Equal((new DateOnly(2020, 1, 1), new DateOnly(2022, 12, 31)), (done.Record.FirstDay, done.Record.LastDay));
        Assert.Equal(366 + 365, done.Record.ValidCount);
        Assert.Contains("2 whole years", done.Done[0], StringComparison.Ordinal);
    }

    [Fact]
    public void Years_may_begin_in_October_and_no_whole_year_is_refused()
    {
        var flows = new double[366];
        Array.Fill(flows, 1.0);
        var record = new DailyRecord(new DateOnly(2019, 10, 1), flows, "");
        Assert.Equal(366, GapPolicies.Apply(record, new RecordPolicies(GapPolicy.WholeYearsOnly, YearStartMonth: 10), "r").Value.Record.ValidCount);
        Assert.Contains("no year", Assert.Single(GapPolicies.Apply(record, new RecordPolicies(GapPolicy.WholeYearsOnly), "r").Problems).Why, StringComparison.Ordinal);
    }

    [Fact]
    public void Spikes_and_flat_runs_are_found_and_a_gate_that_opens_or_shuts_is_neither()
    {
        Assert.Equal([2, 5], SeriesChecks.Spikes([5, 6, 90, 6, 5, 0.1, 5, 6]));
        Assert.Empty(SeriesChecks.Spikes([0, 0, 50, 50, 50, 0, 0, 5, 0]));
        double[] flat = [.. Enumerable.Repeat(3.0, 14), 4, .. Enumerable.Repeat(0.0, 30)];
        Assert.Equal([new FlatRun(0, 14)], SeriesChecks.FlatRuns(flat));
        Assert.Equal(3, SeriesChecks.LongestGap([None, 1, None, None, None, 2]));
    }

    [Fact]
    public void Policies_are_printed_in_sentences()
    {
        Assert.Equal(4, RecordPolicies.Default.Lines().Count);
        Assert.Contains("Gaps of up to 5 days are filled by a straight line; longer ones are left out.", new RecordPolicies(GapPolicy.Interpolated, 5).Lines());
        Assert.Equal("15 minutes", RecordQuality.Words(TimeSpan.FromMinutes(15)));
        Assert.Equal("1 day", RecordQuality.Words(TimeSpan.FromDays(1)));
    }
}
