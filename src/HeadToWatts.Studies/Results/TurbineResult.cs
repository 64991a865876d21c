using HeadToWatts.EnergyYield;
using HeadToWatts.Turbines;
using HeadToWatts.Turbines.Sizing;
using HeadToWatts.Turbines.Units;

namespace HeadToWatts.Studies.Results;

/// <summary>What the study found of the turbine.</summary>
/// <param name="Ranking">Every type, best first.</param>
/// <param name="Chosen">The one the study runs on.</param>
/// <param name="TypeIsSuggested">True when this project suggested the type.</param>
/// <param name="UnitCountIsSuggested">True when this project suggested the number of units.</param>
/// <param name="Efficiency">Efficiency over load used.</param>
/// <param name="EfficiencyIsMakers">True when a manufacturer's table is used.</param>
/// <param name="Units">The units.</param>
public sealed record TurbineResult(
    IReadOnlyList<TurbineCandidate> Ranking,
    TurbineCandidate Chosen,
    bool TypeIsSuggested,
    bool UnitCountIsSuggested,
    EfficiencyCurve Efficiency,
    bool EfficiencyIsMakers,
    UnitSet Units)
{
    /// <summary>Size, speed and setting of every type, in the order of the ranking.</summary>
    public IReadOnlyList<MachineSheet> Sheets { get; init; } = [];

    /// <summary>The sheet of the type the study runs on.</summary>
    public MachineSheet? ChosenSheet => Sheets.FirstOrDefault(s => s.Candidate.Type.Id == Chosen.Type.Id);

    /// <summary>Step-up of the manufacturer's efficiencies to this runner's size; null where none is made.</summary>
    public MoodyStepUp? StepUp { get; init; }

    /// <summary>Several units: the best split beside one after another; null for one unit.</summary>
    public SplitResult? Split { get; init; }

    /// <summary>What the units do away from their rated head; null where capacity and efficiency are held.</summary>
    public HeadBehaviour? HeadBehaviour { get; init; }

    /// <summary>What the correlations say of a pump as turbine; null where the fall gives no head.</summary>
    public PumpBand? Pump { get; init; }
}
