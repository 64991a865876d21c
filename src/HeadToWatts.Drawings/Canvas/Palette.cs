using System.Globalization;

namespace HeadToWatts.Drawings.Canvas;

/// <summary>A colour in sRGB.</summary>
/// <param name="Red">0 to 255.</param>
/// <param name="Green">0 to 255.</param>
/// <param name="Blue">0 to 255.</param>
public readonly record struct Rgb(byte Red, byte Green, byte Blue)
{
    /// <summary>Written as in a style sheet, "#0b6a9c".</summary>
    public override string ToString() => string.Create(CultureInfo.InvariantCulture, $"#{Red:x2}{Green:x2}{Blue:x2}");

    internal static Rgb Of(int hex) => new((byte)(hex >> 16), (byte)(hex >> 8), (byte)hex);
}

/// <summary>The colour of each role on white paper, on a light screen and on a dark one.</summary>
public sealed class Palette
{
    private readonly Rgb[] _colours;

    private Palette(string name, params int[] hex)
    {
        Name = name;
        _colours = [.. hex.Select(Rgb.Of)];
    }

    /// <summary>What the palette is for.</summary>
    public string Name { get; }

    /// <summary>White paper: the memo.</summary>
    public static Palette Print { get; } = new("print",
        0x1b2530, 0x56616c, 0xe3e0d8, 0xcfcbc1, 0x0b6a9c, 0xcfe5f1, 0xe6dfd2, 0xa85a10, 0x1f7a52, 0x7b3f74, 0x8a4b00, 0xfdf1dc, 0xffffff, 0xffffff);

    /// <summary>A light screen.</summary>
    public static Palette Light { get; } = new("light",
        0x1b2530, 0x56616c, 0xebe8e1, 0xdedbd3, 0x0b6a9c, 0xcfe5f1, 0xe6dfd2, 0xa85a10, 0x1f7a52, 0x7b3f74, 0x8a4b00, 0xfdf1dc, 0xfaf9f6, 0xffffff);

    /// <summary>A dark screen.</summary>
    public static Palette Dark { get; } = new("dark",
        0xe9edf0, 0xa8b3bc, 0x29323a, 0x323c45, 0x63b8e6, 0x153a50, 0x2c2a25, 0xeaa457, 0x63c796, 0xd59bcd, 0xf2c273, 0x3a2c12, 0x12171c, 0x1a2127);

    /// <summary>The colour of a role.</summary>
    public Rgb this[InkRole role] => _colours[(int)role];
}
