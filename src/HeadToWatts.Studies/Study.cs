using HeadToWatts.Basis.Sources;
using HeadToWatts.Basis.Units;
using HeadToWatts.EnergyYield;
using HeadToWatts.Hydraulics.Surge;
using HeadToWatts.Hydraulics.Water;
using HeadToWatts.Hydraulics.Waterways;
using HeadToWatts.Studies.Inputs;
using HeadToWatts.Studies.Results;
using HeadToWatts.Studies.Worth;
using HeadToWatts.Turbines;
using HeadToWatts.Turbines.Units;

namespace HeadToWatts.Studies;

/// <summary>Runs a study: from the flow to the energy, one stage after another.</summary>
public static class Study
{
    private static readonly double[] Shares = [0.25, 0.5, 0.75, 1.0];

    /// <summary>Runs every alternative.</summary>
    /// <param name="input">The study.</param>
    public static IReadOnlyList<StudyResult> RunAll(StudyInput input)
    {
        ArgumentNullException.ThrowIfNull(input);
        return [.. input.Alternatives.Select(a => Run(input.Header, a))];
    }

    /// <summary>Runs one alternative.</summary>
    /// <param name="header">Heading of the study.</param>
    /// <param name="input">The alternative.</param>
    public static StudyResult Run(StudyHeader header, AlternativeInput input)
    {
        ArgumentNullException.ThrowIfNull(header);
        ArgumentNullException.ThrowIfNull(input);
        input = RatedHead.Settle(input);
        var site = SiteConditions.At(input.Site.LatitudeRad, input.Site.ElevationM, input.Site.WaterTemperatureDegC);
        var curve = input.Flow.CurveOfYear();
        var supply = new FlowSupply(input.Flow.EnergyCurve(), input.Flow.Allocation);
        var waterway = input.Waterway.Build();
        var choice = PlantChoice.Make(input, site, waterway, supply);
        var designFlow = choice.DesignFlowM3PerS;
        if (input.Head.Moves)
            input = RatedHead.At(input, designFlow);

        var design = new PlantDesign(site, input.Head.Gross, waterway, choice.Units, input.Train);
        design = design with { HeadBehaviour = AwayFromRated.Of(input.Turbine, choice.Chosen.Type, design) };
        var year = YearOfParts.Make(input, design, supply);
        var plant = year.Representative;
        var annual = AnnualEnergy.Of(year.Parts);
        var days = input.Flow.Record is { } record ? DailyRun.Over(year.PlantOfMonth, record, input.Flow.Season, year.AllocationOfMonth, input.Flow.YearKind) : null;
        var losses = waterway.At(designFlow, site);
        var highest = losses.Elements.Count == 0 ? 0 : losses.Elements.Max(e => e.VelocityMPerS);
        var surge = losses.Elements.Count == 0 ? null : SurgeScreening.Of(waterway, designFlow, input.Head.HeadwaterM, input.Head.TailwaterM, site, null, input.Waterway.Stop?.Restraint ?? PipeRestraint.AnchoredThroughout);
        var lines = waterway.GradeLines(designFlow, input.Head.HeadwaterM, input.Head.TailwaterM, site);
        var stop = PlantStop.Of(input, site, losses, lines, surge, choice.Chosen.Type);
        var middleFlow = curve.MeanFlowM3PerS;
        var atMean = plant.At(input.Flow.Allocation.Split(middleFlow).UsableM3PerS).MeterPowerKw * Basis.PhysicalConstants.HoursPerYear * input.Train.Availability;

        var money = MoneyOf(input, design, supply, annual, days);
        var passing = input.Head.Moves
            ? new MovingHead(input.Head.Headwater, input.Head.Tailwater, input.Flow.Allocation, RatedHead.MiddleMonth(input.Flow)).PassingM3PerS(designFlow)
            : designFlow;
        var pumping = PumpingStudy.Of(input.Pumping, site, annual, days);
        var canal = CanalStudy.Of(input.Head.Canal, passing, curve.FlowAt(0), site.GravityMPerS2);

        return new StudyResult(
            header,
            input,
            site,
            new FlowResult(
                curve,
                new FlowSupply(curve, input.Flow.Allocation),
                middleFlow,
                annual.Integral.UsableM3PerS,
                supply.ShareAtLeast(1e-9),
                designFlow,
                input.Flow.DesignFlowM3PerS is null,
                supply.ShareAtLeast(designFlow),
                choice.Scan),
            new HeadResult(
                input.Head.Gross.Metres,
                input.Head.HeadwaterM,
                input.Head.TailwaterM,
                plant.Design.NetHeadM(designFlow),
                [.. Shares.Select(s => NetHead(plant, s * designFlow, s))]) { Levels = LevelTable.Of(input, supply, designFlow) },
            new WaterwayResult(
                waterway,
                losses,
                losses.TotalLossM / input.Head.Gross.Metres,
                highest,
                VelocityLimits.UsbrLimitMPerS(input.Head.Gross.Metres, site.GravityMPerS2),
                lines,
                surge) { Stop = stop },
            new TurbineResult(
                choice.Ranking,
                choice.Chosen,
                input.Turbine.Type is null,
                input.Turbine.UnitCount is null && input.Turbine.UnitSizes is null,
                choice.Units.Efficiency,
                input.Turbine.MakersCurve is not null || input.Turbine.HillChart is not null,
                choice.Units)
            {
                Sheets = MachineSheets.Of(choice.Ranking, site),
                Pump = MachineSheets.Pump(choice, input.Turbine),
                StepUp = choice.StepUp,
                Split = SplitComparison.Of(plant.Design, supply, annual.AnnualEnergyKwh),
                HeadBehaviour = design.HeadBehaviour,
            },
            new EnergyResult(plant, annual, days, DrawingPoints(plant, supply), atMean) { WithHeadError = HeadError.Range(input, design, supply), Electrical = ElectricalResult.Of(plant), ThreePointsLowerKwh = CurveError.LowerKwh(plant, supply, annual.AnnualEnergyKwh) },
            MethodUse.Union([.. StudyMethods.Uses(input, site, waterway, surge, stop, choice, LowestFlowM3PerS(choice, supply), design.HeadBehaviour), .. canal?.Uses ?? [], .. pumping?.Pumping.Uses ?? [], .. money?.Uses ?? []]))
        {
            Summary = RecordSummary.Of(input.Flow),
            Canal = canal,
            Pumping = pumping,
            Money = money,
        };
    }

