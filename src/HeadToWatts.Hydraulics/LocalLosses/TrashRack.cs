using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.LocalLosses;

/// <summary>
/// Clean trash rack after Kirschmer: h = β (t/b)^(4/3) (V_0^2/2g) sin α, for water that meets the rack squarely.
/// V_0 is the approach velocity on the gross area, not the pipe velocity.
/// </summary>
public static class TrashRack
{
    /// <summary>Bar-shape factor β of sharp rectangular bars.</summary>
    public const double SharpRectangularBarCoefficient = 2.42;

    /// <summary>Bar-shape factor β of round bars.</summary>
    public const double RoundBarCoefficient = 1.79;

    /// <summary>The method.</summary>
    public static readonly Method Method = new(
        "kirschmer-trash-rack", "Trash rack, Kirschmer", "h_r = β (t/b)^{4/3} (V_0^2/2g) sin α", LocalLossSources.Kirschmer, "",
        [new InputRange("t/b", "bar thickness over clear spacing", "1", 0, 1), new InputRange("α", "rack to the horizontal", "rad", 0, Math.PI / 2)]);

    /// <summary>Head lost at the clean rack, m.</summary>
    /// <param name="barShapeCoefficient">β.</param>
    /// <param name="barThicknessM">Bar thickness t, m.</param>
    /// <param name="clearSpacingM">Clear spacing b, m.</param>
    /// <param name="inclinationRad">Rack to the horizontal α, rad; above 0, at most π/2.</param>
    /// <param name="approachVelocityMPerS">Approach velocity V_0, m/s.</param>
    /// <param name="gravityMPerS2">Acceleration of gravity, m/s2.</param>
    /// <exception cref="ArgumentOutOfRangeException">A length not above 0, an angle outside its limits, or not a number.</exception>
    public static double LossM(
        double barShapeCoefficient,
        double barThicknessM,
        double clearSpacingM,
        double inclinationRad,
        double approachVelocityMPerS,
        double gravityMPerS2)
    {
        if (barThicknessM is not (> 0 and < double.PositiveInfinity))
            throw new ArgumentOutOfRangeException(nameof(barThicknessM), barThicknessM, "The bar thickness is above 0.");
        if (clearSpacingM is not (> 0 and < double.PositiveInfinity))
            throw new ArgumentOutOfRangeException(nameof(clearSpacingM), clearSpacingM, "The clear spacing is above 0.");
        if (inclinationRad is not (> 0 and <= Math.PI / 2))
            throw new ArgumentOutOfRangeException(nameof(inclinationRad), inclinationRad, "The rack stands between 0 and 90 degrees.");
        return barShapeCoefficient * Math.Pow(barThicknessM / clearSpacingM, 4.0 / 3) * Math.Sin(inclinationRad)
            * approachVelocityMPerS * approachVelocityMPerS / (2 * gravityMPerS2);
    }
}
