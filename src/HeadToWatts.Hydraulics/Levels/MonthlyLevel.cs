namespace HeadToWatts.Hydraulics.Levels;

/// <summary>A level for each month: a reservoir drawn down through the season, a canal checked up in summer.</summary>
public sealed class MonthlyLevel : LevelRule
{
    private readonly double[] _levelsM;

    /// <summary>Makes the levels.</summary>
    /// <param name="levelsM">Twelve levels, January first, m.</param>
    public MonthlyLevel(IReadOnlyList<double> levelsM)
    {
        ArgumentNullException.ThrowIfNull(levelsM);
        if (levelsM.Count != 12 || levelsM.Any(l => !double.IsFinite(l)))
            throw new ArgumentException("Twelve levels are wanted, January first.", nameof(levelsM));
        _levelsM = [.. levelsM];
    }

    /// <inheritdoc/>
    public override bool FollowsMonth => true;

    /// <inheritdoc/>
    public override double LevelM(double flowM3PerS, int month) => _levelsM[month - 1];
}
