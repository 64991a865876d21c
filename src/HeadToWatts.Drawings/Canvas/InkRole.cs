namespace HeadToWatts.Drawings.Canvas;

/// <summary>
/// What a mark is for. Drawings name roles, never colours: the screen turns a role into a colour by its theme, the memo by
/// <see cref="Palette.Print"/>.
/// </summary>
public enum InkRole
{
    /// <summary>The main ink: text, outlines, dimensions.</summary>
    Ink,

    /// <summary>Quieter ink: ticks, axis titles, notes.</summary>
    Soft,

    /// <summary>Grid lines.</summary>
    Grid,

    /// <summary>Hairlines: frames and rules.</summary>
    Line,

    /// <summary>Water and what is measured in it; the accent.</summary>
    Water,

    /// <summary>Areas of water.</summary>
    WaterFill,

    /// <summary>Ground.</summary>
    Ground,

    /// <summary>Energy and losses.</summary>
    Ochre,

    /// <summary>Second line of comparison.</summary>
    Green,

    /// <summary>Third line of comparison.</summary>
    Plum,

    /// <summary>Cautions, and nothing else.</summary>
    Amber,

    /// <summary>Background of cautions.</summary>
    AmberFill,

    /// <summary>The page.</summary>
    Paper,

    /// <summary>The card a drawing stands on.</summary>
    Card,
}
