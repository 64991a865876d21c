using HeadToWatts.EnergyYield;
using HeadToWatts.Turbines.Sizing;

namespace HeadToWatts.Studies.Results;

/// <summary>Size, speed and setting of one type at this site: for comparing, not for building.</summary>
/// <param name="Candidate">The type as it was weighed.</param>
/// <param name="Geometry">Size of the runner; null where this project has no rule, or the fall gives no head.</param>
/// <param name="Setting">Highest position of a runner under pressure; null where it turns in air or is the maker's matter.</param>
/// <param name="SpecificSpeedUsHpFt">Specific speed of the runner in rpm, hp and ft; null without a speed.</param>
/// <param name="SpecificSpeedDimensionless">n_QE; null without a speed.</param>
/// <param name="Against">What speaks against it here, one sentence each.</param>
public sealed record MachineSheet(
    TurbineCandidate Candidate,
    RunnerGeometry? Geometry,
    RunnerSetting? Setting,
    double? SpecificSpeedUsHpFt,
    double? SpecificSpeedDimensionless,
    IReadOnlyList<string> Against);
