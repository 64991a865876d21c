using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Turbines.Sizing;

/// <summary>A runner under pressure: the speed of its rim over the spouting velocity rises in a straight line with the specific speed.</summary>
/// <param name="constant">Rim speed over spouting velocity at n_{QE} = 0.</param>
/// <param name="slope">Its rise with n_{QE}.</param>
/// <param name="diameterName">Which diameter it gives.</param>
/// <param name="lowest">Least n_{QE} for which it was stated.</param>
/// <param name="highest">Greatest n_{QE} for which it was stated.</param>
public sealed class ReactionSizing(double constant, double slope, string diameterName, double lowest, double highest) : RunnerSizing
{
    private static readonly Source Esha = Source.Memory("esha-runner-diameter", "European guide on small hydropower (ESHA 2004), section 6.2.3: runner diameters of Francis and Kaplan turbines after de Siervo and de Leva, and Schweiger and Gregory");

    /// <summary>The method.</summary>
    public static Method Method { get; } = new(
        "reaction-runner", "Runner of a Francis, Kaplan or propeller turbine", "D = 60 (a + b n_{QE})(2 g H)^{1/2}/(π n)", Esha, "a = 0.31, b = 2.488 (Francis, outlet); a = 0.79, b = 1.602 (Kaplan, propeller)",
        [new InputRange("n_{QE}", "specific speed", "1", 0.05, 1.6)]);

    /// <summary>Francis: diameter at the outlet.</summary>
    public static ReactionSizing Francis { get; } = new(0.31, 2.488, "runner, at its outlet", 0.05, 0.33);

    /// <summary>Kaplan and propeller: outside diameter.</summary>
    public static ReactionSizing Kaplan { get; } = new(0.79, 1.602, "runner, outside", 0.19, 1.6);

    /// <inheritdoc/>
    public override RunnerGeometry At(in RunnerDuty duty)
    {
        var specific = duty.SpecificSpeedDimensionless;
        var diameterM = DiameterM(constant + (slope * specific), duty);
        return new RunnerGeometry(
            diameterM,
            diameterName,
            [],
            [],
            specific < lowest || specific > highest ? ["The specific speed lies outside the machines that the rule for the diameter was drawn from."] : [],
            Method.Used(new InputSpan("n_{QE}", specific, specific)));
    }
}
