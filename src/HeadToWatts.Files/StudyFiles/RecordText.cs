using System.Globalization;
using System.Runtime.CompilerServices;
using System.Text;
using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Units;
using HeadToWatts.FlowRecords;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>
/// Reads and writes the days of a record that stand in the study itself. The last reading of a text is kept with the text, so
/// that a keystroke elsewhere in the study does not read thirty years of days again.
/// </summary>
public static class RecordText
{
    private static readonly ConditionalWeakTable<string, Known> Readings = [];

    /// <summary>Puts a record into the study.</summary>
    /// <param name="record">The record.</param>
    /// <param name="unit">Unit in which the days are written.</param>
    public static RecordDocument Write(DailyRecord record, UnitOfMeasure unit)
    {
        ArgumentNullException.ThrowIfNull(record);
        ArgumentNullException.ThrowIfNull(unit);
        var text = new StringBuilder(record.DayCount * 6);
        foreach (var flow in record.Flows)
        {
            if (text.Length > 0)
                text.Append(' ');
            if (double.IsNaN(flow))
                text.Append('-');
            else
                text.Append(Math.Round(unit.FromHeld(flow), 9).ToString("G10", CultureInfo.InvariantCulture));
        }

        return new RecordDocument { Unit = unit.Symbol, FirstDay = record.FirstDay.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture), Days = text.ToString() };
    }

    internal static Checked<DailyRecord> Read(RecordDocument document, string where)
    {
        var key = (document.Unit ?? "") + "|" + (document.FirstDay ?? "");
        if (Readings.TryGetValue(document.Days!, out var known) && known.Key == key)
            return known.Reading;
        var reading = Parse(document, where);
        Readings.AddOrUpdate(document.Days!, new Known(key, reading));
        return reading;
    }

    private static Checked<DailyRecord> Parse(RecordDocument document, string where)
    {
        var problems = new List<Problem>();
        var unit = UnitTable.Find(Dimension.Flow, document.Unit?.Trim() ?? "");
        if (unit is null)
            problems.Add(new Problem(where + ".unit", document.Unit ?? "", "the unit of the days is not known", QuantityText.Accepted(Dimension.Flow)));
        if (!DateOnly.TryParseExact(document.FirstDay, "yyyy-MM-dd", CultureInfo.InvariantCulture, DateTimeStyles.None, out var first))
            problems.Add(new Problem(where + ".firstDay", document.FirstDay ?? "", "the first day is not a date", "yyyy-mm-dd"));
        var flows = new List<double>();
        var row = 0;
        foreach (var range in document.Days.AsSpan().Split(' '))
        {
            var word = document.Days.AsSpan()[range];
            if (word.IsEmpty)
                continue;
            row++;
            if (word is "-")
            {
                flows.Add(double.NaN);
            }
            else if (double.TryParse(word, NumberStyles.Float, CultureInfo.InvariantCulture, out var value) && double.IsFinite(value) && value >= 0)
            {
                flows.Add(unit?.ToHeld(value) ?? 0);
            }
            else if (problems.Count < 20)
            {
                problems.Add(new Problem($"{where}.days day {row}", word.ToString(), "a day's flow is a number, not below zero, or '-'"));
            }
        }

        if (problems.Count == 0 && flows.Count(f => !double.IsNaN(f)) < 2)
            problems.Add(new Problem(where + ".days", $"{flows.Count} days", "a record needs at least two days with a flow"));
        return problems.Count > 0 ? Checked.Refused<DailyRecord>(problems) : Checked.Of(new DailyRecord(first, flows, ""));
    }

    private sealed record Known(string Key, Checked<DailyRecord> Reading);
}
