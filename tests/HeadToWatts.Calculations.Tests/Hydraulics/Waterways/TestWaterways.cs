using CsCheck;
using HeadToWatts.Hydraulics.Friction;
using HeadToWatts.Hydraulics.LocalLosses;
using HeadToWatts.Hydraulics.Pipes;
using HeadToWatts.Hydraulics.Water;
using HeadToWatts.Hydraulics.Waterways;

namespace HeadToWatts.Calculations.Tests.Hydraulics.Waterways;

/// <summary>Waterways for the tests.</summary>
internal static class TestWaterways
{
    public static readonly SiteConditions Site = SiteConditions.At(0.75, 600, 12);

    public static PipeMaterial Steel => PipeMaterials.Find("steel-new")!;

    /// <summary>Waterways of 0 to 4 pipes with up to 4 sorts of fittings each, any formula, any α.</summary>
    public static Gen<Waterway> Any { get; } =
        Gen.Select(
            Element().Array[0, 4],
            Gen.Int[0, FrictionFormulas.All.Count - 1],
            Gen.Double[1, 1.3],
            (elements, formula, alpha) => new Waterway(elements, FrictionFormulas.All[formula], alpha));

    public static Fitting KindOf(string id, int count = 1) => Fitting.Of(FittingKinds.Find(id)!, count);

    private static Gen<PipeElement> Element() =>
        Gen.Select(
            Gen.Double[0, 2000],
            Gen.Double[0.05, 3],
            Gen.Int[0, PipeMaterials.All.Count - 1].Where(i => PipeMaterials.All[i].RoughnessM < 0.01),
            Gen.Select(Gen.Int[0, FittingKinds.All.Count - 1], Gen.Int[1, 5], (kind, count) => Fitting.Of(FittingKinds.All[kind], count)).Array[0, 4],
            (lengthM, diameterM, material, fittings) => PipeElement.Of("Pipe", lengthM, diameterM, PipeMaterials.All[material], fittings));
}
