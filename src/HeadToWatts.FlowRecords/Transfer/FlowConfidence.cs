using HeadToWatts.Basis.Sources;

namespace HeadToWatts.FlowRecords.Transfer;

/// <summary>How far the flow of a study may be relied on.</summary>
public enum FlowConfidence
{
    /// <summary>Measured at the site over ten years or more.</summary>
    High,

    /// <summary>Measured for less long, or extended from a neighbour that moves with it.</summary>
    Fair,

    /// <summary>Carried over from another place without days in common, or from averages.</summary>
    Low,

    /// <summary>A plan or single measurements: no record of what came.</summary>
    Plan,
}

/// <summary>A record made for a site that has none of its own, or too short a one.</summary>
/// <param name="Record">The record at the site.</param>
/// <param name="Confidence">How far it may be relied on.</param>
/// <param name="Reason">Why, in a sentence.</param>
/// <param name="Notes">What was done and counted.</param>
/// <param name="Uses">The methods used.</param>
public sealed record TransferredRecord(DailyRecord Record, FlowConfidence Confidence, string Reason, IReadOnlyList<string> Notes, IReadOnlyList<MethodUse> Uses);
