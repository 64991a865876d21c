using HeadToWatts.Basis.Quantities;

namespace HeadToWatts.Studies.Inputs;

/// <summary>The fall: given directly, or as two levels.</summary>
/// <param name="Gross">Gross head.</param>
/// <param name="HeadwaterM">Headwater level, m; when the head was given directly, the gross head above a tailwater at zero.</param>
/// <param name="TailwaterM">Tailwater level, m.</param>
/// <param name="IsFromLevels">True when the levels were given.</param>
public sealed record HeadInput(GrossHead Gross, double HeadwaterM, double TailwaterM, bool IsFromLevels);
