using HeadToWatts.EnergyYield;
using HeadToWatts.FlowRecords;

namespace HeadToWatts.Studies.Results;

/// <summary>What the study found of the flow.</summary>
/// <param name="Curve">Curve of the year as it is plotted, dry outside the season.</param>
/// <param name="Supply">The plotted curve with its allocation; energy is summed over the days where there is a record.</param>
/// <param name="MeanFlowM3PerS">Mean flow arriving over the year, m3/s.</param>
/// <param name="MeanUsableFlowM3PerS">Mean flow the plant may use, m3/s.</param>
/// <param name="WetShareOfYear">Share of the year in which some water may be used.</param>
/// <param name="DesignFlowM3PerS">Design flow of all units together, m3/s.</param>
/// <param name="DesignFlowIsSuggested">True when this project suggested it.</param>
/// <param name="DesignFlowExceedance">Share of the year in which the usable flow reaches it.</param>
/// <param name="Scan">Energy against design flow.</param>
public sealed record FlowResult(
    FlowDurationCurve Curve,
    FlowSupply Supply,
    double MeanFlowM3PerS,
    double MeanUsableFlowM3PerS,
    double WetShareOfYear,
    double DesignFlowM3PerS,
    bool DesignFlowIsSuggested,
    double DesignFlowExceedance,
    DesignFlowScan Scan);
