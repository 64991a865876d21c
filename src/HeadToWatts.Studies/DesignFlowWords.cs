using HeadToWatts.Basis.Units;
using HeadToWatts.EnergyYield;

namespace HeadToWatts.Studies;

/// <summary>Says why a design flow is suggested.</summary>
public static class DesignFlowWords
{
    /// <summary>The reason in one sentence.</summary>
    /// <param name="result">The study.</param>
    /// <param name="show">Units in which numbers are shown.</param>
    public static string Reason(StudyResult result, UnitDisplay show)
    {
        ArgumentNullException.ThrowIfNull(result);
        ArgumentNullException.ThrowIfNull(show);
        var scan = result.Flow.Scan;
        var flow = show.Flow(scan.SuggestedM3PerS);
        return scan.Reason switch
        {
            DesignFlowReason.LastKwWorksEnough => $"{flow} is the largest size whose last added kilowatt still works at least 2 628 h a year (30 %); beyond it, more machine stands idle more of the time",
            DesignFlowReason.PipeLimits => $"at {flow} the power is near its highest for this waterway; beyond it losses grow faster than the flow",
            DesignFlowReason.LargestScanned => $"even {flow}, exceeded 2 % of the year, would work at least 2 628 h a year (30 %)",
            DesignFlowReason.MostEnergy => $"no size works 30 % of the year; {flow} gives the most energy",
            _ => "there is no usable flow",
        };
    }
}
