using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Water;

/// <summary>Sources of the properties of water, gravity and air.</summary>
internal static class WaterSources
{
    public static readonly Source IndustrialFormulation = new(
        "iapws-r7-97", SourceKind.Standard, "International Association for the Properties of Water and Steam", "2012",
        "Revised Release on the IAPWS Industrial Formulation 1997 for the Thermodynamic Properties of Water and Steam", "IAPWS R7-97(2012)");

    public static readonly Source Viscosity = new(
        "iapws-r12-08", SourceKind.Standard, "International Association for the Properties of Water and Steam", "2008",
        "Release on the IAPWS Formulation 2008 for the Viscosity of Ordinary Water Substance", "IAPWS R12-08");

    public static readonly Source WelmecGravity = new(
        "welmec-2", SourceKind.Standard, "WELMEC, European Cooperation in Legal Metrology", "",
        "Common application of the directive on non-automatic weighing instruments, gravity zones", "WELMEC Guide 2");

    public static readonly Source StandardAtmosphere = new(
        "iso-2533", SourceKind.Standard, "International Organization for Standardization", "1975", "Standard Atmosphere", "ISO 2533:1975");
}
