using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Turbines.Sizing;

/// <summary>What one unit has to do at full flow.</summary>
/// <param name="FlowM3PerS">Full flow of the unit, m3/s.</param>
/// <param name="NetHeadM">Net head, m.</param>
/// <param name="SpeedRpm">Speed of the runner, rpm.</param>
/// <param name="Jets">Number of jets; 1 for machines without.</param>
/// <param name="GravityMPerS2">Acceleration of gravity, m/s2.</param>
public readonly record struct RunnerDuty(double FlowM3PerS, double NetHeadM, double SpeedRpm, int Jets, double GravityMPerS2)
{
    /// <summary>Velocity of a free jet under the net head without loss, m/s: (2 g H)^{1/2}.</summary>
    public double SpoutingMPerS => Math.Sqrt(2 * GravityMPerS2 * NetHeadM);

    /// <summary>Specific speed without dimension, n_{QE}.</summary>
    public double SpecificSpeedDimensionless => SpecificSpeed.Dimensionless(SpeedRpm, FlowM3PerS, GravityMPerS2 * NetHeadM);
}

/// <summary>A length of a runner or of what belongs to it.</summary>
/// <param name="Name">What it is.</param>
/// <param name="LengthM">Length, m.</param>
public readonly record struct RunnerDimension(string Name, double LengthM);

/// <summary>The size of a runner: enough to see whether such a thing is built, not to build it from.</summary>
/// <param name="DiameterM">Diameter, m.</param>
/// <param name="DiameterName">Which diameter it is.</param>
/// <param name="Others">Further lengths.</param>
/// <param name="Parts">Numbers of parts, in words, as "2 jets"; may be empty.</param>
/// <param name="Doubts">What makes the size unusual, one sentence each.</param>
/// <param name="Use">The method used.</param>
public sealed record RunnerGeometry(double DiameterM, string DiameterName, IReadOnlyList<RunnerDimension> Others, IReadOnlyList<string> Parts, IReadOnlyList<string> Doubts, MethodUse Use);

/// <summary>A rule that gives the size of a type's runner from its duty.</summary>
public abstract class RunnerSizing
{
    /// <summary>The size for a duty.</summary>
    /// <param name="duty">What one unit has to do.</param>
    public abstract RunnerGeometry At(in RunnerDuty duty);

    /// <summary>Diameter at which the rim runs at a share of the spouting velocity, m: D = 60 k (2 g H)^{1/2}/(π n).</summary>
    /// <param name="rimSpeedRatio">k, speed of the rim over the spouting velocity.</param>
    /// <param name="duty">What one unit has to do.</param>
    public static double DiameterM(double rimSpeedRatio, in RunnerDuty duty) => 60 * rimSpeedRatio * duty.SpoutingMPerS / (Math.PI * duty.SpeedRpm);
}
