namespace HeadToWatts.FlowRecords.Statistics;

/// <summary>A spell of days without enough flow.</summary>
/// <param name="FirstDay">First day.</param>
/// <param name="LastDay">Last day.</param>
/// <param name="Days">How many.</param>
public sealed record FlowSpell(DateOnly FirstDay, DateOnly LastDay, int Days);

/// <summary>The days on which the plant would stand still.</summary>
/// <param name="Longest">The longest spell of days known to be too low; null when there is none.</param>
/// <param name="LongestWithGaps">The longest spell when days without a flow count as standing still: what the record cannot rule out.</param>
/// <param name="StillDays">Days known to be too low.</param>
/// <param name="RunningDays">Days with enough flow.</param>
/// <param name="MissingDays">Days without a flow.</param>
public sealed record Standstill(FlowSpell? Longest, FlowSpell? LongestWithGaps, int StillDays, int RunningDays, int MissingDays)
{
    /// <summary>Finds the spells. A day outside the season stands still whatever its flow.</summary>
    /// <param name="record">The record, of usable flow when water is reserved.</param>
    /// <param name="leastFlowM3PerS">Flow below which the plant stands, m3/s; 0 or more.</param>
    /// <param name="season">Days of operation.</param>
    public static Standstill Of(DailyRecord record, double leastFlowM3PerS, OperatingSeason season)
    {
        ArgumentNullException.ThrowIfNull(record);
        ArgumentNullException.ThrowIfNull(season);
        if (!(leastFlowM3PerS >= 0 && double.IsFinite(leastFlowM3PerS)))
            throw new ArgumentOutOfRangeException(nameof(leastFlowM3PerS), leastFlowM3PerS, "The least flow is 0 or more.");
        var flows = record.Flows;
        int still = 0, running = 0, missing = 0, known = 0, possible = 0;
        FlowSpell? longest = null, withGaps = null;
        for (var i = 0; i < flows.Length; i++)
        {
            var isOut = !season.Runs(record.MonthOf(i), record.DayOfMonthOf(i));
            if (isOut || flows[i] < leastFlowM3PerS)
            {
                still++;
                known++;
                possible++;
            }
            else if (double.IsNaN(flows[i]))
            {
                missing++;
                known = 0;
                possible++;
            }
            else
            {
                running++;
                known = possible = 0;
            }

            longest = Longer(longest, known, i);
            withGaps = Longer(withGaps, possible, i);
        }

        return new Standstill(longest, withGaps, still, running, missing);

        FlowSpell? Longer(FlowSpell? best, int days, int last) =>
            days > (best?.Days ?? 0) ? new FlowSpell(record.DateOf(last - days + 1), record.DateOf(last), days) : best;
    }
}
