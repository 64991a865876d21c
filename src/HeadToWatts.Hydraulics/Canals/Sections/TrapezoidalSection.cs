namespace HeadToWatts.Hydraulics.Canals.Sections;

/// <summary>A trapezoidal canal; triangular when its bed has no width.</summary>
public sealed record TrapezoidalSection : CanalSection
{
    private readonly double _sideLengthRatio;

    /// <summary>A trapezoidal canal.</summary>
    /// <param name="bedWidthM">Bed width b, m; 0 or more.</param>
    /// <param name="sideSlopeRatio">Side slope m, horizontal for one vertical; 0 or more.</param>
    /// <exception cref="ArgumentOutOfRangeException">A measure is negative or not a number, or both are 0.</exception>
    public TrapezoidalSection(double bedWidthM, double sideSlopeRatio)
    {
        BedWidthM = Require(bedWidthM, 0, mayEqual: true, nameof(bedWidthM), "The bed width is 0 or more.");
        SideSlopeRatio = Require(sideSlopeRatio, 0, mayEqual: true, nameof(sideSlopeRatio), "The side slope is 0 or more.");
        if (bedWidthM + sideSlopeRatio == 0)
            throw new ArgumentOutOfRangeException(nameof(bedWidthM), bedWidthM, "A canal with upright sides needs a bed width.");
        _sideLengthRatio = Math.Sqrt(1 + (sideSlopeRatio * sideSlopeRatio));
    }

    /// <inheritdoc/>
    public override string KindId => "trapezoidal";

    /// <summary>Bed width b, m.</summary>
    public double BedWidthM { get; }

    /// <summary>Side slope m, horizontal for one vertical.</summary>
    public double SideSlopeRatio { get; }

    /// <inheritdoc/>
    protected override WettedSection Wetted(double depthM) => new(
        depthM,
        (BedWidthM + (SideSlopeRatio * depthM)) * depthM,
        BedWidthM + (2 * depthM * _sideLengthRatio),
        BedWidthM + (2 * SideSlopeRatio * depthM),
        depthM * depthM * ((BedWidthM / 2) + (SideSlopeRatio * depthM / 3)));
}
