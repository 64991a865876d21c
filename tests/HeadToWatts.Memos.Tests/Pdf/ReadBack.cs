using UglyToad.PdfPig;
using UglyToad.PdfPig.Content;
using UglyToad.PdfPig.Tokens;

namespace HeadToWatts.Memos.Tests.Pdf;

/// <summary>A memo read back by an independent reader.</summary>
internal sealed class ReadBack : IDisposable
{
    public ReadBack(byte[] pdf)
    {
        Pdf = PdfDocument.Open(pdf);
        Pages = [.. Pdf.GetPages()];
        PageTexts = [.. Pages.Select(p => Plain(p.Text))];
        Text = string.Join("\n", PageTexts);
    }

    public PdfDocument Pdf { get; }

    public IReadOnlyList<Page> Pages { get; }

    public IReadOnlyList<string> PageTexts { get; }

    /// <summary>All text in the order of the file, spaces of every kind made plain.</summary>
    public string Text { get; }

    public static string Plain(string text) => string.Join(' ', text.Replace('\u00a0', ' ').Replace('\u202f', ' ').Split(' ', StringSplitOptions.RemoveEmptyEntries));

    public DictionaryToken Catalog => Pdf.Structure.Catalog.CatalogDictionary;

    /// <summary>Every element of the structure, parents before children.</summary>
    public IEnumerable<(string Type, DictionaryToken Element, int Depth)> Elements()
    {
        var root = (DictionaryToken)Follow(Catalog.Data["StructTreeRoot"]);
        return Kids(root, 0);
    }

    public IToken Follow(IToken token)
    {
        while (token is IndirectReferenceToken reference)
            token = Pdf.Structure.GetObject(reference.Data).Data;
        return token;
    }

    public IEnumerable<IToken> KidsOf(DictionaryToken element)
    {
        if (!element.Data.TryGetValue("K", out var kids))
            return [];
        return Follow(kids) is ArrayToken array ? array.Data.Select(Follow) : [Follow(kids)];
    }

    public void Dispose() => Pdf.Dispose();

    private IEnumerable<(string Type, DictionaryToken Element, int Depth)> Kids(DictionaryToken element, int depth)
    {
        foreach (var kid in KidsOf(element).OfType<DictionaryToken>())
        {
            if (kid.Data.TryGetValue("S", out var type))
            {
                yield return (((NameToken)Follow(type)).Data, kid, depth);
                foreach (var below in Kids(kid, depth + 1))
                    yield return below;
            }
        }
    }
}
