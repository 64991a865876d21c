using HeadToWatts.Basis.Sources;
using HeadToWatts.Hydraulics.Water;
using HeadToWatts.Hydraulics.Waterways;

namespace HeadToWatts.Hydraulics.Surge;

/// <summary>
/// Screening of the pressure rise when the machine stops the whole flow. Each pipe is taken with its own wave speed and velocity;
/// reflections where the diameter changes, air and column separation are left to a transient study.
/// </summary>
public static class SurgeScreening
{
    /// <summary>Screens a waterway.</summary>
    /// <param name="waterway">The waterway.</param>
    /// <param name="flowM3PerS">Flow stopped, m3/s; 0 or more.</param>
    /// <param name="headwaterElevationM">Headwater level, m.</param>
    /// <param name="tailwaterElevationM">Tailwater level, m.</param>
    /// <param name="site">Water and gravity.</param>
    /// <param name="closureTimeS">Time in which the flow is stopped steadily, s; null for an instant stop.</param>
    /// <param name="restraint">How the pipes are held lengthwise.</param>
    /// <exception cref="ArgumentOutOfRangeException">The flow is negative, the closure time not above 0, or a figure is not a number.</exception>
    public static SurgeResult Of(
        Waterway waterway,
        double flowM3PerS,
        double headwaterElevationM,
        double tailwaterElevationM,
        SiteConditions site,
        double? closureTimeS = null,
        PipeRestraint restraint = PipeRestraint.AnchoredThroughout)
    {
        ArgumentNullException.ThrowIfNull(waterway);
        ArgumentNullException.ThrowIfNull(site);
        if (flowM3PerS is not (>= 0 and < double.PositiveInfinity))
            throw new ArgumentOutOfRangeException(nameof(flowM3PerS), flowM3PerS, "A flow is 0 or more.");
        if (closureTimeS is { } given && given is not (> 0 and < double.PositiveInfinity))
            throw new ArgumentOutOfRangeException(nameof(closureTimeS), closureTimeS, "The closure time must be above 0.");

        var centresM = GradeLines.CentreElevations(waterway.Elements, headwaterElevationM, tailwaterElevationM);
        var elements = new List<ElementSurge>(waterway.Elements.Count);
        double criticalTimeS = 0, momentumM2PerS = 0;
        foreach (var (element, index) in waterway.Elements.Select((e, i) => (e, i)))
        {
            var ratio = element.WallThicknessM is { } thicknessM and > 0 ? element.InsideDiameterM / thicknessM : element.Material.TypicalDiameterThicknessRatio;
            var waveSpeedMPerS = WaveSpeed.MPerS(
                site.Water.BulkModulusPa,
                site.Water.DensityKgPerM3,
                element.Material.ElasticModulusPa,
                ratio,
                WaveSpeed.RestraintCoefficient(restraint, element.Material.PoissonRatio));
            var velocityMPerS = flowM3PerS / element.AreaM2;
            criticalTimeS += Michaud.CriticalTimeS(element.LengthM, waveSpeedMPerS);

            // Pipes in series: L V summed from the intake down to this pipe's end takes the place of L V of one pipe.
            momentumM2PerS += element.LengthM * velocityMPerS;
            var rapidM = Joukowsky.RiseM(waveSpeedMPerS, velocityMPerS, site.GravityMPerS2);
            var riseM = closureTimeS is { } timeS ? Math.Min(rapidM, 2 * momentumM2PerS / (site.GravityMPerS2 * timeS)) : rapidM;
            var staticM = Math.Max(0, headwaterElevationM - Math.Min(centresM[index], centresM[index + 1]));
            elements.Add(new ElementSurge(
                element,
                velocityMPerS,
                waveSpeedMPerS,
                ratio,
                element.WallThicknessM is not > 0,
                rapidM,
                riseM,
                staticM,
                site.SpecificWeightNPerM3 * staticM,
                site.SpecificWeightNPerM3 * (staticM + riseM)));
        }

        return new SurgeResult(flowM3PerS, closureTimeS, criticalTimeS, elements, Uses(elements, closureTimeS, site));
    }

    private static List<MethodUse> Uses(List<ElementSurge> elements, double? closureTimeS, SiteConditions site)
    {
        if (elements.Count == 0)
            return [];
        var uses = new List<MethodUse>
        {
            IapwsIf97.SpeedOfSound.Used(new InputSpan("T", site.Water.TemperatureDegC, site.Water.TemperatureDegC)),
            WaveSpeed.Method.Used(new InputSpan("D/e", elements.Min(e => e.DiameterThicknessRatio), elements.Max(e => e.DiameterThicknessRatio))),
            Joukowsky.Method.Used(),
        };
        if (closureTimeS is not null)
            uses.Add(Michaud.Method.Used());
        return uses;
    }
}
