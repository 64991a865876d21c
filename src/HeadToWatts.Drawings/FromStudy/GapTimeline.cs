using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Studies;

namespace HeadToWatts.Drawings;

public static partial class GapTimeline
{
    /// <summary>The record of a study on a time line; null without one.</summary>
    public static Drawing? Draw(StudyResult result, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(result);
        if (result.Input.Flow.Record is not { } record)
            return null;
        var gaps = new List<RecordGap>();
        for (var i = 0; i < record.DayCount; i++)
        {
            var from = i;
            while (i < record.DayCount && double.IsNaN(record.Flows[i]))
                i++;
            if (i > from)
                gaps.Add(new RecordGap(record.DateOf(from), i - from));
        }

        return Draw(new GapTimelineInput(record.FirstDay, record.LastDay, gaps), size);
    }
}
