namespace HeadToWatts.FlowRecords.Reserved;

/// <summary>The plant's right to water.</summary>
/// <param name="RateM3PerS">The most it may take, m3/s; null when the right names no rate.</param>
/// <param name="Season">The days on which it may take it.</param>
public sealed record WaterRight(double? RateM3PerS, OperatingSeason Season);
