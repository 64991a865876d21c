using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Studies;

namespace HeadToWatts.Drawings;

public static partial class LossShareChart
{
    /// <summary>Draws the chart of a study at its design flow; null when nothing is lost, because there is no pipe.</summary>
    public static Drawing? Draw(StudyResult result, UnitDisplay show, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(result);
        var losses = result.Waterway.AtDesign;
        if (losses.Elements.Count == 0)
            return null;
        var several = losses.Elements.Count > 1;
        var shares = losses.Elements.SelectMany(e => e.Fittings
            .Select(f => new LossShare(Name(f.Fitting.Count > 1 ? $"{f.Fitting.Name} × {f.Fitting.Count}" : f.Fitting.Name, e.Element.Name), f.LossM, false))
            .Prepend(new LossShare(Name("friction", e.Element.Name), e.FrictionLossM, true)));
        return Draw(new LossShareInput([.. shares], result.Head.GrossHeadM, losses.FlowM3PerS), show, size);

        string Name(string part, string element) => several ? $"{element}: {part}" : part;
    }
}
