namespace HeadToWatts.Storage;

/// <summary>A study as it stands now: saved after every change, so that a reload or a restart loses nothing.</summary>
/// <param name="Id">Identity; also in the address of its pages.</param>
/// <param name="Name">Name of the study.</param>
/// <param name="StudyJson">The study file's text.</param>
/// <param name="Edition">Counts the changes, from 1; a change is refused when it was made on an older one.</param>
/// <param name="ChangedAt">When it was last changed.</param>
public sealed record StoredStudy(Guid Id, string Name, string StudyJson, long Edition, DateTimeOffset ChangedAt);

/// <summary>A line in the list of recent studies.</summary>
/// <param name="Id">Identity.</param>
/// <param name="Name">Name of the study.</param>
/// <param name="ChangedAt">When it was last changed.</param>
/// <param name="VersionCount">How many versions were put aside.</param>
public sealed record RecentStudy(Guid Id, string Name, DateTimeOffset ChangedAt, int VersionCount);

/// <summary>A version that was put aside and never changes.</summary>
/// <param name="Number">Number, from 1 within its study.</param>
/// <param name="Name">Name the study had.</param>
/// <param name="Note">What the author wrote about it; may be empty.</param>
/// <param name="SavedAt">When it was put aside.</param>
public sealed record SavedVersion(int Number, string Name, string Note, DateTimeOffset SavedAt);

/// <summary>How an attempt to save ended.</summary>
public enum SaveEnd
{
    /// <summary>It is stored.</summary>
    Saved,

    /// <summary>Somebody saved a newer edition in between; nothing was stored.</summary>
    ChangedElsewhere,

    /// <summary>The study is no longer there; nothing was stored.</summary>
    Gone,
}

/// <summary>The end of an attempt to save.</summary>
/// <param name="End">How it ended.</param>
/// <param name="Edition">The edition now stored; 0 when the study is gone.</param>
public readonly record struct SaveOutcome(SaveEnd End, long Edition);
