using HeadToWatts.Turbines.Crossflow;
using HeadToWatts.Turbines.Francis;
using HeadToWatts.Turbines.Kaplan;
using HeadToWatts.Turbines.Pelton;
using HeadToWatts.Turbines.Propeller;
using HeadToWatts.Turbines.PumpAsTurbine;
using HeadToWatts.Turbines.Screw;
using HeadToWatts.Turbines.Turgo;
using HeadToWatts.Turbines.WaterWheel;

namespace HeadToWatts.Turbines;

/// <summary>Every turbine type, from high head to low.</summary>
public static class TurbineTypes
{
    /// <summary>The types. A new one is a folder and a line here.</summary>
    public static IReadOnlyList<TurbineType> All { get; } =
    [
        PeltonTurbine.Type,
        TurgoTurbine.Type,
        CrossflowTurbine.Type,
        FrancisTurbine.Type,
        KaplanTurbine.Type,
        PropellerTurbine.Type,
        ArchimedesScrew.Type,
        WaterWheelTurbine.Type,
        PumpAsTurbineType.Type,
    ];

    /// <summary>The type with this id or name, in any case; null when there is none.</summary>
    public static TurbineType? Find(string idOrName)
    {
        ArgumentNullException.ThrowIfNull(idOrName);
        var wanted = idOrName.Trim();
        return All.FirstOrDefault(t => string.Equals(t.Id, wanted, StringComparison.OrdinalIgnoreCase) || string.Equals(t.Name, wanted, StringComparison.OrdinalIgnoreCase));
    }
}
