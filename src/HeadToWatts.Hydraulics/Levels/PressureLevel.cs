namespace HeadToWatts.Hydraulics.Levels;

/// <summary>
/// The energy grade at a pressure gauge on a pipe, z + p/gamma + alpha V^2/2g, as the level that open water would need to give
/// the same. Upstream it is what the pipe brings; downstream, with the pressure that must remain, what the machine must leave.
/// </summary>
public sealed class PressureLevel : LevelRule
{
    private readonly double _gaugeElevationM;
    private readonly LevelRule _pressureHeadM;
    private readonly double _velocityHeadPerSquare;

    /// <summary>Makes the level.</summary>
    /// <param name="gaugeElevationM">Elevation of the gauge, m.</param>
    /// <param name="pressureHeadM">Pressure head p/gamma at the gauge, m, over flow or month.</param>
    /// <param name="insideDiameterM">Inside diameter of the pipe at the gauge, m; null to leave the velocity head out.</param>
    /// <param name="gravityMPerS2">Gravity, m/s2.</param>
    /// <param name="kineticEnergyCoefficient">alpha.</param>
    public PressureLevel(double gaugeElevationM, LevelRule pressureHeadM, double? insideDiameterM, double gravityMPerS2, double kineticEnergyCoefficient = 1)
    {
        ArgumentNullException.ThrowIfNull(pressureHeadM);
        if (!double.IsFinite(gaugeElevationM))
            throw new ArgumentOutOfRangeException(nameof(gaugeElevationM), gaugeElevationM, "An elevation is a number.");
        if (insideDiameterM is not (null or > 0))
            throw new ArgumentOutOfRangeException(nameof(insideDiameterM), insideDiameterM, "A diameter is above 0.");
        _gaugeElevationM = gaugeElevationM;
        _pressureHeadM = pressureHeadM;
        if (insideDiameterM is { } diameterM)
        {
            var area = Math.PI * diameterM * diameterM / 4;
            _velocityHeadPerSquare = kineticEnergyCoefficient / (2 * gravityMPerS2 * area * area);
        }
    }

    /// <inheritdoc/>
    public override bool FollowsFlow => _pressureHeadM.FollowsFlow || _velocityHeadPerSquare > 0;

    /// <inheritdoc/>
    public override bool FollowsMonth => _pressureHeadM.FollowsMonth;

    /// <inheritdoc/>
    public override double LevelM(double flowM3PerS, int month) =>
        _gaugeElevationM + _pressureHeadM.LevelM(flowM3PerS, month) + (_velocityHeadPerSquare * flowM3PerS * flowM3PerS);

    /// <inheritdoc/>
    public override bool IsOutside(double flowM3PerS) => _pressureHeadM.IsOutside(flowM3PerS);
}
