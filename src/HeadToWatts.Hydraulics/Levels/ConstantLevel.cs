namespace HeadToWatts.Hydraulics.Levels;

/// <summary>A level that stays: a pond held at its operating level, a large lake, a level measured once.</summary>
public sealed class ConstantLevel : LevelRule
{
    private readonly double _levelM;

    /// <summary>Makes the level.</summary>
    /// <param name="levelM">Level, m.</param>
    public ConstantLevel(double levelM)
    {
        if (!double.IsFinite(levelM))
            throw new ArgumentOutOfRangeException(nameof(levelM), levelM, "A level is a number.");
        _levelM = levelM;
    }

    /// <inheritdoc/>
    public override double LevelM(double flowM3PerS, int month) => _levelM;
}
