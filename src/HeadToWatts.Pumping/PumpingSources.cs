using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Pumping;

/// <summary>Sources of the pumping methods.</summary>
internal static class PumpingSources
{
    internal static readonly Source Nebraska = new("unl-npppc-2008", SourceKind.Published, "Dorn, T. W.", "2008", "Nebraska Pumping Plant Performance Criteria", "University of Nebraska-Lincoln Extension");

    internal static readonly Source Munson = new("munson-pumps", SourceKind.Published, "Munson, B. R., Young, D. F. and Okiishi, T. H.", "2006", "Fundamentals of Fluid Mechanics", "Wiley, 5th edition, ch. 12");

    internal static readonly Source Daugherty = new("daugherty-franzini", SourceKind.Published, "R. L. Daugherty and J. B. Franzini", "", "Fluid Mechanics with Engineering Applications", "McGraw-Hill");
}
