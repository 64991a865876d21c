namespace HeadToWatts.FlowRecords.Statistics;

/// <summary>Where a year begins.</summary>
public enum YearKind
{
    /// <summary>1 January to 31 December.</summary>
    Calendar,

    /// <summary>1 October to 30 September, named by the year it ends in.</summary>
    Water,

    /// <summary>1 April to 31 March, named by the year it begins in: keeps a summer's or winter's low flow in one year.</summary>
    Climate,
}

/// <summary>Days and years.</summary>
public static class Years
{
    /// <summary>The year a day belongs to.</summary>
    /// <param name="day">The day.</param>
    /// <param name="kind">Where years begin.</param>
    public static int Of(DateOnly day, YearKind kind) => kind switch
    {
        YearKind.Water => day.Month >= 10 ? day.Year + 1 : day.Year,
        YearKind.Climate => day.Month >= 4 ? day.Year : day.Year - 1,
        _ => day.Year,
    };

    /// <summary>First day of a year.</summary>
    /// <param name="year">The year.</param>
    /// <param name="kind">Where years begin.</param>
    public static DateOnly FirstDayOf(int year, YearKind kind) => kind switch
    {
        YearKind.Water => new DateOnly(year - 1, 10, 1),
        YearKind.Climate => new DateOnly(year, 4, 1),
        _ => new DateOnly(year, 1, 1),
    };

    /// <summary>Days of a year: 365 or 366.</summary>
    /// <param name="year">The year.</param>
    /// <param name="kind">Where years begin.</param>
    public static int DaysOf(int year, YearKind kind) => FirstDayOf(year + 1, kind).DayNumber - FirstDayOf(year, kind).DayNumber;
}
