namespace HeadToWatts.Hydraulics.Levels;

/// <summary>A water level that may follow the flow or the month.</summary>
public abstract class LevelRule
{
    /// <summary>True when the level changes with the flow.</summary>
    public virtual bool FollowsFlow => false;

    /// <summary>True when the level changes with the month.</summary>
    public virtual bool FollowsMonth => false;

    /// <summary>The level.</summary>
    /// <param name="flowM3PerS">Flow passing the place, m3/s.</param>
    /// <param name="month">Month, 1 to 12.</param>
    /// <returns>Level, m.</returns>
    public abstract double LevelM(double flowM3PerS, int month);

    /// <summary>True when a flow lies outside what the rule was given for; the level is then held at its end.</summary>
    /// <param name="flowM3PerS">Flow, m3/s.</param>
    public virtual bool IsOutside(double flowM3PerS) => false;
}
