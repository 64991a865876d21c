using HeadToWatts.Basis.Sources;

namespace HeadToWatts.FlowRecords.OneOff;

/// <summary>A way to measure a flow once.</summary>
/// <param name="Id">Key as study files write it.</param>
/// <param name="Name">Name in the trade.</param>
/// <param name="Readings">What is read.</param>
/// <param name="Method">The method.</param>
public sealed record OneOffKind(string Id, string Name, string Readings, Method Method);

/// <summary>The ways that may be chosen.</summary>
public static class OneOffMethods
{
    /// <summary>All of them.</summary>
    public static IReadOnlyList<OneOffKind> All { get; } =
    [
        new("float", "Float method", "length of the reach, times of the floats, areas of sections, coefficient", FloatMethod.Method),
        new("velocity-area", "Velocity-area", "distance, depth and mean velocity of each vertical", VelocityArea.Method),
        new("bucket", "Bucket and stopwatch", "volume and times", BucketAndStopwatch.Method),
    ];
}
