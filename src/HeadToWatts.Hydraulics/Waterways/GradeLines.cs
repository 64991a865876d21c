using HeadToWatts.Basis.Sources;
using HeadToWatts.Hydraulics.LocalLosses;

namespace HeadToWatts.Hydraulics.Waterways;

/// <summary>Energy and hydraulic grade lines of a waterway.</summary>
public static class GradeLines
{
    /// <summary>The energy equation along the waterway.</summary>
    public static readonly Method EnergyEquation = new(
        "energy-equation", "Energy of flowing water", "E = z + p/γ + α V^2/2g, E_1 = E_2 + h_f + h_L",
        Source.CommonPractice("energy-equation", "Energy equation of steady flow in pipes"), "",
        [new InputRange("α", "kinetic energy coefficient", "1", 1, 1.3)]);

    /// <summary>The section of lowest pressure inside the pipes; null when there is no pipe.</summary>
    /// <param name="sections">Sections of a waterway.</param>
    public static EnergySection? LowestPressure(IReadOnlyList<EnergySection> sections)
    {
        ArgumentNullException.ThrowIfNull(sections);
        // The first and last are the two water surfaces, the last but one the machine.
        return sections.Count > 3 ? sections.Skip(1).SkipLast(2).MinBy(s => s.PressureHeadM) : null;
    }

    internal static IReadOnlyList<EnergySection> Of(Waterway waterway, WaterwayLosses losses, double headwaterElevationM, double tailwaterElevationM)
    {
        var elements = losses.Elements;
        var elevationsM = CentreElevations(waterway.Elements, headwaterElevationM, tailwaterElevationM);
        var sections = new List<EnergySection> { new("Headwater", 0, headwaterElevationM, 0, 0, headwaterElevationM) };
        double energyM = headwaterElevationM, stationM = 0, velocityHeadM = 0;
        for (var i = 0; i < elements.Count; i++)
        {
            var element = elements[i];
            velocityHeadM = waterway.KineticEnergyCoefficient * element.VelocityHeadM;
            energyM -= LossAt(element, FittingPlace.Entrance);
            sections.Add(Section("Start of " + element.Element.Name, elevationsM[i]));
            energyM -= element.FrictionLossM + LossAt(element, FittingPlace.Along);
            stationM += element.Element.LengthM;
            sections.Add(Section("End of " + element.Element.Name, elevationsM[i + 1]));
        }

        sections.Add(Section("Machine", elevationsM[^1]));
        sections.Add(new EnergySection("Tailwater", stationM, tailwaterElevationM, 0, 0, tailwaterElevationM));
        return sections;

        EnergySection Section(string name, double centreM) => new(name, stationM, centreM, energyM - centreM - velocityHeadM, velocityHeadM, energyM);
    }

    /// <summary>Centre elevations at the intake and at the end of every pipe, m.</summary>
    internal static double[] CentreElevations(IReadOnlyList<PipeElement> elements, double headwaterElevationM, double tailwaterElevationM)
    {
        if (elements.Count == 0)
            return [tailwaterElevationM];
        var knots = new double?[elements.Count + 1];
        knots[0] = headwaterElevationM - elements[0].InsideDiameterM;
        for (var i = 0; i < elements.Count; i++)
            knots[i + 1] = elements[i].EndElevationM;
        knots[^1] ??= tailwaterElevationM + (elements[^1].InsideDiameterM / 2);

        var elevationsM = new double[knots.Length];
        var from = 0;
        for (var to = 1; to < knots.Length; to++)
        {
            if (knots[to] is not { } endM)
                continue;
            var startM = knots[from]!.Value;
            var lengthM = Length(from, to);
            elevationsM[from] = startM;
            for (var k = from + 1; k < to; k++)
                elevationsM[k] = lengthM > 0 ? startM + ((endM - startM) * Length(from, k) / lengthM) : endM;
            elevationsM[to] = endM;
            from = to;
        }

        return elevationsM;

        double Length(int a, int b)
        {
            double sum = 0;
            for (var i = a; i < b; i++)
                sum += elements[i].LengthM;
            return sum;
        }
    }

    private static double LossAt(ElementLosses element, FittingPlace place)
    {
        double sum = 0;
        foreach (var fitting in element.Fittings)
        {
            if (fitting.Fitting.Place == place)
                sum += fitting.LossM;
        }

        return sum;
    }
}
