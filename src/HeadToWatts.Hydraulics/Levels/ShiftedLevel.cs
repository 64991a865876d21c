namespace HeadToWatts.Hydraulics.Levels;

/// <summary>A level moved up or down by a constant: an error of measurement carried through.</summary>
/// <param name="level">The level.</param>
/// <param name="shiftM">Added to it, m.</param>
public sealed class ShiftedLevel(LevelRule level, double shiftM) : LevelRule
{
    /// <inheritdoc/>
    public override bool FollowsFlow => level.FollowsFlow;

    /// <inheritdoc/>
    public override bool FollowsMonth => level.FollowsMonth;

    /// <inheritdoc/>
    public override double LevelM(double flowM3PerS, int month) => level.LevelM(flowM3PerS, month) + shiftM;

    /// <inheritdoc/>
    public override bool IsOutside(double flowM3PerS) => level.IsOutside(flowM3PerS);
}
