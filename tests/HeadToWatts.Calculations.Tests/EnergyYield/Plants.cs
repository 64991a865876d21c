using CsCheck;
using HeadToWatts.Basis.Quantities;
using HeadToWatts.EnergyYield;
using HeadToWatts.FlowRecords;
using HeadToWatts.Hydraulics.Friction;
using HeadToWatts.Hydraulics.LocalLosses;
using HeadToWatts.Hydraulics.Pipes;
using HeadToWatts.Hydraulics.Water;
using HeadToWatts.Hydraulics.Waterways;
using HeadToWatts.Turbines;
using HeadToWatts.Turbines.Units;
using MathNet.Numerics.Distributions;

namespace HeadToWatts.Calculations.Tests.EnergyYield;

/// <summary>Plants and curves simple enough to be worked by hand, and random ones.</summary>
internal static class Plants
{
    public const double Gravity = 9.80665;

    public static readonly PowerTrain Lossless = new(1, 1, 1, 1, 0, 0, 1);

    public static readonly Waterway NoPipe = new([], FrictionFormulas.Default);

    public static readonly TurbineType AnyType = TurbineTypes.All[0];

    /// <summary>Water of a round density under a round gravity, as textbook examples have it.</summary>
    public static SiteConditions Site(double densityKgPerM3 = 1000, double gravityMPerS2 = Gravity)
    {
        var site = SiteConditions.At(0.8, 0, 10);
        return site with { GravityMPerS2 = gravityMPerS2, Water = site.Water with { DensityKgPerM3 = densityKgPerM3 } };
    }

    public static EfficiencyCurve FlatEfficiency(double efficiency) => EfficiencyCurve.FromTable([(0, efficiency), (1, efficiency)], "flat").Value;

    /// <summary>A waterway that loses exactly k Q^2: a pipe of no length with a fitting of the right K.</summary>
    public static Waterway Quadratic(double lossPerFlowSquared, double gravityMPerS2 = Gravity)
    {
        const double diameterM = 1;
        var k = lossPerFlowSquared * Math.PI * Math.PI * gravityMPerS2 * Math.Pow(diameterM, 4) / 8;
        return new Waterway([PipeElement.Of("fitting", 0, diameterM, PipeMaterials.All[0], new Fitting("K", k, 1, null))], FrictionFormulas.Default);
    }

    public static PlantDesign FlatDesign(double grossHeadM, double designFlowM3PerS, double efficiency, double leastFlowRatio = 0, Waterway? waterway = null, PowerTrain? train = null, SiteConditions? site = null, int units = 1) =>
        new(site ?? Site(), GrossHead.FromMetres(grossHeadM), waterway ?? NoPipe, new UnitSet(AnyType, FlatEfficiency(efficiency), leastFlowRatio, units, designFlowM3PerS), train ?? Lossless);

    public static PlantCurve Flat(double grossHeadM, double designFlowM3PerS, double efficiency, double leastFlowRatio = 0, Waterway? waterway = null, PowerTrain? train = null, SiteConditions? site = null) =>
        new(FlatDesign(grossHeadM, designFlowM3PerS, efficiency, leastFlowRatio, waterway, train, site));

    public static FlowDurationCurve Curve(params CurvePoint[] rows) => FlowDurationCurve.FromRows(rows, BeyondLastRow.Hold, "rows").Value;

    /// <summary>A flow that runs for a share of the year, and nothing for the rest.</summary>
    public static FlowDurationCurve Constant(double flowM3PerS, double shareOfYear = 1) => Curve(new(0, flowM3PerS), new(1, flowM3PerS)).ForSeasonShare(shareOfYear);

    public static FlowDurationCurve Linear(double largestM3PerS) => Curve(new(0, largestM3PerS), new(1, 0));

    /// <summary>Q = -Qm ln p in straight pieces of 0.001 in ln p.</summary>
    public static FlowDurationCurve Exponential(double meanM3PerS) =>
        Curve([.. Enumerable.Range(0, 36_001).Select(i => new CurvePoint(Math.Exp(-i / 1000.0), meanM3PerS * i / 1000))]);

    /// <summary>ln Q normal, in straight pieces of 0.0005 in the normal variate.</summary>
    public static FlowDurationCurve Lognormal(double medianM3PerS, double sigma) =>
        Curve([.. Enumerable.Range(0, 29_001).Select(i => 8.5 - (i * 0.0005)).Select(z => new CurvePoint(Normal.CDF(0, 1, -z), medianM3PerS * Math.Exp(sigma * z)))]);

