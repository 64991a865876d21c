using System.Text;

namespace HeadToWatts.Memos.Layout.Type;

/// <summary>The memo's typeface: IBM Plex Sans, embedded in this assembly.</summary>
internal static class Typeface
{
    private static readonly Lazy<FontFile[]> Files = new(() =>
        [Load("IBMPlexSans-Regular.ttf"), Load("IBMPlexSans-Italic.ttf"), Load("IBMPlexSans-SemiBold.ttf")]);

    public static FontFile File(Face face) => Files.Value[(int)face];

    /// <summary>Width of a text set at a size, in points.</summary>
    public static double WidthPt(string text, Face face, double sizePt)
    {
        var file = File(face);
        var width = 0.0;
        foreach (var rune in text.EnumerateRunes())
            width += file.AdvancePerEm(rune.Value);
        return width * sizePt;
    }

    /// <summary>True when every face has the character.</summary>
    public static bool Has(Rune rune) => Files.Value.All(f => f.Has(rune.Value));

    private static FontFile Load(string name)
    {
        using var stream = typeof(Typeface).Assembly.GetManifestResourceStream(name)
            ?? throw new InvalidOperationException($"The typeface '{name}' is missing from the assembly.");
        var data = new byte[stream.Length];
        stream.ReadExactly(data);
        return FontFile.Read(data);
    }
}
