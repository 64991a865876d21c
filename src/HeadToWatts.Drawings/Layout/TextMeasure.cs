using HeadToWatts.Drawings.Canvas;

namespace HeadToWatts.Drawings.Layout;

/// <summary>
/// Width of a text before any canvas has set it. The advance widths are those of IBM Plex Sans (regular and semi-bold,
/// thousandths of the type size), read from the font's own table; other faces differ by a few percent.
/// </summary>
public static class TextMeasure
{
    /// <summary>Height of capitals and figures above the baseline, as a share of the type size.</summary>
    public const double AscentRatio = 0.74;

    /// <summary>Depth of descenders below the baseline, as a share of the type size.</summary>
    public const double DescentRatio = 0.21;

    private const double Unknown = 650;

    private static readonly short[] Regular =
    [
        236, 284, 419, 713, 598, 927, 694, 242, 335, 335, 450, 600, 272, 399, 272, 383, 600, 600, 600, 600, 600, 600, 600, 600, 600, 600, 292, 292, 600, 600, 600, 477,
        891, 641, 653, 621, 671, 583, 559, 695, 707, 400, 510, 634, 501, 812, 707, 708, 606, 708, 640, 581, 572, 678, 609, 891, 613, 593, 580, 317, 383, 317, 600, 565,
        600, 534, 580, 503, 580, 549, 324, 528, 568, 250, 250, 527, 272, 873, 568, 560, 580, 580, 367, 487, 351, 568, 492, 768, 507, 499, 464, 343, 314, 343, 600,
    ];

    private static readonly short[] SemiBold =
    [
        236, 309, 471, 656, 600, 960, 713, 260, 337, 337, 556, 600, 299, 402, 299, 437, 600, 600, 600, 600, 600, 600, 600, 600, 600, 600, 319, 319, 600, 600, 600, 493,
        899, 672, 663, 642, 689, 600, 577, 712, 719, 423, 545, 678, 521, 817, 719, 712, 641, 712, 664, 611, 580, 689, 638, 949, 655, 632, 599, 329, 437, 329, 600, 559,
        600, 559, 600, 513, 600, 558, 350, 545, 588, 275, 275, 562, 294, 888, 588, 563, 600, 600, 393, 499, 374, 588, 524, 819, 544, 524, 502, 363, 376, 363, 600,
    ];

    /// <summary>Width of a line of text in drawing units.</summary>
    public static double Width(string text, double size, TextWeight weight = TextWeight.Regular)
    {
        ArgumentNullException.ThrowIfNull(text);
        var table = weight == TextWeight.SemiBold ? SemiBold : Regular;
        var sum = 0.0;
        foreach (var c in text)
            sum += c is >= ' ' and <= '~' ? table[c - ' '] : Other(c);
        return sum * size / 1000;
    }

    /// <summary>Width of a line of text set in a style.</summary>
    public static double Width(string text, TextStyle style) => Width(text, style.Size, style.Weight);

    private static double Other(char c) => c switch
    {
        '\u00a0' => 236,
        '\u202f' or '\u2009' => 118,
        '–' => 588,
        '—' => 780,
        '×' or '−' or '±' or '≤' or '≥' => 600,
        '·' => 349,
        '°' => 469,
        '²' or '³' or '¹' or (>= '⁰' and <= '⁻') => 378,
        '…' or '½' => 872,
        _ => Unknown,
    };
}
