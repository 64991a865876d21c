using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Canals;

/// <summary>Sources of the open-channel methods.</summary>
internal static class CanalSources
{
    public static readonly Source Chow = new(
        "chow-1959", SourceKind.Published, "Chow, V. T.", "1959", "Open-Channel Hydraulics", "McGraw-Hill, New York");

    public static readonly Source Manning = new(
        "manning-1891", SourceKind.Published, "Manning, R.", "1891", "On the flow of water in open channels and pipes",
        "Transactions of the Institution of Civil Engineers of Ireland 20, 161-207");

    public static readonly Source Bakhmeteff = new(
        "bakhmeteff-1932", SourceKind.Published, "Bakhmeteff, B. A.", "1932", "Hydraulics of Open Channels", "McGraw-Hill, New York");

    public static readonly Source Belanger = new(
        "belanger-1841", SourceKind.Published, "Bélanger, J. B.", "1841",
        "Notes sur l'hydraulique", "École Royale des Ponts et Chaussées, Paris");

    public static readonly Source Peterka = new(
        "peterka-1958", SourceKind.Published, "Peterka, A. J.", "1958", "Hydraulic Design of Stilling Basins and Energy Dissipators",
        "US Bureau of Reclamation, Engineering Monograph 25");

    public static readonly Source Rouse = new(
        "rouse-1936", SourceKind.Published, "Rouse, H.", "1936", "Discharge characteristics of the free overfall", "Civil Engineering (ASCE) 6(4), 257-260");
}
