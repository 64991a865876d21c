using HeadToWatts.Basis.Sources;
using HeadToWatts.FlowRecords;
using HeadToWatts.FlowRecords.Statistics;
using HeadToWatts.Studies.Inputs;

namespace HeadToWatts.Studies.Results;

/// <summary>A curve with its name.</summary>
/// <param name="Name">What it counts, as "operating season".</param>
/// <param name="Days">Days of the record behind it.</param>
/// <param name="Curve">Flow against the share of its own time.</param>
public sealed record NamedCurve(string Name, int Days, FlowDurationCurve Curve);

/// <summary>
/// What a daily record tells beyond its duration curve: months, years, dry and wet years, low flows. Each part is worked out when
/// first asked for, since only one page and the memo show it; the parts never change.
/// </summary>
public sealed class RecordSummary
{
    private static readonly double[] BandExceedances = [.. Enumerable.Range(0, 51).Select(i => Math.Clamp(i / 50.0, 0.002, 0.998))];

    private readonly DailyRecord _record;
    private readonly FlowInput _flow;
    private readonly Lazy<RecordYears> _years;
    private readonly Lazy<YearClasses?> _classes;
    private readonly Lazy<IReadOnlyList<DayOfYearBand>> _dayOfYear;
    private readonly Lazy<IReadOnlyList<ExceedanceBand>> _band;
    private readonly Lazy<IReadOnlyList<MonthCurve>> _months;
    private readonly Lazy<FlowDurationCurve?> _allDays;
    private readonly Lazy<FlowDurationCurve?> _medianYear;
    private readonly Lazy<LowFlowResult?> _sevenQTen;

    private RecordSummary(DailyRecord record, FlowInput flow)
    {
        (_record, _flow) = (record, flow);
        _years = new(() => RecordYears.Of(record, flow.YearKind));
        _classes = new(() => YearClasses.Of(Years));
        _dayOfYear = new(() => BetweenYears.ByDayOfYear(record));
        _band = new(() => BetweenYears.ByExceedance(record, flow.PlottingPosition, Years, BandExceedances));
        _months = new(() => DurationCurves.OfMonths(record, flow.PlottingPosition));
        _allDays = new(() => DurationCurves.OfAllDays(record, flow.PlottingPosition));
        _medianYear = new(() => DurationCurves.OfMedianYear(record, flow.PlottingPosition, Years));
        _sevenQTen = new(() => LowFlow.SevenQTen(record));
    }

    /// <summary>The record.</summary>
    public DailyRecord Record => _record;

    /// <summary>The record's years, calendar or water years as chosen.</summary>
    public RecordYears Years => _years.Value;

    /// <summary>A dry, a median and a wet year that happened; null with fewer than three whole years.</summary>
    public YearClasses? Classes => _classes.Value;

    /// <summary>Flow of each day of the year over the years.</summary>
    public IReadOnlyList<DayOfYearBand> DayOfYear => _dayOfYear.Value;

    /// <summary>The curves of the whole years, reached by 90, 50 and 10 percent of them; empty without a whole year.</summary>
    public IReadOnlyList<ExceedanceBand> BetweenYearsBand => _band.Value;

    /// <summary>The curve of each month, over the month's own time.</summary>
    public IReadOnlyList<MonthCurve> Months => _months.Value;

    /// <summary>The curve of all days, in season or not; null without a day of flow.</summary>
    public FlowDurationCurve? AllDays => _allDays.Value;

    /// <summary>The median of the whole years' curves; null without a whole year.</summary>
    public FlowDurationCurve? MedianYear => _medianYear.Value;

    /// <summary>7Q10; null with fewer than three whole climate years of flow.</summary>
    public LowFlowResult? SevenQTen => _sevenQTen.Value;

    /// <summary>Why there is no 7Q10, in a few words; empty when there is one.</summary>
    public string WhyNoSevenQTen => SevenQTen is not null
        ? ""
        : LowFlow.Minima(_record, 7, RecordYears.Of(_record, YearKind.Climate)).Count(m => m.FlowM3PerS <= 0) >= 3 ? "none: dry every year" : "too few years";

    /// <summary>Q95 of all days, m3/s; null without a day of flow.</summary>
    public double? Q95M3PerS => AllDays?.FlowAt(0.95);

    /// <summary>Mean annual flow, m3/s: the mean of the whole years; of all days when no year is whole.</summary>
    public double? MeanAnnualM3PerS => LowFlow.MeanAnnualM3PerS(_record, Years);

    /// <summary>Curves to be set side by side: all days, the operating season, the median year, and a dry and a wet year.</summary>
    public IReadOnlyList<NamedCurve> Curves
    {
        get
        {
            var curves = new List<NamedCurve>();
            if (AllDays is { } all)
                curves.Add(new("all days", _record.ValidCount, all));
            if (!_flow.Season.IsWholeYear && DurationCurves.OfSeason(_record, _flow.PlottingPosition, _flow.Season) is { } season)
                curves.Add(new("operating season", _record.ValidDaysIn(_flow.Season), season));
            if (MedianYear is { } median)
                curves.Add(new("median year", Years.Whole.Sum(y => y.ValidDays), median));
            if (Classes is { } classes)
            {
                Add("dry year", classes.Dry);
                Add("wet year", classes.Wet);
            }

            return curves;

            void Add(string name, RecordYear year)
            {
                if (DurationCurves.OfYear(_record, _flow.PlottingPosition, year) is { } curve)
                    curves.Add(new(name + " " + year.Year.ToString(System.Globalization.CultureInfo.InvariantCulture), year.ValidDays, curve));
            }
        }
    }

    /// <summary>The methods behind the figures.</summary>
    public IReadOnlyList<MethodUse> Uses => [.. MedianYear is null ? [] : new[] { DurationCurves.MedianYearUse(Years) }, .. SevenQTen?.Uses ?? []];

    /// <summary>The summary of a study's record; null where there is none.</summary>
    /// <param name="flow">The flow of the study.</param>
    public static RecordSummary? Of(FlowInput flow)
    {
        ArgumentNullException.ThrowIfNull(flow);
        return flow.Record is { ValidCount: > 0 } record ? new RecordSummary(record, flow) : null;
    }
}
