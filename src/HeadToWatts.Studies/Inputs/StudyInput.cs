using HeadToWatts.EnergyYield;

namespace HeadToWatts.Studies.Inputs;

/// <summary>A study: its heading and one or more alternatives, each a complete input.</summary>
/// <param name="Header">Heading.</param>
/// <param name="Alternatives">At least one.</param>
public sealed record StudyInput(StudyHeader Header, IReadOnlyList<AlternativeInput> Alternatives);

/// <summary>One complete way of using the site.</summary>
/// <param name="Name">Name of the alternative.</param>
/// <param name="Site">Place and water.</param>
/// <param name="Flow">Flow and what may be used of it.</param>
/// <param name="Head">Gross head.</param>
/// <param name="Waterway">Waterway to the machine.</param>
/// <param name="Turbine">Turbine.</param>
/// <param name="Train">From the shaft to the meter.</param>
/// <param name="Assumptions">What the author left out and was assumed, one sentence each.</param>
public sealed record AlternativeInput(
    string Name,
    SiteInput Site,
    FlowInput Flow,
    HeadInput Head,
    WaterwayInput Waterway,
    TurbineInput Turbine,
    PowerTrain Train,
    IReadOnlyList<string> Assumptions)
{
    /// <summary>The pumping set against the generation; null when none is given.</summary>
    public PumpingInput? Pumping { get; init; }

    /// <summary>Costs and income; null when none are given.</summary>
    public MoneyInput? Money { get; init; }
}
