using HeadToWatts.Files.FlowFiles;
using HeadToWatts.Files.StudyFiles;
using HeadToWatts.FlowRecords.Quality;

namespace HeadToWatts.Files.Tests.FlowFiles;

public sealed class QualityTests
{
    private const string Rough = "date,flow_m3/s,flag\n2020-01-01,5,A\n2020-01-02,-1,A\n2020-01-03,6,e\n2020-01-03,6,e\n2020-01-05,700,P\n2020-01-04,6.5,A\n2020-01-06,7,A\n2020-01-09,7,ice\nTotal,99,\n";

    [Fact]
    public void Everything_found_has_its_count_its_first_places_and_what_was_done()
    {
        Assert.Contains("negative", Assert.Single(FlowFileReader.ReadText("q.csv", Rough, FlowFileOptions.Default).Problems).Why, StringComparison.Ordinal);
        var report = Read(new RecordPolicies(Negatives: NegativePolicy.KeptOut)).Report;
        var quality = report.Quality!;
        Assert.Equal((9, 3, 2), (quality.Days, quality.MissingDays, quality.LongestGapDays));
        Assert.Equal((1, 1, 1), (quality.EstimatedDays, quality.IceDays, quality.ProvisionalDays));
        Assert.Equal("kept out", Only(QualityKind.Negative, 3, "2020-01-02, -1").Done);
        Assert.Equal("counted once", Only(QualityKind.RepeatedSame, 5, "2020-01-03, 6").Done);
        Assert.Equal("put in order", Only(QualityKind.OutOfOrder, 7, "2020-01-04, 6.5").Done);
        Assert.Equal("left out", Only(QualityKind.TotalsRow, 10, "Total, 99").Done);
        Assert.Contains("2020-01-05", Only(QualityKind.Spike, 6, "2020-01-05, 700 m3/s").Examples[0].Text, StringComparison.Ordinal);
        Assert.Contains(report.Lines(), l => l.StartsWith("Found: Negative flows: 1 (row 3: 2020-01-02, -1); kept out", StringComparison.Ordinal));
        Assert.Contains("Policy: Negative flows are kept out, as days without a flow.", report.Lines());

        QualityFinding Only(QualityKind kind, int row, string text)
        {
            var finding = quality.Find(kind);
            Assert.NotNull(finding);
            Assert.Equal((1, new QualityExample(row, text)), (finding.Count, Assert.Single(finding.Examples)));
            return finding;
        }
    }

    [Fact]
    public void Policies_do_what_they_say()
    {
        Assert.Equal(0, Read(new RecordPolicies(Negatives: NegativePolicy.Zeroed)).Record!.Flows[1]);
        Assert.Equal(-1, Read(new RecordPolicies(Negatives: NegativePolicy.Kept)).Record!.Flows[1]);
        var without = Read(new RecordPolicies(Negatives: NegativePolicy.KeptOut, KeepEstimated: false));
        Assert.True(double.IsNaN(without.Record!.Flows[2]));
        Assert.Contains("1 estimated values were left out.", without.Report.Quality!.Done);
        var filled = Read(new RecordPolicies(GapPolicy.Interpolated, 1, Negatives: NegativePolicy.KeptOut));
        Assert.Equal((5.5, 1), (filled.Record!.Flows[1], filled.Record.Quality!.FilledDays));
        Assert.True(double.IsNaN(filled.Record.Flows[6]));
        Assert.Contains("no year", Assert.Single(FlowFileReader.ReadText("q.csv", Rough, new FlowFileOptions(Policies: new RecordPolicies(GapPolicy.WholeYearsOnly, Negatives: NegativePolicy.Zeroed))).Problems).Why, StringComparison.Ordinal);
    }

