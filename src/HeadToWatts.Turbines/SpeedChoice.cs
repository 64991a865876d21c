using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Turbines;

/// <summary>The speed of a unit: on the generator's shaft at a synchronous speed, or at its own speed through a gear or belt.</summary>
/// <param name="IsDirect">True when a usual synchronous speed suits the runner; false when a gear or belt is needed.</param>
/// <param name="Poles">Poles of the generator on the same shaft; null with gear or belt.</param>
/// <param name="SynchronousRpm">Its synchronous speed, rpm; null with gear or belt.</param>
/// <param name="SpecificSpeedKwM">Specific speed of the runner (rpm, kW, m) at the speed chosen.</param>
/// <param name="RunnerSpeedRpm">Speed of the runner, rpm: the synchronous speed, or what the machine wants.</param>
/// <param name="RunawayRpm">Speed of the runner without load, rpm, at the upper end of the type's runaway ratio.</param>
/// <param name="Jets">Number of jets; 1 for machines without jets.</param>
/// <param name="SpecificSpeedPerJetKwM">Specific speed per jet, which is what is compared with the type's band.</param>
/// <param name="LowestSpeedRpm">Speed at the lower end of the type's band with these jets, rpm; the runner's own speed for screws and wheels.</param>
/// <param name="HighestSpeedRpm">Speed at the upper end of the type's band with these jets, rpm; the runner's own speed for screws and wheels.</param>
/// <param name="RunnerDiameterM">Diameter where the type's speed follows from it (screw, wheel), m; otherwise null.</param>
/// <param name="Uses">The methods used.</param>
public sealed record SpeedChoice(
    bool IsDirect,
    int? Poles,
    double? SynchronousRpm,
    double SpecificSpeedKwM,
    double RunnerSpeedRpm,
    double RunawayRpm,
    int Jets,
    double SpecificSpeedPerJetKwM,
    double LowestSpeedRpm,
    double HighestSpeedRpm,
    double? RunnerDiameterM,
    IReadOnlyList<MethodUse> Uses)
{
    /// <summary>
    /// Chooses the speed of a unit: with the fewest jets for which a usual synchronous speed falls in the type's band, the one
    /// nearest the band's geometric middle. Where none falls in it, and for screws and wheels, the unit is geared.
    /// </summary>
    /// <param name="type">Turbine type.</param>
    /// <param name="unitFlowM3PerS">Full flow of one unit, m3/s.</param>
    /// <param name="netHeadM">Net head at full flow, m.</param>
    /// <param name="unitPowerKw">Shaft power of one unit at full flow, kW.</param>
    /// <param name="frequencyHz">Frequency of the grid, Hz.</param>
    /// <exception cref="ArgumentOutOfRangeException">A number that is not positive.</exception>
    public static SpeedChoice Choose(TurbineType type, double unitFlowM3PerS, double netHeadM, double unitPowerKw, double frequencyHz)
    {
        ArgumentNullException.ThrowIfNull(type);
        if (!(unitFlowM3PerS > 0) || double.IsInfinity(unitFlowM3PerS))
            throw new ArgumentOutOfRangeException(nameof(unitFlowM3PerS), unitFlowM3PerS, "Must be a positive number.");
        if (type.OwnSpeedRule is { } rule)
        {
            var size = rule.At(unitFlowM3PerS, netHeadM);
            return Geared(type, netHeadM, unitPowerKw, 1, size.SpeedRpm, size.SpeedRpm, size.SpeedRpm, size.DiameterM,
                rule.Method.Used(new InputSpan("D", size.DiameterM, size.DiameterM)));
        }

        var band = type.SpecificSpeed;
        for (var jets = 1; jets <= band.MostJets; jets++)
        {
            if (Direct(type, jets, netHeadM, unitPowerKw, frequencyHz) is { } direct)
                return direct;
        }

        // Where even the slowest usual generator is too fast, every jet that can be had brings the wheel nearer to it.
        var wantedJets = Speed(band.HighestKwM, 1) < SynchronousSpeed.Rpm(SynchronousSpeed.MostUsualPoles, frequencyHz) ? band.MostJets : 1;
        return Geared(type, netHeadM, unitPowerKw, wantedJets, Speed(band.MiddleKwM, wantedJets), Speed(band.LowestKwM, wantedJets), Speed(band.HighestKwM, wantedJets), null, null);

        double Speed(double perJetKwM, int jets) => SpecificSpeed.SpeedRpm(perJetKwM * Math.Sqrt(jets), unitPowerKw, netHeadM);
    }

    private static SpeedChoice? Direct(TurbineType type, int jets, double netHeadM, double unitPowerKw, double frequencyHz)
    {
        var band = type.SpecificSpeed;
        int? best = null;
        var bestOff = double.PositiveInfinity;
        for (var poles = SynchronousSpeed.FewestUsualPoles; poles <= SynchronousSpeed.MostUsualPoles; poles += 2)
        {
            var perJet = SpecificSpeed.PerJetKwM(SpecificSpeed.KwM(SynchronousSpeed.Rpm(poles, frequencyHz), unitPowerKw, netHeadM), jets);
            var off = Math.Abs(Math.Log(perJet / band.MiddleKwM));
            if (band.Contains(perJet) && off < bestOff)
                (best, bestOff) = (poles, off);
        }

        if (best is not { } chosen)
            return null;
        var rpm = SynchronousSpeed.Rpm(chosen, frequencyHz);
        var specific = SpecificSpeed.KwM(rpm, unitPowerKw, netHeadM);
        var root = Math.Sqrt(jets);
        return new SpeedChoice(
            true, chosen, rpm, specific, rpm, rpm * type.Runaway.Highest, jets, SpecificSpeed.PerJetKwM(specific, jets),
            SpecificSpeed.SpeedRpm(band.LowestKwM * root, unitPowerKw, netHeadM),
            SpecificSpeed.SpeedRpm(band.HighestKwM * root, unitPowerKw, netHeadM),
            null,
            [SpecificSpeedUse(rpm, unitPowerKw, netHeadM), TurbineMethods.SynchronousSpeed.Used(new InputSpan("f", frequencyHz, frequencyHz), new InputSpan("p", chosen, chosen))]);
    }

    private static SpeedChoice Geared(TurbineType type, double netHeadM, double unitPowerKw, int jets, double speedRpm, double lowestRpm, double highestRpm, double? diameterM, MethodUse? rule)
    {
        var specific = SpecificSpeed.KwM(speedRpm, unitPowerKw, netHeadM);
        var use = SpecificSpeedUse(speedRpm, unitPowerKw, netHeadM);
        return new SpeedChoice(
            false, null, null, specific, speedRpm, speedRpm * type.Runaway.Highest, jets, SpecificSpeed.PerJetKwM(specific, jets),
            lowestRpm, highestRpm, diameterM, rule is null ? [use] : [rule, use]);
    }

    private static MethodUse SpecificSpeedUse(double speedRpm, double powerKw, double headM) =>
        TurbineMethods.SpecificSpeedKwM.Used(new InputSpan("n", speedRpm, speedRpm), new InputSpan("P", powerKw, powerKw), new InputSpan("H", headM, headM));
}
