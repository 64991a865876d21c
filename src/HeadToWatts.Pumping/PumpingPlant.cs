using HeadToWatts.Hydraulics.Water;

namespace HeadToWatts.Pumping;

/// <summary>The head a pump works against, part by part.</summary>
/// <param name="StaticM">From the water at rest to the outlet, m.</param>
/// <param name="DrawdownM">How far the water sinks while pumping, m.</param>
/// <param name="PressureM">Pressure wanted at the outlet as head, m.</param>
/// <param name="PipeLossM">Lost in the pipe at the plant's flow, m.</param>
public sealed record PumpingHead(double StaticM, double DrawdownM, double PressureM, double PipeLossM)
{
    /// <summary>All of it, m.</summary>
    public double TotalM => StaticM + DrawdownM + PressureM + PipeLossM;
}

/// <summary>A well, relift or booster.</summary>
/// <param name="Name">Its name.</param>
/// <param name="Source">What it runs on.</param>
/// <param name="FlowM3PerS">Flow while it runs, m3/s; above 0.</param>
/// <param name="VolumesM3">Volume of each month, January first, m3; twelve of zero or more.</param>
/// <param name="Head">Head it works against.</param>
/// <param name="PlantEfficiency">Water energy over energy bought, above 0 and up to 1; for fuels, over the fuel that a criterion plant of the same output would be told by <see cref="EnergySource.WaterKwhPerUnit"/>: its rating.</param>
/// <param name="PricePerUnit">Price of a unit of its energy; null when not given.</param>
public sealed record PumpingPlant(string Name, EnergySource Source, double FlowM3PerS, IReadOnlyList<double> VolumesM3, PumpingHead Head, double PlantEfficiency, double? PricePerUnit)
{
    /// <summary>Water lifted in a year, m3.</summary>
    public double AnnualVolumeM3 => VolumesM3.Sum();

    /// <summary>Energy put into the water in a year, kWh.</summary>
    /// <param name="site">Water at the site.</param>
    public double WaterEnergyKwh(SiteConditions site)
    {
        ArgumentNullException.ThrowIfNull(site);
        return site.SpecificWeightNPerM3 * AnnualVolumeM3 * Head.TotalM / 3.6e6;
    }
}
