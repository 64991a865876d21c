using System.Globalization;
using HeadToWatts.Basis.Problems;
using HeadToWatts.FlowRecords;
using HeadToWatts.FlowRecords.Quality;

namespace HeadToWatts.Files.FlowFiles.Reading;

/// <summary>Makes a record of one row a day: sorts, finds repeats, lays absent days open as missing, and counts all of it.</summary>
internal sealed class DailyBuild(RecordRows rows, RecordAbout about)
{
    public Checked<FlowFile> Build(PlacedRow[] placed)
    {
        var problems = rows.Problems;
        var total = placed.Length;
        var outOfOrder = RowOrder.Sort(placed, rows, Text);
        var count = RowOrder.Repeats(placed, rows, "day", Text, out var repeats);
        Array.Resize(ref placed, count);
        var estimatedOut = RowOrder.Values(placed, rows, Text);
        var firstAt = Array.FindIndex(placed, d => !double.IsNaN(d.Value));
        if (firstAt < 0)
        {
            if (!problems.Any)
                problems.File($"{Number(total)} rows", "no row has a flow", "at least one day with a flow");
            return problems.Refuse();
        }

        if (problems.Any)
            return problems.Refuse();

        var lastAt = Array.FindLastIndex(placed, d => !double.IsNaN(d.Value));
        var first = (int)placed[firstAt].At;
        var flows = new double[(int)placed[lastAt].At - first + 1];
        var marks = new DayMarks[flows.Length];
        var fileRows = new int[flows.Length];
        Array.Fill(flows, double.NaN);
        var rated = new RatedRows(rows, about, row => DateOnly.FromDayNumber((int)row.At), Text);
        for (var i = firstAt; i <= lastAt; i++)
        {
            var day = (int)placed[i].At - first;
            flows[day] = rated.FlowM3PerS(placed[i]);
            marks[day] = placed[i].Marks;
            fileRows[day] = placed[i].FileRow;
        }

        rated.State();
        if (flows.All(double.IsNaN))
        {
            problems.File($"{Number(total)} rows", "no level lies within the rating", "a rating for these levels, or another choice for levels outside it");
            return problems.Refuse();
        }

        var flow = about.AsFlow(rows.Options);
        var record = new DailyRecord(DateOnly.FromDayNumber(first), flows, flow.Description);
        var within = lastAt - firstAt + 1;
        return new RecordFinish(rows, flow)
        {
            Marks = marks,
            FileRows = fileRows,
            RowCount = total,
            DaysWithRow = within,
            RowsOutside = count - within,
            Repeats = repeats,
            OutOfOrder = outOfOrder,
            EstimatedLeftOut = estimatedOut,
        }.Finish(record);
    }

    private static string Number(int count) => count.ToString("N0", CultureInfo.InvariantCulture);

    private static string Text(PlacedRow day) =>
        string.Create(CultureInfo.InvariantCulture, $"{DateOnly.FromDayNumber((int)day.At):yyyy-MM-dd}, {day.Value:R}");
}
