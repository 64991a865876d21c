using HeadToWatts.Basis.Sources;
using HeadToWatts.Hydraulics.Friction;
using HeadToWatts.Hydraulics.LocalLosses;
using HeadToWatts.Hydraulics.Water;

namespace HeadToWatts.Hydraulics.Waterways;

/// <summary>
/// Pipes in series from the intake to the machine. Without any pipe the machine stands at the drop itself and nothing is lost.
/// </summary>
public sealed class Waterway
{
    private readonly PipeElement[] _elements;
    private readonly double[] _localCoefficients;

    /// <summary>Makes a waterway.</summary>
    /// <param name="elements">Pipes in the order of the flow; may be empty.</param>
    /// <param name="formula">Friction formula.</param>
    /// <param name="kineticEnergyCoefficient">Kinetic energy coefficient α of the grade lines, 1 to 2; 1.0 when unknown.</param>
    /// <exception cref="ArgumentException">A pipe has a length below 0, a diameter, Hazen-Williams C or Manning n not above 0, a negative roughness, K or count, or a figure is not a number.</exception>
    /// <exception cref="ArgumentOutOfRangeException">α outside 1 to 2.</exception>
    public Waterway(IReadOnlyList<PipeElement> elements, FrictionFormula formula, double kineticEnergyCoefficient = 1.0)
    {
        ArgumentNullException.ThrowIfNull(elements);
        ArgumentNullException.ThrowIfNull(formula);
        if (kineticEnergyCoefficient is not (>= 1 and <= 2))
            throw new ArgumentOutOfRangeException(nameof(kineticEnergyCoefficient), kineticEnergyCoefficient, "The kinetic energy coefficient lies between 1 and 2.");
        _elements = [.. elements];
        foreach (var element in _elements)
            Check(element);
        _localCoefficients = [.. _elements.Select(e => e.Fittings.Sum(f => f.TotalLossCoefficient))];
        Formula = formula;
        KineticEnergyCoefficient = kineticEnergyCoefficient;
    }

    /// <summary>The pipes in the order of the flow.</summary>
    public IReadOnlyList<PipeElement> Elements => _elements;

    /// <summary>The friction formula.</summary>
    public FrictionFormula Formula { get; }

    /// <summary>Kinetic energy coefficient α.</summary>
    public double KineticEnergyCoefficient { get; }

    /// <summary>Length of all pipes together, m.</summary>
    public double LengthM => _elements.Sum(e => e.LengthM);

    /// <summary>Head lost, m: friction and local losses of all pipes. Allocates nothing.</summary>
    /// <param name="flowM3PerS">Flow, m3/s; 0 or more.</param>
    /// <param name="site">Water and gravity.</param>
    /// <exception cref="ArgumentOutOfRangeException">The flow is negative or not a number.</exception>
    public double LossM(double flowM3PerS, SiteConditions site)
    {
        ArgumentNullException.ThrowIfNull(site);
        CheckFlow(flowM3PerS);
        double sum = 0;
        for (var i = 0; i < _elements.Length; i++)
        {
            var flow = FlowIn(_elements[i], flowM3PerS, site);
            sum += (Formula.LossPerMetre(flow) * _elements[i].LengthM) + (_localCoefficients[i] * flow.VelocityHeadM);
        }

        return sum;
    }

    /// <summary>The losses in full: every pipe and every fitting.</summary>
    /// <param name="flowM3PerS">Flow, m3/s; 0 or more.</param>
    /// <param name="site">Water and gravity.</param>
    /// <exception cref="ArgumentOutOfRangeException">The flow is negative or not a number.</exception>
    public WaterwayLosses At(double flowM3PerS, SiteConditions site)
    {
        ArgumentNullException.ThrowIfNull(site);
        CheckFlow(flowM3PerS);
        var elements = new List<ElementLosses>(_elements.Length);
        foreach (var element in _elements)
        {
            var flow = FlowIn(element, flowM3PerS, site);
            var velocityHeadM = flow.VelocityHeadM;
            FittingLoss[] fittings = [.. element.Fittings.Select(f => new FittingLoss(f, f.TotalLossCoefficient * velocityHeadM))];
            elements.Add(new ElementLosses(
                element,
                flowM3PerS,
                flow.VelocityMPerS,
                velocityHeadM,
                flow.Reynolds,
                flow.RelativeRoughness,
                (Formula.FactorOf(flow) ?? Formula.EquivalentDarcy(flow)).Value,
                TransitionFlow.RegimeAt(flow.Reynolds),
                Formula.LossPerMetre(flow) * element.LengthM,
                fittings,
                fittings.Sum(f => f.LossM)));
        }

        double frictionM = elements.Sum(e => e.FrictionLossM), localM = elements.Sum(e => e.LocalLossM);
        return new WaterwayLosses(flowM3PerS, elements, frictionM, localM, frictionM + localM, UsesBetween(flowM3PerS, flowM3PerS, site));
    }

