using HeadToWatts.FlowRecords.Quality;

namespace HeadToWatts.FlowRecords;

/// <summary>
/// Daily mean flows from one day to another without a break; a day without a value is NaN. Zeros are data. Negative flows
/// (computed inflows have them) are kept as read and counted; a flow-duration curve counts them as no flow.
/// </summary>
public sealed class DailyRecord
{
    private readonly double[] _flows;
    private readonly byte[] _months;
    private readonly byte[] _daysOfMonth;

    /// <summary>A record.</summary>
    /// <param name="firstDay">Day of the first flow.</param>
    /// <param name="flowsM3PerS">Flow of each day in m3/s, NaN where it is missing.</param>
    /// <param name="description">Station, source, kind of record.</param>
    /// <exception cref="ArgumentException">No day at all, or an infinite flow.</exception>
    public DailyRecord(DateOnly firstDay, IReadOnlyList<double> flowsM3PerS, string description)
    {
        ArgumentNullException.ThrowIfNull(flowsM3PerS);
        ArgumentNullException.ThrowIfNull(description);
        if (flowsM3PerS.Count == 0)
            throw new ArgumentException("A record has at least one day.", nameof(flowsM3PerS));

        FirstDay = firstDay;
        Description = description;
        _flows = [.. flowsM3PerS];
        _months = new byte[_flows.Length];
        _daysOfMonth = new byte[_flows.Length];
        LastDay = firstDay.AddDays(_flows.Length - 1);

        double sum = 0, smallest = double.PositiveInfinity, largest = double.NegativeInfinity;
        var (year, month, day) = firstDay;
        var monthLength = DateTime.DaysInMonth(year, month);
        for (var i = 0; i < _flows.Length; i++)
        {
            _months[i] = (byte)month;
            _daysOfMonth[i] = (byte)day;
            if (++day > monthLength)
            {
                day = 1;
                if (++month > 12)
                {
                    month = 1;
                    year++;
                }

                if (year <= 9999)
                    monthLength = DateTime.DaysInMonth(year, month);
            }

            var q = _flows[i];
            if (double.IsInfinity(q))
                throw new ArgumentException($"The flow of day {i + 1} is infinite.", nameof(flowsM3PerS));
            if (double.IsNaN(q))
            {
                MissingCount++;
                continue;
            }

            sum += q;
            smallest = Math.Min(smallest, q);
            largest = Math.Max(largest, q);
            if (q == 0)
                ZeroCount++;
            else if (q < 0)
                NegativeCount++;
        }

        ValidCount = _flows.Length - MissingCount;
        MeanM3PerS = ValidCount == 0 ? double.NaN : sum / ValidCount;
        SmallestM3PerS = ValidCount == 0 ? double.NaN : smallest;
        LargestM3PerS = ValidCount == 0 ? double.NaN : largest;
    }

    /// <summary>First day.</summary>
    public DateOnly FirstDay { get; }

    /// <summary>Last day.</summary>
    public DateOnly LastDay { get; }

    /// <summary>Station, source, kind of record.</summary>
    public string Description { get; }

    /// <summary>What the record is worth, for a record that was read; null where nobody looked.</summary>
    public RecordQuality? Quality { get; init; }

    /// <summary>Flow of each day in m3/s, NaN where it is missing; without a copy.</summary>
    public ReadOnlySpan<double> Flows => _flows;

    /// <summary>Days from the first to the last, both included.</summary>
    public int DayCount => _flows.Length;

    /// <summary>Days with a value.</summary>
    public int ValidCount { get; }

    /// <summary>Days without a value.</summary>
    public int MissingCount { get; }

    /// <summary>Days of no flow.</summary>
    public int ZeroCount { get; }

    /// <summary>Days of negative flow.</summary>
    public int NegativeCount { get; }

    /// <summary>Valid days as years of 365.25 days.</summary>
    public double YearsSpanned => ValidCount / 365.25;

    /// <summary>Mean of the valid days, m3/s; NaN when there is none.</summary>
    public double MeanM3PerS { get; }

    /// <summary>Smallest flow, m3/s; NaN when there is none.</summary>
    public double SmallestM3PerS { get; }

    /// <summary>Largest flow, m3/s; NaN when there is none.</summary>
    public double LargestM3PerS { get; }

    /// <summary>Month, 1 to 12, of the day at an index of <see cref="Flows"/>.</summary>
    public int MonthOf(int index) => _months[index];

    /// <summary>Day of the month, 1 to 31, of the day at an index of <see cref="Flows"/>.</summary>
    public int DayOfMonthOf(int index) => _daysOfMonth[index];

    /// <summary>How many valid days lie in a season.</summary>
    public int ValidDaysIn(OperatingSeason season)
    {
        ArgumentNullException.ThrowIfNull(season);
        var days = 0;
        for (var i = 0; i < _flows.Length; i++)
        {
            if (!double.IsNaN(_flows[i]) && season.Runs(_months[i], _daysOfMonth[i]))
                days++;
        }

        return days;
    }

    /// <summary>The date at an index of <see cref="Flows"/>.</summary>
    public DateOnly DateOf(int index) => FirstDay.AddDays(index);
}
