namespace HeadToWatts.Hydraulics.Levels;

/// <summary>The level above a weir crest over which the whole flow passes: z = z_crest + (Q/(C L))^(2/3).</summary>
public sealed class WeirCrestLevel : LevelRule
{
    private readonly double _crestM;
    private readonly double _lengthM;
    private readonly double _coefficient;

    /// <summary>Makes the level.</summary>
    /// <param name="crestM">Crest elevation, m.</param>
    /// <param name="lengthM">Crest length, m; above 0.</param>
    /// <param name="coefficient">C in Q = C L h^(3/2), SI: about 1.84 for a sharp crest, 1.6 to 1.7 for a broad one.</param>
    public WeirCrestLevel(double crestM, double lengthM, double coefficient)
    {
        if (!double.IsFinite(crestM))
            throw new ArgumentOutOfRangeException(nameof(crestM), crestM, "A level is a number.");
        if (lengthM is not (> 0 and < 10_000))
            throw new ArgumentOutOfRangeException(nameof(lengthM), lengthM, "A crest has a length.");
        if (coefficient is not (>= 1 and <= 2.5))
            throw new ArgumentOutOfRangeException(nameof(coefficient), coefficient, "A weir coefficient lies between 1 and 2.5 in SI.");
        (_crestM, _lengthM, _coefficient) = (crestM, lengthM, coefficient);
    }

    /// <inheritdoc/>
    public override bool FollowsFlow => true;

    /// <inheritdoc/>
    public override double LevelM(double flowM3PerS, int month) =>
        _crestM + Math.Pow(Math.Max(flowM3PerS, 0) / (_coefficient * _lengthM), 2.0 / 3.0);
}
