using HeadToWatts.Basis.Quantities;
using HeadToWatts.Hydraulics.Levels;

namespace HeadToWatts.Studies.Inputs;

/// <summary>The fall: given directly, or as two levels.</summary>
/// <param name="Gross">Gross head.</param>
/// <param name="HeadwaterM">Headwater level, m; when the head was given directly, the gross head above a tailwater at zero.</param>
/// <param name="TailwaterM">Tailwater level, m.</param>
/// <param name="IsFromLevels">True when the levels were given.</param>
public sealed record HeadInput(GrossHead Gross, double HeadwaterM, double TailwaterM, bool IsFromLevels)
{
    /// <summary>Headwater level by flow or month; null when it stays at <see cref="HeadwaterM"/>.</summary>
    public LevelRule? HeadwaterRule { get; init; }

    /// <summary>Tailwater level by flow or month; null when it stays at <see cref="TailwaterM"/>.</summary>
    public LevelRule? TailwaterRule { get; init; }

    /// <summary>The canal with its drop; null when none is given.</summary>
    public CanalInput? Canal { get; init; }

    /// <summary>Error of the measured head, m, one standard error or the author's own bound; zero when none is stated.</summary>
    public double ErrorM { get; init; }

    /// <summary>How the head was measured, in words; empty when it was simply given.</summary>
    public string Measurement { get; init; } = "";

    /// <summary>True when a level moves with the flow or the month.</summary>
    public bool Moves => HeadwaterRule is not null || TailwaterRule is not null;

    /// <summary>True when a level moves with the month.</summary>
    public bool MovesWithMonth => HeadwaterRule is { FollowsMonth: true } || TailwaterRule is { FollowsMonth: true };

    /// <summary>The headwater level as a rule, moving or not.</summary>
    public LevelRule Headwater => HeadwaterRule ?? new ConstantLevel(HeadwaterM);

    /// <summary>The tailwater level as a rule, moving or not.</summary>
    public LevelRule Tailwater => TailwaterRule ?? new ConstantLevel(TailwaterM);
}
