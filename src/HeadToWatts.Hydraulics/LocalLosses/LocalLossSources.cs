using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.LocalLosses;

/// <summary>Sources of the local losses.</summary>
internal static class LocalLossSources
{
    public static readonly Source Typical = Source.Memory(
        "typical-loss-coefficients", "Loss coefficients usual in handbooks of pipelines and penstocks");

    public static readonly Source Cengel = new(
        "cengel-cimbala", SourceKind.Published, "Çengel, Y. A.; Cimbala, J. M.", "", "Fluid Mechanics: Fundamentals and Applications", "McGraw-Hill");

    public static readonly Source PenstockTabulation = new(
        "cwcb-104678", SourceKind.Published, "Colorado Water Conservation Board", "", "Penstock loss tabulation for 1,000 ft3/s", "document 104678, p. 42");

    public static readonly Source Rennels = new(
        "rennels-hudson-2012", SourceKind.Published, "Rennels, D. C.; Hudson, H. M.", "2012", "Pipe Flow: A Practical and Comprehensive Guide", "Wiley");

    public static readonly Source Miller = new(
        "miller-1990", SourceKind.Published, "Miller, D. S.", "1990", "Internal Flow Systems", "BHR Group");

    public static readonly Source Borda = new(
        "borda-1766", SourceKind.Published, "Borda, J.-C.", "1766", "Mémoire sur l'écoulement des fluides par les orifices des vases", "Mémoires de l'Académie Royale des Sciences, Paris");

    public static readonly Source Weisbach = new(
        "weisbach-1855", SourceKind.Published, "Weisbach, J.", "1855", "Die Experimental-Hydraulik", "Engelhardt, Freiberg");

    public static readonly Source Kirschmer = new(
        "kirschmer-1926", SourceKind.Published, "Kirschmer, O.", "1926", "Untersuchungen über den Gefällsverlust an Rechen",
        "Mitteilungen des Hydraulischen Instituts der TH München 1");
}
