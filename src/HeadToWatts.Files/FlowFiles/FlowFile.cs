using System.Globalization;
using HeadToWatts.Basis.Units;
using HeadToWatts.FlowRecords;
using HeadToWatts.FlowRecords.Quality;

namespace HeadToWatts.Files.FlowFiles;

/// <summary>What was read from a flow file: either a flow-duration curve or a daily record.</summary>
/// <param name="Format">Key of the format.</param>
/// <param name="Curve">The curve, for a file of one; its rows are the file's.</param>
/// <param name="Record">The record, for a file of one.</param>
/// <param name="Report">What was found in the file and what was assumed.</param>
public sealed record FlowFile(string Format, FlowDurationCurve? Curve, DailyRecord? Record, FlowFileReport Report);

/// <summary>How often something stood in a file.</summary>
/// <param name="Mark">The mark or code as written; "(blank)" for an empty cell.</param>
/// <param name="Count">How often.</param>
public readonly record struct MarkCount(string Mark, int Count);

/// <summary>What was found in a flow file, counted, and what was assumed in reading it.</summary>
public sealed record FlowFileReport
{
    /// <summary>Name of the format.</summary>
    public required string FormatName { get; init; }

    /// <summary>Station or title as the file gives it; may be empty.</summary>
    public string Description { get; init; } = "";

    /// <summary>Column the flows were read from.</summary>
    public string Column { get; init; } = "";

    /// <summary>Unit the flows are written in.</summary>
    public required UnitOfMeasure Unit { get; init; }

    /// <summary>First day with a value; null for a curve.</summary>
    public DateOnly? FirstDay { get; init; }

    /// <summary>Last day with a value; null for a curve.</summary>
    public DateOnly? LastDay { get; init; }

    /// <summary>Rows of data in the file.</summary>
    public int Rows { get; init; }

    /// <summary>Days from the first to the last.</summary>
    public int Days { get; init; }

    /// <summary>Days with a value.</summary>
    public int Valid { get; init; }

    /// <summary>Days within the period that have a row without a value.</summary>
    public int MissingValueRows { get; init; }

    /// <summary>Days within the period that have no row.</summary>
    public int AbsentDays { get; init; }

    /// <summary>Rows without a value before the first or after the last day, left out.</summary>
    public int RowsOutsidePeriod { get; init; }

    /// <summary>Rows that repeat a day.</summary>
    public int Duplicates { get; init; }

    /// <summary>Rows that stand before an earlier day.</summary>
    public int OutOfOrder { get; init; }

    /// <summary>Days of negative flow.</summary>
    public int Negatives { get; init; }

    /// <summary>Days of no flow; they are data.</summary>
    public int Zeros { get; init; }

    /// <summary>What was taken as missing.</summary>
    public IReadOnlyList<MarkCount> MissingMarks { get; init; } = [];

    /// <summary>Quality codes of the agency and how often each stood.</summary>
    public IReadOnlyList<MarkCount> Codes { get; init; } = [];

    /// <summary>What was assumed, each in words with its evidence.</summary>
    public IReadOnlyList<string> Assumptions { get; init; } = [];

    /// <summary>What the record is worth; null for a curve.</summary>
    public RecordQuality? Quality { get; init; }

    /// <summary>The report in plain lines.</summary>
    public IReadOnlyList<string> Lines()
    {
        var lines = new List<string> { $"Format: {FormatName}" };
        if (Description.Length > 0)
            lines.Add($"Description: {Description}");
        if (Column.Length > 0)
            lines.Add($"Column: {Column}");
        lines.Add($"Unit: {Unit.Symbol}");
        lines.Add($"Rows: {Number(Rows)}");
        if (FirstDay is { } first && LastDay is { } last)
        {
            lines.Add($"Period: {first.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture)} to {last.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture)}, {Number(Days)} days");
            lines.Add($"Days with a value: {Number(Valid)} ({(100.0 * Valid / Days).ToString("0.0", CultureInfo.InvariantCulture)} %)");
            lines.Add($"Days with a row but no value: {Number(MissingValueRows)}");
            lines.Add($"Days without a row: {Number(AbsentDays)}");
            lines.Add($"Rows without a value outside the period: {Number(RowsOutsidePeriod)}");
            lines.Add($"Repeated days: {Number(Duplicates)}; rows out of order: {Number(OutOfOrder)}");
            lines.Add($"Days of no flow: {Number(Zeros)}; days of negative flow: {Number(Negatives)}");
        }

        if (MissingMarks.Count > 0)
            lines.Add("Taken as missing: " + string.Join(", ", MissingMarks.Select(m => $"{m.Mark} ({Number(m.Count)})")));
        if (Codes.Count > 0)
            lines.Add("Quality codes: " + string.Join(", ", Codes.Select(m => $"{m.Mark} ({Number(m.Count)})")));
        lines.AddRange(Assumptions.Select(a => "Assumed: " + a));
        if (Quality is not null)
            lines.AddRange(Quality.Lines());
        return lines;
    }

    private static string Number(int count) => count.ToString("N0", CultureInfo.InvariantCulture);
}
