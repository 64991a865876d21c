namespace HeadToWatts.Hydraulics.Canals;

/// <summary>The shape of a canal across the flow.</summary>
public abstract record CanalSection
{
    /// <summary>Key of the shape, as study files write it.</summary>
    public abstract string KindId { get; }

    /// <summary>Depth at which the section is full, m: a pipe's diameter, the lower bank of a surveyed section; infinite for walls drawn on upwards.</summary>
    public virtual double FullDepthM => double.PositiveInfinity;

    /// <summary>The water at a depth.</summary>
    /// <param name="depthM">Depth above the lowest point, m; 0 to <see cref="FullDepthM"/>.</param>
    /// <exception cref="ArgumentOutOfRangeException">The depth is negative, above the full depth, infinite or not a number.</exception>
    public WettedSection At(double depthM)
    {
        if (!(depthM >= 0 && depthM <= FullDepthM) || double.IsInfinity(depthM))
            throw new ArgumentOutOfRangeException(nameof(depthM), depthM, "The depth lies between 0 and the depth at which the section is full.");
        return depthM == 0 ? default : Wetted(depthM);
    }

    /// <summary>The water at a depth that was checked and is above 0.</summary>
    /// <param name="depthM">Depth, m.</param>
    protected abstract WettedSection Wetted(double depthM);

    /// <summary>Refuses a measure that is not finite, or below its least value.</summary>
    internal static double Require(double figure, double least, bool mayEqual, string name, string why) =>
        double.IsFinite(figure) && (mayEqual ? figure >= least : figure > least)
            ? figure
            : throw new ArgumentOutOfRangeException(name, figure, why);
}
