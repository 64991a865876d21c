namespace HeadToWatts.EnergyYield;

/// <summary>A part of the year with its own head or its own reserved flow, such as a month; the flows are dry outside the part.</summary>
/// <param name="Plant">The plant in that part.</param>
/// <param name="Supply">The flows of that part.</param>
public sealed record YearPart(PlantCurve Plant, FlowSupply Supply);
