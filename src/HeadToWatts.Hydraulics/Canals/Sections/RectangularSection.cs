namespace HeadToWatts.Hydraulics.Canals.Sections;

/// <summary>A rectangular canal.</summary>
public sealed record RectangularSection : CanalSection
{
    /// <summary>A rectangular canal.</summary>
    /// <param name="widthM">Width b, m; above 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">The width is not above 0 or not a number.</exception>
    public RectangularSection(double widthM) =>
        WidthM = Require(widthM, 0, mayEqual: false, nameof(widthM), "The width of a canal is above 0.");

    /// <inheritdoc/>
    public override string KindId => "rectangular";

    /// <summary>Width b, m.</summary>
    public double WidthM { get; }

    /// <inheritdoc/>
    protected override WettedSection Wetted(double depthM) =>
        new(depthM, WidthM * depthM, WidthM + (2 * depthM), WidthM, WidthM * depthM * depthM / 2);
}
