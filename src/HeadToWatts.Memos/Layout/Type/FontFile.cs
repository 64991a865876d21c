using System.Buffers.Binary;

namespace HeadToWatts.Memos.Layout.Type;

/// <summary>
/// What the layout needs of a TrueType file: which characters it has, how wide they are, how its lines stand. Read here and not
/// from the PDF library, so that the layout knows nothing of the canvas.
/// </summary>
internal sealed class FontFile
{
    // By code point: format 4 has no characters beyond the first plane.
    private readonly ushort[] _glyphs = new ushort[0x10000];
    private readonly double[] _advances;

    private FontFile(byte[] data)
    {
        Data = data;
        var tables = Tables(data);
        var unitsPerEm = (double)U16(data, tables["head"] + 18);
        AscentPerEm = I16(data, tables["hhea"] + 4) / unitsPerEm;
        DescentPerEm = -I16(data, tables["hhea"] + 6) / unitsPerEm;
        var metrics = U16(data, tables["hhea"] + 34);
        MaxComponentDepth = U16(data, tables["maxp"] + 30);
        var glyphs = U16(data, tables["maxp"] + 4);
        _advances = new double[glyphs];
        for (var i = 0; i < glyphs; i++)
            _advances[i] = U16(data, tables["hmtx"] + 4 * Math.Min(i, metrics - 1)) / unitsPerEm;
        ReadCharacters(data, tables["cmap"]);
    }

    /// <summary>The file's bytes.</summary>
    public byte[] Data { get; }

    /// <summary>Height above the baseline, in ems.</summary>
    public double AscentPerEm { get; }

    /// <summary>Depth below the baseline, in ems.</summary>
    public double DescentPerEm { get; }

    /// <summary>How deep composite glyphs are nested; deeper than 1 they would be lost when the file is subset.</summary>
    public int MaxComponentDepth { get; }

    public static FontFile Read(byte[] data) => new(data);

    /// <summary>True when the face can draw the character.</summary>
    public bool Has(int codePoint) => codePoint is >= 0 and < 0x10000 && _glyphs[codePoint] != 0;

    /// <summary>Width of a character in ems; 0 when the face lacks it.</summary>
    public double AdvancePerEm(int codePoint) => Has(codePoint) ? _advances[_glyphs[codePoint]] : 0;

    private static Dictionary<string, int> Tables(byte[] data)
    {
        var tables = new Dictionary<string, int>(StringComparer.Ordinal);
        var count = U16(data, 4);
        for (var i = 0; i < count; i++)
        {
            var at = 12 + 16 * i;
            tables[System.Text.Encoding.ASCII.GetString(data, at, 4)] = (int)BinaryPrimitives.ReadUInt32BigEndian(data.AsSpan(at + 8));
        }

        return tables;
    }

    // The table of format 4 holds every character of the first plane, which is all that a text face of this kind has.
    private void ReadCharacters(byte[] data, int cmap)
    {
        var count = U16(data, cmap + 2);
        for (var i = 0; i < count; i++)
        {
            var table = cmap + (int)BinaryPrimitives.ReadUInt32BigEndian(data.AsSpan(cmap + 4 + 8 * i + 4));
            if (U16(data, table) == 4)
                ReadFormat4(data, table);
        }
    }

    private void ReadFormat4(byte[] data, int table)
    {
        var segments = U16(data, table + 6) / 2;
        var ends = table + 14;
        var starts = ends + 2 * segments + 2;
        var deltas = starts + 2 * segments;
        var offsets = deltas + 2 * segments;
        for (var s = 0; s < segments; s++)
        {
            var end = U16(data, ends + 2 * s);
            var start = U16(data, starts + 2 * s);
            var delta = U16(data, deltas + 2 * s);
            var offset = U16(data, offsets + 2 * s);
            for (var c = start; c <= end && c != 0xffff; c++)
            {
                var glyph = offset == 0
                    ? (c + delta) & 0xffff
                    : U16(data, offsets + 2 * s + offset + 2 * (c - start)) is var g && g != 0 ? (g + delta) & 0xffff : 0;
                _glyphs[c] = (ushort)glyph;
            }
        }
    }

    private static int U16(byte[] data, int at) => BinaryPrimitives.ReadUInt16BigEndian(data.AsSpan(at));

    private static int I16(byte[] data, int at) => BinaryPrimitives.ReadInt16BigEndian(data.AsSpan(at));
}
