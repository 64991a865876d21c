using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Friction;

/// <summary>Sources of the friction formulas.</summary>
internal static class FrictionSources
{
    public static readonly Source Weisbach = new(
        "weisbach-1845", SourceKind.Published, "Weisbach, J.", "1845", "Lehrbuch der Ingenieur- und Maschinen-Mechanik", "Vieweg, Braunschweig");

    public static readonly Source Poiseuille = new(
        "poiseuille-1840", SourceKind.Published, "Poiseuille, J. L. M.", "1840",
        "Recherches expérimentales sur le mouvement des liquides dans les tubes de très petits diamètres", "Comptes Rendus de l'Académie des Sciences 11");

    public static readonly Source Colebrook = new(
        "colebrook-1939", SourceKind.Published, "Colebrook, C. F.", "1939",
        "Turbulent flow in pipes, with particular reference to the transition region between the smooth and rough pipe laws",
        "Journal of the Institution of Civil Engineers 11(4), 133-156");

    public static readonly Source SwameeJain = new(
        "swamee-jain-1976", SourceKind.Published, "Swamee, P. K.; Jain, A. K.", "1976", "Explicit equations for pipe-flow problems",
        "Journal of the Hydraulics Division, ASCE 102(HY5), 657-664");

    public static readonly Source Haaland = new(
        "haaland-1983", SourceKind.Published, "Haaland, S. E.", "1983", "Simple and explicit formulas for the friction factor in turbulent pipe flow",
        "Journal of Fluids Engineering 105(1), 89-90");

    public static readonly Source Churchill = new(
        "churchill-1977", SourceKind.Published, "Churchill, S. W.", "1977", "Friction-factor equation spans all fluid-flow regimes",
        "Chemical Engineering 84(24), 91-92");

    public static readonly Source HazenWilliams = new(
        "williams-hazen-1905", SourceKind.Published, "Williams, G. S.; Hazen, A.", "1905", "Hydraulic Tables", "Wiley, New York");

    public static readonly Source Manning = new(
        "manning-1891", SourceKind.Published, "Manning, R.", "1891", "On the flow of water in open channels and pipes",
        "Transactions of the Institution of Civil Engineers of Ireland 20, 161-207");
}
