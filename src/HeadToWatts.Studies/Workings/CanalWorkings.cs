using HeadToWatts.Basis.Units;
using HeadToWatts.Hydraulics.Canals;

namespace HeadToWatts.Studies.Workings;

internal static class CanalWorkings
{
    internal static IEnumerable<Working> Of(StudyResult result, UnitDisplay show)
    {
        if (result.Canal is not { } canal || result.Input.Head.Canal is not { } given)
            yield break;
        if (canal.AtDesign.Upstream.NormalDepthM is { } depth)
        {
            yield return new Working(
                "canal-depth", StudyStage.Head, "Normal depth above the drop", UniformFlow.Method.Formula,
                $"n = {UnitDisplay.Number(given.Upstream.Canal.ManningCoefficient)}, S = {UnitDisplay.Number(given.Upstream.Canal.BedSlopeRatio)}, Q = {show.Flow(canal.AtDesign.FlowM3PerS)}",
                show.Length(depth), $"Critical depth {(canal.AtDesign.Upstream.CriticalDepthM is { } critical ? show.Length(critical) : "not reached")}, Froude number {UnitDisplay.Number(canal.AtDesign.Upstream.FroudeNumber ?? 0)}.", [UniformFlow.Method, SpecificEnergy.Critical]);
        }

        if (canal is { EnergyAbove: { } above, EnergyBelow: { } below, FallOfEnergyM: { } fall })
        {
            yield return new Working(
                "canal-energy", StudyStage.Head, "Energy from section to section", "z_1 + y_1 + α V_1^2/2g = z_2 + y_2 + α V_2^2/2g + H",
                $"({show.Length(above.BedM)} + {show.Length(above.DepthM)} + {show.Length(above.VelocityHeadM)}) − ({show.Length(below.BedM)} + {show.Length(below.DepthM)} + {show.Length(below.VelocityHeadM)})",
                show.Length(fall), "At normal depth on both sides, at the flow the canal carries when the plant runs full. The machine, its waterway and the drop share it.", [SpecificEnergy.Method]);
        }
    }
}
