using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Transients;

/// <summary>Sources of the transient.</summary>
internal static class TransientSources
{
    public static readonly Source WylieStreeter = new(
        "wylie-streeter-1993", SourceKind.Published, "Wylie, E. B., Streeter, V. L.", "1993", "Fluid Transients in Systems", "Prentice Hall");

    public static readonly Source Allievi = new(
        "allievi-1903", SourceKind.Published, "Allievi, L.", "1903", "Teoria generale del moto perturbato dell'acqua nei tubi in pressione",
        "Annali della Società degli Ingegneri ed Architetti Italiani");
}
