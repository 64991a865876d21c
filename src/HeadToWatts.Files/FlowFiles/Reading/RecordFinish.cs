using System.Globalization;
using HeadToWatts.Basis.Problems;
using HeadToWatts.FlowRecords;
using HeadToWatts.FlowRecords.Quality;

namespace HeadToWatts.Files.FlowFiles.Reading;

/// <summary>The last step of reading a record: looks at its quality, applies the policy about gaps, states everything.</summary>
internal sealed class RecordFinish(RecordRows rows, RecordAbout about)
{
    public required DayMarks[] Marks { get; init; }

    public required int[] FileRows { get; init; }

    public required int RowCount { get; init; }

    public required int DaysWithRow { get; init; }

    public int RowsOutside { get; init; }

    public int Repeats { get; init; }

    public int OutOfOrder { get; init; }

    public int EstimatedLeftOut { get; init; }

    public TimeSpan Step { get; init; } = TimeSpan.FromDays(1);

    public Checked<FlowFile> Finish(DailyRecord read)
    {
        Look(read);
        State(read);
        var policies = rows.Options.Chosen;
        var gaps = GapPolicies.Apply(read, policies, about.Description.Length > 0 ? about.Description : "the record");
        if (!gaps.TryGet(out var done))
            return Checked.Refused<FlowFile>(gaps.Problems);

        List<string> words = [.. done.Done];
        if (EstimatedLeftOut > 0)
            words.Insert(0, $"{Number(EstimatedLeftOut)} estimated values were left out.");
        var quality = new RecordQuality
        {
            FirstDay = read.FirstDay,
            LastDay = read.LastDay,
            Step = Step,
            Rows = RowCount,
            Days = read.DayCount,
            MissingDays = read.MissingCount,
            LongestGapDays = SeriesChecks.LongestGap(read.Flows),
            EstimatedDays = Marks.Count(m => (m & DayMarks.Estimated) != 0),
            IceDays = Marks.Count(m => (m & DayMarks.Ice) != 0),
            ProvisionalDays = Marks.Count(m => (m & DayMarks.Provisional) != 0),
            ZeroDays = read.ZeroCount,
            FilledDays = done.FilledDays,
            Findings = rows.Findings.All(),
            Policies = policies,
            Done = words,
        };
        var record = new DailyRecord(done.Record.FirstDay, done.Record.Flows.ToArray(), about.Description) { Quality = quality };
        return Checked.Of(new FlowFile(about.FormatId, null, record, new FlowFileReport
        {
            FormatName = about.FormatName,
            Description = about.Description,
            Column = about.Column,
            Unit = about.Unit,
            FirstDay = read.FirstDay,
            LastDay = read.LastDay,
            Rows = RowCount,
            Days = read.DayCount,
            Valid = read.ValidCount,
            MissingValueRows = DaysWithRow - read.ValidCount,
            AbsentDays = read.DayCount - DaysWithRow,
            RowsOutsidePeriod = RowsOutside,
            Duplicates = Repeats,
            OutOfOrder = OutOfOrder,
            Negatives = rows.Findings.Of(QualityKind.Negative),
            Zeros = read.ZeroCount,
            MissingMarks = rows.Missing.Counts(),
            Codes = rows.Codes.Counts(),
            Assumptions = rows.Assumptions,
            Quality = quality,
        }));
    }

    private static string Number(int count) => count.ToString("N0", CultureInfo.InvariantCulture);

    private static string RowsText(int count) => count == 1 ? "1 row" : Number(count) + " rows";

    private void Look(DailyRecord read)
    {
        if (Step == TimeSpan.FromDays(1))
        {
            foreach (var i in SeriesChecks.Spikes(read.Flows))
                rows.Findings.Add(QualityKind.Spike, FileRows[i], $"{Iso(read.DateOf(i))}, {Value(read.Flows[i])}", "kept; see whether they are real");
        }

        foreach (var run in SeriesChecks.FlatRuns(read.Flows))
            rows.Findings.Add(QualityKind.FlatRun, FileRows[run.First], $"{Iso(read.DateOf(run.First))} to {Iso(read.DateOf(run.First + run.Length - 1))}, {Number(run.Length)} days of {Value(read.Flows[run.First])}", "kept; see whether the gauge stood still");
    }

    private string Value(double flowM3PerS) => about.Unit.FromHeld(flowM3PerS).ToString("0.####", CultureInfo.InvariantCulture) + " " + about.Unit.Symbol;

    private static string Iso(DateOnly day) => day.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture);

    private void State(DailyRecord record)
    {
        foreach (var mark in rows.Missing.Counts())
            rows.Assume($"{mark.Mark} means a missing value ({RowsText(mark.Count)})");
        if (rows.DryMarks > 0)
            rows.Assume($"Dry means no flow ({RowsText(rows.DryMarks)})");
        if (OutOfOrder > 0)
            rows.Assume($"{RowsText(OutOfOrder)} out of order put in the order of their dates");
        var same = rows.Findings.Of(QualityKind.RepeatedSame);
        if (same > 0)
            rows.Assume($"{RowsText(same)} that repeat a day with the same flow, or without one, counted once");
        if (RowsOutside > 0)
            rows.Assume($"{RowsText(RowsOutside)} without a value before the first or after the last flow left out of the period");
        if (record.NegativeCount > 0)
            rows.Assume($"{Number(record.NegativeCount)} negative flows were accepted; the flow-duration curve counts them as no flow");
    }
}
