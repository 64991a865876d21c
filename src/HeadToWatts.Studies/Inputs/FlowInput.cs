using HeadToWatts.FlowRecords;
using HeadToWatts.FlowRecords.Reserved;
using HeadToWatts.FlowRecords.Statistics;

namespace HeadToWatts.Studies.Inputs;

/// <summary>The flow and what may be used of it: either a typed curve or a daily record.</summary>
/// <param name="TypedCurve">Rows of percent exceeded and flow; null when there is a record.</param>
/// <param name="RowsAreForSeason">True when the typed rows count only the days of the season.</param>
/// <param name="Record">Daily record; null when rows were typed.</param>
/// <param name="PlottingPosition">How exceedance is reckoned from a record.</param>
/// <param name="Season">Days on which the plant may run.</param>
/// <param name="Allocation">Prior deliveries and reserved flow.</param>
/// <param name="ReservedFlowIsStated">True when the author stated a reserved flow, even zero.</param>
/// <param name="DesignFlowM3PerS">Design flow of all units together, m3/s; null to have one suggested.</param>
/// <param name="SourceDescription">Where the figures come from, in the author's words.</param>
public sealed record FlowInput(
    FlowDurationCurve? TypedCurve,
    bool RowsAreForSeason,
    DailyRecord? Record,
    PlottingPosition PlottingPosition,
    OperatingSeason Season,
    WaterAllocation Allocation,
    bool ReservedFlowIsStated,
    double? DesignFlowM3PerS,
    string SourceDescription)
{
    /// <summary>Allocations by month, January first, where the reserved flow changes through the year; null where it does not. <see cref="Allocation"/> is then that of the season's middle month.</summary>
    public IReadOnlyList<WaterAllocation>? AllocationByMonth { get; init; }

    /// <summary>What was found when the file behind the record was read, line by line; empty where nobody looked.</summary>
    public IReadOnlyList<string> Findings { get; init; } = [];

    /// <summary>How the flow came about where it was not measured at the site; null where it was, or where nothing is known of it.</summary>
    public FlowOrigin? Origin { get; init; }

    /// <summary>Where the years begin in which a record is looked at.</summary>
    public YearKind YearKind { get; init; } = YearKind.Calendar;

    /// <summary>The rules behind the allocations; null where only an allocation was given.</summary>
    public WaterRules? Rules { get; init; }

    /// <summary>The allocation in a month.</summary>
    /// <param name="month">Month, 1 to 12.</param>
    public WaterAllocation AllocationIn(int month) => AllocationByMonth?[month - 1] ?? Allocation;

    /// <summary>The curve of the year on which the plant is run: dry outside the season.</summary>
    /// <exception cref="InvalidOperationException">There is neither a curve nor a record.</exception>
    public FlowDurationCurve CurveOfYear()
    {
        if (Record is not null)
            return FlowDurationCurve.FromRecord(Record, PlottingPosition, Season);
        if (TypedCurve is null)
            throw new InvalidOperationException("A study needs a typed curve or a daily record.");
        return RowsAreForSeason && Season.ShareOfYear < 1 ? TypedCurve.ForSeasonShare(Season.ShareOfYear) : TypedCurve;
    }

    /// <summary>
    /// The curve that energy is summed over: the same as <see cref="CurveOfYear"/> for typed rows; with a record every day counts
    /// by itself, so that the sum over the curve is the sum over the days (decision 0010).
    /// </summary>
    public FlowDurationCurve EnergyCurve() => Record is null ? CurveOfYear() : FlowDurationCurve.OfDays(Record, Season);
}
