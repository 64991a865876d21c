namespace HeadToWatts.Hydraulics.Canals.Sections;

/// <summary>A circular pipe that runs part full.</summary>
public sealed record CircularSection : CanalSection
{
    /// <summary>A circular pipe.</summary>
    /// <param name="diameterM">Inside diameter, m; above 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">The diameter is not above 0 or not a number.</exception>
    public CircularSection(double diameterM) =>
        DiameterM = Require(diameterM, 0, mayEqual: false, nameof(diameterM), "A diameter is above 0.");

    /// <inheritdoc/>
    public override string KindId => "circular";

    /// <summary>Inside diameter, m.</summary>
    public double DiameterM { get; }

    /// <inheritdoc/>
    public override double FullDepthM => DiameterM;

    /// <inheritdoc/>
    protected override WettedSection Wetted(double depthM)
    {
        var radiusM = DiameterM / 2;
        var ratio = depthM / DiameterM;
        // Half the angle of the wetted arc; by the sine of its half, which loses no digits in a thin film or near the crown.
        var halfRad = 2 * Math.Asin(Math.Sqrt(ratio));
        var topM = 2 * Math.Sqrt(Math.Max(0, depthM * (DiameterM - depthM)));
        var areaM2 = radiusM * radiusM * HalfAngleLessSine(2 * halfRad);
        // The first moment about the centre is T^3/12 below it; the surface lies y - r above the centre.
        var firstMomentM3 = (areaM2 * (depthM - radiusM)) + (topM * topM * topM / 12);
        return new WettedSection(depthM, areaM2, DiameterM * halfRad, topM, Math.Max(0, firstMomentM3));
    }

    // (a - sin a)/2, by its series where the difference would cancel.
    private static double HalfAngleLessSine(double angleRad)
    {
        if (angleRad > 0.2)
            return (angleRad - Math.Sin(angleRad)) / 2;
        var square = angleRad * angleRad;
        return angleRad * square / 12 * (1 - (square / 20 * (1 - (square / 42 * (1 - (square / 72))))));
    }
}