    [Fact]
    public void Two_flows_for_a_day_are_refused_or_settled_by_the_user()
    {
        const string Text = "date,flow_m3/s\n2020-01-01,5\n2020-01-01,6\n";
        Assert.Contains("another flow", Assert.Single(FlowFileReader.ReadText("q.csv", Text, FlowFileOptions.Default).Problems).Why, StringComparison.Ordinal);
        Assert.Equal(5, FlowFileReader.ReadText("q.csv", Text, new FlowFileOptions(Policies: new RecordPolicies(Repeats: RepeatPolicy.First))).Value.Record!.Flows[0]);
        var last = FlowFileReader.ReadText("q.csv", Text, new FlowFileOptions(Policies: new RecordPolicies(Repeats: RepeatPolicy.Last))).Value;
        Assert.Equal(6, last.Record!.Flows[0]);
        Assert.Equal("the last holds", last.Report.Quality!.Find(QualityKind.RepeatedDifferent)!.Done);
    }

    [Fact]
    public void Long_runs_of_one_flow_are_flagged_and_zeros_are_data()
    {
        var rows = string.Concat(Enumerable.Range(0, 40).Select(i => $"{new DateOnly(2020, 1, 1).AddDays(i):yyyy-MM-dd},{(i < 20 ? 3 : 0)}\n"));
        var quality = FlowFileReader.ReadText("q.csv", "date,flow_m3/s\n" + rows, FlowFileOptions.Default).Value.Report.Quality!;
        Assert.Equal(20, quality.ZeroDays);
        Assert.Contains("20 days of 3 m3/s", Assert.Single(quality.Find(QualityKind.FlatRun)!.Examples).Text, StringComparison.Ordinal);
    }

    [Fact]
    public void A_last_row_that_is_cut_off_is_left_out_and_told_and_one_that_may_be_is_told()
    {
        var cut = FlowFileReader.ReadText("q.csv", "date,flow_m3/s\n2020-01-01,5\n2020-01-0", FlowFileOptions.Default).Value;
        Assert.Equal((1, "2020-01-0"), (cut.Report.Days, cut.Report.Quality!.Find(QualityKind.CutRow)!.Examples[0].Text));
        var open = FlowFileReader.ReadText("q.csv", "date,flow_m3/s\n2020-01-01,5\n2020-01-02,12", FlowFileOptions.Default).Value;
        Assert.Equal(2, open.Report.Valid);
        Assert.NotNull(open.Report.Quality!.Find(QualityKind.OpenEnd));
        Assert.Null(FlowFileReader.ReadText("q.csv", "date,flow_m3/s\n2020-01-01,5\n", FlowFileOptions.Default).Value.Report.Quality!.Find(QualityKind.OpenEnd));
    }

    [Fact]
    public void Choices_are_written_in_the_study_and_printed_with_the_record()
    {
        var policies = new RecordPolicies(GapPolicy.Interpolated, 3, 10, NegativePolicy.KeptOut, false, RepeatPolicy.Last);
        var problems = new List<HeadToWatts.Basis.Problems.Problem>();
        Assert.Equal(policies, PolicyBuilder.Policies(PolicyBuilder.From(policies), "p", problems));
        Assert.Equal(RecordPolicies.Default, PolicyBuilder.Policies(PolicyBuilder.From(RecordPolicies.Default), "p", problems));
        Assert.Empty(problems);
        PolicyBuilder.Policies(new PolicyDocument { Gaps = "interpolated up to 900 days", Negatives = "dropped", YearStarts = "Octember" }, "p", problems);
        PolicyBuilder.SubDaily(new PolicyDocument { DayShare = "0 %", LongestStep = "2 psi" }, "p", problems);
        Assert.Equal(["p.dayShare", "p.gaps", "p.longestStep", "p.negatives", "p.yearStarts"], problems.Select(p => p.Where).Order(StringComparer.Ordinal));
    }

    private static FlowFile Read(RecordPolicies policies) => FlowFileReader.ReadText("q.csv", Rough, new FlowFileOptions(Policies: policies)).Value;
}
