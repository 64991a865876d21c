namespace HeadToWatts.Hydraulics.Levels;

/// <summary>A point of a level rating.</summary>
/// <param name="FlowM3PerS">Flow, m3/s.</param>
/// <param name="LevelM">Level at that flow, m.</param>
public readonly record struct LevelPoint(double FlowM3PerS, double LevelM);

/// <summary>
/// A level read from measured pairs of flow and level, straight between them. Outside the measured flows the level is held at
/// the nearest pair and <see cref="IsOutside"/> says so: nothing is extrapolated.
/// </summary>
public sealed class RatedLevel : LevelRule
{
    private readonly double[] _flows;
    private readonly double[] _levels;

    /// <summary>Makes the rating.</summary>
    /// <param name="points">At least two points with rising flows; a headwater or a pressure may fall with the flow, a tailwater does not.</param>
    public RatedLevel(IReadOnlyList<LevelPoint> points)
    {
        ArgumentNullException.ThrowIfNull(points);
        if (points.Count < 2)
            throw new ArgumentException("A rating needs at least two points.", nameof(points));
        for (var i = 0; i < points.Count; i++)
        {
            if (!double.IsFinite(points[i].FlowM3PerS) || !double.IsFinite(points[i].LevelM) || points[i].FlowM3PerS < 0)
                throw new ArgumentException("Flows and levels are numbers, flows not below zero.", nameof(points));
            if (i > 0 && points[i].FlowM3PerS <= points[i - 1].FlowM3PerS)
                throw new ArgumentException("Flows rise from point to point.", nameof(points));
        }

        _flows = [.. points.Select(p => p.FlowM3PerS)];
        _levels = [.. points.Select(p => p.LevelM)];
    }

    /// <summary>The points.</summary>
    public IReadOnlyList<LevelPoint> Points => [.. _flows.Zip(_levels, (q, l) => new LevelPoint(q, l))];

    /// <inheritdoc/>
    public override bool FollowsFlow => true;

    /// <inheritdoc/>
    public override double LevelM(double flowM3PerS, int month)
    {
        if (flowM3PerS <= _flows[0])
            return _levels[0];
        if (flowM3PerS >= _flows[^1])
            return _levels[^1];
        var i = Array.BinarySearch(_flows, flowM3PerS);
        if (i >= 0)
            return _levels[i];
        i = ~i;
        return _levels[i - 1] + ((flowM3PerS - _flows[i - 1]) / (_flows[i] - _flows[i - 1]) * (_levels[i] - _levels[i - 1]));
    }

    /// <inheritdoc/>
    public override bool IsOutside(double flowM3PerS) => flowM3PerS < _flows[0] || flowM3PerS > _flows[^1];
}
