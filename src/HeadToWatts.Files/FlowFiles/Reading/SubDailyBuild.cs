using System.Globalization;
using HeadToWatts.Basis.Problems;
using HeadToWatts.FlowRecords;
using HeadToWatts.FlowRecords.Quality;
using HeadToWatts.FlowRecords.SubDaily;

namespace HeadToWatts.Files.FlowFiles.Reading;

/// <summary>
/// Makes a record of several rows a day: puts the instants on one clock that never jumps, sorts them, finds repeats, and takes
/// daily means weighted by time.
/// </summary>
internal sealed class SubDailyBuild(RecordRows rows, RecordAbout about)
{
    public Checked<FlowFile> Build(PlacedRow[] placed)
    {
        var problems = rows.Problems;
        var settings = rows.Options.SubDaily ?? SubDailySettings.Default;
        if (!ClockOfRows.Place(placed, rows))
            return problems.Refuse();
        var total = placed.Length;
        var daysWithRow = CountDays(placed);
        var outOfOrder = RowOrder.Sort(placed, rows, Text);
        var count = RowOrder.Repeats(placed, rows, "time", Text, out var repeats);
        Array.Resize(ref placed, count);
        var estimatedOut = RowOrder.Values(placed, rows, Text);
        if (problems.Any)
            return problems.Refuse();
        if (!Array.Exists(placed, r => !double.IsNaN(r.Value)))
        {
            problems.File($"{Number(total)} rows", "no row has a flow", "at least one day with a flow");
            return problems.Refuse();
        }

        var times = new long[count];
        var values = new double[count];
        var rated = new RatedRows(rows, about, row => DateOnly.FromDayNumber(Day(row.At)), Text);
        for (var i = 0; i < count; i++)
        {
            times[i] = placed[i].At;
            values[i] = rated.FlowM3PerS(placed[i]);
        }

        rated.State();
        var flow = about.AsFlow(rows.Options);

        var means = DailyMeans.Of(times, values, settings);
        Spikes(placed, values);
        Pauses(placed, values, means);
        var first = means.Flows.IndexOfAnyExcept(double.NaN);
        if (first < 0)
        {
            problems.File($"{Number(total)} rows in {Number(daysWithRow)} days", $"no day has flows over {Percent(settings.DayShareNeeded)} of it",
                $"a smaller share of the day, or a longest step above {RecordQuality.Words(means.LongestStep)}");
            return problems.Refuse();
        }

        var last = means.Flows.LastIndexOfAnyExcept(double.NaN);
        Partial(means);
        var flows = means.Flows[first..(last + 1)].ToArray();
        var firstDay = means.FirstDay.AddDays(first);
        var (marks, fileRows, within) = Days(placed, firstDay.DayNumber, flows.Length);
        rows.Assume($"daily means are weighted by time, with straight lines between values up to {RecordQuality.Words(means.LongestStep)} apart");
        rows.Assume($"a day counts when its flow is known over {Percent(settings.DayShareNeeded)} of it or more");
        var record = new DailyRecord(firstDay, flows, flow.Description);
        return new RecordFinish(rows, flow)
        {
            Marks = marks,
            FileRows = fileRows,
            RowCount = total,
            DaysWithRow = within,
            RowsOutside = placed.Count(r => Day(r.At) < firstDay.DayNumber || Day(r.At) >= firstDay.DayNumber + flows.Length),
            Repeats = repeats,
            OutOfOrder = outOfOrder,
            EstimatedLeftOut = estimatedOut,
            Step = means.UsualStep,
        }.Finish(record);
    }

    private static (DayMarks[] Marks, int[] FileRows, int Within) Days(PlacedRow[] placed, int firstDay, int days)
    {
        var marks = new DayMarks[days];
        var fileRows = new int[days];
        foreach (var row in placed)
        {
            var day = Day(row.At) - firstDay;
            if (day < 0 || day >= days)
                continue;
            marks[day] |= row.Marks;
            if (fileRows[day] == 0)
                fileRows[day] = row.FileRow;
        }

        return (marks, fileRows, fileRows.Count(r => r > 0));
    }

    private void Partial(DailyMeans means)
    {
        var settings = rows.Options.SubDaily ?? SubDailySettings.Default;
        for (var d = 0; d < means.Flows.Length; d++)
        {
            if (double.IsNaN(means.Flows[d]) && means.CoveredShares[d] > 0 && rows.Findings.Count(QualityKind.PartialDay, $"left out: less than {Percent(settings.DayShareNeeded)} of the day is known"))
                rows.Findings.Example(QualityKind.PartialDay, 0, $"{Iso(means.FirstDay.AddDays(d))}, {Percent(means.CoveredShares[d])}");
        }
    }

    private void Pauses(PlacedRow[] placed, double[] values, DailyMeans means)
    {
        if (means.Breaks == 0)
            return;
        var before = -1;
        for (var i = 0; i < placed.Length; i++)
        {
            if (double.IsNaN(values[i]))
                continue;
            if (before >= 0 && placed[i].At - placed[before].At > (long)means.LongestStep.TotalMilliseconds
                && rows.Findings.Count(QualityKind.Pause, $"not bridged: longer than {RecordQuality.Words(means.LongestStep)}"))
                rows.Findings.Example(QualityKind.Pause, placed[i].FileRow, $"{Stamp(placed[before].At)} to {Stamp(placed[i].At)}");
            before = i;
        }
    }

    private void Spikes(PlacedRow[] placed, double[] values)
    {
        foreach (var i in SeriesChecks.Spikes(values))
        {
            if (rows.Findings.Count(QualityKind.Spike, "kept; see whether they are real"))
                rows.Findings.Example(QualityKind.Spike, placed[i].FileRow, Text(placed[i]));
        }
    }

    private static int CountDays(PlacedRow[] placed)
    {
        var days = new HashSet<int>();
        var last = -1;
        foreach (var row in placed)
        {
            var day = Day(row.At);
            if (day != last)
                days.Add(last = day);
        }

        return days.Count;
    }

    private static int Day(long at) => (int)(at / DailyMeans.DayMs);

    private static string Number(int count) => count.ToString("N0", CultureInfo.InvariantCulture);

    private static string Percent(double ratio) => (ratio * 100).ToString("0.#", CultureInfo.InvariantCulture) + " %";

    private static string Iso(DateOnly day) => day.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture);

    private static string Stamp(long at) => new DateTime(at * TimeSpan.TicksPerMillisecond, DateTimeKind.Unspecified).ToString(at % 60_000 == 0 ? "yyyy-MM-dd HH:mm" : "yyyy-MM-dd HH:mm:ss", CultureInfo.InvariantCulture);

    private static string Text(PlacedRow row) => $"{Stamp(row.At)}, {row.Value.ToString("R", CultureInfo.InvariantCulture)}";
}
