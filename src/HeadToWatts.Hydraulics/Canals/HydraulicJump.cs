using HeadToWatts.Basis.Sources;
using HeadToWatts.Hydraulics.Canals.Sections;

namespace HeadToWatts.Hydraulics.Canals;

/// <summary>Appearance of a jump by the Froude number that enters it (US Bureau of Reclamation).</summary>
public enum JumpKind
{
    /// <summary>Fr 1 to 1.7: standing waves.</summary>
    Undular,

    /// <summary>Fr 1.7 to 2.5: small rollers.</summary>
    Weak,

    /// <summary>Fr 2.5 to 4.5: an unsteady jet that sends waves down the canal.</summary>
    Oscillating,

    /// <summary>Fr 4.5 to 9: the usual aim.</summary>
    Steady,

    /// <summary>Fr above 9: rough.</summary>
    Strong,
}

/// <summary>A hydraulic jump on a level bed.</summary>
/// <param name="EntryDepthM">Fast depth y_1, m.</param>
/// <param name="ConjugateDepthM">Slow depth y_2, m.</param>
/// <param name="EntryFroudeNumber">Fr_1.</param>
/// <param name="EnergyLossM">Energy lost E_1 - E_2, m.</param>
/// <param name="LengthM">Length of the jump, m.</param>
/// <param name="Kind">Its appearance.</param>
/// <param name="Uses">The methods used.</param>
public sealed record JumpResult(
    double EntryDepthM, double ConjugateDepthM, double EntryFroudeNumber, double EnergyLossM, double LengthM, JumpKind Kind, IReadOnlyList<MethodUse> Uses);

/// <summary>The hydraulic jump.</summary>
public static class HydraulicJump
{
    /// <summary>Length of the jump over its slow depth.</summary>
    public const double LengthDepthRatio = 6.1;

    /// <summary>Energy lost.</summary>
    public static readonly Method EnergyLoss = new(
        "jump-energy-loss", "Energy lost in a hydraulic jump", "ΔE = E_1 - E_2", CanalSources.Chow, "ch. 15", []);

    /// <summary>Length of the jump on a plain floor.</summary>
    public static readonly Method Length = new(
        "jump-length", "Length of a hydraulic jump", "L = 6.1 y_2", CanalSources.Peterka, "basins I and IV",
        [new InputRange("Fr_1", "Froude number that enters the jump", "1", 2.5, 20)]);

    /// <summary>The jump of a fast flow; null when its slow depth does not fit the section.</summary>
    /// <param name="section">Shape of the canal.</param>
    /// <param name="entryDepthM">Fast depth y_1, m.</param>
    /// <param name="flowM3PerS">Flow Q, m3/s; above 0.</param>
    /// <param name="gravityMPerS2">Gravity g, m/s2.</param>
    /// <exception cref="ArgumentOutOfRangeException">The flow is not fast at that depth, so that there is no jump.</exception>
    public static JumpResult? Of(CanalSection section, double entryDepthM, double flowM3PerS, double gravityMPerS2)
    {
        var froude = SpecificEnergy.FroudeNumber(section, entryDepthM, flowM3PerS, gravityMPerS2);
        if (froude <= 1)
            throw new ArgumentOutOfRangeException(nameof(entryDepthM), entryDepthM, "A jump needs a fast flow: a Froude number above 1.");
        if (ConjugateDepth.M(section, entryDepthM, flowM3PerS, gravityMPerS2) is not { } conjugateM)
            return null;
        var lossM = section is RectangularSection
            ? Cubed(conjugateM - entryDepthM) / (4 * entryDepthM * conjugateM)
            : SpecificEnergy.M(section, entryDepthM, flowM3PerS, gravityMPerS2) - SpecificEnergy.M(section, conjugateM, flowM3PerS, gravityMPerS2);
        return new JumpResult(
            entryDepthM, conjugateM, froude, lossM, LengthDepthRatio * conjugateM, KindOf(froude),
            [
                (section is RectangularSection ? ConjugateDepth.Rectangular : ConjugateDepth.Momentum).Used(),
                EnergyLoss.Used(),
                Length.Used(new InputSpan("Fr_1", froude, froude)),
            ]);
    }

    /// <summary>Appearance by the Froude number.</summary>
    /// <param name="entryFroudeNumber">Fr_1, above 1.</param>
    public static JumpKind KindOf(double entryFroudeNumber) => entryFroudeNumber switch
    {
        < 1.7 => JumpKind.Undular,
        < 2.5 => JumpKind.Weak,
        < 4.5 => JumpKind.Oscillating,
        <= 9 => JumpKind.Steady,
        _ => JumpKind.Strong,
    };

    private static double Cubed(double x) => x * x * x;
}
