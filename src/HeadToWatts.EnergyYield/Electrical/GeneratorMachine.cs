namespace HeadToWatts.EnergyYield.Electrical;

/// <summary>How a generator is excited.</summary>
public enum GeneratorKind
{
    /// <summary>With its own excitation: it can supply reactive power and run apart from the grid.</summary>
    Synchronous,

    /// <summary>Excited by the grid: it draws reactive power and stops with the grid.</summary>
    Induction,
}

/// <summary>A generator as it is chosen; each unit has one.</summary>
/// <param name="Kind">Synchronous or induction.</param>
/// <param name="RatedPowerKw">Rated output of one generator, kW; null to size it to the unit.</param>
/// <param name="FullLoadEfficiency">Efficiency at rated output, 0 to 1; null for the usual one of its size.</param>
public sealed record GeneratorMachine(GeneratorKind Kind, double? RatedPowerKw, double? FullLoadEfficiency)
{
    /// <summary>Share of the full-load losses that is there at any load (iron, friction, fan, excitation).</summary>
    public const double ConstantLossShare = 0.45;

    // Output kW and efficiency at it. Synchronous: ESHA 2004 table 6.8, from memory. Induction: motors of four poles, CSA C390.
    private static readonly (double Kw, double Efficiency)[] Synchronous = [(10, 0.91), (50, 0.94), (100, 0.95), (250, 0.955), (500, 0.96), (1000, 0.97)];
    private static readonly (double Kw, double Efficiency)[] Induction = [(3.73, 0.875), (7.46, 0.895), (37.3, 0.93), (74.6, 0.945), (149, 0.95)];

    /// <summary>Usual power factor at the terminals when none is given.</summary>
    /// <param name="kind">Kind of generator; null when it is not known.</param>
    public static double UsualPowerFactor(GeneratorKind? kind) => kind == GeneratorKind.Induction ? 0.85 : 0.95;

    /// <summary>Usual efficiency at rated output, 0 to 1; held at the ends of the table.</summary>
    /// <param name="kind">Kind of generator.</param>
    /// <param name="ratedPowerKw">Rated output, kW, above 0.</param>
    public static double UsualEfficiency(GeneratorKind kind, double ratedPowerKw)
    {
        if (!(ratedPowerKw > 0))
            throw new ArgumentOutOfRangeException(nameof(ratedPowerKw), ratedPowerKw, "A rated power is a positive number.");
        var table = kind == GeneratorKind.Induction ? Induction : Synchronous;
        if (ratedPowerKw <= table[0].Kw)
            return table[0].Efficiency;
        for (var i = 1; i < table.Length; i++)
        {
            var (low, high) = (table[i - 1], table[i]);
            if (ratedPowerKw <= high.Kw)
                return low.Efficiency + (Math.Log(ratedPowerKw / low.Kw) / Math.Log(high.Kw / low.Kw) * (high.Efficiency - low.Efficiency));
        }

        return table[^1].Efficiency;
    }

    /// <summary>The generator sized for a unit.</summary>
    /// <param name="drivenKw">Power at its shaft with the unit at its best, kW.</param>
    internal RatedGenerator Rate(double drivenKw)
    {
        var ratedKw = RatedPowerKw ?? SizeTo(drivenKw);
        return new RatedGenerator(ratedKw, FullLoadEfficiency ?? UsualEfficiency(Kind, ratedKw));
    }

    // The rated output is the shaft's power less the losses at that output; the efficiency hardly moves with size, so this settles at once.
    private double SizeTo(double drivenKw)
    {
        var kw = Math.Max(drivenKw, 1e-6);
        for (var i = 0; i < 4; i++)
            kw = Math.Max(drivenKw, 1e-6) * (FullLoadEfficiency ?? UsualEfficiency(Kind, kw));
        return kw;
    }
}

/// <summary>A generator with its figures settled.</summary>
/// <param name="RatedPowerKw">Rated output, kW.</param>
/// <param name="FullLoadEfficiency">Efficiency at rated output, 0 to 1.</param>
public readonly record struct RatedGenerator(double RatedPowerKw, double FullLoadEfficiency)
{
    /// <summary>Losses at rated output, kW.</summary>
    public double FullLoadLossKw => RatedPowerKw * ((1 / FullLoadEfficiency) - 1);

    /// <summary>Efficiency when it puts out a share of its rated power, 0 to 1.</summary>
    /// <param name="loadRatio">Output over rated output, above 0.</param>
    public double EfficiencyAt(double loadRatio)
    {
        const double s = GeneratorMachine.ConstantLossShare;
        var lossRatio = ((1 / FullLoadEfficiency) - 1) * (s + ((1 - s) * loadRatio * loadRatio));
        return loadRatio / (loadRatio + lossRatio);
    }
}
