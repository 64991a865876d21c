using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Turbines.Sizing;

/// <summary>The drum of a crossflow turbine: the rim at half the tangential speed of a jet that enters at 16 degrees, the length from the thickness of the jet.</summary>
public sealed class CrossflowSizing : RunnerSizing
{
    /// <summary>Speed of the rim over the spouting velocity: 0.98 cos 16° / 2.</summary>
    public const double RimSpeedRatio = 0.471;

    /// <summary>Thickness of the jet over the diameter of the drum.</summary>
    public const double JetThicknessRatio = 0.087;

    private static readonly Source MockmoreMerryfield = Source.Memory("mockmore-merryfield-1949", "C. A. Mockmore and F. Merryfield, 1949, The Banki water turbine, Bulletin 25, Engineering Experiment Station, Oregon State College: D = 862 H^(1/2)/N in inches, feet and rpm; jet 0.087 D thick");

    /// <summary>The method.</summary>
    public static Method Method { get; } = new(
        "crossflow-runner", "Drum of a crossflow turbine", "D = 60 k (2 g H)^{1/2}/(π n), L = Q/(0.087 D C_v (2 g H)^{1/2})", MockmoreMerryfield, "k = 0.471", []);

    /// <inheritdoc/>
    public override RunnerGeometry At(in RunnerDuty duty)
    {
        var diameterM = DiameterM(RimSpeedRatio, duty);
        var lengthM = duty.FlowM3PerS / (JetThicknessRatio * diameterM * JetWheelSizing.JetVelocityCoefficient * duty.SpoutingMPerS);
        var doubts = new List<string>();
        if (lengthM > 4 * diameterM)
            doubts.Add("The drum comes out more than four times as long as it is thick: slower speed, or more units.");
        if (lengthM < 0.2 * diameterM)
            doubts.Add("The drum comes out as a disc: faster speed, or fewer units.");
        return new RunnerGeometry(
            diameterM,
            "drum",
            [new RunnerDimension("length of the drum", lengthM), new RunnerDimension("small cell, one third", lengthM / 3), new RunnerDimension("large cell, two thirds", lengthM * 2 / 3)],
            ["2 cells"],
            doubts,
            Method.Used());
    }
}
