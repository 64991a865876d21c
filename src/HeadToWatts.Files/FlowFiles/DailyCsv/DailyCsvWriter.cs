using System.Globalization;
using System.Text;
using HeadToWatts.Basis.Units;
using HeadToWatts.FlowRecords;

namespace HeadToWatts.Files.FlowFiles.DailyCsv;

/// <summary>Writes a daily record as a table of dates and flows; reading it again gives the same record.</summary>
public static class DailyCsvWriter
{
    /// <summary>The text of the table: "date,flow_cfs" or another unit, a blank where a flow is missing.</summary>
    /// <param name="record">The record.</param>
    /// <param name="unit">Unit in which the flows are written.</param>
    public static string Write(DailyRecord record, UnitOfMeasure unit)
    {
        ArgumentNullException.ThrowIfNull(record);
        ArgumentNullException.ThrowIfNull(unit);
        var text = new StringBuilder(record.DayCount * 18).Append(CultureInfo.InvariantCulture, $"date,flow ({unit.Symbol})\n");
        for (var i = 0; i < record.DayCount; i++)
        {
            text.Append(CultureInfo.InvariantCulture, $"{record.DateOf(i):yyyy-MM-dd},");
            if (!double.IsNaN(record.Flows[i]))
                text.Append(Shortest(record.Flows[i], unit));
            text.Append('\n');
        }

        return text.ToString();
    }

    // The shortest number that turns back into the same flow; one unit back and forth may change the last digit.
    private static string Shortest(double flowM3PerS, UnitOfMeasure unit)
    {
        var written = unit.FromHeld(flowM3PerS);
        foreach (var format in new[] { "G12", "G15", "R" })
        {
            var text = written.ToString(format, CultureInfo.InvariantCulture);
            if (unit.ToHeld(double.Parse(text, CultureInfo.InvariantCulture)) == flowM3PerS)
                return text;
        }

        var (below, above) = (Math.BitDecrement(written), Math.BitIncrement(written));
        return (unit.ToHeld(below) == flowM3PerS ? below : unit.ToHeld(above) == flowM3PerS ? above : written).ToString("R", CultureInfo.InvariantCulture);
    }
}
