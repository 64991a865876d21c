using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Memos.Content;

namespace HeadToWatts.Memos.Layout;

/// <summary>Sizes, distances and colours of the memo: one place to change its look.</summary>
internal static class Look
{
    public const double MarginXPt = 62;
    public const double HeaderBaselinePt = 46;
    public const double HeaderRulePt = 55;
    public const double BodyTopPt = 84;
    public const double FirstBodyTopPt = 52;
    public const double FooterRuleFromBottomPt = 52;
    public const double FooterBaselineFromBottomPt = 38;
    public const double BodyBottomFromBottomPt = 74;

    public const double BodyPt = 10;
    public const double BodyLeadingPt = 14.6;
    public const double LeadPt = 11;
    public const double LeadLeadingPt = 16;
    public const double NotePt = 8.5;
    public const double NoteLeadingPt = 12;
    public const double TablePt = 8.5;
    public const double TableLeadingPt = 11.6;
    public const double CaptionPt = 8.5;
    public const double CaptionLeadingPt = 12;
    public const double SmallPt = 8;

    public static Rgb Ink => Palette.Print[InkRole.Ink];

    public static Rgb Soft => Palette.Print[InkRole.Soft];

    public static Rgb Accent => Palette.Print[InkRole.Water];

    public static Rgb Amber => Palette.Print[InkRole.Amber];

    public static Rgb AmberTint => Palette.Print[InkRole.AmberFill];

    public static Rgb Hairline => new(0xc9, 0xd0, 0xd6);

    public static Rgb Zebra => new(0xf4, 0xf7, 0xf9);

    public static Rgb HeadTint => new(0xe6, 0xee, 0xf4);

    public static Rgb ChosenTint => new(0xda, 0xea, 0xf4);

    public static (double WidthPt, double HeightPt) Size(Paper paper) => paper == Paper.Letter ? (612, 792) : (595.276, 841.890);
}
