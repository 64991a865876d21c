using HeadToWatts.Basis.Sources;
using HeadToWatts.Hydraulics.Canals;
using HeadToWatts.Hydraulics.Friction;
using HeadToWatts.Hydraulics.LocalLosses;
using HeadToWatts.Hydraulics.Surge;
using HeadToWatts.Hydraulics.Transients;
using HeadToWatts.Hydraulics.Water;
using HeadToWatts.Hydraulics.Waterways;

namespace HeadToWatts.Hydraulics;

/// <summary>Every published method of this project, for the methods page and the check that each has expected values.</summary>
public static class HydraulicsMethods
{
    /// <summary>All methods, in the order of the flow.</summary>
    public static IReadOnlyList<Method> All { get; } =
    [
        IapwsIf97.Density,
        IapwsViscosity.Method,
        IapwsIf97.SaturationPressure,
        IapwsIf97.SpeedOfSound,
        Gravity.Method,
        SiteConditions.SpecificWeight,
        Atmosphere.Method,
        DarcyFormula.DarcyWeisbach,
        TransitionFlow.Laminar,
        TransitionFlow.Transition,
        .. FrictionFormulas.All.Select(f => f.Method),
        LocalLoss.Method,
        PenstockBend.Method,
        SuddenContraction.Method,
        SuddenExpansion.Method,
        TrashRack.Method,
        GradeLines.EnergyEquation,
        VelocityLimits.Method,
        WaveSpeed.Method,
        Joukowsky.Method,
        Michaud.Method,
        Characteristics.Method,
        AllieviClosure.Method,
        UniformFlow.Method,
        SpecificEnergy.Method,
        SpecificEnergy.Froude,
        SpecificEnergy.Critical,
        ConjugateDepth.Rectangular,
        ConjugateDepth.Momentum,
        HydraulicJump.EnergyLoss,
        HydraulicJump.Length,
        StillingBasin.Entry,
        FreeOverfall.Method,
        CanalReach.Method,
    ];
}
