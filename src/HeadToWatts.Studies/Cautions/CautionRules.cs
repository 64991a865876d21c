using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Every caution rule, in the order in which a reader meets the stages.</summary>
public static class CautionRules
{
    /// <summary>The rules.</summary>
    public static IReadOnlyList<CautionRule> All { get; } =
    [
        new NoReservedFlow(),
        new AssumedInputs(),
        new FlowNotMeasured(),
        new StagesOutsideRating(),
        new ReservedByMonth(),
        new ScreeningReserve(),
        new RightBelowDesign(),
        new RecordUnderTenYears(),
        new MissingDays(),
        new NoRecord(),
        new CurveEndsEarly(),
        new DryMonths(),
        new DesignFlowSeldom(),
        new NetHeadGone(),
        new LowHead(),
        new TailwaterConstant(),
        new BypassNotStated(),
        new BasinTooSmall(),
        new CanalFastFlow(),
        new HighWaterTakesHead(),
        new LevelOutsideRating(),
        new PressureBelowAir(),
        new PressureNearRating(),
        new SurgeOverRating(),
        new StopOverRating(),
        new ColumnParts(),
        new StopIsScreening(),
        new VelocityHigh(),
        new VelocityOverLimit(),
        new VelocityLow(),
        new LossOverTenPercent(),
        new PipeLimitsFlow(),
        new TransitionFlowRule(),
        new NoPressureRating(),
        new MethodOutOfRange(),
        new OutsideEnvelope(),
        new MuchBelowLeast(),
        new BetterType(),
        new TypicalEfficiency(),
        new MakersEfficiency(),
        new HillChartLeft(),
        new HeadMovesMachineHeld(),
        new RunnerTooHigh(),
        new RunnerBelowTailwater(),
        new HighRunaway(),
        new PumpScatter(),
        new DriveLossForgotten(),
        new GeneratorOverloaded(),
        new InductionNeedsGrid(),
        new LineLossHigh(),
        new NoEnergy(),
        new LowPlantFactor(),
        new SmallPlant(),
        new HighEfficiency(),
        new AlwaysAvailable(),
        new MeanFlowTrap(),
        new PumpBelowCriterion(),
        new SuctionTooLow(),
        new PumpingOnAnotherMeter(),
        new NoCostGiven(),
        new NoPriceGiven(),
        new NoInterconnectionCost(),
        new NoContingency(),
        new NoRunningCosts(),
        new NoReplacements(),
        new SeveralRates(),
        new PaybackBeyondLife(),
        new LongLife(),
        new DebtCoverThin(),
        new RealWithHighRate(),
        new PriceYearOld(),
        new NoTaxCounted(),
        new CorrelationOutOfRange(),
    ];

    /// <summary>The cautions that bite, those to settle first before the others.</summary>
    /// <param name="result">The study.</param>
    /// <param name="show">Units in which numbers are shown.</param>
    public static IReadOnlyList<Caution> For(StudyResult result, UnitDisplay show) =>
    [
        .. All.Select(rule => (rule, text: rule.Say(result, show)))
            .Where(x => x.text is not null)
            .Select(x => new Caution(x.rule.Id, x.rule.Stage, x.rule.Severity, x.rule.Title, x.text!, x.rule.Authority))
            .OrderBy(c => c.Severity),
    ];
}
