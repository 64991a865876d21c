namespace HeadToWatts.Economics.CostCorrelations;

/// <summary>Every cost correlation.</summary>
public static class CostCorrelationList
{
    /// <summary>The correlations, those of the machine first.</summary>
    public static IReadOnlyList<CostCorrelation> All { get; } = [GordonPenman.Machine, Aggidis.Machine, Aggidis.LowHead, Aggidis.HighHead, Hall.Dam, Hall.Undeveloped, OConnor.NewStream];
}
