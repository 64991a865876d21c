using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Studies;
using HeadToWatts.Turbines.Units;

namespace HeadToWatts.Drawings;

public static partial class SplitChart
{
    /// <summary>Draws the chart of a study with several units; null for one unit.</summary>
    public static Drawing? Draw(StudyResult result, UnitDisplay show, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(result);
        if (result.Turbine.Split is not { } split)
            return null;
        var (inTurn, best) = (result.Turbine.Units.With(LoadSplit.InTurn), result.Turbine.Units.With(LoadSplit.Best));
        var flows = new SortedSet<double>(Enumerable.Range(0, 121).Select(i => result.Flow.DesignFlowM3PerS * i / 120));
        foreach (var edge in inTurn.FlowBreakpointsM3PerS)
        {
            flows.Add(edge * (1 - 1e-9));
            flows.Add(edge * (1 + 1e-9));
        }

        return Draw(new SplitInput([.. flows.Where(f => f <= result.Flow.DesignFlowM3PerS).Select(Point)], result.Turbine.Units.UnitCount, split.GainRatio), show, size);

        SplitPoint Point(double flow)
        {
            var simple = Share(inTurn.InTurnAt(flow), flow);
            return new SplitPoint(flow, simple, Math.Max(simple, Share(best.LoadAt(flow), flow)));
        }

        // What is not taken counts as lost, so that both are out of the same water.
        static double Share(UnitLoad load, double flow) => flow > 0 ? load.Efficiency * load.TurbineFlowM3PerS / flow : 0;
    }
}