    /// <summary>The methods used when every flow between two is computed.</summary>
    /// <param name="lowestFlowM3PerS">Lowest flow, m3/s; 0 or more.</param>
    /// <param name="highestFlowM3PerS">Highest flow, m3/s.</param>
    /// <param name="site">Water and gravity.</param>
    /// <exception cref="ArgumentOutOfRangeException">A flow is negative or not a number.</exception>
    public IReadOnlyList<MethodUse> UsesBetween(double lowestFlowM3PerS, double highestFlowM3PerS, SiteConditions site)
    {
        ArgumentNullException.ThrowIfNull(site);
        CheckFlow(lowestFlowM3PerS);
        CheckFlow(highestFlowM3PerS);
        if (!(highestFlowM3PerS > 0))
            return [];
        var uses = new List<MethodUse>();
        foreach (var element in _elements)
        {
            uses.AddRange(Formula.UsesBetween(FlowIn(element, lowestFlowM3PerS, site), FlowIn(element, highestFlowM3PerS, site)));
            foreach (var fitting in element.Fittings)
                uses.Add(LocalLoss.Method.Used(new InputSpan("K", fitting.LossCoefficient, fitting.LossCoefficient)));
        }

        return MethodUse.Union(uses);
    }

    /// <summary>
    /// Energy and hydraulic grade at the headwater, the start (behind its entrance fittings) and the end of every pipe, the machine
    /// and the tailwater. Losses of fittings along a pipe are counted between its start and its end, those of exits behind the machine.
    /// Where a pipe has no end elevation, centres run straight from one diameter below the headwater to half the last diameter above the tailwater.
    /// </summary>
    /// <param name="flowM3PerS">Flow, m3/s; 0 or more.</param>
    /// <param name="headwaterElevationM">Headwater level, m.</param>
    /// <param name="tailwaterElevationM">Tailwater level, m.</param>
    /// <param name="site">Water and gravity.</param>
    /// <exception cref="ArgumentOutOfRangeException">The flow is negative or not a number.</exception>
    public IReadOnlyList<EnergySection> GradeLines(double flowM3PerS, double headwaterElevationM, double tailwaterElevationM, SiteConditions site)
    {
        ArgumentNullException.ThrowIfNull(site);
        return Waterways.GradeLines.Of(this, At(flowM3PerS, site), headwaterElevationM, tailwaterElevationM);
    }

    private static PipeFlow FlowIn(PipeElement element, double flowM3PerS, SiteConditions site) => new(
        flowM3PerS,
        element.InsideDiameterM,
        element.RoughnessM,
        element.HazenWilliamsCoefficient,
        element.ManningCoefficient,
        site.Water.KinematicViscosityM2PerS,
        site.GravityMPerS2);

    private static void CheckFlow(double flowM3PerS)
    {
        if (flowM3PerS is not (>= 0 and < double.PositiveInfinity))
            throw new ArgumentOutOfRangeException(nameof(flowM3PerS), flowM3PerS, "A flow is 0 or more.");
    }

    private static void Check(PipeElement element)
    {
        Require(element.LengthM >= 0 && double.IsFinite(element.LengthM), element, "its length must be 0 or more");
        Require(element.InsideDiameterM > 0 && double.IsFinite(element.InsideDiameterM), element, "its inside diameter must be above 0");
        Require(element.RoughnessM >= 0 && element.RoughnessM < element.InsideDiameterM, element, "its roughness must be 0 or more and less than its diameter");
        Require(element.HazenWilliamsCoefficient > 0 && double.IsFinite(element.HazenWilliamsCoefficient), element, "its Hazen-Williams coefficient must be above 0");
        Require(element.ManningCoefficient > 0 && double.IsFinite(element.ManningCoefficient), element, "its Manning coefficient must be above 0");
        foreach (var fitting in element.Fittings)
            Require(fitting.LossCoefficient >= 0 && double.IsFinite(fitting.LossCoefficient) && fitting.Count >= 0, element, $"loss coefficient and count of '{fitting.Name}' must be 0 or more");
    }

    private static void Require(bool met, PipeElement element, string what)
    {
        if (!met)
            throw new ArgumentException($"Pipe '{element.Name}': {what}.", nameof(element));
    }
}
