using HeadToWatts.Basis.Sources;
using HeadToWatts.Basis.Units;
using HeadToWatts.Hydraulics.Water;
using HeadToWatts.Studies.Inputs;
using HeadToWatts.Studies.Results;

namespace HeadToWatts.Studies;

/// <summary>Everything a study found of one alternative. Immutable; screens, memo and files only read it.</summary>
/// <param name="Header">Heading of the study.</param>
/// <param name="Input">The alternative as given.</param>
/// <param name="Site">Water, gravity and air at the site.</param>
/// <param name="Flow">Flow.</param>
/// <param name="Head">Head.</param>
/// <param name="Waterway">Waterway.</param>
/// <param name="Turbine">Turbine.</param>
/// <param name="Energy">Energy.</param>
/// <param name="MethodsUsed">Every method used, in order of first use, with the spans of its inputs.</param>
public sealed record StudyResult(
    StudyHeader Header,
    AlternativeInput Input,
    SiteConditions Site,
    FlowResult Flow,
    HeadResult Head,
    WaterwayResult Waterway,
    TurbineResult Turbine,
    EnergyResult Energy,
    IReadOnlyList<MethodUse> MethodsUsed)
{
    /// <summary>Whether it pays; null when no costs and no income are given.</summary>
    public Worth.MoneyResult? Money { get; init; }

    /// <summary>Pumping beside generation; null when no pumping is given.</summary>
    public PumpingSide? Pumping { get; init; }

    /// <summary>The canal above and below a drop; null when none is given.</summary>
    public CanalResult? Canal { get; init; }

    /// <summary>What the daily record tells beyond its duration curve; null without one.</summary>
    public RecordSummary? Summary { get; init; }

    /// <summary>A display in the given family of units, with flow units that suit the study's size.</summary>
    public UnitDisplay Show(UnitSystem system) => UnitDisplay.For(system, Flow.DesignFlowM3PerS);

    /// <summary>A display in the study's own family of units.</summary>
    public UnitDisplay Show() => Show(Header.Units);
}
