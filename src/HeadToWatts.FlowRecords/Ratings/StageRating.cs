using HeadToWatts.Basis.Sources;

namespace HeadToWatts.FlowRecords.Ratings;

/// <summary>Where a stage lies against the range of its rating.</summary>
public enum RatingPlace
{
    /// <summary>Within the range.</summary>
    Within,

    /// <summary>Below the lowest stage of the rating.</summary>
    Below,

    /// <summary>Above the highest stage of the rating.</summary>
    Above,

    /// <summary>The water below stands too high for the rating of free flow.</summary>
    Submerged,

    /// <summary>There is no stage.</summary>
    Missing,
}

/// <summary>What is done with a stage the rating does not cover. It is counted in every case.</summary>
public enum OutsideRating
{
    /// <summary>No flow is given: the day or moment counts as missing.</summary>
    LeaveOut,

    /// <summary>The flow at the nearest end of the rating is given.</summary>
    HoldEnd,

    /// <summary>The formula, or the last piece of the table, is carried on.</summary>
    Extend,
}

/// <summary>A flow read from a rating.</summary>
/// <param name="FlowM3PerS">Flow, m3/s; NaN when none is given.</param>
/// <param name="Place">Where the stage lies.</param>
public readonly record struct RatedFlow(double FlowM3PerS, RatingPlace Place);

/// <summary>Flow against stage, with the range over which it was measured or is published.</summary>
public abstract class StageRating
{
    /// <summary>The method with its source.</summary>
    public abstract Method Method { get; }

    /// <summary>Lowest stage of the range, m.</summary>
    public abstract double LowestStageM { get; }

    /// <summary>Highest stage of the range, m; positive infinity when none is stated.</summary>
    public abstract double HighestStageM { get; }

    /// <summary>The rating in words, for the record's description.</summary>
    public abstract string Describe();

    /// <summary>The flow at a stage.</summary>
    /// <param name="stageM">Stage, m; NaN where it is missing.</param>
    /// <param name="outside">What is done outside the range.</param>
    /// <exception cref="ArgumentOutOfRangeException">The stage is infinite.</exception>
    public RatedFlow At(double stageM, OutsideRating outside = OutsideRating.LeaveOut)
    {
        if (double.IsInfinity(stageM))
            throw new ArgumentOutOfRangeException(nameof(stageM), stageM, "A stage is a number, or missing.");
        if (double.IsNaN(stageM))
            return new RatedFlow(double.NaN, RatingPlace.Missing);
        var flag = stageM < LowestStageM ? RatingPlace.Below : stageM > HighestStageM ? RatingPlace.Above : RatingPlace.Within;
        return (flag, outside) switch
        {
            (RatingPlace.Within, _) or (_, OutsideRating.Extend) => new RatedFlow(FlowAt(stageM), flag),
            (_, OutsideRating.HoldEnd) => new RatedFlow(FlowAt(Math.Clamp(stageM, LowestStageM, HighestStageM)), flag),
            _ => new RatedFlow(double.NaN, flag),
        };
    }

    /// <summary>The formula or table at any stage, carried on beyond its range.</summary>
    /// <param name="stageM">Stage, m.</param>
    protected abstract double FlowAt(double stageM);
}
