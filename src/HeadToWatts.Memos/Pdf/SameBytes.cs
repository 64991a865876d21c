using System.Globalization;
using System.IO.Compression;
using System.Security;
using System.Security.Cryptography;
using System.Text;
using HeadToWatts.Memos.Content;
using PdfSharp.Pdf;
using PdfSharp.Pdf.Advanced;

namespace HeadToWatts.Memos.Pdf;

/// <summary>
/// Makes the same memo the same file. The library puts the clock and random numbers into dates, ids and names of fonts; it does so
/// while it prepares to save, so they are set right between that and the first byte it writes.
/// </summary>
internal static class SameBytes
{
    // Dates in a PDF need a value; a memo without a date gets one that nobody takes for the day it was written.
    private static readonly DateOnly NoDate = new(2000, 1, 1);

    /// <summary>Saves the document.</summary>
    public static byte[] Save(PdfDocument pdf, MemoDocument memo)
    {
        using var stream = new FirstByteStream(() => Settle(pdf, memo));
        pdf.Save(stream, closeStream: false);
        return stream.ToArray();
    }

    private static void Settle(PdfDocument pdf, MemoDocument memo)
    {
        var date = (memo.Date ?? NoDate).ToString("yyyyMMdd", CultureInfo.InvariantCulture);
        var pdfDate = $"D:{date}000000Z";
        pdf.Info.Elements.SetString("/CreationDate", pdfDate);
        pdf.Info.Elements.SetString("/ModDate", pdfDate);
        using var hash = IncrementalHash.CreateHash(HashAlgorithmName.SHA256);
        var fonts = new Dictionary<string, string>(StringComparer.Ordinal);
        var note = 0;
        PdfDictionary? metadata = null;
        foreach (var dictionary in pdf.Internals.GetAllObjects().OfType<PdfDictionary>())
        {
            Rename(dictionary, "/BaseFont", fonts);
            Rename(dictionary, "/FontName", fonts);
            if (dictionary.Elements.ContainsKey("/NM"))
                dictionary.Elements.SetString("/NM", "memo-" + (++note).ToString(CultureInfo.InvariantCulture));
            if (dictionary.Elements.ContainsKey("/NM"))
                dictionary.Elements.SetString("/M", pdfDate);
            if (dictionary.Elements.GetName("/Type") == "/Metadata")
            {
                metadata = dictionary;
            }
            else if (dictionary.Stream is { } stream)
            {
                hash.AppendData(stream.Value);
                if (!dictionary.Elements.ContainsKey("/Filter"))
                    Compress(dictionary);
            }
        }

        hash.AppendData(Encoding.UTF8.GetBytes(string.Join('\n', memo.Title, memo.Subject, memo.Author, memo.Language, pdfDate)));
        var id = hash.GetHashAndReset().AsSpan(0, 16).ToArray();
        var idText = Encoding.Latin1.GetString(id);
        pdf.Internals.FirstDocumentID = idText;
        pdf.Internals.SecondDocumentID = idText;
        if (metadata != null)
            WriteMetadata(metadata, memo, new Guid(id));
    }

    // A subset's name begins with six capitals, made at random by the library; here they say which subset it is.
    private static void Rename(PdfDictionary dictionary, string key, Dictionary<string, string> known)
    {
        if (!dictionary.Elements.ContainsKey(key))
            return;
        var name = dictionary.Elements.GetName(key);
        if (name.Length < 9 || name[7] != '+')
            return;
        if (!known.TryGetValue(name, out var tag))
            known[name] = tag = "MEMOA" + (char)('A' + known.Count);
        dictionary.Elements.SetName(key, "/" + tag + name[7..]);
    }

    private static void Compress(PdfDictionary dictionary)
    {
        using var packed = new MemoryStream();
        using (var zlib = new ZLibStream(packed, CompressionLevel.Optimal, leaveOpen: true))
            zlib.Write(dictionary.Stream.Value);
        dictionary.Stream.Value = packed.ToArray();
        dictionary.Elements.SetName("/Filter", "/FlateDecode");
        dictionary.Elements.SetInteger("/Length", dictionary.Stream.Length);
    }

    private static void WriteMetadata(PdfDictionary metadata, MemoDocument memo, Guid id)
    {
        var date = (memo.Date ?? NoDate).ToString("yyyy-MM-dd", CultureInfo.InvariantCulture) + "T00:00:00Z";
        var xmp = $"""
            <?xpacket begin="{'\ufeff'}" id="W5M0MpCehiHzreSzNTczkc9d"?>
            <x:xmpmeta xmlns:x="adobe:ns:meta/">
             <rdf:RDF xmlns:rdf="http://www.w3.org/1999/02/22-rdf-syntax-ns#">
              <rdf:Description rdf:about="" xmlns:dc="http://purl.org/dc/elements/1.1/" xmlns:xmp="http://ns.adobe.com/xap/1.0/" xmlns:xmpMM="http://ns.adobe.com/xap/1.0/mm/">
               <dc:title><rdf:Alt><rdf:li xml:lang="x-default">{Escape(memo.Title)}</rdf:li></rdf:Alt></dc:title>
               <dc:creator><rdf:Seq><rdf:li>{Escape(memo.Author)}</rdf:li></rdf:Seq></dc:creator>
               <dc:description><rdf:Alt><rdf:li xml:lang="x-default">{Escape(memo.Subject)}</rdf:li></rdf:Alt></dc:description>
               <dc:language><rdf:Bag><rdf:li>{Escape(memo.Language)}</rdf:li></rdf:Bag></dc:language>
               <xmp:CreatorTool>HeadToWatts</xmp:CreatorTool>
               <xmp:CreateDate>{date}</xmp:CreateDate>
               <xmp:ModifyDate>{date}</xmp:ModifyDate>
               <xmpMM:DocumentID>uuid:{id}</xmpMM:DocumentID>
               <xmpMM:InstanceID>uuid:{id}</xmpMM:InstanceID>
              </rdf:Description>
             </rdf:RDF>
            </x:xmpmeta>
            <?xpacket end="w"?>
            """.ReplaceLineEndings("\n");
        metadata.Stream.Value = Encoding.UTF8.GetBytes(xmp);
        metadata.Elements.SetInteger("/Length", metadata.Stream.Length);
    }

    // XML refuses most control characters even when they are escaped.
    private static string Escape(string text) => SecurityElement.Escape(string.Concat(text.Where(c => c >= ' ' || c is '\t' or '\n')));

    private sealed class FirstByteStream(Action beforeFirst) : MemoryStream
    {
        private bool _begun;

        public override void Write(byte[] buffer, int offset, int count)
        {
            Begin();
            base.Write(buffer, offset, count);
        }

        public override void Write(ReadOnlySpan<byte> buffer)
        {
            Begin();
            base.Write(buffer);
        }

        public override void WriteByte(byte value)
        {
            Begin();
            base.WriteByte(value);
        }

        private void Begin()
        {
            if (_begun)
                return;
            _begun = true;
            beforeFirst();
        }
    }
}
