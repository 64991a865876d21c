using HeadToWatts.Memos.Layout.Type;
using PdfSharp.Drawing;
using PdfSharp.Fonts;
using PdfSharp.Pdf;

namespace HeadToWatts.Memos.Pdf;

/// <summary>Gives the PDF library the embedded typeface and nothing of the machine it runs on.</summary>
internal sealed class MemoFonts : IFontResolver
{
    private static readonly Lock Gate = new();
    private static bool _set;

    // The library reads the embedding from here; it is the same for every face.
    private static readonly XPdfFontOptions Options = new(PdfFontEncoding.Unicode, PdfFontEmbedding.TryComputeSubset);

    /// <summary>The face at a size.</summary>
    public static XFont Font(Face face, double sizePt) => new(Name(face), sizePt, XFontStyleEx.Regular, Options);

    /// <summary>Makes the typeface known to the PDF library, once in a process.</summary>
    public static void Register()
    {
        lock (Gate)
        {
            if (_set)
                return;
            GlobalFontSettings.FontResolver ??= new MemoFonts();
            _set = true;
        }
    }

    /// <inheritdoc/>
    public FontResolverInfo? ResolveTypeface(string familyName, bool bold, bool italic) => new(familyName);

    /// <inheritdoc/>
    public byte[]? GetFont(string faceName) => Typeface.File(Enum.GetValues<Face>().First(f => Name(f) == faceName)).Data;

    private static string Name(Face face) => "Memo " + face;
}
