namespace HeadToWatts.FlowRecords.Statistics;

/// <summary>A year of a record.</summary>
/// <param name="Year">Its name.</param>
/// <param name="FirstIndex">Index in the record of its first day there.</param>
/// <param name="Days">Days of it in the record.</param>
/// <param name="ValidDays">Days with a flow.</param>
/// <param name="IsWhole">True when enough of its days have a flow.</param>
/// <param name="MeanFlowM3PerS">Mean of the days with a flow, m3/s; NaN when there is none.</param>
/// <param name="VolumeM3">Mean flow times the seconds of the year, m3; NaN when there is no flow.</param>
public sealed record RecordYear(int Year, int FirstIndex, int Days, int ValidDays, bool IsWhole, double MeanFlowM3PerS, double VolumeM3);

/// <summary>The years of a record.</summary>
/// <param name="Kind">Where they begin.</param>
/// <param name="NeededShare">Share of a year's days that must have a flow for the year to count as whole.</param>
/// <param name="All">Every year the record touches, in order.</param>
public sealed record RecordYears(YearKind Kind, double NeededShare, IReadOnlyList<RecordYear> All)
{
    /// <summary>Share of the days that a whole year needs when nothing else is chosen.</summary>
    public const double UsualNeededShare = 0.95;

    /// <summary>The whole years.</summary>
    public IReadOnlyList<RecordYear> Whole => [.. All.Where(y => y.IsWhole)];

    /// <summary>Parts a record into years.</summary>
    /// <param name="record">The record.</param>
    /// <param name="kind">Where years begin.</param>
    /// <param name="neededShare">Share of a year's days that must have a flow; above 0 and up to 1.</param>
    public static RecordYears Of(DailyRecord record, YearKind kind, double neededShare = UsualNeededShare)
    {
        ArgumentNullException.ThrowIfNull(record);
        if (!(neededShare is > 0 and <= 1))
            throw new ArgumentOutOfRangeException(nameof(neededShare), neededShare, "The share of days needed lies above 0 and up to 1.");
        var years = new List<RecordYear>();
        var flows = record.Flows;
        for (var first = 0; first < flows.Length;)
        {
            var year = Years.Of(record.DateOf(first), kind);
            var end = Math.Min(flows.Length, Years.FirstDayOf(year + 1, kind).DayNumber - record.FirstDay.DayNumber);
            var sum = 0.0;
            var valid = 0;
            for (var i = first; i < end; i++)
            {
                if (double.IsNaN(flows[i]))
                    continue;
                sum += flows[i];
                valid++;
            }

            var days = Years.DaysOf(year, kind);
            var mean = valid > 0 ? sum / valid : double.NaN;
            years.Add(new RecordYear(year, first, end - first, valid, valid >= neededShare * days, mean, mean * days * 86_400));
            first = end;
        }

        return new RecordYears(kind, neededShare, years);
    }
}
