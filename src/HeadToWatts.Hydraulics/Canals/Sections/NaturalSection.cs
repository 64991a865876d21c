using System.Globalization;
using HeadToWatts.Basis.Problems;

namespace HeadToWatts.Hydraulics.Canals.Sections;

/// <summary>A point of a surveyed section.</summary>
/// <param name="StationM">Distance across the canal, m.</param>
/// <param name="ElevationM">Elevation of the ground, m.</param>
public readonly record struct SurveyPoint(double StationM, double ElevationM);

/// <summary>
/// A section surveyed by points, from bank to bank. The water stands at one level over the whole width, also over low ground
/// beside the channel; it may rise to the lower of the two ends, no further.
/// </summary>
public sealed record NaturalSection : CanalSection
{
    private readonly double _bedElevationM;

    private NaturalSection(IReadOnlyList<SurveyPoint> points)
    {
        Points = points;
        _bedElevationM = points.Min(p => p.ElevationM);
        FullDepthM = Math.Min(points[0].ElevationM, points[^1].ElevationM) - _bedElevationM;
    }

    /// <inheritdoc/>
    public override string KindId => "natural";

    /// <summary>The points from bank to bank.</summary>
    public IReadOnlyList<SurveyPoint> Points { get; }

    /// <summary>Elevation of the lowest point, m.</summary>
    public double BedElevationM => _bedElevationM;

    /// <inheritdoc/>
    public override double FullDepthM { get; }

    /// <summary>Makes a section from its points, or lists what is wrong with them.</summary>
    /// <param name="points">At least three points, their stations never falling.</param>
    /// <param name="where">Field or file they come from.</param>
    public static Checked<NaturalSection> FromPoints(IReadOnlyList<SurveyPoint> points, string where)
    {
        ArgumentNullException.ThrowIfNull(points);
        ArgumentNullException.ThrowIfNull(where);
        var problems = new List<Problem>();
        if (points.Count < 3)
            problems.Add(new Problem(where, $"{Text(points.Count)} points", "a surveyed section needs at least three points", "three or more points from bank to bank"));
        for (var i = 0; i < points.Count; i++)
        {
            var (stationM, elevationM) = points[i];
            if (!double.IsFinite(stationM) || !double.IsFinite(elevationM))
                problems.Add(new Problem(At(i), Read(i), "a figure is not a number", "a distance and an elevation"));
            else if (i > 0 && stationM < points[i - 1].StationM)
                problems.Add(new Problem(At(i), Read(i), "the distance is less than that of the point before", "points in order from bank to bank"));
        }

        if (problems.Count == 0)
        {
            var lowest = points.Min(p => p.ElevationM);
            if (points[0].ElevationM <= lowest || points[^1].ElevationM <= lowest)
                problems.Add(new Problem(where, $"ends at {Text(points[0].ElevationM)} and {Text(points[^1].ElevationM)} m", "an end of the section is its lowest point, so that it holds no water", "both ends on the banks, above the bed"));
            else if (points[^1].StationM <= points[0].StationM)
                problems.Add(new Problem(where, $"{Text(points.Count)} points", "the section has no width", "points at different distances"));
        }

        return problems.Count > 0 ? Checked.Refused<NaturalSection>(problems) : Checked.Of(new NaturalSection([.. points]));

        string At(int i) => $"{where} point {Text(i + 1)}";
        string Read(int i) => $"{Text(points[i].StationM)} m, {Text(points[i].ElevationM)} m";
    }

    /// <inheritdoc/>
    public bool Equals(NaturalSection? other) => other is not null && Points.SequenceEqual(other.Points);

    /// <inheritdoc/>
    public override int GetHashCode() => Points.Aggregate(Points.Count, HashCode.Combine);

    /// <inheritdoc/>
    protected override WettedSection Wetted(double depthM)
    {
        double areaM2 = 0, perimeterM = 0, topM = 0, momentM3 = 0;
        for (var i = 1; i < Points.Count; i++)
        {
            var aM = depthM - (Points[i - 1].ElevationM - _bedElevationM);
            var bM = depthM - (Points[i].ElevationM - _bedElevationM);
            if (aM <= 0 && bM <= 0)
                continue;
            var widthM = Points[i].StationM - Points[i - 1].StationM;
            var riseM = Points[i].ElevationM - Points[i - 1].ElevationM;
            // The share of a piece of ground that lies under water.
            var share = aM > 0 && bM > 0 ? 1 : Math.Max(aM, bM) / Math.Abs(aM - bM);
            var (deepM, otherM) = (Math.Max(0, aM), Math.Max(0, bM));
            topM += share * widthM;
            perimeterM += share * Math.Sqrt((widthM * widthM) + (riseM * riseM));
            areaM2 += share * widthM * (deepM + otherM) / 2;
            momentM3 += share * widthM * ((deepM * deepM) + (deepM * otherM) + (otherM * otherM)) / 6;
        }

        return new WettedSection(depthM, areaM2, perimeterM, topM, momentM3);
    }

    private static string Text(double value) => value.ToString("0.###", CultureInfo.InvariantCulture);
}
