using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Studies;

namespace HeadToWatts.Drawings;

public static partial class FlowDurationChart
{
    // Enough for any width of paper; a 30-year record would bring ten thousand.
    private const int MostPoints = 600;

    private const int MostParts = 60;
    private const double PartOfLargest = 0.01;

    /// <summary>Draws the chart of a study.</summary>
    public static Drawing Draw(StudyResult result, UnitDisplay show, DrawingSize size) => Draw(InputOf(result), show, size);

    /// <summary>What the chart of a study shows.</summary>
    public static FlowDurationInput InputOf(StudyResult result)
    {
        ArgumentNullException.ThrowIfNull(result);
        var supply = result.Flow.Supply;
        var plant = result.Energy.Plant;
        var allocation = supply.Allocation;
        var season = result.Input.Flow.Season;
        var shares = new List<FlowShare>();
        var count = supply.Exceedance.Length;
        var step = Math.Max(1, count / MostPoints);

        // Both sides of every flow at which the plant changes its way of running, so that steps stand upright.
        var edges = plant.BreakpointsM3PerS.Where(e => e > 0).OrderDescending().ToArray();
        var last = -1;
        for (var i = 0; i < count; i++)
        {
            var isKept = i == 0 || i == count - 1 || i % step == 0 || supply.Exceedance[i] == supply.Exceedance[i - 1]
                || (i + 1 < count && supply.Exceedance[i] == supply.Exceedance[i + 1]);
            if (!isKept)
                continue;
            if (last >= 0)
                Between(last, i);
            shares.Add(Share(supply.Exceedance[i], supply.ArrivingM3PerS[i], supply.UsableM3PerS[i]));
            last = i;
        }

        var prior = allocation.PriorDeliveriesM3PerS > 0;
        var reserves = allocation.Reserved.FlowM3PerS > 0 || allocation.Reserved.Ratio > 0;
        return new FlowDurationInput(
            shares,
            result.Flow.DesignFlowM3PerS,
            result.Flow.DesignFlowExceedance,
            LeastRunning(result),
            season.IsWholeYear ? null : "runs " + season.Describe() + ", else dry",
            prior ? (reserves ? "reserved and delivered first" : "delivered first") : "reserved");

        // Edges stand as steps; between them what is taken may bend where the levels move with the flow.
        void Between(int from, int to)
        {
            var (high, low) = (supply.UsableM3PerS[from], supply.UsableM3PerS[to]);
            if (!(high > low))
                return;
            var places = new List<(double T, double Usable)>();
            foreach (var edge in edges)
            {
                if (edge <= low || edge > high)
                    continue;
                var t = (high - edge) / (high - low);
                places.Add((t, edge * (1 + 1e-9)));
                places.Add((t, edge * (1 - 1e-9)));
            }

            var parts = Math.Min(MostParts, (int)((high - low) / (PartOfLargest * supply.UsableM3PerS[0])));
            for (var part = 1; part < parts; part++)
                places.Add(((double)part / parts, high + ((low - high) * part / parts)));
            foreach (var (t, usable) in places.OrderBy(x => x.T).ThenByDescending(x => x.Usable))
            {
                shares.Add(Share(
                    supply.Exceedance[from] + (t * (supply.Exceedance[to] - supply.Exceedance[from])),
                    supply.ArrivingM3PerS[from] + (t * (supply.ArrivingM3PerS[to] - supply.ArrivingM3PerS[from])),
                    usable));
            }
        }

        FlowShare Share(double exceedance, double arrivingM3PerS, double usableM3PerS)
        {
            var point = plant.At(usableM3PerS);
            var rest = usableM3PerS - point.TurbineFlowM3PerS;
            return point.IsRunning
                ? new FlowShare(exceedance, point.TurbineFlowM3PerS, 0, rest, Math.Max(0, arrivingM3PerS - usableM3PerS))
                : new FlowShare(exceedance, 0, rest, 0, Math.Max(0, arrivingM3PerS - usableM3PerS));
        }
    }

    private static double LeastRunning(StudyResult result)
    {
        foreach (var edge in result.Energy.Plant.BreakpointsM3PerS)
        {
            if (edge > 0 && result.Energy.Plant.At(edge * (1 + 1e-9)).IsRunning)
                return edge;
        }

        return 0;
    }
}
