using HeadToWatts.Basis.Sources;
using HeadToWatts.FlowRecords.Transfer;

namespace HeadToWatts.Studies.Inputs;

/// <summary>How the flow came about where it was not measured at the site from the first day to the last.</summary>
/// <param name="Confidence">How far it may be relied on.</param>
/// <param name="Reason">Why, as part of a sentence.</param>
/// <param name="Notes">What was done and counted.</param>
/// <param name="Uses">The methods used.</param>
public sealed record FlowOrigin(FlowConfidence Confidence, string Reason, IReadOnlyList<string> Notes, IReadOnlyList<MethodUse> Uses)
{
    /// <summary>The confidence in a word or two.</summary>
    public string Grade => Confidence switch
    {
        FlowConfidence.High => "measured at the site",
        FlowConfidence.Fair => "fair",
        FlowConfidence.Low => "low",
        _ => "no record",
    };

    /// <summary>The origin of a record made for the site.</summary>
    /// <param name="made">The record.</param>
    public static FlowOrigin Of(TransferredRecord made)
    {
        ArgumentNullException.ThrowIfNull(made);
        return new FlowOrigin(made.Confidence, made.Reason, made.Notes, made.Uses);
    }
}
