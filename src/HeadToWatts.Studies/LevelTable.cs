using HeadToWatts.EnergyYield;
using HeadToWatts.Studies.Inputs;
using HeadToWatts.Studies.Results;

namespace HeadToWatts.Studies;

/// <summary>Levels and gross head over the flow, where they move.</summary>
internal static class LevelTable
{
    private static readonly double[] Exceedances = [0.02, 0.05, 0.10, 0.25, 0.50, 0.75, 0.90];

    internal static IReadOnlyList<LevelAtFlow> Of(AlternativeInput input, FlowSupply supply, double designFlowM3PerS)
    {
        if (!input.Head.Moves)
            return [];
        var moving = new MovingHead(input.Head.Headwater, input.Head.Tailwater, input.Flow.Allocation, RatedHead.MiddleMonth(input.Flow));
        return
        [
            .. Exceedances.Select(supply.UsableAtM3PerS).Append(designFlowM3PerS).Where(q => q > 0).Distinct().OrderDescending().Select(q => new LevelAtFlow(
                q,
                moving.PassingM3PerS(q),
                moving.HeadwaterM(q),
                moving.TailwaterM(q),
                input.Head.Headwater.IsOutside(moving.PassingM3PerS(q)) || input.Head.Tailwater.IsOutside(moving.PassingM3PerS(q)))),
        ];
    }
}
