using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Turbines.Sizing;

/// <summary>How high a runner under pressure may stand above the tailwater.</summary>
/// <param name="ThomaSigma">Thoma's coefficient below which it cavitates.</param>
/// <param name="AirHeadM">Pressure of the air at the site, m of water.</param>
/// <param name="VapourHeadM">Pressure of water vapour, m of water.</param>
/// <param name="HighestM">Highest position above the tailwater, m; negative when it must lie below.</param>
/// <param name="Uses">The methods used.</param>
public sealed record RunnerSetting(double ThomaSigma, double AirHeadM, double VapourHeadM, double HighestM, IReadOnlyList<MethodUse> Uses)
{
    /// <summary>Depth by which the mouth of a draft tube is usually kept under the lowest tailwater, m (common practice, no source).</summary>
    public const double DraftTubeCoverM = 0.5;

    private static readonly Source Handbook = new("logan-roy-turbomachinery", SourceKind.Published, "E. Logan and R. Roy (editors)", "2003", "Handbook of Turbomachinery", "second edition, Marcel Dekker");

    // Specific speed in rpm, hp, ft against critical sigma.
    private static readonly (double Ns, double Sigma)[] Francis = [(20, 0.025), (40, 0.10), (60, 0.23), (80, 0.40), (100, 0.64)];
    private static readonly (double Ns, double Sigma)[] Kaplan = [(100, 0.43), (150, 0.73), (200, 1.5)];

    /// <summary>Critical coefficient over specific speed.</summary>
    public static Method CriticalSigma { get; } = new(
        "thoma-critical", "Critical cavitation coefficient", "σ_c(N_s)", Handbook, "table 4; straight lines over the logarithms of both",
        [new InputRange("N_s", "specific speed in rpm, hp and ft", "1", 20, 200)]);

    /// <summary>Highest setting.</summary>
    public static Method Highest { get; } = new(
        "thoma-setting", "Highest setting of a runner", "H_s = H_a − H_v − σ_c H", TurbineReferences.DaughertyFranzini, "chapter 16", []);

    /// <summary>Critical coefficient of Francis, or of Kaplan and propeller, runners.</summary>
    /// <param name="flow">How water goes through the runner.</param>
    /// <param name="specificSpeedUsHpFt">Specific speed in rpm, hp and ft, above 0.</param>
    public static double CriticalThomaSigma(RunnerFlow flow, double specificSpeedUsHpFt)
    {
        if (!(specificSpeedUsHpFt > 0) || double.IsInfinity(specificSpeedUsHpFt))
            throw new ArgumentOutOfRangeException(nameof(specificSpeedUsHpFt), specificSpeedUsHpFt, "Must be a positive number.");
        var table = flow == RunnerFlow.Axial ? Kaplan : Francis;
        var i = 1;
        while (i < table.Length - 1 && specificSpeedUsHpFt > table[i].Ns)
            i++;
        var (low, high) = (table[i - 1], table[i]);

        // Beyond the table the last straight line goes on; the use of the method says so by its range.
        var t = Math.Log(specificSpeedUsHpFt / low.Ns) / Math.Log(high.Ns / low.Ns);
        return low.Sigma * Math.Pow(high.Sigma / low.Sigma, t);
    }

    /// <summary>The highest position above the tailwater, m.</summary>
    /// <param name="airHeadM">Pressure of the air, m of water.</param>
    /// <param name="vapourHeadM">Pressure of the vapour, m of water.</param>
    /// <param name="thomaSigma">Critical coefficient.</param>
    /// <param name="netHeadM">Net head, m.</param>
    public static double HighestAboveTailwaterM(double airHeadM, double vapourHeadM, double thomaSigma, double netHeadM) => airHeadM - vapourHeadM - (thomaSigma * netHeadM);

    /// <summary>The setting of a unit.</summary>
    /// <param name="flow">How water goes through the runner.</param>
    /// <param name="specificSpeedKwM">Specific speed of the runner, rpm, kW, m.</param>
    /// <param name="netHeadM">Net head, m.</param>
    /// <param name="airHeadM">Pressure of the air at the site, m of water.</param>
    /// <param name="vapourHeadM">Pressure of the vapour, m of water.</param>
    public static RunnerSetting Of(RunnerFlow flow, double specificSpeedKwM, double netHeadM, double airHeadM, double vapourHeadM)
    {
        var us = SpecificSpeed.UsHpFtFromKwM(specificSpeedKwM);
        var sigma = CriticalThomaSigma(flow, us);
        return new RunnerSetting(sigma, airHeadM, vapourHeadM, HighestAboveTailwaterM(airHeadM, vapourHeadM, sigma, netHeadM), [CriticalSigma.Used(new InputSpan("N_s", us, us)), Highest.Used()]);
    }
}
