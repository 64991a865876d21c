using HeadToWatts.Drawings;

namespace HeadToWatts.Web.Sessions;

/// <summary>Sizes of the drawings for the window they are seen in, so that their type is shown one to one.</summary>
/// <param name="Wide">Over the whole column.</param>
/// <param name="Half">Half the column; the same as wide where the column holds only one.</param>
public sealed record PictureSizes(DrawingSize Wide, DrawingSize Half)
{
    private const double Stages = 200;
    private const double Inputs = 350;
    private const double Gap = 24;
    private const double CardEdge = 30;

    /// <summary>For a desk screen of 1280 pixels.</summary>
    public static PictureSizes Usual { get; } = For(1280);

    /// <summary>For a window of so many CSS pixels. The widths at which the page is laid out anew are those of the style sheet.</summary>
    /// <param name="windowWidth">Width of the window.</param>
    public static PictureSizes For(int windowWidth)
    {
        if (windowWidth <= 760)
        {
            var phone = Math.Clamp(windowWidth - 28 - CardEdge, 280, 720);
            var narrow = new DrawingSize(phone, Math.Clamp(phone * 0.72, 230, 320), TypeScale.Compact);
            return new PictureSizes(narrow, narrow);
        }

        var main = Math.Min(windowWidth - Stages, 1500) - (2 * Gap);
        var column = (windowWidth <= 980 ? main : main - Inputs - Gap) - 8;
        var half = ((column - 16) / 2) - CardEdge;
        return new PictureSizes(
            new DrawingSize(column - CardEdge, Math.Clamp((column - CardEdge) * 0.42, 250, 380), TypeScale.Screen),
            new DrawingSize(half, Math.Clamp(half * 0.78, 235, 340), TypeScale.Screen));
    }
}
