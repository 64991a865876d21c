using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Units;
using HeadToWatts.Files.StudyFiles;
using HeadToWatts.Studies;
using HeadToWatts.Web.Sessions;
using Microsoft.AspNetCore.Components;

namespace HeadToWatts.Web.Worksheet.Stages;

/// <summary>What every stage of the worksheet works with.</summary>
public abstract class StageBase : ComponentBase
{
    /// <summary>The study on the screen.</summary>
    [Parameter, EditorRequired] public StudySession Session { get; set; } = default!;

    /// <summary>The alternative worked on, as entered.</summary>
    protected AlternativeDocument Doc => Session.Alternative;

    /// <summary>The last good result; null when there is none yet.</summary>
    protected StudyResult? Result => Session.Result;

    /// <summary>Units in which numbers are shown.</summary>
    protected UnitDisplay Show => Session.Show;

    /// <summary>The problem of a field, by its path within the alternative.</summary>
    protected Problem? At(string path) => Session.ProblemAt(path);

    /// <summary>Changes the study.</summary>
    protected Task Edit(Action change) => Session.EditAsync(change);
}
