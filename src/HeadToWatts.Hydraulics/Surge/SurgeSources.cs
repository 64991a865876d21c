using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Surge;

/// <summary>Sources of the surge screening.</summary>
internal static class SurgeSources
{
    public static readonly Source Korteweg = new(
        "korteweg-1878", SourceKind.Published, "Korteweg, D. J.", "1878",
        "Ueber die Fortpflanzungsgeschwindigkeit des Schalles in elastischen Röhren", "Annalen der Physik und Chemie 241(12), 525-542");

    public static readonly Source Joukowsky = new(
        "joukowsky-1898", SourceKind.Published, "Joukowsky, N.", "1898", "Über den hydraulischen Stoss in Wasserleitungsröhren",
        "Mémoires de l'Académie Impériale des Sciences de St.-Pétersbourg (1900) 9(5)");

    public static readonly Source Michaud = new(
        "michaud-1878", SourceKind.Published, "Michaud, J.", "1878", "Coups de bélier dans les conduites",
        "Bulletin de la Société Vaudoise des Ingénieurs et des Architectes 4");
}
