using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Inputs;

/// <summary>What stands at the top of a memo. Texts are as the author wrote them and may be empty.</summary>
/// <param name="Name">Name of the study.</param>
/// <param name="Place">Where the site is.</param>
/// <param name="Client">For whom.</param>
/// <param name="Author">By whom.</param>
/// <param name="Date">Date of the memo, as written; nothing here reads a clock.</param>
/// <param name="Revision">Revision mark.</param>
/// <param name="Notes">Remarks to be printed.</param>
/// <param name="Units">Family of units in which the study is shown.</param>
public sealed record StudyHeader(string Name, string Place, string Client, string Author, string Date, string Revision, string Notes, UnitSystem Units);
