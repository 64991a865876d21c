using System.Globalization;
using HeadToWatts.Basis.Units;
using HeadToWatts.Memos.Content;
using HeadToWatts.Memos.Pdf;
using HeadToWatts.Memos.Sections;
using HeadToWatts.Studies;

namespace HeadToWatts.Memos;

/// <summary>The memo of a study.</summary>
public static class Memo
{
    /// <summary>The memo as a tagged PDF: the whole file. The same study gives the same bytes.</summary>
    /// <param name="result">The study.</param>
    /// <param name="show">Units in which numbers are shown; US customary is printed on Letter, SI on A4.</param>
    public static byte[] Make(StudyResult result, UnitDisplay show) => MemoPdf.Write(Document(result, show));

    /// <summary>The memo before it is drawn.</summary>
    /// <param name="result">The study.</param>
    /// <param name="show">Units in which numbers are shown.</param>
    public static MemoDocument Document(StudyResult result, UnitDisplay show)
    {
        ArgumentNullException.ThrowIfNull(result);
        ArgumentNullException.ThrowIfNull(show);
        var context = new MemoContext(result, show);
        foreach (var section in MemoSections.All)
            section(context);
        var header = result.Header;
        var name = MemoContext.OrElse(header.Name, "Unnamed site");
        return new MemoDocument(
            name + ": pre-feasibility memo",
            "Screening of hydropower at " + name,
            header.Author,
            "en",
            DateOnly.TryParseExact(header.Date, "yyyy-MM-dd", CultureInfo.InvariantCulture, DateTimeStyles.None, out var date) ? date : null,
            show.System == UnitSystem.US ? Paper.Letter : Paper.A4,
            name + ", pre-feasibility",
            header.Revision.Length > 0 ? "Revision " + header.Revision : "",
            header.Date.Length > 0 ? "Dated " + header.Date + ". Screening, not for construction." : "Screening, not for construction.",
            context.Body.Finish());
    }
}
