namespace HeadToWatts.Drawings.Canvas;

/// <summary>A place on a drawing.</summary>
/// <param name="X">Drawing units from the left.</param>
/// <param name="Y">Drawing units from the top, downwards.</param>
public readonly record struct Point(double X, double Y);

/// <summary>How a line is broken.</summary>
public enum Dash
{
    /// <summary>Unbroken.</summary>
    Solid,

    /// <summary>Seven on, four off.</summary>
    Dashed,

    /// <summary>Two on, three off.</summary>
    Dotted,
}

/// <summary>How a line is drawn.</summary>
/// <param name="Role">What the line is for.</param>
/// <param name="Width">Width in drawing units.</param>
/// <param name="Dash">How it is broken; lengths as in <see cref="Stroke.Pattern"/>.</param>
/// <param name="Opacity">0 to 1.</param>
public readonly record struct Stroke(InkRole Role, double Width = 1, Dash Dash = Dash.Solid, double Opacity = 1)
{
    /// <summary>On and off lengths in drawing units; empty for an unbroken line.</summary>
    public IReadOnlyList<double> Pattern => Dash switch
    {
        Dash.Dashed => [7, 4],
        Dash.Dotted => [2, 3],
        _ => [],
    };
}

/// <summary>How an area is filled.</summary>
/// <param name="Role">What the area is for.</param>
/// <param name="Opacity">0 to 1.</param>
public readonly record struct Fill(InkRole Role, double Opacity = 1);

/// <summary>Filling and outline of a shape; either may be missing.</summary>
/// <param name="Fill">The filling.</param>
/// <param name="Stroke">The outline.</param>
public readonly record struct Paint(Fill? Fill, Stroke? Stroke)
{
    /// <summary>A filled shape without outline.</summary>
    public static Paint Filled(InkRole role, double opacity = 1) => new(new Fill(role, opacity), null);

    /// <summary>An outline alone.</summary>
    public static Paint Outlined(InkRole role, double width = 1) => new(null, new Stroke(role, width));
}

/// <summary>Where the point given for a text lies along its line.</summary>
public enum TextAnchor
{
    /// <summary>At its beginning.</summary>
    Start,

    /// <summary>At its middle.</summary>
    Middle,

    /// <summary>At its end.</summary>
    End,
}

/// <summary>Weight of a text.</summary>
public enum TextWeight
{
    /// <summary>Regular, 400.</summary>
    Regular,

    /// <summary>Semi-bold, 600.</summary>
    SemiBold,
}

/// <summary>How a text is set. The face is the surrounding page's: the screen's own, IBM Plex Sans in the memo.</summary>
/// <param name="Role">What the text is for.</param>
/// <param name="Size">Type size in drawing units.</param>
/// <param name="Anchor">Where the given point lies along the line.</param>
/// <param name="Weight">Weight.</param>
/// <param name="RotationDeg">Turn about the given point in degrees, clockwise.</param>
/// <param name="Halo">
/// True for a label that may stand on lines: it is set off by a rim (or a backing) in the card's colour.
/// </param>
public readonly record struct TextStyle(
    InkRole Role, double Size, TextAnchor Anchor = TextAnchor.Start, TextWeight Weight = TextWeight.Regular, double RotationDeg = 0, bool Halo = false);
