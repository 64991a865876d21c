using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Studies;

namespace HeadToWatts.Drawings;

public static partial class StopTimeChart
{
    /// <summary>Draws the chart of a study; null without a stop.</summary>
    public static Drawing? Draw(StudyResult result, UnitDisplay show, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(result);
        if (result.Waterway.Stop is not { } stop)
            return null;
        var gamma = result.Site.SpecificWeightNPerM3;
        var centreM = stop.Run.Nodes[^1].CentreM;
        return Draw(
            new StopTimeInput(
                stop.Run.Grid.TimeStepS,
                [.. stop.Run.MachineHeadsM.Select(h => gamma * (h - centreM))],
                stop.Run.MachineFlowsM3PerS,
                gamma * (stop.Run.Case.HeadwaterM - centreM),
                stop.Limit?.LimitPa),
            show, size);
    }
}
