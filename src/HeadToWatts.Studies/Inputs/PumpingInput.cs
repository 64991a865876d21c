using HeadToWatts.Pumping;

namespace HeadToWatts.Studies.Inputs;

/// <summary>A pumping plant of the study.</summary>
/// <param name="Plant">The plant.</param>
/// <param name="SuctionLiftM">Height of the pump over its water, m; null when not given.</param>
/// <param name="SuctionLossM">Head lost in its suction pipe, m.</param>
/// <param name="RequiredSuctionM">Suction head the maker requires, m; null when not given.</param>
public sealed record PumpingPlantInput(PumpingPlant Plant, double? SuctionLiftM, double SuctionLossM, double? RequiredSuctionM);

/// <summary>The pumping that the generation is set against.</summary>
/// <param name="Plants">The plants, one or more.</param>
public sealed record PumpingInput(IReadOnlyList<PumpingPlantInput> Plants);
