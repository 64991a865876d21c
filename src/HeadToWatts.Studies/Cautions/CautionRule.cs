using HeadToWatts.Basis.Sources;
using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>A test on a result and the sentence to say when it bites.</summary>
/// <param name="id">Key, unique: lower-case words with hyphens.</param>
/// <param name="stage">Stage it belongs to.</param>
/// <param name="severity">How much it weighs.</param>
/// <param name="title">A few words.</param>
/// <param name="authority">Who says so.</param>
public abstract class CautionRule(string id, StudyStage stage, Severity severity, string title, Source authority)
{
    /// <summary>Key of the rule.</summary>
    public string Id { get; } = id;

    /// <summary>Stage it belongs to.</summary>
    public StudyStage Stage { get; } = stage;

    /// <summary>How much it weighs.</summary>
    public Severity Severity { get; } = severity;

    /// <summary>A few words.</summary>
    public string Title { get; } = title;

    /// <summary>Who says so.</summary>
    public Source Authority { get; } = authority;

    /// <summary>The sentence with the study's numbers, or null when the rule does not bite.</summary>
    /// <param name="result">The study.</param>
    /// <param name="show">Units in which numbers are shown.</param>
    public abstract string? Say(StudyResult result, UnitDisplay show);
}
