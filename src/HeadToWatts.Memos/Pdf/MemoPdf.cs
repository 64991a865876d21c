using HeadToWatts.Memos.Content;
using HeadToWatts.Memos.Layout;
using HeadToWatts.Memos.Layout.Type;
using PdfSharp.Pdf;

namespace HeadToWatts.Memos.Pdf;

/// <summary>Writes a memo as a tagged PDF. The same memo gives the same bytes on every machine.</summary>
public static class MemoPdf
{
    /// <summary>The whole file; nothing is given out unless all of it could be made.</summary>
    /// <exception cref="InvalidOperationException">A link of the memo leads to nothing.</exception>
    public static byte[] Write(MemoDocument document)
    {
        ArgumentNullException.ThrowIfNull(document);
        MemoFonts.Register();
        var layout = MemoLayout.Of(document);
        using var pdf = new PdfDocument();
        pdf.Options.CompressContentStreams = false;
        pdf.Info.Title = document.Title;
        pdf.Info.Subject = document.Subject;
        pdf.Info.Author = document.Author;
        pdf.Info.Creator = "HeadToWatts";
        pdf.PageMode = PdfPageMode.UseOutlines;
        var painter = new PagePainter(pdf, layout);
        pdf.Internals.Catalog.Language = document.Language;
        painter.Paint();
        return SameBytes.Save(pdf, document);
    }

    /// <summary>
    /// The characters of the memo for which its typeface has neither a glyph nor a stand-in; they are printed as question marks.
    /// </summary>
    public static IReadOnlyList<string> MissingCharacters(MemoDocument document)
    {
        ArgumentNullException.ThrowIfNull(document);
        return [.. MemoTexts.Of(document).SelectMany(Letters.Missing).Select(r => r.ToString()).Distinct().Order(StringComparer.Ordinal)];
    }
}
