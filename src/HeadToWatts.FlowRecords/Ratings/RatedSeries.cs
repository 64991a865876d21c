using HeadToWatts.Basis.Sources;

namespace HeadToWatts.FlowRecords.Ratings;

/// <summary>How many stages fell where.</summary>
/// <param name="Within">Within the rating.</param>
/// <param name="Below">Below it.</param>
/// <param name="Above">Above it.</param>
/// <param name="Submerged">With the water below too high.</param>
/// <param name="Missing">Without a stage.</param>
public sealed record RatingCounts(int Within, int Below, int Above, int Submerged, int Missing)
{
    /// <summary>Stages the rating does not cover.</summary>
    public int Outside => Below + Above + Submerged;

    /// <summary>All stages.</summary>
    public int Total => Within + Outside + Missing;
}

/// <summary>Stages turned to flows.</summary>
/// <param name="FlowsM3PerS">Flow of each stage in their order, m3/s; NaN where none is given.</param>
/// <param name="Counts">How many stages fell where.</param>
/// <param name="FirstOutside">Place in the series of the first stages not covered, ten at most.</param>
/// <param name="Outside">What was done with them.</param>
/// <param name="Uses">The method used.</param>
public sealed record RatedSeries(
    IReadOnlyList<double> FlowsM3PerS, RatingCounts Counts, IReadOnlyList<int> FirstOutside, OutsideRating Outside, IReadOnlyList<MethodUse> Uses)
{
    private const int Examples = 10;

    /// <summary>Reads every stage from a rating. Rate the single readings and take the daily means afterwards: the flow at the mean stage is not the mean flow.</summary>
    /// <param name="stagesM">Stages, m; NaN where missing.</param>
    /// <param name="rating">The rating.</param>
    /// <param name="outside">What is done outside its range.</param>
    public static RatedSeries Of(IReadOnlyList<double> stagesM, StageRating rating, OutsideRating outside = OutsideRating.LeaveOut) =>
        Of(stagesM, rating, outside, _ => 0);

    /// <summary>Daily mean stages to a daily record, with shifts. For a stage that hardly moves within the day.</summary>
    /// <param name="firstDay">Day of the first stage.</param>
    /// <param name="stagesM">Mean stage of each day, m; NaN where missing.</param>
    /// <param name="rating">The rating.</param>
    /// <param name="outside">What is done outside its range.</param>
    /// <param name="shifts">Shifts of the rating.</param>
    /// <param name="description">Station and source.</param>
    public static (DailyRecord Record, RatedSeries Series) OfDays(
        DateOnly firstDay, IReadOnlyList<double> stagesM, StageRating rating, OutsideRating outside, StageShifts shifts, string description)
    {
        ArgumentNullException.ThrowIfNull(rating);
        ArgumentNullException.ThrowIfNull(shifts);
        var series = Of(stagesM, rating, outside, i => shifts.OnM(firstDay.AddDays(i)));
        return (new DailyRecord(firstDay, series.FlowsM3PerS, $"{description}; {rating.Describe()}"), series);
    }

    private static RatedSeries Of(IReadOnlyList<double> stagesM, StageRating rating, OutsideRating outside, Func<int, double> shiftM)
    {
        ArgumentNullException.ThrowIfNull(stagesM);
        ArgumentNullException.ThrowIfNull(rating);
        var flows = new double[stagesM.Count];
        var counts = new int[5];
        var examples = new List<int>();
        double lowestM = double.PositiveInfinity, highestM = double.NegativeInfinity;
        for (var i = 0; i < flows.Length; i++)
        {
            var stageM = stagesM[i] + shiftM(i);
            var rated = rating.At(stageM, outside);
            flows[i] = rated.FlowM3PerS;
            counts[(int)rated.Place]++;
            if (rated.Place is not (RatingPlace.Within or RatingPlace.Missing) && examples.Count < Examples)
                examples.Add(i);
            if (!double.IsNaN(rated.FlowM3PerS))
            {
                lowestM = Math.Min(lowestM, stageM);
                highestM = Math.Max(highestM, stageM);
            }
        }

        return new RatedSeries(
            flows,
            new RatingCounts(counts[(int)RatingPlace.Within], counts[(int)RatingPlace.Below], counts[(int)RatingPlace.Above], counts[(int)RatingPlace.Submerged], counts[(int)RatingPlace.Missing]),
            examples,
            outside,
            highestM >= lowestM ? [rating.Method.Used(new InputSpan("h", lowestM, highestM))] : []);
    }
}
