using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Studies;

namespace HeadToWatts.Drawings;

public static partial class EnergyStaircaseChart
{
    /// <summary>Draws the staircase of a study; null when it makes no energy.</summary>
    public static Drawing? Draw(StudyResult result, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(result);
        var stairs = result.Energy.Annual.Staircase;
        return Draw(new EnergyStaircaseInput(stairs.GrossKwh, [.. stairs.Steps.Select(s => new StaircaseStep(s.Name, s.LossKwh, s.LeftKwh))]), size);
    }
}
