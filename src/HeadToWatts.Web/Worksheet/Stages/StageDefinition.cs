using HeadToWatts.Studies;
using HeadToWatts.Web.Sessions;

namespace HeadToWatts.Web.Worksheet.Stages;

/// <summary>A stage of the worksheet.</summary>
/// <param name="Key">The last part of its address.</param>
/// <param name="Title">Its name.</param>
/// <param name="Component">Its page.</param>
/// <param name="Stage">The stage of the study it shows; null for pages about the whole.</param>
/// <param name="KeyResult">Its key result in a few words.</param>
/// <param name="Fields">Paths of the fields it holds, within an alternative.</param>
public sealed record StageDefinition(string Key, string Title, Type Component, StudyStage? Stage, Func<StudySession, StudyResult, string> KeyResult, IReadOnlyList<string> Fields)
{
    /// <summary>The stage as it stands at the side.</summary>
    /// <param name="session">The study.</param>
    public StageEntry Entry(StudySession session)
    {
        ArgumentNullException.ThrowIfNull(session);
        var problems = session.Problems.Count(p => StageDefinitions.Of(p) == this);
        var cautions = Key == "cautions" ? session.Cautions.Count : session.Cautions.Count(c => c.Stage == Stage);
        return new StageEntry(Key, Title, session.Result is { } result ? KeyResult(session, result) : "", session.Result is null ? 0 : cautions, problems);
    }
}
