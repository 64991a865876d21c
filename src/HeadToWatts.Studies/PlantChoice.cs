using HeadToWatts.EnergyYield;
using HeadToWatts.Hydraulics.Water;
using HeadToWatts.Hydraulics.Waterways;
using HeadToWatts.Studies.Inputs;
using HeadToWatts.Turbines;
using HeadToWatts.Turbines.Sizing;
using HeadToWatts.Turbines.Units;

namespace HeadToWatts.Studies;

/// <summary>Design flow, type and number of units: as given, or suggested in turn (decisions 0005 and 0006).</summary>
/// <param name="DesignFlowM3PerS">Design flow of all units, m3/s.</param>
/// <param name="Scan">Energy against design flow, with the chosen type.</param>
/// <param name="Ranking">Every type at the design flow.</param>
/// <param name="Chosen">The type the study runs on.</param>
/// <param name="Units">The units.</param>
internal sealed record PlantChoice(double DesignFlowM3PerS, DesignFlowScan Scan, IReadOnlyList<TurbineCandidate> Ranking, TurbineCandidate Chosen, UnitSet Units)
{
    /// <summary>Step-up of a manufacturer's efficiencies to the runner's size; null where none is made.</summary>
    internal MoodyStepUp? StepUp { get; init; }

    // A dry curve still needs a machine to speak of; a litre a second keeps every formula finite and makes no energy.
    private const double SmallestDesignFlowM3PerS = 1e-3;

    internal static PlantChoice Make(AlternativeInput input, SiteConditions site, Waterway waterway, FlowSupply supply)
    {
        var turbine = input.Turbine;
        if (input.Flow.DesignFlowM3PerS is { } given)
        {
            var ranking = Rank(given);
            var chosen = Pick(ranking);
            return Settled(given, Scan(chosen), ranking, chosen);
        }

        // The type depends on the design flow and the design flow on the type: begin at the flow exceeded 30 percent of the
        // year, the middle of common practice, and settle once more if the type changes.
        var start = supply.UsableAtM3PerS(DesignFlowScan.LeastShareOfLastKw);
        if (start <= 0)
            start = supply.UsableAtM3PerS(supply.ShareAtLeast(1e-9) / 2);
        start = Math.Max(start, SmallestDesignFlowM3PerS);
        var first = Pick(Rank(start));
        var scan = Scan(first);
        var flow = Math.Max(scan.SuggestedM3PerS, SmallestDesignFlowM3PerS);
        var ranked = Rank(flow);
        var second = Pick(ranked);
        if (second.Type.Id != first.Type.Id || second.UnitCount != first.UnitCount)
        {
            scan = Scan(second);
            flow = Math.Max(scan.SuggestedM3PerS, SmallestDesignFlowM3PerS);
            ranked = Rank(flow);
            second = ranked.First(c => c.Type.Id == second.Type.Id);
        }

        return Settled(flow, scan, ranked, second);

        // The size of the runner, and with it a step-up of the efficiency, is known with the machine.
        PlantChoice Settled(double flowM3PerS, DesignFlowScan settledScan, IReadOnlyList<TurbineCandidate> ranking, TurbineCandidate chosen)
        {
            var stepUp = StepUpOf(turbine, chosen, site, Curve(chosen));
            var units = Units(chosen, flowM3PerS).With(turbine.Split);
            return new PlantChoice(flowM3PerS, settledScan, ranking, chosen, stepUp is null ? units : units.With(units.Efficiency.Shifted(stepUp.PeakChange))) { StepUp = stepUp };
        }

        IReadOnlyList<TurbineCandidate> Rank(double flowM3PerS) =>
            TurbineRanking.Rank(site, input.Head.Gross, waterway, input.Train, supply, flowM3PerS, input.Site.FrequencyHz, turbine.UnitSizes?.Count ?? turbine.UnitCount);

        TurbineCandidate Pick(IReadOnlyList<TurbineCandidate> ranking) =>
            turbine.Type is { } type ? ranking.First(c => c.Type.Id == type.Id) : ranking[0];

        EfficiencyCurve Curve(TurbineCandidate candidate) => turbine.MakersCurve ?? turbine.HillChart?.CurveAt(candidate.NetHeadM) ?? candidate.Type.Efficiency;

        // Sizes are compared with units one after another; the split is settled with the machine.
        UnitSet Units(TurbineCandidate candidate, double flowM3PerS) => turbine.UnitSizes is { } sizes
            ? new UnitSet(candidate.Type, Curve(candidate), sizes, flowM3PerS, LoadSplit.InTurn)
            : new UnitSet(candidate.Type, Curve(candidate), turbine.LeastFlowRatio ?? candidate.Type.LeastFlowRatio, candidate.UnitCount, flowM3PerS);

        DesignFlowScan Scan(TurbineCandidate candidate) =>
            DesignFlowScan.Over(site, input.Head.Gross, waterway, input.Train, supply, flowM3PerS => Units(candidate, flowM3PerS));
    }

    private static MoodyStepUp? StepUpOf(TurbineInput turbine, TurbineCandidate chosen, SiteConditions site, EfficiencyCurve curve)
    {
        if (turbine.TestedDiameterM is not { } tested || chosen.Type.CavitationTable is null)
            return null;
        var diameter = turbine.RunnerDiameterM ?? MachineSheets.Sheet(chosen, site).Geometry?.DiameterM;
        return diameter is { } known ? MoodyStepUp.Of(curve, tested, known) : null;
    }
}
