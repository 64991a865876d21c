using System.Globalization;
using HeadToWatts.Basis.Sources;

namespace HeadToWatts.FlowRecords.Reserved;

/// <summary>How much must stay in the stream or canal in each month.</summary>
public abstract record ReservedRule
{
    /// <summary>Key of the kind, as study files write it.</summary>
    public abstract string KindId { get; }

    /// <summary>The rule in words.</summary>
    public abstract string Describe();

    /// <summary>The methods behind it.</summary>
    public virtual IReadOnlyList<MethodUse> Uses => [];

    /// <summary>The reserved flow of a month.</summary>
    /// <param name="month">1 to 12.</param>
    public abstract ReservedFlow ReservedIn(int month);

    /// <summary>The rule of a month with nothing else coming off.</summary>
    /// <param name="month">1 to 12.</param>
    public WaterAllocation ForMonth(int month)
    {
        RequireMonth(month);
        return new WaterAllocation(ReservedIn(month), 0);
    }

    /// <summary>True when every month has the same rule, so that one curve of the year serves.</summary>
    public bool IsSameAllYear => Enumerable.Range(2, 11).All(m => ReservedIn(m) == ReservedIn(1));

    internal static void RequireMonth(int month)
    {
        ArgumentOutOfRangeException.ThrowIfLessThan(month, 1);
        ArgumentOutOfRangeException.ThrowIfGreaterThan(month, 12);
    }

    internal static string Flow(double flowM3PerS) => flowM3PerS.ToString("0.####", CultureInfo.InvariantCulture) + " m3/s";

    internal static string Percent(double ratio) => (ratio * 100).ToString("0.##", CultureInfo.InvariantCulture) + " %";
}

/// <summary>Nothing is reserved, or nothing is known of it.</summary>
public sealed record NothingReserved : ReservedRule
{
    /// <inheritdoc/>
    public override string KindId => "none";

    /// <inheritdoc/>
    public override string Describe() => "no reserved flow is given";

    /// <inheritdoc/>
    public override ReservedFlow ReservedIn(int month) => ReservedFlow.None;
}

/// <summary>The same flow in all months.</summary>
/// <param name="FlowM3PerS">Flow, m3/s, zero or more.</param>
public sealed record ConstantReserved(double FlowM3PerS) : ReservedRule
{
    private readonly ReservedFlow _flow = ReservedFlow.Constant(FlowM3PerS);

    /// <inheritdoc/>
    public override string KindId => "constant";

    /// <inheritdoc/>
    public override string Describe() => $"{Flow(FlowM3PerS)} all year";

    /// <inheritdoc/>
    public override ReservedFlow ReservedIn(int month) => _flow;
}

/// <summary>A share of the flow that arrives, never less than a floor; without a floor a plain share.</summary>
/// <param name="Ratio">Share, 0 to 1.</param>
/// <param name="FloorM3PerS">Floor, m3/s, zero or more.</param>
public sealed record ProportionalReserved(double Ratio, double FloorM3PerS = 0) : ReservedRule
{
    private readonly ReservedFlow _flow = FloorM3PerS == 0 ? ReservedFlow.PercentOfFlow(Ratio) : ReservedFlow.PercentWithFloor(Ratio, FloorM3PerS);

    /// <inheritdoc/>
    public override string KindId => "proportional";

    /// <inheritdoc/>
    public override string Describe() => $"{Percent(Ratio)} of the flow that arrives" + (FloorM3PerS > 0 ? $", at least {Flow(FloorM3PerS)}" : "");

    /// <inheritdoc/>
    public override ReservedFlow ReservedIn(int month) => _flow;
}

/// <summary>A reserved flow for each month.</summary>
public sealed record MonthlyReserved : ReservedRule
{
    private readonly ReservedFlow[] _months;

    /// <summary>A rule of twelve flows.</summary>
    /// <param name="flowsM3PerS">Twelve flows from January on, m3/s, zero or more.</param>
    /// <exception cref="ArgumentException">Not twelve flows.</exception>
    public MonthlyReserved(IReadOnlyList<double> flowsM3PerS)
        : this((flowsM3PerS ?? throw new ArgumentNullException(nameof(flowsM3PerS))).Select(ReservedFlow.Constant))
    {
    }

