using System.Globalization;
using HeadToWatts.FlowRecords.SubDaily;

namespace HeadToWatts.Files.FlowFiles.Reading;

/// <summary>
/// Puts times of day on a clock that never jumps, the standard time of the place, so that every day has 24 hours: by the offsets
/// beside the times, by a named time zone, or by the jumps that a daylight-saving clock leaves in the rows.
/// </summary>
internal static class ClockOfRows
{
    private const long HourMs = 3_600_000;
    private const int MinuteMs = 60_000;

    /// <summary>Turns day numbers into instants; false after telling a problem.</summary>
    public static bool Place(PlacedRow[] placed, RecordRows rows)
    {
        var written = rows.Rows;
        int withOffset = 0, withTime = 0;
        short standard = short.MaxValue, summer = short.MinValue;
        for (var i = 0; i < placed.Length; i++)
        {
            var date = written[i].Date;
            placed[i] = placed[i] with { At = (placed[i].At * DailyMeans.DayMs) + Math.Max(0, date.TimeMs) };
            if (date.HasTime)
                withTime++;
            if (date.OffsetMin == WrittenDate.NoOffset)
                continue;
            withOffset++;
            standard = Math.Min(standard, date.OffsetMin);
            summer = Math.Max(summer, date.OffsetMin);
        }

        if (withTime < placed.Length)
            rows.Assume($"{(placed.Length - withTime).ToString("N0", CultureInfo.InvariantCulture)} rows without a time of day stand for midnight, the start of their day");
        if (withOffset > 0)
        {
            if (withOffset < placed.Length)
            {
                rows.Problems.File($"{(placed.Length - withOffset).ToString("N0", CultureInfo.InvariantCulture)} of {placed.Length.ToString("N0", CultureInfo.InvariantCulture)} rows", "only some times say their offset from UTC", "an offset or zone code for all times, or for none");
                return false;
            }

            if (summer - standard > 120)
            {
                rows.Problems.File($"{Utc(standard)} and {Utc(summer)}", "the times are of time zones more than two hours apart", "times of one place");
                return false;
            }

            for (var i = 0; i < placed.Length; i++)
                placed[i] = placed[i] with { At = placed[i].At - ((written[i].Date.OffsetMin - standard) * (long)MinuteMs) };
            rows.Assume(summer == standard
                ? $"days run from midnight to midnight at {Utc(standard)}, the offset of all times"
                : $"days run from midnight to midnight at {Utc(standard)}, standard time all year; times at {Utc(summer)} were moved");
            return true;
        }

        if (rows.Options.Zone is { } zone)
            return ByZone(placed, zone, rows);
        if (!rows.Options.ClockStandsStill)
            ByJumps(placed, rows);
        return true;
    }

    public static string Utc(int offsetMin) =>
        string.Create(CultureInfo.InvariantCulture, $"UTC{(offsetMin < 0 ? '-' : '+')}{Math.Abs(offsetMin) / 60:00}:{Math.Abs(offsetMin) % 60:00}");

    // In the hour that occurs twice the first pass is daylight time, and the second begins where the rows step back.
    private static bool ByZone(PlacedRow[] placed, TimeZoneInfo zone, RecordRows rows)
    {
        var before = long.MinValue;
        var second = false;
        for (var i = 0; i < placed.Length; i++)
        {
            var at = placed[i].At;
            var local = new DateTime(at * TimeSpan.TicksPerMillisecond, DateTimeKind.Unspecified);
            if (zone.IsInvalidTime(local))
            {
                rows.Problems.Row(placed[i].FileRow, local.ToString("yyyy-MM-dd HH:mm", CultureInfo.InvariantCulture), $"this hour is passed over by the clocks of {zone.Id}", "the zone whose clock the logger kept, or its offset from UTC");
            }
            else
            {
                var offset = zone.GetUtcOffset(local);
                if (zone.IsAmbiguousTime(local))
                {
                    second |= at < before && before - at <= HourMs;
                    var offsets = zone.GetAmbiguousTimeOffsets(local);
                    offset = second ? offsets.Min() : offsets.Max();
                }
                else
                {
                    second = false;
                }

                placed[i] = placed[i] with { At = at - (long)(offset - zone.BaseUtcOffset).TotalMilliseconds };
            }

            before = at;
        }

        rows.Assume($"times are of {zone.Id}; days run from midnight to midnight in its standard time, {Utc((int)zone.BaseUtcOffset.TotalMinutes)}");
        return !rows.Problems.Any;
    }

    // A clock set back leaves rows that step back an hour on one Sunday of autumn; set forward, a missing hour on one of spring.
    private static void ByJumps(PlacedRow[] placed, RecordRows rows)
    {
        var jumps = new List<(int Index, bool Back)>();
        for (var i = 1; i < placed.Length; i++)
        {
            var step = placed[i].At - placed[i - 1].At;
            if (step is > 0 and < HourMs)
                continue;
            var usual = i > 1 ? placed[i - 1].At - placed[i - 2].At : i + 1 < placed.Length ? placed[i + 1].At - placed[i].At : 0;
            if (usual is <= 0 or > HourMs)
                continue;
            if (step == usual - HourMs && IsSunday(placed[i].At) && (placed[i].At % DailyMeans.DayMs) <= 3 * HourMs)
                jumps.Add((i, true));
            else if (step == usual + HourMs && IsSunday(placed[i].At) && (placed[i].At % DailyMeans.DayMs) is >= 2 * HourMs and <= 4 * HourMs)
                jumps.Add((i, false));
        }

        // Jumps of a clock take turns, and one back must be among them: a missing hour alone is only a missing hour.
        if (!jumps.Exists(j => j.Back))
            return;
        for (var k = 1; k < jumps.Count; k++)
        {
            if (jumps[k].Back == jumps[k - 1].Back)
                return;
        }

        var next = 0;
        var summer = jumps[0].Back;
        for (var i = 0; i < placed.Length; i++)
        {
            if (next < jumps.Count && jumps[next].Index == i)
            {
                summer = !jumps[next].Back;
                next++;
            }

            if (summer)
                placed[i] = placed[i] with { At = placed[i].At - HourMs };
        }

        var first = jumps.First(j => j.Back).Index;
        rows.Assume($"the clock changes to and from daylight-saving time, as the hour that stands twice at row {rows.Rows[first].FileRow.ToString(CultureInfo.InvariantCulture)} shows; days run from midnight to midnight in standard time");
    }

    private static bool IsSunday(long at) => (at / DailyMeans.DayMs) % 7 == 6;
}
