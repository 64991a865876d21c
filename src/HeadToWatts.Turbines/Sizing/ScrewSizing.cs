using HeadToWatts.Basis.Sources;
using HeadToWatts.Turbines.Screw;

namespace HeadToWatts.Turbines.Sizing;

/// <summary>An Archimedes screw of three flights laid at 22 degrees, with the proportions that carry most water in a turn.</summary>
public sealed class ScrewSizing : RunnerSizing
{
    /// <summary>Inner over outer diameter that carries most water, three flights.</summary>
    public const double RadiusRatio = 0.5357;

    /// <summary>Pitch over 2πR/tan θ that carries most water, three flights.</summary>
    public const double PitchRatio = 0.2217;

    /// <summary>Slope of the screw's axis, rad: 22 degrees.</summary>
    public const double SlopeRad = 22 * Math.PI / 180;

    private static readonly Source Rorres = Source.Memory("rorres-2000-proportions", "C. Rorres, 2000, The turn of the screw: optimal design of an Archimedes screw, Journal of Hydraulic Engineering 126(1): best proportions for three flights");

    /// <summary>The method.</summary>
    public static Method Method { get; } = new(
        "screw-proportions", "Proportions of an Archimedes screw", "R_i = 0.536 R, Λ = 0.222 × 2 π R/tan θ, L = H/sin θ", Rorres, "three flights; θ = 22° is common practice", []);

    /// <inheritdoc/>
    public override RunnerGeometry At(in RunnerDuty duty)
    {
        var diameterM = ScrewSpeed.DiameterCoefficient * Math.Pow(duty.FlowM3PerS, 3.0 / 7);
        var doubts = new List<string>();
        if (diameterM > 5)
            doubts.Add("Screws of more than 5 m are not usual; several beside each other are.");
        var lengthM = duty.NetHeadM / Math.Sin(SlopeRad);
        if (lengthM > 25)
            doubts.Add("A screw this long sags between its bearings; two in a row are usual.");
        return new RunnerGeometry(
            diameterM,
            "screw, outside",
            [new RunnerDimension("core", diameterM * RadiusRatio), new RunnerDimension("pitch", PitchRatio * Math.PI * diameterM / Math.Tan(SlopeRad)), new RunnerDimension("length along the axis", lengthM)],
            ["3 flights"],
            doubts,
            Method.Used());
    }
}
