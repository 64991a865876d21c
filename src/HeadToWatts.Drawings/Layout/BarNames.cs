using HeadToWatts.Drawings.Canvas;

namespace HeadToWatts.Drawings.Layout;

/// <summary>Names beside bars.</summary>
internal static class BarNames
{
    /// <summary>The name, shortened with dots where the room is too small.</summary>
    internal static string Fitted(string name, double room, double size, bool strong = false)
    {
        var text = name;
        while (text.Length > 1 && TextMeasure.Width(text, size, strong ? TextWeight.SemiBold : TextWeight.Regular) > room)
            text = text.TrimEnd('…')[..^1].TrimEnd() + "…";
        return text;
    }
}
