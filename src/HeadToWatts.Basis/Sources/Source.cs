namespace HeadToWatts.Basis.Sources;

/// <summary>What stands behind a figure or a formula.</summary>
public enum SourceKind
{
    /// <summary>A book, paper or agency report.</summary>
    Published,

    /// <summary>A standard.</summary>
    Standard,

    /// <summary>A statute or regulation.</summary>
    Law,

    /// <summary>Common practice of the trade, without one source to name.</summary>
    CommonPractice,

    /// <summary>Typical figures written down from memory, not checked against print.</summary>
    Memory,

    /// <summary>A judgement of this project, recorded in docs/decisions.</summary>
    Decision,

    /// <summary>Figures the user gave.</summary>
    User,
}

/// <summary>A source as the memo lists it.</summary>
/// <param name="Id">Short key, unique: letters, digits and hyphens.</param>
/// <param name="Kind">What kind of source it is.</param>
/// <param name="Authors">Authors or issuing body.</param>
/// <param name="Year">Year of publication; empty where there is none.</param>
/// <param name="Title">Title.</param>
/// <param name="Place">Journal, publisher, report number.</param>
public sealed record Source(string Id, SourceKind Kind, string Authors, string Year, string Title, string Place)
{
    /// <summary>The source on one line, marked when it is memory, practice or our own decision.</summary>
    public override string ToString()
    {
        // Initials bring a full stop of their own.
        var parts = new[] { Authors, Year, Title, Place }.Where(p => p.Length > 0).Select(p => p.TrimEnd('.'));
        var line = string.Join(". ", parts) + ".";
        return Kind switch
        {
            SourceKind.Memory => line + " (Typical, from memory.)",
            SourceKind.CommonPractice => line + " (Common practice, no source.)",
            _ => line,
        };
    }

    /// <summary>A judgement of this project.</summary>
    /// <param name="number">Number of the page in docs/decisions.</param>
    /// <param name="title">What was decided.</param>
    public static Source Decision(string number, string title)
    {
        ArgumentNullException.ThrowIfNull(number);
        return new($"decision-{number}", SourceKind.Decision, "This project", "", title, $"decision {number}");
    }

    /// <summary>Common practice, with nothing to cite.</summary>
    public static Source CommonPractice(string id, string title) => new(id, SourceKind.CommonPractice, "", "", title, "");

    /// <summary>Typical figures from memory.</summary>
    public static Source Memory(string id, string title) => new(id, SourceKind.Memory, "", "", title, "");
}
