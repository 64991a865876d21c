using HeadToWatts.EnergyYield;
using HeadToWatts.Studies.Results;
using HeadToWatts.Turbines.Units;

namespace HeadToWatts.Studies;

/// <summary>Weighs the best split of the flow against units one after another, on equal shares of the year.</summary>
internal static class SplitComparison
{
    private const int SharesOfYear = 400;
    private static readonly double[] Shares = [0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9, 1];

    internal static SplitResult? Of(PlantDesign design, FlowSupply supply, double annualEnergyKwh)
    {
        var units = design.Units;
        if (units.UnitCount < 2)
            return null;
        var losses = new LossTable(design.Waterway, design.Site, units.DesignFlowM3PerS);
        var (inTurn, best) = (units.With(LoadSplit.InTurn), units.With(LoadSplit.Best));
        var middles = supply.MiddlesM3PerS(SharesOfYear);
        var inTurnKw = Mean(inTurn);
        var bestKw = Math.Max(Mean(best), inTurnKw);
        var own = units.Split == LoadSplit.Best ? bestKw : inTurnKw;
        return new SplitResult(
            own > 0 ? annualEnergyKwh * inTurnKw / own : 0,
            own > 0 ? annualEnergyKwh * bestKw / own : 0,
            [.. Shares.Select(s => Row(inTurn, best, s))]);

        double Mean(UnitSet set)
        {
            var plant = new PlantCurve(design with { Units = set, QuickLosses = losses });
            return middles.Average(q => plant.At(q).MeterPowerKw);
        }
    }

    private static SplitRow Row(UnitSet inTurn, UnitSet best, double share)
    {
        var flow = share * inTurn.DesignFlowM3PerS;
        var simple = inTurn.InTurnAt(flow);
        var good = best.LoadAt(flow);
        var better = good.Efficiency * good.TurbineFlowM3PerS >= simple.Efficiency * simple.TurbineFlowM3PerS;
        return new SplitRow(
            share,
            flow,
            inTurn.UnitFlowsM3PerS(flow, LoadSplit.InTurn),
            simple.Efficiency,
            best.UnitFlowsM3PerS(flow, better ? LoadSplit.Best : LoadSplit.InTurn),
            better ? good.Efficiency : simple.Efficiency);
    }
}
