namespace HeadToWatts.Drawings;

/// <summary>Sizes of type in drawing units.</summary>
/// <param name="Tick">Numbers at the ticks.</param>
/// <param name="Label">Labels and axis titles.</param>
/// <param name="Strong">Labels that carry the answer.</param>
public sealed record TypeScale(double Tick, double Label, double Strong)
{
    /// <summary>A screen.</summary>
    public static TypeScale Screen { get; } = new(11.5, 12, 13);

    /// <summary>A phone: small, but never below 11.</summary>
    public static TypeScale Compact { get; } = new(11, 11.5, 12);

    /// <summary>The memo, in points.</summary>
    public static TypeScale Print { get; } = new(7.5, 8, 8.5);
}

/// <summary>Size of a drawing. Text is sized for showing it one to one.</summary>
/// <param name="Width">Width in drawing units.</param>
/// <param name="Height">Height in drawing units.</param>
/// <param name="Type">Sizes of type.</param>
public sealed record DrawingSize(double Width, double Height, TypeScale Type)
{
    /// <summary>A card over the whole width.</summary>
    public static DrawingSize Wide { get; } = new(860, 300, TypeScale.Screen);

    /// <summary>Half a card.</summary>
    public static DrawingSize Half { get; } = new(420, 270, TypeScale.Screen);

    /// <summary>A phone held upright.</summary>
    public static DrawingSize Phone { get; } = new(360, 270, TypeScale.Compact);

    /// <summary>A figure over the width of a memo page, in points.</summary>
    public static DrawingSize MemoPage { get; } = new(480, 230, TypeScale.Print);
}