    private static MoneyResult? MoneyOf(AlternativeInput input, PlantDesign design, FlowSupply supply, AnnualEnergy annual, DailyRun? days)
    {
        if (input.Money is not { } money)
            return null;
        var shift = Math.Max(input.Head.ErrorM, MoneyRun.HeadSwingRatio * input.Head.Gross.Metres);
        var swing = annual.AnnualEnergyKwh > 0
            ? new HeadSwing(HeadError.EnergyKwh(input, design, supply, -shift), HeadError.EnergyKwh(input, design, supply, shift), (100 * shift / input.Head.Gross.Metres).ToString("0.#", System.Globalization.CultureInfo.InvariantCulture) + " %")
            : null;
        var found = MoneyRun.Of(money, annual.AnnualEnergyKwh, input.Train.Availability, null, swing, new FlowEvidence(days?.WholeYearsKwh.Count ?? 0));
        return found with { CostBands = CostBand.Of(money, found.Costs, annual.InstalledPowerKw, input.Head.Gross.Metres) };
    }

    // The lowest flow the plant runs on: what its units need, or what there is at the dry end of the curve.
    private static double LowestFlowM3PerS(PlantChoice choice, FlowSupply supply) =>
        Math.Max(choice.Units.LeastFlowM3PerS, supply.UsableM3PerS[^1]);

    private static NetHeadPoint NetHead(PlantCurve plant, double flowM3PerS, double share)
    {
        var loss = plant.Design.LossM(flowM3PerS);
        return new NetHeadPoint(share, flowM3PerS, loss, plant.Design.GrossHeadM(flowM3PerS) - loss);
    }

    // Evenly spaced, with both sides of every breakpoint so that steps are drawn as steps.
    private static IReadOnlyList<PlantPoint> DrawingPoints(PlantCurve plant, FlowSupply supply)
    {
        var largest = Math.Max(plant.Design.Units.DesignFlowM3PerS * 1.15, 1e-9);
        var top = Math.Min(Math.Max(largest, supply.UsableM3PerS[0]), largest * 1.5);
        var flows = new SortedSet<double>();
        for (var i = 0; i <= 80; i++)
            flows.Add(top * i / 80);
        foreach (var edge in plant.BreakpointsM3PerS)
        {
            if (edge <= 0 || edge > top)
                continue;
            flows.Add(edge * (1 - 1e-9));
            flows.Add(edge);
            flows.Add(edge * (1 + 1e-9));
        }

        return [.. flows.Select(plant.At)];
    }
}
