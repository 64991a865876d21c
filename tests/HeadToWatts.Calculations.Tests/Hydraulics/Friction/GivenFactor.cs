using HeadToWatts.Basis.Sources;
using HeadToWatts.Hydraulics.Friction;

namespace HeadToWatts.Calculations.Tests.Hydraulics.Friction;

/// <summary>Darcy-Weisbach with the factor that a printed example states.</summary>
internal sealed class GivenFactor(double darcyFrictionFactor)
    : DarcyFormula(new Method("given-factor", "Given factor", "f", Source.CommonPractice("given", "stated by the example"), "", []))
{
    protected override bool CoversAllFlow => true;

    protected override double TurbulentFactor(double reynolds, double relativeRoughness) => darcyFrictionFactor;
}