    /// <summary>A rule of twelve reserved flows of any kind.</summary>
    /// <param name="months">Twelve, from January on.</param>
    /// <exception cref="ArgumentException">Not twelve.</exception>
    public MonthlyReserved(IEnumerable<ReservedFlow> months)
    {
        ArgumentNullException.ThrowIfNull(months);
        _months = [.. months];
        if (_months.Length != 12)
            throw new ArgumentException("A rule by month has twelve flows.", nameof(months));
    }

    /// <inheritdoc/>
    public override string KindId => "monthly";

    /// <summary>The reserved flows from January on.</summary>
    public IReadOnlyList<ReservedFlow> Months => _months;

    /// <inheritdoc/>
    public override string Describe() => _months.All(m => m.Ratio == 0)
        ? $"by month, {Flow(_months.Min(m => m.FlowM3PerS))} to {Flow(_months.Max(m => m.FlowM3PerS))}"
        : "by month";

    /// <inheritdoc/>
    public override ReservedFlow ReservedIn(int month)
    {
        RequireMonth(month);
        return _months[month - 1];
    }

    /// <inheritdoc/>
    public bool Equals(MonthlyReserved? other) => other is not null && _months.SequenceEqual(other._months);

    /// <inheritdoc/>
    public override int GetHashCode() => _months.Aggregate(0, HashCode.Combine);
}

/// <summary>Shares of the mean annual flow in two seasons, by Tennant or by the user's own shares.</summary>
/// <param name="MeanAnnualFlowM3PerS">Mean annual flow, m3/s.</param>
/// <param name="Level">The shares.</param>
public sealed record TennantReserved(double MeanAnnualFlowM3PerS, TennantLevel Level) : ReservedRule
{
    private readonly ReservedFlow _winter = ReservedFlow.Constant(MeanAnnualFlowM3PerS * Level.WinterRatio);
    private readonly ReservedFlow _summer = ReservedFlow.Constant(MeanAnnualFlowM3PerS * Level.SummerRatio);

    /// <inheritdoc/>
    public override string KindId => "tennant";

    /// <inheritdoc/>
    public override IReadOnlyList<MethodUse> Uses => [TennantLevels.Method.Used()];

    /// <inheritdoc/>
    public override string Describe() =>
        $"{Level.Name} (Tennant): {Percent(Level.WinterRatio)} of the mean annual flow of {Flow(MeanAnnualFlowM3PerS)} from October to March, {Percent(Level.SummerRatio)} from April to September";

    /// <inheritdoc/>
    public override ReservedFlow ReservedIn(int month)
    {
        RequireMonth(month);
        return month is >= 4 and <= 9 ? _summer : _winter;
    }
}

/// <summary>A share of a low-flow statistic, Q95 or 7Q10, in all months.</summary>
/// <param name="Statistic">Its name, such as Q95 or 7Q10.</param>
/// <param name="StatisticFlowM3PerS">Its flow, m3/s.</param>
/// <param name="Ratio">Share of it, zero or more; 1 for the statistic itself.</param>
public sealed record LowFlowReserved(string Statistic, double StatisticFlowM3PerS, double Ratio = 1) : ReservedRule
{
    private readonly ReservedFlow _flow = ReservedFlow.Constant(StatisticFlowM3PerS * Ratio);

    /// <inheritdoc/>
    public override string KindId => "low-flow";

    /// <summary>The methods behind the statistic, where it was reckoned from a record.</summary>
    public IReadOnlyList<MethodUse> StatisticUses { get; init; } = [];

    /// <inheritdoc/>
    public override IReadOnlyList<MethodUse> Uses => StatisticUses;

    /// <inheritdoc/>
    public override string Describe() => (Ratio == 1 ? Statistic : $"{Percent(Ratio)} of {Statistic}") + $", {Flow(StatisticFlowM3PerS * Ratio)}";

    /// <inheritdoc/>
    public override ReservedFlow ReservedIn(int month) => _flow;
}
