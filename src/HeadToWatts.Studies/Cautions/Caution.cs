using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Something the reader must know before relying on a figure.</summary>
/// <param name="Id">Key of the rule.</param>
/// <param name="Stage">Stage it belongs to.</param>
/// <param name="Severity">How much it weighs.</param>
/// <param name="Title">A few words.</param>
/// <param name="Text">The sentence with this study's numbers.</param>
/// <param name="Authority">Who says so.</param>
public sealed record Caution(string Id, StudyStage Stage, Severity Severity, string Title, string Text, Source Authority);
