using HeadToWatts.Basis;
using HeadToWatts.Basis.Quantities;
using HeadToWatts.Hydraulics.Water;
using HeadToWatts.Hydraulics.Waterways;
using HeadToWatts.Turbines;
using HeadToWatts.Turbines.Units;

namespace HeadToWatts.EnergyYield;

/// <summary>
/// Weighs every turbine type on a site: those whose envelope holds the design point first, by annual energy less three percent
/// for every unit beyond the first; the others after them by how far outside they lie (decision 0005). Cost is not weighed here.
/// </summary>
public static class TurbineRanking
{
    /// <summary>Equal shares of the year on which candidates are compared; reported energies use the full integral.</summary>
    public const int ComparisonShares = 800;

    /// <summary>One more unit must bring at least this much more energy to be worth its house room.</summary>
    public const double GainOfOneMoreUnit = 0.03;

    /// <summary>Ranks all types.</summary>
    /// <param name="site">Water and gravity.</param>
    /// <param name="grossHead">Gross head.</param>
    /// <param name="waterway">Waterway.</param>
    /// <param name="train">From the shaft to the meter.</param>
    /// <param name="supply">Flows.</param>
    /// <param name="designFlowM3PerS">Design flow of all units together, m3/s.</param>
    /// <param name="frequencyHz">Grid frequency, Hz.</param>
    /// <param name="fixedUnitCount">Number of units when the user has set it; else null.</param>
    public static IReadOnlyList<TurbineCandidate> Rank(
        SiteConditions site,
        GrossHead grossHead,
        Waterway waterway,
        PowerTrain train,
        FlowSupply supply,
        double designFlowM3PerS,
        double frequencyHz,
        int? fixedUnitCount)
    {
        ArgumentNullException.ThrowIfNull(supply);
        ArgumentNullException.ThrowIfNull(train);
        var middles = supply.MiddlesM3PerS(ComparisonShares);
        var losses = new LossTable(waterway, site, designFlowM3PerS);
        var candidates = new List<TurbineCandidate>();
        foreach (var type in TurbineTypes.All)
        {
            var byUnits = new double[4];
            var plants = new PlantCurve[4];
            for (var n = 1; n <= 4; n++)
            {
                var units = new UnitSet(type, type.Efficiency, type.LeastFlowRatio, n, designFlowM3PerS);
                plants[n - 1] = new PlantCurve(new PlantDesign(site, grossHead, waterway, units, train) { QuickLosses = losses });
                byUnits[n - 1] = QuickEnergyKwh(plants[n - 1], middles);
            }

            var count = fixedUnitCount ?? BestCount(type, plants, byUnits);
            var plant = count <= 4 ? plants[count - 1] : new PlantCurve(new PlantDesign(site, grossHead, waterway, new UnitSet(type, type.Efficiency, type.LeastFlowRatio, count, designFlowM3PerS), train) { QuickLosses = losses });
            candidates.Add(Candidate(type, count, plant, byUnits, supply, middles, frequencyHz));
        }

        return
        [
            .. candidates.Where(c => c.Fit.IsInside).OrderByDescending(c => c.AnnualEnergyKwh * Math.Pow(1 - GainOfOneMoreUnit, c.UnitCount - 1)),
            .. candidates.Where(c => !c.Fit.IsInside).OrderBy(c => c.Fit.DecadesOutside),
        ];
    }

    /// <summary>Annual energy on equal shares of the year, kWh: for comparing, within 0.2 percent of the full integral and half a share of full power where the plant starts with a jump.</summary>
    /// <param name="plant">The plant.</param>
    /// <param name="middlesM3PerS">Usable flow at the middle of each share, m3/s.</param>
    public static double QuickEnergyKwh(PlantCurve plant, IReadOnlyList<double> middlesM3PerS)
    {
        ArgumentNullException.ThrowIfNull(plant);
        ArgumentNullException.ThrowIfNull(middlesM3PerS);
        var sum = 0.0;
        double lastTaken = -1, lastPower = 0;
        foreach (var flow in middlesM3PerS)
        {
            // Much of the year the plant takes the same flow (full, or nothing).
            var taken = plant.FlowTakenM3PerS(flow);
            if (taken != lastTaken)
            {
                lastTaken = taken;
                lastPower = plant.At(flow).MeterPowerKw;
            }

            sum += lastPower;
        }

        return sum / middlesM3PerS.Count * PhysicalConstants.HoursPerYear * plant.Design.Train.Availability;
    }

    // The fewest units inside the envelope beyond which one more brings little; if none is inside, the fewest of all.
    private static int BestCount(TurbineType type, PlantCurve[] plants, double[] byUnits)
    {
        var inside = new bool[4];
        for (var n = 1; n <= 4; n++)
        {
            var design = plants[n - 1].Design;
            var flow = design.Units.DesignFlowM3PerS;
            inside[n - 1] = type.Envelope.Fit(flow / n, Math.Max(design.NetHeadM(flow), 1e-3)).IsInside;
        }

        var any = inside.Contains(true);
        var best = 0;
        for (var n = 1; n <= 4; n++)
        {
            if (any && !inside[n - 1])
                continue;
            if (best == 0 || byUnits[n - 1] > byUnits[best - 1] * (1 + GainOfOneMoreUnit))
                best = n;
        }

        return best;
    }

    private static TurbineCandidate Candidate(TurbineType type, int count, PlantCurve plant, double[] byUnits, FlowSupply supply, double[] middles, double frequencyHz)
    {
        var top = plant.At(plant.BestFlowM3PerS);
        var design = plant.Design;
        var unitFlow = design.Units.DesignFlowM3PerS / count;
        var netHeadM = design.NetHeadM(design.Units.DesignFlowM3PerS);
        var least = LeastFlow(plant);
        var wet = supply.ShareAtLeast(1e-9);
        var speed = netHeadM > 0 && top.ShaftPowerKw > 0
            ? SpeedChoice.Choose(type, unitFlow, netHeadM, top.ShaftPowerKw / Math.Max(top.UnitsRunning, 1), frequencyHz)
            : null;
        return new TurbineCandidate(
            type,
            count,
            unitFlow,
            netHeadM,
            type.Envelope.Fit(unitFlow, Math.Max(netHeadM, 1e-3)),
            byUnits,
            count <= 4 ? byUnits[count - 1] : QuickEnergyKwh(plant, middles),
            top.MeterPowerKw,
            least,
            Math.Max(0, wet - (least > 0 ? supply.ShareAtLeast(least) : wet)),
            design.Units.Efficiency.At(0.5) is var half && type.LeastFlowRatio <= 0.5 ? half : 0,
            design.Units.Efficiency.Peak,
            speed);
    }

    private static double LeastFlow(PlantCurve plant)
    {
        foreach (var edge in plant.BreakpointsM3PerS)
        {
            if (edge > 0 && plant.At(edge * (1 + 1e-9)).IsRunning)
                return edge;
        }

        return plant.BestFlowM3PerS;
    }
}
