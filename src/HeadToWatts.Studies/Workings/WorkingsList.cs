using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Workings;

/// <summary>The workings of a study, in the order of the stages.</summary>
public static class WorkingsList
{
    /// <summary>Every working that this study has.</summary>
    /// <param name="result">The study.</param>
    /// <param name="show">Units in which numbers are shown.</param>
    public static IReadOnlyList<Working> For(StudyResult result, UnitDisplay show)
    {
        ArgumentNullException.ThrowIfNull(result);
        ArgumentNullException.ThrowIfNull(show);
        return
        [
            .. FlowWorkings.Of(result, show),
            .. LowFlowWorkings.Of(result, show),
            .. HeadWorkings.Of(result, show),
            .. CanalWorkings.Of(result, show),
            .. WaterwayWorkings.Of(result, show),
            .. StopWorkings.Of(result, show),
            .. TurbineWorkings.Of(result, show),
            .. EnergyWorkings.Of(result, show),
            .. PumpingWorkings.Of(result, show),
            .. MoneyWorkings.Of(result),
        ];
    }

    /// <summary>One working by its key, or null when this study has none.</summary>
    public static Working? Find(StudyResult result, UnitDisplay show, string id) => For(result, show).FirstOrDefault(w => w.Id == id);
}
