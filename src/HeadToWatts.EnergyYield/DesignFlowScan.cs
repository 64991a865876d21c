using HeadToWatts.Basis;
using HeadToWatts.Basis.Quantities;
using HeadToWatts.Hydraulics.Water;
using HeadToWatts.Hydraulics.Waterways;
using HeadToWatts.Turbines.Units;

namespace HeadToWatts.EnergyYield;

/// <summary>A plant of one design flow on the scan.</summary>
/// <param name="DesignFlowM3PerS">Design flow of all units, m3/s.</param>
/// <param name="Exceedance">Share of the year in which the usable flow reaches it.</param>
/// <param name="InstalledPowerKw">Power at the generator's terminals, kW.</param>
/// <param name="AnnualEnergyKwh">Annual energy at the meter, kWh.</param>
/// <param name="PlantFactor">Annual energy over installed power times 8760 h.</param>
/// <param name="HoursOfLastKw">Hours a year that the last added kilowatt works, from this step of the scan, h; not a number where the power no longer grows.</param>
public sealed record DesignFlowPoint(double DesignFlowM3PerS, double Exceedance, double InstalledPowerKw, double AnnualEnergyKwh, double PlantFactor, double HoursOfLastKw);

/// <summary>Energy and plant factor over design flow, and a suggested design flow (decision 0006).</summary>
/// <param name="Points">Scan, ascending in design flow.</param>
/// <param name="SuggestedM3PerS">Suggested design flow, m3/s; zero when there is no usable flow.</param>
/// <param name="Reason">Why there.</param>
public sealed record DesignFlowScan(IReadOnlyList<DesignFlowPoint> Points, double SuggestedM3PerS, DesignFlowReason Reason)
{
    /// <summary>The last added kilowatt should work at least this share of the year.</summary>
    public const double LeastShareOfLastKw = 0.30;

    private const int Steps = 40;

    /// <summary>Scans design flows from a fortieth of the largest flow considered (exceeded 2 percent of the year) up to it.</summary>
    /// <param name="site">Water and gravity.</param>
    /// <param name="grossHead">Gross head.</param>
    /// <param name="waterway">Waterway.</param>
    /// <param name="train">From the shaft to the meter.</param>
    /// <param name="supply">Flows.</param>
    /// <param name="unitsOf">Makes the units for a design flow, m3/s.</param>
    public static DesignFlowScan Over(SiteConditions site, GrossHead grossHead, Waterway waterway, PowerTrain train, FlowSupply supply, Func<double, UnitSet> unitsOf)
    {
        ArgumentNullException.ThrowIfNull(supply);
        ArgumentNullException.ThrowIfNull(unitsOf);
        ArgumentNullException.ThrowIfNull(train);
        var largest = supply.UsableAtM3PerS(0.02);
        if (largest <= 0)
            largest = supply.UsableM3PerS[0];
        if (largest <= 0)
            return new DesignFlowScan([], 0, DesignFlowReason.NoUsableFlow);

        var middles = supply.MiddlesM3PerS(TurbineRanking.ComparisonShares);
        var losses = new LossTable(waterway, site, largest);
        var points = new List<DesignFlowPoint>(Steps);
        double lastKw = 0, lastKwh = 0;
        var suggested = 0.0;
        var reason = DesignFlowReason.LargestScanned;
        for (var i = 1; i <= Steps; i++)
        {
            var flow = largest * i / Steps;
            var plant = new PlantCurve(new PlantDesign(site, grossHead, waterway, unitsOf(flow), train) { QuickLosses = losses });
            var kwh = TurbineRanking.QuickEnergyKwh(plant, middles);
            var best = plant.At(plant.BestFlowM3PerS);
            var kw = train.IsConstant ? train.GeneratedPowerKw(best.ShaftPowerKw) : best.IsRunning ? plant.Design.Train.At(best.ShaftPowerKw, best.RunningShare, best.LoadSpread).GeneratedKw : 0;
            var grows = kw > lastKw * (1 + 1e-6) && kw > 0;
            var hours = grows ? (kwh - lastKwh) / (kw - lastKw) : double.NaN;
            points.Add(new DesignFlowPoint(flow, supply.ShareAtLeast(flow), kw, kwh, kw > 0 ? kwh / kw / PhysicalConstants.HoursPerYear : 0, hours));
            if (grows && hours >= LeastShareOfLastKw * PhysicalConstants.HoursPerYear)
                suggested = flow;
            (lastKw, lastKwh) = (Math.Max(kw, lastKw), Math.Max(kwh, lastKwh));
        }

        if (suggested == 0)
            return new DesignFlowScan(points, points.MaxBy(p => p.AnnualEnergyKwh)!.DesignFlowM3PerS, DesignFlowReason.MostEnergy);
        if (suggested < largest)
        {
            var next = points.Find(p => p.DesignFlowM3PerS > suggested * (1 + 1e-9));
            reason = next is not null && double.IsNaN(next.HoursOfLastKw) ? DesignFlowReason.PipeLimits : DesignFlowReason.LastKwWorksEnough;
        }

        return new DesignFlowScan(points, suggested, reason);
    }
}

/// <summary>Why a design flow is suggested.</summary>
public enum DesignFlowReason
{
    /// <summary>Beyond it, an added kilowatt would work less than the stated share of the year.</summary>
    LastKwWorksEnough,

    /// <summary>Beyond it, the pipe loses more than the flow brings.</summary>
    PipeLimits,

    /// <summary>Even the largest flow scanned is used enough of the year.</summary>
    LargestScanned,

    /// <summary>No size works for the stated share of the year; this one gives the most energy.</summary>
    MostEnergy,

    /// <summary>There is no usable flow.</summary>
    NoUsableFlow,
}