    public static FlowSupply Supply(FlowDurationCurve curve, WaterAllocation? allocation = null) => new(curve, allocation ?? WaterAllocation.None);

    // ---- random plants -------------------------------------------------------------------------------------------------

    private static readonly Gen<PowerTrain> AnyTrain = Gen.Select(
        Gen.Double[0.85, 1], Gen.Double[0.8, 0.98], Gen.Double[0.95, 1], Gen.Double[0.9, 1], Gen.Double[0, 0.05], Gen.OneOf(0.0, 0.05, 1, 20), Gen.Double[0.5, 1],
        (drive, generator, transformer, line, ownRatio, ownKw, availability) => new PowerTrain(drive, generator, transformer, line, ownRatio, ownKw, availability));

    /// <summary>Any type, 1 to 4 units, heads of 1 to 500 m, flows of 10 L/s to 30 m3/s; a third of the pipes are too small for the flow.</summary>
    public static readonly Gen<PlantDesign> AnyDesign = Gen.Select(
        Gen.OneOf([.. TurbineTypes.All]), Gen.Int[1, 4], Gen.Double[0, 2.7], Gen.Double[-2, 1.5], Gen.Double[-0.5, 1.1], Gen.Double[0, 3000], Gen.OneOf([.. FrictionFormulas.All]), AnyTrain,
        (type, units, logHead, logFlow, logVelocity, lengthM, formula, train) =>
        {
            var designFlow = Math.Pow(10, logFlow);
            var diameterM = Math.Sqrt(4 * designFlow / (Math.PI * Math.Pow(10, logVelocity)));
            var pipe = PipeElement.Of("pipe", lengthM, diameterM, PipeMaterials.Find("steel-new")!, new Fitting("all", 1.2, 1, null));
            return new PlantDesign(SiteConditions.At(0.75, 400, 12), GrossHead.FromMetres(Math.Pow(10, logHead)), new Waterway([pipe], formula), new UnitSet(type, type.Efficiency, type.LeastFlowRatio, units, designFlow), train);
        });

    private static readonly Gen<(double[] Flows, double[] Steps, bool Dry, double Season)> AnyShape =
        Gen.Int[2, 14].SelectMany(n => Gen.Select(Gen.Double[0, 3].Array[n], Gen.Double[0.01, 1].Array[n], Gen.Bool, Gen.OneOf(1.0, 1.0, 0.58, 0.3)));

    private static readonly Gen<(int Kind, double Share, double Prior)> AnyTaking = Gen.Select(Gen.Int[0, 2], Gen.Double[0, 0.6], Gen.OneOf(0.0, 0.0, 0.2));

    /// <summary>A plant with a curve and an allocation in proportion to its design flow.</summary>
    public static readonly Gen<(PlantDesign Design, FlowDurationCurve Curve, WaterAllocation Allocation)> AnyCase =
        Gen.Select(AnyDesign, AnyShape, AnyTaking, (design, shape, taking) => (design, CurveOf(shape, design.Units.DesignFlowM3PerS), AllocationOf(taking, design.Units.DesignFlowM3PerS)));

    private static FlowDurationCurve CurveOf((double[] Flows, double[] Steps, bool Dry, double Season) shape, double scale)
    {
        double[] flows = [.. shape.Flows.OrderDescending().Select(q => q * scale)];
        var rows = new CurvePoint[flows.Length];
        double at = 0, whole = shape.Steps.Sum();
        for (var i = 0; i < rows.Length; i++)
        {
            rows[i] = new CurvePoint(at / whole, flows[i]);
            at += shape.Steps[i];
        }

        return FlowDurationCurve.FromRows(rows, shape.Dry ? BeyondLastRow.Dry : BeyondLastRow.Hold, "rows").Value.ForSeasonShare(shape.Season);
    }

    private static WaterAllocation AllocationOf((int Kind, double Share, double Prior) taking, double scale) => new(
        taking.Kind switch { 0 => ReservedFlow.None, 1 => ReservedFlow.Constant(taking.Share * scale), _ => ReservedFlow.PercentOfFlow(taking.Share) },
        taking.Prior * scale);
}
