using HeadToWatts.Basis.Sources;

namespace HeadToWatts.FlowRecords.Reserved;

/// <summary>
/// All that stands between the flow at the gauge and the flow the plant may use. Seepage comes first and changes the record;
/// then turnouts above the site and prior deliveries, the reserved flow, and the water right.
/// </summary>
/// <param name="Reserved">The reserved flow.</param>
/// <param name="Deliveries">Prior deliveries and turnouts above the site.</param>
/// <param name="Right">The water right; null when none is given.</param>
/// <param name="Seepage">Loss between gauge and site.</param>
public sealed record WaterRules(ReservedRule Reserved, IReadOnlyList<Delivery> Deliveries, WaterRight? Right, ReachLoss Seepage)
{
    /// <summary>Nothing is given.</summary>
    public static WaterRules None { get; } = new(new NothingReserved(), [], null, ReachLoss.None);

    /// <summary>True when every month has the same allocation, so that one curve of the year serves.</summary>
    public bool IsSameAllYear => Enumerable.Range(2, 11).All(m => ForMonth(m) == ForMonth(1));

    /// <summary>The methods behind the rules.</summary>
    public IReadOnlyList<MethodUse> Uses => Reserved.Uses;

    /// <summary>What a reader should know: what is given and what is not.</summary>
    public IReadOnlyList<string> Notes
    {
        get
        {
            var notes = new List<string> { Reserved is NothingReserved ? "no reserved flow is given; a permit may ask for one" : "reserved: " + Reserved.Describe() };
            notes.AddRange(Deliveries.Select(d => $"first to {d.Name}: {ReservedRule.Flow(d.FlowsM3PerS.Min())} to {ReservedRule.Flow(d.FlowsM3PerS.Max())} by month"));
            notes.Add(Right switch
            {
                null => "no water right is given; the plant is taken to have the use of all that is left",
                { RateM3PerS: { } rate } => $"water right of {ReservedRule.Flow(rate)}, {Right.Season.Describe()}",
                _ => $"water right, {Right.Season.Describe()}",
            });
            if (Seepage != ReachLoss.None)
                notes.Add("between gauge and site: " + Seepage.Describe());
            return notes;
        }
    }

    /// <summary>What comes off the flow at the site in a month.</summary>
    /// <param name="month">1 to 12.</param>
    public WaterAllocation ForMonth(int month)
    {
        ReservedRule.RequireMonth(month);
        return new WaterAllocation(Reserved.ReservedIn(month), Deliveries.Sum(d => d.FlowsM3PerS[month - 1])) { RightRateM3PerS = Right?.RateM3PerS };
    }

    /// <summary>The days on which water may be used: the operating season within the days of the right; null when there is none.</summary>
    /// <param name="season">Operating season.</param>
    public OperatingSeason? SeasonWithin(OperatingSeason season)
    {
        ArgumentNullException.ThrowIfNull(season);
        return Right is null ? season : season.Within(Right.Season);
    }
}
