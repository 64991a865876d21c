using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Studies;

namespace HeadToWatts.Drawings;

public static partial class StopHeadsChart
{
    /// <summary>Draws the chart of a study; null without a stop.</summary>
    public static Drawing? Draw(StudyResult result, UnitDisplay show, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(result);
        if (result.Waterway.Stop is not { } stop)
            return null;
        var gamma = result.Site.SpecificWeightNPerM3;
        return Draw(
            new StopHeadsInput(
                [.. stop.Run.Nodes.Select(n => new StopHeads(n.StationM, n.CentreM, n.SteadyHeadM, n.HighestHeadM, n.LowestHeadM, n.CentreM + (stop.Pipes[n.PipeIndex].Element.PressureRatingPa / gamma)))],
                stop.Run.Case.SeparationHeadM,
                stop.Run.Separation is not null),
            show, size);
    }
}
