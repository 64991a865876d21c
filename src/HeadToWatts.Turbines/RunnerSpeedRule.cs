using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Turbines;

/// <summary>Size and speed of a slow runner.</summary>
/// <param name="DiameterM">Outside diameter, m.</param>
/// <param name="SpeedRpm">Speed, rpm.</param>
public readonly record struct RunnerSize(double DiameterM, double SpeedRpm);

/// <summary>A rule that sets diameter and speed of a slow machine from its flow and head.</summary>
public abstract class RunnerSpeedRule
{
    /// <summary>The method behind the speed; its input is the diameter D in m.</summary>
    public abstract Method Method { get; }

    /// <summary>Diameter and speed of one unit of this full flow (m3/s) at this net head (m).</summary>
    public abstract RunnerSize At(double unitFlowM3PerS, double netHeadM);
}
